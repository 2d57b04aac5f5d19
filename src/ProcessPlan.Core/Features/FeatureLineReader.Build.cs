using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Decides what the parts mean together, and makes the feature or says everything that stands against it.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>A deviation of this size or more without a decimal mark was almost certainly meant in micrometres.</summary>
    private const long SuspiciousDeviation = Length.PicometresPerMillimetre;

    private const long FinestNanometres = 6;
    private const long CoarsestNanometres = 400_000;

    public Parsed<FeatureRequest> Build()
    {
        DecideEither();
        PartMaterialsFromSizes();
        FeatureRequest? request = _classes.Count switch
        {
            0 => BuildTyped(),
            1 => BuildClass(),
            2 => BuildFit(),
            _ => Refuse($"'{Show(_classes[2].Place)}' is a third tolerance class.", _classes[2].Place, "one class, or two for a fit such as H7/k6"),
        };
        if (_problems is not null || request is null)
        {
            _problems!.Sort(static (a, b) => a.At.CompareTo(b.At));
            return Parsed<FeatureRequest>.Failed(_problems);
        }

        return Parsed<FeatureRequest>.Of(request);
    }

    private FeatureRequest? Refuse(string message, Place place, string expected)
    {
        Report(message, place, expected);
        return null;
    }

    private readonly bool ProblemAt(int at) => _problems is not null && _problems.Exists(problem => problem.At == at);

    private readonly bool HasTolerance => _classes.Count > 0 || _deviations.Is || _limitPair.Is || _general.Is;

    /// <summary>"N7", "x6" and "D9" become the tolerance class only where none is given otherwise.</summary>
    private void DecideEither()
    {
        int chosen = -1;
        if (!HasTolerance)
        {
            for (int i = 0; i < _either.Count; i++)
            {
                EitherNote note = _either[i];
                bool possible = note.Kind switch
                {
                    EitherKind.Extent => note.AfterSize && FitsKind(note.Class),
                    EitherKind.Diameter => _sizes.Count > 0 || _either.Count > 1,
                    _ => true,
                };
                if (possible && (chosen < 0 || (note.AfterSize && !_either[chosen].AfterSize)))
                {
                    chosen = i;
                }
            }
        }

        for (int i = 0; i < _either.Count; i++)
        {
            EitherNote note = _either[i];
            if (i == chosen)
            {
                _classes.Add(new ClassNote(note.Class, note.Place));
            }
            else
            {
                TakeEither(note.Kind, note.Number, note.Place);
            }
        }
    }

    private readonly bool FitsKind(ToleranceClass c) => !_kind.Is || _kind.Value.IsInternal() == c.IsInternal;

    /// <summary>"6061" and "1.4301" are numbers too; they name a material where another number is the size.</summary>
    private void PartMaterialsFromSizes()
    {
        int needed = _limitPair.Is ? 0 : 1;
        for (int i = _sizes.Count - 1; i >= 0 && _sizes.Count > needed; i--)
        {
            Place place = _sizes[i].Place;
            if (!ToleranceFollows(place.End) && _materials.TryFind(_text.Slice(place.At, place.Length), out string material))
            {
                _sizes.RemoveAt(i);
                Note(ref _material, material, place, "material");
            }
        }

        for (int i = 1; i < _sizes.Count; i++)
        {
            Report($"'{Show(_sizes[i].Place)}' is a second size after '{Show(_sizes[0].Place)}'.", _sizes[i].Place,
                "one size; a length is written x 40, a wall wall 2, a quantity 200off");
        }

        if (needed == 0 && _sizes.Count > 0)
        {
            Report($"'{Show(_sizes[0].Place)}' is a size beside the limits '{Show(_limitPair.Place)}'.", _sizes[0].Place, "either a size or two limits");
        }
    }

    private readonly bool ToleranceFollows(int end)
    {
        int next = AfterSpaces(end);
        if (_deviations.Is && _deviations.Place.At == next)
        {
            return true;
        }

        for (int i = 0; i < _classes.Count; i++)
        {
            if (_classes[i].Place.At == next)
            {
                return true;
            }
        }

        return false;
    }

    private bool TrySize(out Length nominal)
    {
        nominal = default;
        if (_sizes.Count == 0)
        {
            // A sign in the wrong place has already been told.
            if (_problems is null)
            {
                Report("There is no size.", new Place(0, _text.Length), "a size with its tolerance, such as 25H7 or 60 +0.030/0");
            }

            return false;
        }

        Measured size = _sizes[0];
        if (size.IsFraction && size.Unit == WrittenUnit.None && _unitPlace is null)
        {
            Report($"'{Show(size.Place)}' is a fraction without a unit.", size.Place, $"{Show(size.Place)} in");
            return false;
        }

        return TryConvert(size, out nominal);
    }

    /// <summary>Converts and demands a size above zero.</summary>
    private bool TryConvert(Measured number, out Length length)
    {
        if (!number.TryLength(_unit, out length))
        {
            Report($"'{Show(number.Place)}' is finer or larger than a length can hold.", number.Place, "at most nine decimal places of a millimetre");
            return false;
        }

        if (length <= Length.Zero)
        {
            Report($"'{Show(number.Place)}' is no size.", number.Place, "a size above 0");
            return false;
        }

        return true;
    }

    private Length? Optional(Noted<Measured> note) => note.Is && TryConvert(note.Value, out Length length) ? length : null;

    private FeatureRequest? BuildTyped()
    {
        if (!_kind.Is)
        {
            Report("The line does not say whether this is a hole or a shaft.", new Place(0, _text.Length), "hole, shaft, slot or tongue, or a tolerance class, whose letter says it");
        }

        Length nominal;
        SizeWindow limits;
        if (_limitPair.Is)
        {
            if (!TryConvert(_limitPair.Value.First, out Length one) || !TryConvert(_limitPair.Value.Second, out Length two))
            {
                return null;
            }

            limits = new SizeWindow(one < two ? one : two, one < two ? two : one);
            nominal = Roundest(limits, !_kind.Is || _kind.Value.IsInternal());
            if (_deviations.Is)
            {
                return Refuse($"Deviations '{Show(_deviations.Place)}' beside the limits '{Show(_limitPair.Place)}'.", _deviations.Place, "either deviations or limits");
            }
        }
        else if (!TrySize(out nominal))
        {
            return null;
        }
        else if (_deviations.Is)
        {
            if (!TryDeviationLimits(nominal, out limits))
            {
                return null;
            }
        }
        else if (_general.Is)
        {
            if (Iso2768.Find(nominal, _general.Value) is not { } permissible)
            {
                return Refuse($"ISO 2768-1 gives no tolerance {Iso2768.Name(_general.Value)} for {nominal}.", _general.Place, "a class, deviations or limits");
            }

            limits = new SizeWindow(nominal - permissible, nominal + permissible);
        }
        else
        {
            // A tolerance that could not be read has already been told.
            return ProblemAt(AfterSpaces(_sizes[0].Place.End)) ? null : Refuse($"'{Show(_sizes[0].Place)}' has no tolerance.", _sizes[0].Place, GeneralOffer(nominal));
        }

        return Make(_kind.Value, nominal, limits, null, _general.Is ? _general.Value : null) is { } feature ? new FeatureRequest(feature, null) : null;
    }

    private static string GeneralOffer(Length nominal)
    {
        string offer = "a class, deviations or limits";
        foreach (GeneralTolerance general in Enum.GetValues<GeneralTolerance>())
        {
            if (Iso2768.Find(nominal, general) is { } permissible)
            {
                offer += $"{(offer.Contains("2768", StringComparison.Ordinal) ? "," : "; or by name")} {Iso2768.Name(general)} (±{DecimalText.Format(permissible.Picometres, Length.MillimetrePlaces)} mm)";
            }
        }

        return offer;
    }

    private bool TryDeviationLimits(Length nominal, out SizeWindow limits)
    {
        limits = default;
        DeviationNote note = _deviations.Value;
        if (!TryDeviation(note.First, note.FirstSign, nominal, out Deviation first) || !TryDeviation(note.Second, note.SecondSign, nominal, out Deviation second))
        {
            return false;
        }

        (Deviation lower, Deviation upper) = first < second ? (first, second) : (second, first);
        if (nominal + lower <= Length.Zero)
        {
            Report($"With '{Show(_deviations.Place)}' the smallest size is not above 0.", _deviations.Place, "deviations smaller than the size");
            return false;
        }

        if (lower == upper)
        {
            Report($"'{Show(_deviations.Place)}' leaves no tolerance.", _deviations.Place, "two different deviations, such as +0.030/0");
            return false;
        }

        limits = new SizeWindow(nominal + lower, nominal + upper);
        return true;
    }

    private bool TryDeviation(Measured number, int sign, Length nominal, out Deviation deviation)
    {
        bool exact = number.TryLength(_unit, out Length size);
        deviation = new Deviation(sign * size.Picometres);
        if (!exact)
        {
            Report($"'{Show(number.Place)}' is finer or larger than a length can hold.", number.Place, "at most nine decimal places of a millimetre");
            return false;
        }

        bool whole = number.Number.Places == 0 && number.Unit == WrittenUnit.None && _unit == LengthUnit.Millimetre;
        if (whole && size.Picometres >= SuspiciousDeviation && size.Picometres * 10 > nominal.Picometres)
        {
            string um = Show(number.Place) + "um";
            Report($"'{Show(number.Place)}' would be a deviation of {size}, a large part of the size itself.", number.Place,
                $"{um} for micrometres, or {Show(number.Place)}.0 if millimetres are meant");
            return false;
        }

        return true;
    }

    /// <summary>The size with the fewest decimals inside the limits; among several, the one nearest to the maximum-material limit.</summary>
    private static Length Roundest(SizeWindow limits, bool isInternal)
    {
        for (long step = 1000 * Length.PicometresPerMillimetre; step > 1; step /= 10)
        {
            Length low = limits.Min.RoundUp(new Length(step));
            Length high = limits.Max.RoundDown(new Length(step));
            if (low <= high && low > Length.Zero)
            {
                return isInternal ? low : high;
            }
        }

        return isInternal ? limits.Min : limits.Max;
    }

    private FeatureRequest? BuildClass()
    {
        ClassNote note = _classes[0];
        FeatureKind kind = _kind.Is ? _kind.Value : note.Class.IsInternal ? FeatureKind.Hole : FeatureKind.Shaft;
        if (kind.IsInternal() != note.Class.IsInternal)
        {
            string mirror = note.Class.Mirror.ToString();
            return Refuse(
                $"'{Show(_kind.Place)}' is {(kind.IsInternal() ? "internal" : "external")}, but {note.Class} is a class for {(kind.IsInternal() ? "external" : "internal")} features.",
                note.Place, $"{mirror} for a {kind.Word()}, or another word for {note.Class}");
        }

        if (RefuseSecondTolerance(note.Place) | !TrySize(out Length nominal) || !TryClassLimits(nominal, note, out SizeWindow limits))
        {
            return null;
        }

        return Make(kind, nominal, limits, note.Class, null) is { } feature ? new FeatureRequest(feature, null) : null;
    }

    private bool RefuseSecondTolerance(Place classPlace)
    {
        Place? second = _deviations.Is ? _deviations.Place : _limitPair.Is ? _limitPair.Place : _general.Is ? _general.Place : null;
        if (second is { } place)
        {
            Report($"'{Show(place)}' beside the class '{Show(classPlace)}'.", place, "one tolerance: a class, deviations, limits or a general tolerance");
        }

        return second is not null;
    }

    private FeatureRequest? BuildFit()
    {
        (ClassNote first, ClassNote second) = (_classes[0], _classes[1]);
        if (first.Class.IsInternal == second.Class.IsInternal)
        {
            return Refuse($"'{Show(second.Place)}' is a second class for {(second.Class.IsInternal ? "internal" : "external")} features.", second.Place,
                $"one class, or a fit such as {(second.Class.IsInternal ? second.Class : second.Class.Mirror)}/{(first.Class.IsInternal ? first.Class.Mirror : first.Class)}");
        }

        if (_kind is { Is: true, Value: FeatureKind.Hole or FeatureKind.Shaft })
        {
            Report($"'{Show(_kind.Place)}' names one feature, but {Show(first.Place.To(second.Place))} is a fit of two.", _kind.Place,
                "the fit without this word, or one class");
        }

        (ClassNote hole, ClassNote shaft) = first.Class.IsInternal ? (first, second) : (second, first);
        if (RefuseSecondTolerance(hole.Place) | !TrySize(out Length nominal)
            || !(TryClassLimits(nominal, hole, out SizeWindow inside) & TryClassLimits(nominal, shaft, out SizeWindow outside)))
        {
            return null;
        }

        bool flat = _kind is { Is: true, Value: FeatureKind.Slot or FeatureKind.Tongue };
        Feature? internalFeature = Make(flat ? FeatureKind.Slot : FeatureKind.Hole, nominal, inside, hole.Class, null);
        return internalFeature is null ? null : new FeatureRequest(internalFeature, internalFeature with
        {
            Kind = flat ? FeatureKind.Tongue : FeatureKind.Shaft,
            Limits = outside,
            Class = shaft.Class,
            End = null,
            BottomRoom = null,
            Wall = null,
        });
    }

    private bool TryClassLimits(Length nominal, ClassNote note, out SizeWindow limits)
    {
        ClassLookup found = Iso286.Find(nominal, note.Class);
        if (!found.IsDefined)
        {
            ClassRefusal refusal = Iso286.Explain(nominal, note.Class);
            Report(refusal.Message, note.Place, refusal.Nearest.Count > 0 ? string.Join(" or ", refusal.Nearest) : "a size up to 3150 mm");
            limits = default;
            return false;
        }

        if (nominal + found.Lower <= Length.Zero)
        {
            Report($"At {nominal} the class {note.Class} would reach down to a size of 0 or less.", note.Place, "a larger size or a finer class");
            limits = default;
            return false;
        }

        limits = new SizeWindow(nominal + found.Lower, nominal + found.Upper);
        return true;
    }

    private Feature? Make(FeatureKind kind, Length nominal, SizeWindow limits, ToleranceClass? toleranceClass, GeneralTolerance? general)
    {
        Feature feature = new()
        {
            Kind = kind,
            Nominal = nominal,
            Class = toleranceClass,
            General = general,
            Limits = limits,
            Unit = _unit,
            Extent = Optional(_extent),
            End = _end.Is ? _end.Value : null,
            BottomRoom = Optional(_bottom),
            Wall = WallOf(nominal),
            Interrupted = _interrupted,
            Finish = FinishAsked(),
            Material = _material.Is ? _material.Value : null,
            Hardness = _hardness.Is ? _hardness.Value : null,
            Treatment = TreatmentAsked(),
            Coating = CoatingAsked(),
            Geometry = GeometryAsked(),
            Start = StartAsked(kind, limits),
            Quantity = _quantity.Is ? _quantity.Value : null,
        };
        RefuseMisfits(feature);
        return _problems is null ? feature : null;
    }

    /// <summary>Words that belong to holes only, and a coating side without a coating.</summary>
    private void RefuseMisfits(Feature feature)
    {
        bool fit = _classes.Count == 2;
        if (_end.Is && feature.Kind != FeatureKind.Hole && !fit)
        {
            Report($"'{Show(_end.Place)}' is said of a {feature.Kind.Word()}.", _end.Place, "through or blind for a hole only");
        }

        if (_bottom.Is && _end is { Is: true, Value: HoleEnd.Through })
        {
            Report($"'{Show(_bottom.Place)}' in a hole that goes through.", _bottom.Place, "blind, or no room at the bottom");
        }

        if ((_wall.Is || _outerDiameter.Is) && !feature.IsInternal && !fit)
        {
            Report($"'{Show(_wall.Is ? _wall.Place : _outerDiameter.Place)}' is said of a {feature.Kind.Word()}.", _wall.Is ? _wall.Place : _outerDiameter.Place,
                "a wall around a hole only");
        }

        if (_wall.Is && _outerDiameter.Is)
        {
            Report($"'{Show(_outerDiameter.Place)}' beside '{Show(_wall.Place)}'.", _outerDiameter.Place, "the wall or the outer diameter, not both");
        }

        if (_coatingLimits.Is && !_coating.Is)
        {
            Report($"'{Show(_coatingLimits.Place)}' without a coating.", _coatingLimits.Place, "a coating, such as coat zinc-nickel 8-12um before");
        }
    }

    private Length? WallOf(Length nominal)
    {
        if (_outerDiameter.Is && TryConvert(_outerDiameter.Value, out Length outer))
        {
            if (outer <= nominal)
            {
                Report($"'{Show(_outerDiameter.Place)}' is not larger than the hole.", _outerDiameter.Place, $"an outer diameter above {nominal}");
                return null;
            }

            return new Length((outer.Picometres - nominal.Picometres) / 2);
        }

        return Optional(_wall);
    }

    private Roughness? FinishAsked()
    {
        if (!_finish.Is)
        {
            return null;
        }

        (FeatureWord word, Measured number) = _finish.Value;
        if (word == FeatureWord.None)
        {
            if (number.Unit == WrittenUnit.None && number.Number is { Places: 0, Units: >= 1 and <= 12 } numbered)
            {
                return Roughness.N((int)numbered.Units);
            }

            Report($"'{Show(_finish.Place)}' is no roughness class.", _finish.Place, "N1 to N12");
            return null;
        }

        const int LeastMicroinch = 4;
        if (_unit == LengthUnit.Inch && number.Unit == WrittenUnit.None && number.Number is { Places: 0, Units: >= LeastMicroinch })
        {
            Report($"'{Show(_finish.Place)}' on an inch line: micrometres or microinches?", _finish.Place, $"{Show(number.Place)}uin or {Show(number.Place)}um");
            return null;
        }

        // A microinch is 25.4 nm: the limit is held to the whole nanometre below.
        bool microinch = number.Unit == WrittenUnit.Microinch;
        if ((microinch || number.Unit is WrittenUnit.None or WrittenUnit.Micrometre)
            && number.Number.TryScale(microinch ? 254_000 : 10_000, out long tenthNanometres)
            && tenthNanometres / (microinch ? 10_000 : 10) is >= FinestNanometres and <= CoarsestNanometres and long nanometres)
        {
            Roughness asked = word == FeatureWord.Ra ? Roughness.Ra(nanometres) : Roughness.Rz(nanometres);
            if (RoughnessPairs.ToRa(asked) is not null)
            {
                return asked;
            }
        }

        Report($"'{Show(_finish.Place)}' is no roughness that can be made.", _finish.Place, word == FeatureWord.Ra ? "Ra 0.006 to 100 µm" : "Rz 0.25 to 400 µm");
        return null;
    }

    private Treatment? TreatmentAsked()
    {
        if (!_treatment.Is)
        {
            return null;
        }

        Length? depth = _treatment.Value.Depth is { } typed && TryConvert(typed, out Length length) ? length : null;
        return new Treatment(_treatment.Value.Kind, _treatment.Value.Hardness, depth);
    }

    private Coating? CoatingAsked()
    {
        if (!_coating.Is || !TryConvert(_coating.Value.Least, out Length least) || !TryConvert(_coating.Value.Most, out Length most))
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

    private List<GeometryRequirement> GeometryAsked()
    {
        if (_geometry is null)
        {
            return [];
        }

        List<GeometryRequirement> asked = [];
        foreach ((GeometryKind kind, Measured zone) in _geometry)
        {
            if (TryConvert(zone, out Length width))
            {
                asked.Add(new GeometryRequirement(kind, width));
            }
        }

        asked.Sort(static (a, b) => a.Kind.CompareTo(b.Kind));
        return asked;
    }

    private StartForm? StartAsked(FeatureKind kind, SizeWindow limits)
    {
        if (!_start.Is)
        {
            return null;
        }

        (StartKind start, Measured? typed) = _start.Value;
        if (typed is not { } number)
        {
            return new StartForm(start, null);
        }

        if (!TryConvert(number, out Length size))
        {
            return null;
        }

        bool metalOn = kind.IsInternal() ? size < limits.Min : size > limits.Max;
        if (!metalOn && start != StartKind.Bar)
        {
            Report($"'{Show(_start.Place)}' leaves no metal to cut.", _start.Place, kind.IsInternal() ? $"a blank below {limits.Min}" : $"a blank above {limits.Max}");
            return null;
        }

        return new StartForm(start, size);
    }
}
