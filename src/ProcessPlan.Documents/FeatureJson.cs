using System.Text.Json;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Documents;

/// <summary>Features as JSON: the fields of the limits always, whatever else was read where it was read.</summary>
public static class FeatureJson
{
    private const int NanometrePlaces = 3;
    private const int TenthPlaces = 1;

    private static readonly JsonEncodedText Features = JsonEncodedText.Encode("features");
    private static readonly JsonEncodedText Kind = JsonEncodedText.Encode("kind");
    private static readonly JsonEncodedText Nominal = JsonEncodedText.Encode("nominal");
    private static readonly JsonEncodedText Class = JsonEncodedText.Encode("toleranceClass");
    private static readonly JsonEncodedText Grade = JsonEncodedText.Encode("grade");
    private static readonly JsonEncodedText NearestGrade = JsonEncodedText.Encode("nearestGrade");
    private static readonly JsonEncodedText General = JsonEncodedText.Encode("generalTolerance");
    private static readonly JsonEncodedText Tolerance = JsonEncodedText.Encode("toleranceUm");
    private static readonly JsonEncodedText Upper = JsonEncodedText.Encode("upperUm");
    private static readonly JsonEncodedText Lower = JsonEncodedText.Encode("lowerUm");
    private static readonly JsonEncodedText Max = JsonEncodedText.Encode("max");
    private static readonly JsonEncodedText Min = JsonEncodedText.Encode("min");
    private static readonly JsonEncodedText Middle = JsonEncodedText.Encode("middle");
    private static readonly JsonEncodedText Unit = JsonEncodedText.Encode("unit");
    private static readonly JsonEncodedText Extent = JsonEncodedText.Encode("extent");
    private static readonly JsonEncodedText End = JsonEncodedText.Encode("end");
    private static readonly JsonEncodedText BottomRoom = JsonEncodedText.Encode("bottomRoom");
    private static readonly JsonEncodedText Wall = JsonEncodedText.Encode("wall");
    private static readonly JsonEncodedText Interrupted = JsonEncodedText.Encode("interrupted");
    private static readonly JsonEncodedText RaUm = JsonEncodedText.Encode("raUm");
    private static readonly JsonEncodedText RzUm = JsonEncodedText.Encode("rzUm");
    private static readonly JsonEncodedText Material = JsonEncodedText.Encode("material");
    private static readonly JsonEncodedText Hardness = JsonEncodedText.Encode("hardness");
    private static readonly JsonEncodedText Value = JsonEncodedText.Encode("value");
    private static readonly JsonEncodedText To = JsonEncodedText.Encode("to");
    private static readonly JsonEncodedText Scale = JsonEncodedText.Encode("scale");
    private static readonly JsonEncodedText Treatment = JsonEncodedText.Encode("treatment");
    private static readonly JsonEncodedText Depth = JsonEncodedText.Encode("depth");
    private static readonly JsonEncodedText Coating = JsonEncodedText.Encode("coating");
    private static readonly JsonEncodedText Name = JsonEncodedText.Encode("name");
    private static readonly JsonEncodedText LeastUm = JsonEncodedText.Encode("leastUm");
    private static readonly JsonEncodedText MostUm = JsonEncodedText.Encode("mostUm");
    private static readonly JsonEncodedText Limits = JsonEncodedText.Encode("limits");
    private static readonly JsonEncodedText Geometry = JsonEncodedText.Encode("geometry");
    private static readonly JsonEncodedText Zone = JsonEncodedText.Encode("zone");
    private static readonly JsonEncodedText Start = JsonEncodedText.Encode("start");
    private static readonly JsonEncodedText Size = JsonEncodedText.Encode("size");
    private static readonly JsonEncodedText Quantity = JsonEncodedText.Encode("quantity");

    /// <summary>The features of a request as the property <c>features</c> of the object that is open.</summary>
    public static void Write(Utf8JsonWriter json, FeatureRequest request)
    {
        json.WriteStartArray(Features);
        Write(json, request.First);
        if (request.Mate is { } mate)
        {
            Write(json, mate);
        }

        json.WriteEndArray();
    }

    /// <summary>One feature as an object.</summary>
    public static void Write(Utf8JsonWriter json, Feature feature)
    {
        json.WriteStartObject();
        WriteLimits(json, feature);
        WriteShape(json, feature);
        WriteMetal(json, feature);
        json.WriteEndObject();
    }

    private static void WriteLimits(Utf8JsonWriter json, Feature feature)
    {
        json.WriteString(Kind, feature.Kind.Word());
        json.WriteMillimetres(Nominal, feature.Nominal);
        if (feature.Class is { } toleranceClass)
        {
            json.WriteString(Class, toleranceClass.ToString());
            json.WriteString(Grade, toleranceClass.Grade.Text);
        }
        else
        {
            json.WriteNull(Class);
            json.WriteNull(Grade);
            json.WriteString(NearestGrade, feature.NearestGrade?.Text);
        }

        if (feature.General is { } general)
        {
            json.WriteString(General, Iso2768.Name(general));
        }

        json.WriteMicrometres(Tolerance, feature.Limits.Width);
        json.WriteMicrometres(Upper, feature.Upper);
        json.WriteMicrometres(Lower, feature.Lower);
        json.WriteMillimetres(Max, feature.Limits.Max);
        json.WriteMillimetres(Min, feature.Limits.Min);
        json.WriteMillimetres(Middle, feature.Limits.Middle);
        json.WriteString(Unit, feature.Unit == LengthUnit.Inch ? "in" : "mm");
    }

    private static void WriteShape(Utf8JsonWriter json, Feature feature)
    {
        json.WriteMillimetresIfGiven(Extent, feature.Extent);
        if (feature.End is { } end)
        {
            json.WriteString(End, end == HoleEnd.Through ? "through" : "blind");
        }

        json.WriteMillimetresIfGiven(BottomRoom, feature.BottomRoom);
        json.WriteMillimetresIfGiven(Wall, feature.Wall);
        if (feature.Interrupted)
        {
            json.WriteBoolean(Interrupted, value: true);
        }

        if (feature.Finish is { } finish)
        {
            json.WriteDecimal(finish.IsRa ? RaUm : RzUm, finish.Nanometres, NanometrePlaces);
        }

        if (feature.Geometry.Count > 0)
        {
            json.WriteStartArray(Geometry);
            foreach (GeometryRequirement requirement in feature.Geometry)
            {
                json.WriteStartObject();
                json.WriteString(Kind, Word(requirement.Kind));
                json.WriteMillimetres(Zone, requirement.Zone);
                json.WriteEndObject();
            }

            json.WriteEndArray();
        }
    }

    private static void WriteMetal(Utf8JsonWriter json, Feature feature)
    {
        if (feature.Material is { } material)
        {
            json.WriteString(Material, material);
        }

        WriteHardness(json, feature.Hardness, feature.HardnessTo);
        if (feature.Treatment is { } treatment)
        {
            json.WriteStartObject(Treatment);
            json.WriteString(Kind, Word(treatment.Kind));
            WriteHardness(json, treatment.Hardness, treatment.HardnessTo);
            json.WriteMillimetresIfGiven(Depth, treatment.Depth);
            json.WriteEndObject();
        }

        if (feature.Coating is { } coating)
        {
            json.WriteStartObject(Coating);
            json.WriteString(Name, coating.Name);
            json.WriteMicrometres(LeastUm, coating.Least - Length.Zero);
            json.WriteMicrometres(MostUm, coating.Most - Length.Zero);
            json.WriteString(Limits, coating.Limits switch { null => null, CoatingLimits.Before => "before", _ => "after" });
            json.WriteEndObject();
        }

        if (feature.Start is { } start)
        {
            json.WriteStartObject(Start);
            json.WriteString(Kind, Word(start.Kind));
            json.WriteMillimetresIfGiven(Size, start.Size);
            json.WriteEndObject();
        }

        if (feature.Quantity is { } quantity)
        {
            json.WriteNumber(Quantity, quantity);
        }
    }

    private static void WriteHardness(Utf8JsonWriter json, Hardness? asked, Hardness? to)
    {
        if (asked is { } hardness)
        {
            json.WriteStartObject(Hardness);
            json.WriteDecimal(Value, hardness.Tenths, TenthPlaces);
            if (to is { } most)
            {
                json.WriteDecimal(To, most.Tenths, TenthPlaces);
            }

            json.WriteString(Scale, hardness.Scale switch { HardnessScale.HRC => "HRC", HardnessScale.HB => "HB", _ => "HV" });
            json.WriteEndObject();
        }
    }

    private static string Word(GeometryKind kind) => kind switch
    {
        GeometryKind.Cylindricity => "cylindricity",
        GeometryKind.Roundness => "roundness",
        GeometryKind.Runout => "runout",
        GeometryKind.Coaxiality => "coaxiality",
        GeometryKind.Position => "position",
        GeometryKind.Perpendicularity => "perpendicularity",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "A characteristic that a feature line can ask for."),
    };

    private static string Word(TreatmentKind kind) => kind switch
    {
        TreatmentKind.Hardened => "hardened",
        TreatmentKind.CaseHardened => "case hardened",
        TreatmentKind.Nitrided => "nitrided",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "Hardened, case hardened or nitrided."),
    };

    private static string Word(StartKind kind) => kind switch
    {
        StartKind.Solid => "solid",
        StartKind.Cast => "cast",
        StartKind.Cored => "cored",
        StartKind.Bar => "bar",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "Solid, cast, cored or bar."),
    };
}
