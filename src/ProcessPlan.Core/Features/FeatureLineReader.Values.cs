using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>What belongs to a word: its number, its hardness, its range.</content>
internal ref partial struct FeatureLineReader
{
    private const int MostPieces = 1_000_000_000;

    /// <summary>The number behind a word. Reports and returns false where there is none.</summary>
    private bool TryMeasured(Place word, out Measured number)
    {
        SkipToValue();
        if (NumberAt(_at))
        {
            return TryNumber(out number);
        }

        number = default;
        if (!AtEnd && Sign(Current) < 0 && NumberAt(AfterSpaces(_at + 1)))
        {
            int start = _at;
            _at = AfterSpaces(_at + 1);
            if (TryNumber(out Measured negative))
            {
                Place place = new(start, negative.Place.End - start);
                Report($"'{Show(place)}' behind '{Show(word)}' is negative.", place, "a number above 0");
            }

            return false;
        }

        Report($"'{Show(word)}' needs a number behind it.", word, $"a number, such as {Show(word)} 10");
        return false;
    }

    private void TakeMeasured(ref Noted<Measured> slot, Place word, string what)
    {
        if (TryMeasured(word, out Measured number))
        {
            Note(ref slot, number, word.To(number.Place), what);
        }
    }

    private void TakeGeometry(GeometryKind kind, Place word)
    {
        if (!TryMeasured(word, out Measured zone))
        {
            return;
        }

        _geometry ??= [];
        foreach ((GeometryKind known, _) in _geometry)
        {
            if (known == kind)
            {
                Report($"A second '{Show(word)}'.", word.To(zone.Place), "each form or position once");
                return;
            }
        }

        _geometry.Add((kind, zone));
    }

    private void NoteQuantity(Measured number, Place place)
    {
        if (number.Number.Places > 0 || number.IsFraction || number.Number.Units is < 1 or > MostPieces || number.Unit != WrittenUnit.None)
        {
            Report($"'{Show(place)}' is no number of pieces.", place, "a whole number from 1, such as 200off");
            return;
        }

        Note(ref _quantity, (int)number.Number.Units, place, "number of pieces");
    }

    private void TakeQuantityAfter(Place word)
    {
        if (TryMeasured(word, out Measured number))
        {
            NoteQuantity(number, word.To(number.Place));
        }
    }

    private void TakeRoughness(FeatureWord word, Place place)
    {
        if (!TryMeasured(place, out Measured number))
        {
            return;
        }

        // "Ra 0.8 in C45": nobody gives roughness in inches, so the unit is that of the line.
        TakeUnitOf(number);
        number = number.Unit is WrittenUnit.Millimetre or WrittenUnit.Inch ? number with { Unit = WrittenUnit.None } : number;
        Note(ref _finish, new FinishNote(word, number), place.To(number.Place), "roughness");
    }

    private void TakeRoughnessNumber(Measured number, Place place) =>
        Note(ref _finish, new FinishNote(FeatureWord.None, number), place, "roughness");

    private bool TryHardness(Measured number, HardnessScale scale, Place place, out Hardness hardness)
    {
        hardness = default;
        if (number.Unit == WrittenUnit.None && !number.IsFraction && TryHardness(number.Number, scale, out hardness))
        {
            return true;
        }

        Report($"'{Show(place)}' is outside the scale.", place, $"{(scale == HardnessScale.HRC ? "20 to 70" : "30 to 1000")} {scale}");
        return false;
    }

    private static bool TryHardness(ExactDecimal points, HardnessScale scale, out Hardness hardness)
    {
        bool tenths = points.TryScale(10, out long whole);
        hardness = new Hardness(whole, scale);
        return tenths && (scale == HardnessScale.HRC ? hardness.Points is >= 20 and <= 70 : hardness.Points is >= 30 and <= 1000);
    }

    /// <summary>"hardness 28HRC", "hardness=28HRC", "HRC 28", "HRC28".</summary>
    private void TakeHardness(Place word)
    {
        if (!TryMeasured(word, out Measured number))
        {
            return;
        }

        ReadOnlySpan<char> name = _text.Slice(word.At, word.Length);
        HardnessScale scale;
        if (name.Equals("hardness", StringComparison.OrdinalIgnoreCase))
        {
            if (!TryScale(out scale))
            {
                Report($"'{Show(word.To(number.Place))}' does not say its scale.", number.Place, "HRC, HB or HV behind the number");
                return;
            }
        }
        else
        {
            scale = name[1] is 'r' or 'R' ? HardnessScale.HRC : name[1] is 'v' or 'V' ? HardnessScale.HV : HardnessScale.HB;
        }

        Place place = new(word.At, _at - word.At);
        if (TryHardness(number, scale, place, out Hardness hardness))
        {
            Note(ref _hardness, hardness, place, "hardness");
        }
    }

    /// <summary>"hardened 58HRC", "case 0.8", "case 0.8 58HRC", "nitrided 0.3".</summary>
    private void TakeTreatment(FeatureWord word, Place place)
    {
        if (!TryMeasured(place, out Measured number))
        {
            return;
        }

        Hardness? hardness = null;
        Measured? depth = null;
        if (TryScale(out HardnessScale scale))
        {
            if (!TryHardness(number, scale, new Place(number.Place.At, _at - number.Place.At), out Hardness asked))
            {
                return;
            }

            hardness = asked;
        }
        else if (word == FeatureWord.Hardened)
        {
            Report($"'{Show(place.To(number.Place))}' does not say its scale.", number.Place, "HRC, HB or HV behind the number");
            return;
        }
        else
        {
            depth = number;
            hardness = HardnessOfCase();
        }

        TreatmentKind kind = word == FeatureWord.Hardened ? TreatmentKind.Hardened : word == FeatureWord.Case ? TreatmentKind.CaseHardened : TreatmentKind.Nitrided;
        Note(ref _treatment, new TreatmentNote(kind, hardness, depth), new Place(place.At, _at - place.At), "treatment");
    }

    /// <summary>A hardness right behind the depth is that of the case if it is too hard to be the hardness as delivered.</summary>
    private Hardness? HardnessOfCase()
    {
        int back = _at;
        SkipSpaces();
        if (NumberAt(_at) && DecimalText.TryRead(_text[_at..], out ExactDecimal number, out int length))
        {
            _at += length;
            if (TryScale(out HardnessScale scale) && TryHardness(number, scale, out Hardness hardness)
                && number.ToDouble() >= (scale == HardnessScale.HRC ? 45 : 450))
            {
                return hardness;
            }
        }

        _at = back;
        return null;
    }

    /// <summary>"coat zinc-nickel 8-12um": a name of one or more words, then the least and the greatest build-up per surface.</summary>
    private void TakeCoating(Place word)
    {
        SkipToValue();
        int start = _at;
        int end = _at;
        while (!AtEnd && !NumberAt(_at))
        {
            _at = WordEnd(_at);
            end = _at;
            if (!AtEnd && Current == '=')
            {
                break;
            }

            SkipSeparators();
        }

        Place name = new(start, Math.Max(end - start, 0));
        if (name.Length == 0 || AtEnd || !NumberAt(_at))
        {
            Report($"'{Show(word)}' needs the name of the coating and its build-up per surface.", word, "such as coat zinc-nickel 8-12um");
            return;
        }

        if (!TryNumber(out Measured least))
        {
            return;
        }

        int dash = AfterSpaces(_at);
        if (dash >= _text.Length || Sign(_text[dash]) >= 0 || !NumberAt(AfterSpaces(dash + 1)))
        {
            Report($"'{Show(least.Place)}' is one thickness; a coating varies.", least.Place, "least and greatest build-up per surface, such as 8-12um");
            return;
        }

        _at = AfterSpaces(dash + 1);
        if (!TryNumber(out Measured most))
        {
            return;
        }

        // Build-up is spoken in micrometres; only another written unit changes that.
        most = most.Unit == WrittenUnit.None ? most with { Unit = WrittenUnit.Micrometre } : most;
        least = least.Unit == WrittenUnit.None ? least with { Unit = most.Unit } : least;
        Note(ref _coating, new CoatingNote(_text.Slice(name.At, name.Length).ToString(), least, most), word.To(most.Place), "coating");
    }

    /// <summary>Ra or Rz with its number, or no word and an N number.</summary>
    private readonly record struct FinishNote(FeatureWord Word, Measured Number);
}
