using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Decides what the parts mean together: kind, size and tolerance.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>A whole number as a deviation of more than this part of the size was almost certainly meant in a smaller unit.</summary>
    private const long SuspiciousPart = 50;

    private static readonly Length Largest = Length.FromMillimetres(100_000);

    public Parsed<FeatureRequest> Build()
    {
        DecideEither();
        DecideSize();
        DecideUnit();
        RefuseForgottenInches();
        RefuseMoreTolerances();
        FeatureRequest? request = _classes.Count > 1 ? BuildFit() : BuildOne();
        if (request is not null && ProblemCount == 0)
        {
            return Parsed<FeatureRequest>.Of(request);
        }

        return Parsed<FeatureRequest>.Failed([.. _problems!.OrderBy(static problem => problem.At)]);
    }

    private readonly bool ProblemAt(int at) => _problems is not null && _problems.Exists(problem => problem.At == at);

    /// <summary>"N7", "x6", "D9" and "H13" become the tolerance class only where none is given otherwise; the one behind the size first.</summary>
    private void DecideEither()
    {
        int chosen = -1;
        if (_classes.Count == 0 && !_deviations.Is && !_limits.Is && !_general.Is)
        {
            for (int i = 0; i < _either.Count; i++)
            {
                bool afterSize = IsRightAfterSize(_either[i].Place.At);
                bool possible = _either[i].Kind switch
                {
                    EitherKind.Extent => afterSize && FitsKind(_either[i].Class),
                    EitherKind.Diameter => _sizes.Count > 0 || _either.Count > 1,
                    _ => true,
                };
                if (possible && (chosen < 0 || (afterSize && !IsRightAfterSize(_either[chosen].Place.At))))
                {
                    chosen = i;
                }
            }
        }

        for (int i = 0; i < _either.Count; i++)
        {
            if (i == chosen)
            {
                _classes.Add(new ClassNote(_either[i].Class, _either[i].Place));
            }
            else
            {
                TakeOther(_either[i]);
            }
        }
    }

    private readonly bool FitsKind(ToleranceClass c) => !_kind.Is || _kind.Value.IsInternal() == c.IsInternal;

    /// <summary>"6061" and "1.4301" are numbers too: all but the size name materials or are one number too many.</summary>
    private void DecideSize()
    {
        _size = _limits.Is ? null : SizeAmongNumbers();
        for (int i = 0; i < _sizes.Count; i++)
        {
            Measured number = _sizes[i];
            Place place = number.Place;
            if (place == _size?.Place)
            {
                continue;
            }

            if (_materials.TryFind(At(place), out string material))
            {
                Note(ref _material, material, place, "material");
            }
            else if (IsLikeMaterialNumber(number) && place.At != _namedSizeAt)
            {
                ReportNoMaterial(place, MaterialsListed);
            }
            else if (_limits.Is)
            {
                Report($"'{Show(place)}' is a size beside the limits '{Show(_limits.Place)}'.", place, "either a size or two limits");
            }
            else if (IsLikeAlloyNumber(number) && !ProblemAt(place.End) && !ProblemAt(_size!.Value.Place.At))
            {
                Report($"'{Show(place)}' is no material of the shop book, and a second size beside '{Show(_size.Value.Place)}'.", place,
                    $"a material that shop show materials lists; a length is written x {Show(place)}");
            }
            else if (!ProblemAt(place.End) && !ProblemAt(_size!.Value.Place.At))
            {
                Report($"'{Show(place)}' is a second size beside '{Show(_size.Value.Place)}'.", place,
                    "one size; a length is written x 40, a wall wall 2, a quantity 200off");
            }
        }
    }

    /// <summary>"1.4404": a digit, a point and four digits, on a line that says nothing of inches.</summary>
    private readonly bool IsLikeMaterialNumber(Measured number)
    {
        const int PlacesOfMaterial = 4;
        const int Behind = 10_000;
        return number is { Unit: WrittenUnit.None, IsFraction: false } && number.Number.Places == PlacesOfMaterial
            && number.Number.Units is >= Behind and < 4 * Behind && !SaysInches();
    }

    /// <summary>"2024", "4130": four digits as alloys have them.</summary>
    private static bool IsLikeAlloyNumber(Measured number) => number is { Unit: WrittenUnit.None, IsFraction: false } && number.IsBareWhole
        && number.Number.Units is >= 1000 and <= 9999;

    private readonly bool SaysInches()
    {
        for (int i = 0; i < _units.Count; i++)
        {
            if (_units[i].Unit == LengthUnit.Inch)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>
    /// The number that a word calls the size, else the one with the tolerance behind it, else the first that names no material; asks where these
    /// disagree.
    /// </summary>
    private Measured? SizeAmongNumbers()
    {
        if (_sizes.Count <= 1)
        {
            return _sizes.Count == 0 ? null : _sizes[0];
        }

        _sizes.Sort(static (a, b) => a.Place.At.CompareTo(b.Place.At));
        for (int i = 0; i < _sizes.Count; i++)
        {
            Measured number = _sizes[i];
            if (number.Place.At == _namedSizeAt)
            {
                return number;
            }
        }

        Measured? withTolerance = null;
        Measured? noMaterial = null;
        for (int i = 0; i < _sizes.Count; i++)
        {
            Measured number = _sizes[i];
            withTolerance ??= ToleranceFollows(number.Place.End) ? number : null;
            noMaterial ??= _materials.TryFind(At(number.Place), out _) || IsLikeMaterialNumber(number) ? null : number;
        }

        Measured size = withTolerance ?? noMaterial ?? _sizes[0];
        bool mayBeMaterial = _materials.TryFind(At(size.Place), out _);
        if (mayBeMaterial && (withTolerance is null || noMaterial is not null))
        {
            Measured other = noMaterial ?? _sizes[1];
            Report($"'{Show(size.Place)}' and '{Show(other.Place)}' could each be the size.", size.Place,
                $"the tolerance right behind the size, and the material as mat={Show(size.Place)}");
        }

        return size;
    }

    private readonly bool ToleranceFollows(int end)
    {
        int next = AfterSpaces(end);
        bool follows = (_deviations.Is && _deviations.Place.At == next) || (_general.Is && _general.Place.At == next);
        for (int i = 0; i < _classes.Count; i++)
        {
            ClassNote note = _classes[i];
            follows |= note.Place.At == next;
        }

        return follows;
    }

    /// <summary>One tolerance a line, or the two classes of a fit.</summary>
    private void RefuseMoreTolerances()
    {
        _classes.Sort(static (a, b) => a.Place.At.CompareTo(b.Place.At));
        if (_classes.Count > 2)
        {
            Report($"'{Show(_classes[2].Place)}' is a third tolerance class.", _classes[2].Place, "one class, or two for a fit such as H7/k6");
        }

        Place? first = _classes.Count > 0 ? _classes[0].Place : null;
        RefuseSecond(_deviations.Is ? _deviations.Place : null, ref first);
        RefuseSecond(_limits.Is ? _limits.Place : null, ref first);
        RefuseSecond(_general.Is ? _general.Place : null, ref first);
    }

    private void RefuseSecond(Place? tolerance, ref Place? first)
    {
        if (tolerance is { } place && first is { } other)
        {
            Report($"'{Show(place)}' is a second tolerance beside '{Show(other)}'.", place, "one tolerance: a class, deviations, limits or a general tolerance");
        }

        first ??= tolerance;
    }

    private FeatureRequest? BuildOne()
    {
        FeatureKind? kind = DecideKind();
        bool known = TryLimits(kind, out Length nominal, out SizeWindow limits);
        Feature feature = Describe(kind ?? default, nominal, limits);
        if (kind is not null)
        {
            RefuseMisfits(feature);
        }

        return kind is not null && known ? new FeatureRequest(feature, null) : null;
    }

    /// <summary>What the word or the letter of the class says; null, and told, where they disagree or neither says anything.</summary>
    private FeatureKind? DecideKind()
    {
        if (_classes.Count == 0)
        {
            if (!_kind.Is && !(_size is { } size && ProblemAt(AfterSpaces(size.Place.End))))
            {
                Report("The line does not say whether this is a hole or a shaft.", WholeLine, "hole, shaft, slot or tongue, or a tolerance class, whose letter says it");
            }

            return _kind.Is ? _kind.Value : null;
        }

        ClassNote note = _classes[0];
        if (FitsKind(note.Class))
        {
            return _kind.Is ? _kind.Value : note.Class.IsInternal ? FeatureKind.Hole : FeatureKind.Shaft;
        }

        (string word, string letter) = note.Class.IsInternal ? ("external", "internal") : ("internal", "external");
        Report($"'{Show(_kind.Place)}' is {word}, but {note.Class} is a class for {letter} features.", note.Place,
            $"{note.Class.Mirror} for a {_kind.Value.Word()}, or another word for {note.Class}");
        return null;
    }

    private readonly Place WholeLine => new(0, _text.Length);

    private bool TryLimits(FeatureKind? kind, out Length nominal, out SizeWindow limits)
    {
        limits = default;
        if (_limits.Is)
        {
            return TryLimitPair(kind ?? FeatureKind.Hole, out nominal, out limits);
        }

        if (!TryNominal(out nominal))
        {
            return false;
        }

        if (_classes.Count > 0)
        {
            return TryClassLimits(nominal, _classes[0], out limits);
        }

        if (_deviations.Is)
        {
            return TryDeviationLimits(nominal, out limits);
        }

        if (_general.Is)
        {
            return TryGeneralLimits(nominal, out limits);
        }

        // A tolerance that could not be read has already been told.
        if (!ProblemAt(AfterSpaces(_size!.Value.Place.End)))
        {
            Report($"'{Show(_size.Value.Place)}' has no tolerance.", _size.Value.Place, GeneralOffer(nominal));
        }

        return false;
    }

    private bool TryNominal(out Length nominal)
    {
        nominal = default;
        if (_size is { } size)
        {
            return TryConvert(size, out nominal);
        }

        if (!_sizeTold)
        {
            Report("There is no size.", WholeLine, "a size with its tolerance, such as 25H7 or 60 +0.030/0");
        }

        return false;
    }

    /// <summary>The exact length of a number in the unit of the line; tells where there is none or it is larger than anything made here.</summary>
    private bool TryExact(Measured number, out Length length)
    {
        if (number.IsFraction && number.Unit == WrittenUnit.None && _unit.Value != LengthUnit.Inch)
        {
            Report($"'{Show(number.Place)}' is a fraction without a unit.", number.Place, $"{Show(number.Place)}in");
        }
        else if (number.TryLength(_unit.Value, out length) && length <= Largest)
        {
            return true;
        }
        else if (number.Number.ToDouble() * 1000 > Largest.ToMillimetres())
        {
            Report($"'{Show(number.Place)}' is too large.", number.Place, "a length of up to 100 m");
        }
        else
        {
            Report($"'{Show(number.Place)}' is finer than a length can hold.", number.Place, "at most nine decimal places of a millimetre");
        }

        length = default;
        return false;
    }

    /// <summary>Converts and demands a length above zero.</summary>
    private bool TryConvert(Measured number, out Length length)
    {
        if (!TryExact(number, out length))
        {
            return false;
        }

        if (length <= Length.Zero)
        {
            Report($"'{Show(number.Place)}' is no size.", number.Place, "a size above 0");
            return false;
        }

        return true;
    }

    private bool TryLimitPair(FeatureKind kind, out Length nominal, out SizeWindow limits)
    {
        (nominal, limits) = (default, default);
        if (!(TryConvert(_limits.Value.First, out Length one) & TryConvert(_limits.Value.Second, out Length two)))
        {
            return false;
        }

        if (one == two)
        {
            Report($"'{Show(_limits.Place)}' leaves no tolerance.", _limits.Place, "two different limits, such as 60.000-60.030");
            return false;
        }

        limits = one < two ? new SizeWindow(one, two) : new SizeWindow(two, one);
        nominal = Roundest(limits, kind.IsInternal());
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

    private bool TryClassLimits(Length nominal, ClassNote note, out SizeWindow limits)
    {
        limits = default;
        ClassLookup found = Iso286.Find(nominal, note.Class);
        if (!found.IsDefined)
        {
            ClassRefusal refusal = Iso286.Explain(nominal, note.Class);
            Report(refusal.Message, note.Place, refusal.Nearest.Count > 0 ? string.Join(" or ", refusal.Nearest) : "a size up to 3150 mm");
            return false;
        }

        if (nominal + found.Lower <= Length.Zero)
        {
            Report($"At {nominal} the class {note.Class} would reach down to a size of 0 or less.", note.Place, "a larger size or a finer class");
            return false;
        }

        limits = found.LimitsAt(nominal);
        return true;
    }

    private bool TryDeviationLimits(Length nominal, out SizeWindow limits)
    {
        limits = default;
        PairNote note = _deviations.Value;
        Place place = _deviations.Place;
        bool symmetric = note.First.Place == note.Second.Place;
        bool exact = TryDeviation(note.First, nominal, out Deviation first);
        Deviation second = first;
        if (!(exact & (symmetric || TryDeviation(note.Second, nominal, out second))))
        {
            return false;
        }

        first = note.FirstSign < 0 ? -first : first;
        second = note.SecondSign < 0 ? -second : second;

        if (first == second)
        {
            Report($"'{Show(place)}' leaves no tolerance.", place, "two different deviations, such as +0.030/0");
            return false;
        }

        (Deviation lower, Deviation upper) = first < second ? (first, second) : (second, first);
        if (nominal + lower <= Length.Zero)
        {
            Report($"With '{Show(place)}' the smallest size is not above 0.", place, "deviations smaller than the size");
            return false;
        }

        limits = new SizeWindow(nominal + lower, nominal + upper);
        return true;
    }

    private bool TryDeviation(Measured number, Length nominal, out Deviation deviation)
    {
        bool exact = TryExact(number, out Length size);
        deviation = new Deviation(size.Picometres);
        if (exact && number.IsBareWhole && size.Picometres * SuspiciousPart > nominal.Picometres)
        {
            (string small, string large) = _unit.Value == LengthUnit.Inch ? ("thou", "inches") : ("um", "millimetres");
            Report($"The deviation '{Show(number.Place)}' is a large part of the size itself.", number.Place,
                $"{number.Number}{small}, or {number.Number}.0 if {large} are meant");
            return false;
        }

        return exact;
    }

    private bool TryGeneralLimits(Length nominal, out SizeWindow limits)
    {
        limits = default;
        if (Iso2768.Find(nominal, _general.Value) is not { } permissible || nominal - permissible <= Length.Zero)
        {
            Report($"ISO 2768-1 gives no tolerance {Iso2768.Name(_general.Value)} for {nominal}.", _general.Place, "a class, deviations or limits");
            return false;
        }

        limits = new SizeWindow(nominal - permissible, nominal + permissible);
        return true;
    }

    private static string GeneralOffer(Length nominal)
    {
        List<string> byName = [];
        foreach (GeneralTolerance general in Enum.GetValues<GeneralTolerance>())
        {
            if (Iso2768.Find(nominal, general) is { } permissible)
            {
                byName.Add($"{Iso2768.Name(general)} (±{DecimalText.Format(permissible.Picometres, Length.MillimetrePlaces)} mm)");
            }
        }

        return "a class, deviations or limits" + (byName.Count > 0 ? "; or by name " + string.Join(", ", byName) : "");
    }

    private FeatureRequest? BuildFit()
    {
        (ClassNote first, ClassNote second) = (_classes[0], _classes[1]);
        if (first.Class.IsInternal == second.Class.IsInternal)
        {
            (ToleranceClass capital, ToleranceClass small) = second.Class.IsInternal ? (first.Class, second.Class.Mirror) : (first.Class.Mirror, second.Class);
            Report($"'{Show(second.Place)}' is a second class for {(second.Class.IsInternal ? "internal" : "external")} features.", second.Place,
                $"one class, or a fit such as {capital}/{small}");
        }

        RefuseForOneOnly(_kind.Is && _kind.Value.IsRound() ? _kind.Place : null);
        RefuseForOneOnly(_coating.Is ? _coating.Place : null);
        RefuseForOneOnly(_start.Is ? _start.Place : null);
        (ClassNote inside, ClassNote outside) = first.Class.IsInternal ? (first, second) : (second, first);
        SizeWindow hole = default;
        SizeWindow shaft = default;
        bool known = TryNominal(out Length nominal) && (TryClassLimits(nominal, inside, out hole) & TryClassLimits(nominal, outside, out shaft));
        bool round = !_kind.Is || _kind.Value.IsRound();
        Feature internalFeature = Describe(round ? FeatureKind.Hole : FeatureKind.Slot, nominal, hole);
        RefuseMisfits(internalFeature);
        return known ? new FeatureRequest(internalFeature with { Class = inside.Class }, internalFeature with
        {
            Kind = round ? FeatureKind.Shaft : FeatureKind.Tongue,
            Limits = shaft,
            Class = outside.Class,
            End = null,
            BottomRoom = null,
            Wall = null,
        }) : null;
    }

    /// <summary>Words that could mean either part of a fit.</summary>
    private void RefuseForOneOnly(Place? word)
    {
        if (word is { } place)
        {
            Report($"'{Show(place)}' is said of one feature, but {_classes[0].Class} and {_classes[1].Class} are two.", place,
                "the fit without this, or one class; the other part in a line of its own");
        }
    }
}
