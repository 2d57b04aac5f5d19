using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>What belongs to a word: its roughness, its hardness, its name and range.</content>
internal ref partial struct FeatureLineReader
{
    private const int MostPieces = 1_000_000_000;

    private const string CoatingExpected = "such as coat zinc-nickel 8-12um";

    /// <summary>How a range of hardness is written: 58-62, 58+4, 58+4/0, 60±2.</summary>
    private enum RangeForm
    {
        To,
        Plus,
        PlusZero,
        PlusMinus,
    }

    /// <summary>A hardness as written; a range has its end, or how far it reaches, in <paramref name="Other"/>.</summary>
    private readonly record struct HardnessNote(Measured Number, Measured? Other, RangeForm Form, HardnessScale Scale, Place Place);

    private void TakeGeometry(FeatureWord word, Place place)
    {
        if (!TryMeasured(word, place, out Measured zone))
        {
            return;
        }

        GeometryKind kind = (GeometryKind)(word - FeatureWord.Cylindricity);
        for (int i = 0; i < _geometry.Count; i++)
        {
            GeometryNote known = _geometry[i];
            if (known.Kind == kind)
            {
                Report($"A second '{Show(place)}'.", place.To(zone.Place), "each form or position once");
                return;
            }
        }

        _geometry.Add(new GeometryNote(kind, zone));
    }

    private void NoteQuantity(Measured number, Place place)
    {
        if (!number.IsBareWhole || number.Number.Units is < 1 or > MostPieces)
        {
            Report($"'{Show(place)}' is no number of pieces.", place, "a whole number from 1, such as 200off");
            return;
        }

        Note(ref _quantity, (int)number.Number.Units, place, "number of pieces");
    }

    /// <summary>"Ra 0.8", "Ra&lt;0.8", "Ra 0.8 max": roughness is a greatest value, however it is said.</summary>
    private void TakeRoughness(FeatureWord word, Place place)
    {
        SkipSpaces();
        if (CharAt(_at) is '>' or '≥')
        {
            Report($"'{Show(place)}' asks for a least roughness.", place.To(new Place(_at, 1)), $"the greatest one, such as {Show(place)} {FeatureWords.Example(word)}");
            _at++;
        }
        else if (CharAt(_at) is '<' or '≤')
        {
            _at++;
        }

        if (TryMeasured(word, place, out Measured number))
        {
            _ = TrySuffix("max");
            Note(ref _finish, new FinishNote(word, number), PlaceFrom(place.At), "roughness");
        }
    }

    private bool TryScale(out HardnessScale scale)
    {
        scale = TrySuffix("hrc") ? HardnessScale.HRC : TrySuffix("hbw") || TrySuffix("hb") ? HardnessScale.HB : HardnessScale.HV;
        return scale != HardnessScale.HV || TrySuffix("hv");
    }

    /// <summary>"58HRC", "58-62 HRC", "HRC 58", "HRC58", "hrc=58".</summary>
    private bool TryHardness(out HardnessNote note)
    {
        Mark start = Here;
        int letters = _at;
        while (LetterAt(letters))
        {
            letters++;
        }

        FeatureWord word = FeatureWords.Find(_text[_at..letters]);
        bool scaleFirst = word is >= FeatureWord.Hrc and <= FeatureWord.Hv;
        HardnessScale scale = scaleFirst ? HardnessScale.HRC + (word - FeatureWord.Hrc) : default;
        if (scaleFirst)
        {
            _at = letters;
            SkipToValue();
        }

        if (NumberAt(_at) && TryNumber(out Measured number))
        {
            // "HRC 58 +0.03/0": what stands apart behind the number of a scale is no part of it.
            RangeForm form = RangeForm.To;
            Measured? other = EndOfRange();
            _ = other is null && !(scaleFirst && SpaceAt(_at)) && TryReach(out form, out other);
            if (scaleFirst || TryScale(out scale))
            {
                note = new HardnessNote(number, other, form, scale, PlaceFrom(start.At));
                return true;
            }
        }

        GoBack(start);
        note = default;
        return false;
    }

    private Measured? EndOfRange()
    {
        int second = SecondOfRange();
        _at = second < 0 ? _at : second;
        return second >= 0 && TryNumber(out Measured end) ? end : null;
    }

    /// <summary>"+2", "+2/0" or "±2" behind a hardness.</summary>
    private bool TryReach(out RangeForm form, out Measured? reach)
    {
        Mark start = Here;
        (form, reach) = (RangeForm.To, null);
        SkipSpaces();
        if (AtEnd || (Current != '±' && Sign(Current) <= 0))
        {
            GoBack(start);
            return false;
        }

        int behindBoth = AfterPlusMinus();
        form = behindBoth > 0 ? RangeForm.PlusMinus : RangeForm.Plus;
        _at = AfterSpaces(behindBoth > 0 ? behindBoth : _at + 1);
        if (!NumberAt(_at) || !TryNumber(out Measured number))
        {
            GoBack(start);
            return false;
        }

        reach = number;
        int zero = CharAt(_at) == '/' ? _at + 1 : _at;
        zero = Sign(CharAt(zero)) != 0 ? zero + 1 : zero;
        if (form == RangeForm.Plus && zero > _at && CharAt(zero) == '0' && !NumberAt(zero + 1))
        {
            _at = zero + 1;
            form = RangeForm.PlusZero;
        }

        return true;
    }

    /// <summary>"58+4 HRC" and "60±2HRC", but not the size in "25 ±0.1 HRC 28".</summary>
    private bool TrySpread(Measured number, out HardnessNote note)
    {
        Mark start = Here;
        if (TryReach(out RangeForm form, out Measured? reach) && TryScale(out HardnessScale scale)
            && (form == RangeForm.Plus || _sizes.Count > 0 || _limits.Is || !NumberAt(AfterSpaces(_at))))
        {
            note = new HardnessNote(number, reach, form, scale, PlaceFrom(number.Place.At));
            return true;
        }

        GoBack(start);
        note = default;
        return false;
    }

    /// <summary>The hardness, or null after telling why it is none that can be taken.</summary>
    private HardnessRange? Accept(HardnessNote note)
    {
        const int Tenth = 10;
        if (!note.Number.IsBare || !note.Number.Number.TryScale(Tenth, out long number) || note.Other is { IsBare: false })
        {
            return ReportOffScale(note);
        }

        long other = 0;
        if (note.Other is { } end && !end.Number.TryScale(Tenth, out other))
        {
            return ReportOffScale(note);
        }

        Int128 least = note.Form == RangeForm.PlusMinus ? (Int128)number - other : number;
        Int128 most = note.Other is null ? least : note.Form == RangeForm.To ? other : (Int128)number + other;
        if (!TryHardnessOf(least, note.Scale, out Hardness low) || !TryHardnessOf(most, note.Scale, out Hardness high))
        {
            return ReportOffScale(note);
        }

        if (least > most)
        {
            Report($"'{Show(note.Place)}' has the greatest hardness first.", note.Place, $"the least hardness first, such as {Hardness.Text(high, low)}");
            return null;
        }

        return new HardnessRange(low, least == most ? null : high);
    }

    private static bool TryHardnessOf(Int128 tenths, HardnessScale scale, out Hardness hardness)
    {
        hardness = default;
        return tenths >= 0 && tenths <= int.MaxValue && Hardness.TryCreate(new ExactDecimal((long)tenths, 1), scale, out hardness);
    }

    private HardnessRange? ReportOffScale(HardnessNote note)
    {
        Report($"'{Show(note.Place)}' is outside the scale.", note.Place,
            Hardness.RangeOf(note.Scale) + (note.Scale == HardnessScale.HB ? "; harder steel is given in HRC or HV" : ""));
        return null;
    }

    private void NoteHardness(HardnessNote note)
    {
        if (Accept(note) is { } hardness)
        {
            Note(ref _hardness, hardness, note.Place, "hardness");
        }
    }

    private void TakeHardness(FeatureWord word, Place place)
    {
        if (word == FeatureWord.Hardness)
        {
            SkipToValue();
        }
        else
        {
            _at = place.At;
        }

        if (TryHardness(out HardnessNote note))
        {
            NoteHardness(note);
            return;
        }

        _at = Math.Max(_at, place.End);
        ReportNoHardness(place);
    }

    private void ReportNoHardness(Place word)
    {
        if (!NumberAt(_at))
        {
            string scale = FeatureWords.Find(At(word)) is >= FeatureWord.Hrc and <= FeatureWord.Hv ? "" : "HRC";
            Report($"'{Show(word)}' needs a hardness behind it.", word, $"a hardness, such as {Show(word)} 58{scale}");
        }
        else if (TryNumber(out Measured number))
        {
            _ = EndOfRange() is not null || TryReach(out _, out _);
            Report($"'{Show(PlaceFrom(word.At))}' does not say its scale.", PlaceFrom(number.Place.At),
                $"{Show(number.Place)}HRC, {Show(number.Place)}HB or {Show(number.Place)}HV");
        }
    }

    /// <summary>"hardened 58HRC", "case 0.8", "case 0.8 58HRC", "nitrided 0.3".</summary>
    private void TakeTreatment(FeatureWord word, Place place)
    {
        SkipToValue();
        Measured? depth = null;
        HardnessRange? hardness = null;
        const int DeepestCase = 10;
        Mark behindWord = Here;
        bool hard = TryHardness(out HardnessNote asked);
        if (hard && word != FeatureWord.Hardened && asked.Number.Number.ToDouble() < DeepestCase)
        {
            // "case 0.8 HRC 58": the scale is that of the next number.
            GoBack(behindWord);
            hard = false;
        }

        if (hard)
        {
            hardness = Accept(asked);
        }
        else if (word == FeatureWord.Hardened)
        {
            ReportNoHardness(place);
        }
        else if (TryMeasured(word, place, out Measured deep))
        {
            depth = deep;
            hardness = HardnessOfCase();
        }

        if (depth is not null || hardness is not null)
        {
            Note(ref _treatment, new TreatmentNote(TreatmentKind.Hardened + (word - FeatureWord.Hardened), hardness, depth), PlaceFrom(place.At), "treatment");
        }
    }

    /// <summary>A hardness right behind the depth is that of the case if it is too hard to be the hardness as delivered.</summary>
    private HardnessRange? HardnessOfCase()
    {
        const double LeastHrc = 45;
        const double LeastOther = 450;
        Mark behindDepth = Here;
        SkipSpaces();
        if (TryHardness(out HardnessNote note) && note.Number.Number.ToDouble() >= (note.Scale == HardnessScale.HRC ? LeastHrc : LeastOther))
        {
            return Accept(note);
        }

        GoBack(behindDepth);
        return null;
    }

    /// <summary>"coat zinc-nickel 8-12um": a name of one or more words, then the least and the greatest build-up per surface.</summary>
    private void TakeCoating(Place word)
    {
        SkipToValue();
        Place name = TakeCoatingName();
        if (FeatureWords.Find(_text[_at..WordEnd(_at)]) is FeatureWord.Before or FeatureWord.After)
        {
            TakePart();
            SkipSpaces();
        }

        Mark behindName = Here;
        if (NumberAt(_at))
        {
            if (!TryNumber(out Measured least))
            {
                return;
            }

            if (EndOfRange() is { } most)
            {
                NoteCoating(word, name, least, most);
                return;
            }

            bool otherNumber = LetterAt(_at) || TryScale(out _) || TryPieces();
            if (!otherNumber)
            {
                Report($"'{Show(least.Place)}' is one thickness; a coating varies.", least.Place, "least and greatest build-up per surface, such as 8-12um");
                return;
            }

            GoBack(behindName);
        }

        Place said = name.Length > 0 ? word.To(name) : word;
        Report($"'{Show(said)}' needs {(name.Length > 0 ? "" : "a name and ")}its build-up per surface behind it.", said, CoatingExpected);
    }

    private void NoteCoating(Place word, Place name, Measured least, Measured most)
    {
        if (name.Length == 0)
        {
            Report($"'{Show(word)}' needs the name of the coating before its build-up.", word, CoatingExpected);
            return;
        }

        // Build-up is spoken in micrometres; only another written unit changes that.
        most = most.Unit == WrittenUnit.None ? most with { Unit = WrittenUnit.Micrometre } : most;
        least = least.Unit == WrittenUnit.None ? least with { Unit = most.Unit } : least;
        Note(ref _coating, new CoatingNote(At(name).ToString(), least, most), word.To(most.Place), "coating");
    }

    /// <summary>Words up to the first that is a number, a word of the line, a material or, behind the first word, has a digit.</summary>
    private Place TakeCoatingName()
    {
        int start = _at;
        int end = _at;
        while (!AtEnd && !NumberAt(_at) && Current != '=')
        {
            ReadOnlySpan<char> word = _text[_at..WordEnd(_at)];
            bool first = end == start;
            if (FeatureWords.Find(word) != FeatureWord.None || (!first && (word.ContainsAnyInRange('0', '9') || _materials.TryFind(word, out _))))
            {
                break;
            }

            end = WordEnd(_at);
            _at = end;
            SkipSeparators();
        }

        return new Place(start, end - start);
    }
}
