using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Turns the other parts into what is asked of the feature.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>The feature with everything that the line says, each part told where it cannot be taken.</summary>
    private Feature Describe(FeatureKind kind, Length nominal, SizeWindow limits) => new()
    {
        Kind = kind,
        Nominal = nominal,
        Limits = limits,
        Class = _classes.Count > 0 ? _classes[0].Class : null,
        General = _general.Is ? _general.Value : null,
        Unit = _unit.Value,
        Extent = Optional(_extent),
        End = _end.Is ? _end.Value : null,
        BottomRoom = _bottom.Is && TryExact(_bottom.Value, out Length room) ? room : null,
        Wall = Optional(_wall) ?? WallInside(nominal),
        Interrupted = _interrupted.Is,
        Finish = FinishAsked(),
        Material = _material.Is ? _material.Value : null,
        Hardness = _hardness.Is ? _hardness.Value.Least : null,
        HardnessTo = _hardness.Is ? _hardness.Value.Most : null,
        Treatment = TreatmentAsked(),
        Coating = CoatingAsked(),
        Geometry = GeometryAsked(),
        Start = StartAsked(),
        Quantity = _quantity.Is ? _quantity.Value : null,
    };

    private Length? Optional(Noted<Measured> note) => note.Is && TryConvert(note.Value, out Length length) ? length : null;

    private Length? WallInside(Length nominal)
    {
        if (Optional(_outerDiameter) is not { } outer)
        {
            return null;
        }

        if (outer <= nominal)
        {
            Report($"'{Show(_outerDiameter.Place)}' is not larger than the hole.", _outerDiameter.Place, $"an outer diameter above {nominal}");
            return null;
        }

        return new Length((outer.Picometres - nominal.Picometres) / 2);
    }

    private const long PicometresPerNanometre = 1000;
    private const long FinestNanometres = 6;
    private const long CoarsestNanometres = 400_000;

    private Roughness? FinishAsked()
    {
        if (!_finish.Is)
        {
            return null;
        }

        (FeatureWord word, Measured number) = _finish.Value;
        Place place = _finish.Place;
        if (word == FeatureWord.Finish)
        {
            const int MostClasses = 12;
            if (number.IsBareWhole && number.Number.Units is >= 1 and <= MostClasses)
            {
                return Roughness.N((int)number.Number.Units);
            }

            Report($"'{Show(place)}' is no roughness class.", place, "N1 to N12");
            return null;
        }

        const int LeastMicroinch = 4;
        if (_unit.Value == LengthUnit.Inch && number.IsBareWhole && number.Number.Units >= LeastMicroinch)
        {
            Report($"'{Show(place)}' on an inch line: micrometres or microinches?", place, $"{number.Number}uin or {number.Number}um");
            return null;
        }

        // "Ra 0.8 in C45": nobody gives roughness in inches, so a unit that stands apart is that of the line.
        // Held to the whole nanometre below: a microinch is 25.4 nm.
        long unit = number.Unit == WrittenUnit.Microinch ? Length.PicometresPerMicroinch
            : number.IsBare || number.Unit == WrittenUnit.Micrometre ? Length.PicometresPerMicrometre
            : 0;
        if (unit > 0 && number.Number.TryScale(unit, out long picometres)
            && picometres / PicometresPerNanometre is >= FinestNanometres and <= CoarsestNanometres and long nanometres)
        {
            Roughness asked = word == FeatureWord.Ra ? Roughness.Ra(nanometres) : Roughness.Rz(nanometres);
            if (RoughnessPairs.ToRa(asked) is not null)
            {
                return asked;
            }
        }

        Report($"'{Show(place)}' is no roughness that can be made.", place, word == FeatureWord.Ra ? "Ra 0.006 to 100 µm" : "Rz 0.25 to 400 µm");
        return null;
    }

    private Treatment? TreatmentAsked()
    {
        if (!_treatment.Is)
        {
            return null;
        }

        TreatmentNote note = _treatment.Value;
        return new Treatment(note.Kind, note.Hardness?.Least, note.Depth is { } deep && TryConvert(deep, out Length depth) ? depth : null)
        {
            HardnessTo = note.Hardness?.Most,
        };
    }

    private Coating? CoatingAsked()
    {
        if (!_coating.Is || !(TryConvert(_coating.Value.Least, out Length least) & TryConvert(_coating.Value.Most, out Length most)))
        {
            return null;
        }

        if (least > most)
        {
            Report($"'{Show(_coating.Place)}' has the greatest build-up first.", _coating.Place, "the least build-up first, such as 8-12um");
            return null;
        }

        return new Coating(_coating.Value.Name, least, most, _coatingLimits.Is ? _coatingLimits.Value : null);
    }

    private ValueList<GeometryRequirement> GeometryAsked()
    {
        if (_geometry.Count == 0)
        {
            return [];
        }

        if (_geometry.Count == 0)
        {
            return ValueList<GeometryRequirement>.Empty;
        }

        List<GeometryRequirement> asked = [];
        for (int i = 0; i < _geometry.Count; i++)
        {
            GeometryNote note = _geometry[i];
            if (TryConvert(note.Zone, out Length zone))
            {
                asked.Add(new GeometryRequirement(note.Kind, zone));
            }
        }

        asked.Sort(static (a, b) => a.Kind.CompareTo(b.Kind));
        return [.. asked];
    }

    private StartForm? StartAsked()
    {
        if (!_start.Is)
        {
            return null;
        }

        Length? size = _start.Value.Size is { } number && TryConvert(number, out Length length) ? length : null;
        return new StartForm(_start.Value.Kind, size);
    }

    /// <summary>Words that do not belong to this kind of feature, and words that contradict each other.</summary>
    private void RefuseMisfits(Feature feature)
    {
        if (feature.Kind != FeatureKind.Hole)
        {
            RefuseOf(feature.Kind, _end.Is ? _end.Place : null, "thru or blind for a hole only");
            RefuseOf(feature.Kind, _bottom.Is ? _bottom.Place : null, "room at the bottom of a hole only");
        }
        else if (_bottom.Is && _end is { Is: true, Value: HoleEnd.Through })
        {
            Report($"'{Show(_bottom.Place)}' in a hole that goes through.", _bottom.Place, "blind, or no room at the bottom");
        }

        if (!feature.IsInternal)
        {
            RefuseOf(feature.Kind, _wall.Is ? _wall.Place : null, "a wall around a hole or slot only");
            RefuseOf(feature.Kind, _outerDiameter.Is ? _outerDiameter.Place : null, "an outer diameter around a hole only");
        }
        else if (_wall.Is && _outerDiameter.Is)
        {
            Report($"'{Show(_outerDiameter.Place)}' beside '{Show(_wall.Place)}'.", _outerDiameter.Place, "the wall or the outer diameter, not both");
        }

        if (_coatingLimits.Is && !_coating.Is)
        {
            Report($"'{Show(_coatingLimits.Place)}' without a coating.", _coatingLimits.Place, "a coating, such as coat zinc-nickel 8-12um before");
        }

        RefuseBlank(feature);
    }

    /// <summary>A blank that is used up before the feature begins, and a bar that is said of a hole.</summary>
    private void RefuseBlank(Feature feature)
    {
        if (_classes.Count <= 1 && feature is { Kind: FeatureKind.Hole, Start.Kind: StartKind.Bar })
        {
            Report($"'{Show(_start.Place)}' is the outside of the part, not of the hole.", _start.Place, $"od {Show(_start.Value.Size!.Value.Place)}");
            return;
        }

        bool typed = feature.Limits.Max > Length.Zero;
        if (!typed || feature.Start is not { Size: { } blank } start)
        {
            return;
        }

        string word = start.Kind == StartKind.Bar ? "bar" : "blank";
        if (feature.IsInternal && start.Kind != StartKind.Bar && blank >= feature.Limits.Min)
        {
            Report($"'{Show(_start.Place)}' leaves no metal to cut.", _start.Place, $"a {word} below {feature.Limits.Min}");
        }
        else if (!feature.IsInternal && blank < feature.Limits.Max)
        {
            Report($"'{Show(_start.Place)}' is smaller than the {feature.Kind.Word()}.", _start.Place, $"a {word} above {feature.Limits.Max}");
        }
        else if (!feature.IsInternal && blank == feature.Limits.Max)
        {
            Report($"'{Show(_start.Place)}' leaves no metal to cut.", _start.Place, $"a {word} above {feature.Limits.Max}");
        }
    }

    private void RefuseOf(FeatureKind kind, Place? word, string expected)
    {
        if (word is { } place)
        {
            Report($"'{Show(place)}' is said of a {kind.Word()}.", place, expected);
        }
    }
}
