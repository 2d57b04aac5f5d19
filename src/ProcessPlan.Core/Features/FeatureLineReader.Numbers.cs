using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Numbers with their unit, ranges of two numbers, and deviations.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>+1 or -1 for every sign that keyboards and drawings use, 0 for other characters.</summary>
    private static int Sign(char c) => c switch
    {
        '+' or '＋' => 1,
        '-' or '−' or '–' or '—' or '‐' or '‑' or '﹣' or '－' => -1,
        _ => 0,
    };

    /// <summary>A number, a fraction of an inch, and the unit behind it, where a number stands. Tells what is wrong with it and then returns false.</summary>
    private bool TryNumber(out Measured number)
    {
        int start = _at;
        number = default;
        bool read = DecimalText.TryRead(_text[_at..], out ExactDecimal value, out int length);
        if (!read || (CharAt(_at + length) is '.' or ',' && DigitAt(_at + length + 1)))
        {
            TakeNumberRun();
            Place run = PlaceFrom(start);
            if (read)
            {
                Report($"'{Show(run)}' has more than one decimal mark.", run, "one decimal point or comma, and no mark for thousands");
            }
            else
            {
                Report($"'{Show(run)}' has more digits than a size can hold.", run, "at most 18 digits");
            }

            return false;
        }

        _at += length;
        int in128ths = value.Places == 0 ? Fraction(ref value) : 0;
        bool apart = SpaceAt(_at);
        int unitStart = AfterSpaces(_at);
        WrittenUnit unit = ReadUnit();
        if (unit is WrittenUnit.Millimetre or WrittenUnit.Inch or WrittenUnit.Thou)
        {
            _units.Add(new UnitNote(unit == WrittenUnit.Millimetre ? LengthUnit.Millimetre : LengthUnit.Inch, PlaceFrom(unitStart), PlaceFrom(start)));
        }

        number = new Measured(value, in128ths, unit, apart && (unit is WrittenUnit.Millimetre or WrittenUnit.Inch), PlaceFrom(start));
        return true;
    }

    private void TakeNumberRun()
    {
        while (DigitAt(_at) || CharAt(_at) is '.' or ',')
        {
            _at++;
        }
    }

    /// <summary>"1/4" or "1-1/2": 2, 4, 8 … 128 below the stroke, and a true fraction. In 128ths; 0 where none stands here.</summary>
    private int Fraction(ref ExactDecimal whole)
    {
        int at = _at;
        long top = whole.Units;
        long inches = 0;
        if (CharAt(at) == '-' && DecimalText.TryRead(_text[(at + 1)..], out ExactDecimal mixed, out int mixedLength) && mixed.Places == 0)
        {
            (inches, top) = (whole.Units, mixed.Units);
            at += 1 + mixedLength;
        }

        if (CharAt(at) != '/' || !DecimalText.TryRead(_text[(at + 1)..], out ExactDecimal below, out int length)
            || below.Places > 0 || below.Units is not (2 or 4 or 8 or 16 or 32 or 64 or 128) || top <= 0 || top >= below.Units)
        {
            return 0;
        }

        _at = at + 1 + length;
        whole = new ExactDecimal(inches, 0);
        return (int)(top * 128 / below.Units);
    }

    private WrittenUnit ReadUnit()
    {
        if (CharAt(_at) is '"' or '″' or '”')
        {
            _at++;
            return WrittenUnit.Inch;
        }

        return TrySuffix("mm") ? WrittenUnit.Millimetre
            : TrySuffix("in") || TrySuffix("inch") || TrySuffix("inches") ? WrittenUnit.Inch
            : TrySuffix("um") || TrySuffix("µm") || TrySuffix("μm") ? WrittenUnit.Micrometre
            : TrySuffix("uin") || TrySuffix("µin") || TrySuffix("μin") ? WrittenUnit.Microinch
            : TrySuffix("thou") ? WrittenUnit.Thou
            : WrittenUnit.None;
    }

    /// <summary>The word, glued or after spaces, where it ends there or a length is glued to it ("25mmx40").</summary>
    private bool TrySuffix(ReadOnlySpan<char> word)
    {
        int at = AfterSpaces(_at);
        int end = at + word.Length;
        if (!_text[at..].StartsWith(word, StringComparison.OrdinalIgnoreCase)
            || (char.IsLetterOrDigit(CharAt(end)) && !(CharAt(end) is 'x' or 'X' && NumberAt(end + 1)) || CharAt(end) == '='))
        {
            return false;
        }

        _at = end;
        return true;
    }

    /// <summary>Where the second number of a range begins, as in "8-12", "8..12", "8…12", "8 to 12"; -1 where there is none.</summary>
    private readonly int SecondOfRange()
    {
        int at = AfterSpaces(_at);
        ReadOnlySpan<char> rest = _text[at..];
        int mark = Sign(CharAt(at)) < 0 || CharAt(at) == '…' ? 1
            : rest.StartsWith("...") ? 3
            : rest.StartsWith("..") || rest.StartsWith("to", StringComparison.OrdinalIgnoreCase) ? 2
            : 0;
        int second = AfterSpaces(at + mark);
        return mark > 0 && NumberAt(second) ? second : -1;
    }

    /// <summary>The second number of two limits: "60-60.03", "60.03/60". In "60 -0.03" and "60 - 0.03" stands a deviation.</summary>
    private bool TrySecondLimit(Measured first, out Measured second)
    {
        second = default;
        int mark = AfterSpaces(_at);
        int number = CharAt(mark) == '/' ? AfterSpaces(mark + 1) : SecondOfRange();
        bool signed = Sign(CharAt(mark)) < 0 && mark > _at && number == mark + 1;
        if (signed || number < 0 || !NumberAt(number))
        {
            return false;
        }

        Mark start = Here;
        _at = number;
        if (TryNumber(out second) && second.Number.ToDouble() * 2 >= first.Number.ToDouble() && !second.IsFraction)
        {
            return true;
        }

        GoBack(start);
        return false;
    }

    /// <summary>The number behind a word. Tells and returns false where there is none.</summary>
    private bool TryMeasured(FeatureWord word, Place place, out Measured number)
    {
        SkipToValue();
        int start = _at;
        if (NumberAt(_at))
        {
            return TryNumber(out number) && (word is FeatureWord.Size or FeatureWord.Diameter || !HasClass(place, number));
        }

        if (Sign(CharAt(_at)) != 0 && NumberAt(AfterSpaces(_at + 1)))
        {
            _at = AfterSpaces(_at + 1);
            if (TryNumber(out number))
            {
                Report($"'{Show(PlaceFrom(start))}' behind '{Show(place)}' has a sign.", PlaceFrom(start), "a number above 0, without a sign");
            }

            return false;
        }

        number = default;
        Report($"'{Show(place)}' needs a number behind it.", place, $"a number, such as {Show(place)} {FeatureWords.Example(word)}");
        return false;
    }

    /// <summary>Whether a tolerance class is glued to the number behind a word: "2 deep 25H7" says something else than its words. Tells it.</summary>
    private bool HasClass(Place word, Measured number)
    {
        if (number.Unit != WrittenUnit.None || CharAt(_at) is 'x' or 'X' || !ToleranceClass.TryRead(_text[_at..], out _, out int length))
        {
            return false;
        }

        Place place = new(number.Place.At, number.Place.Length + length);
        _at = _classes.Count == 0 ? _at : place.End;
        _sizeTold = true;
        Report($"'{Show(place)}' behind '{Show(word)}' is a size with its tolerance class.", place, $"{Show(number.Place)} alone, and the class behind the size");
        return true;
    }

    private void TakeMeasured(ref Noted<Measured> slot, FeatureWord word, Place place, string what)
    {
        if (TryMeasured(word, place, out Measured number))
        {
            Note(ref slot, number, place.To(number.Place), what);
        }
    }

    private bool TryDeviations()
    {
        int start = _at;
        int afterBoth = AfterPlusMinus();
        int number = AfterSpaces(afterBoth > 0 ? afterBoth : _at + 1);
        if (!NumberAt(number))
        {
            return false;
        }

        int sign = Sign(Current);
        _at = number;
        if (!TryNumber(out Measured first))
        {
            return true;
        }

        first = first with { Place = PlaceFrom(start) };
        if (afterBoth > 0)
        {
            Note(ref _deviations, new PairNote(first, 1, first, -1), first.Place, "pair of deviations");
        }
        else if (SecondDeviationFollows())
        {
            TakeSecondDeviation(first, sign);
        }
        else if (_sizes.Count == 0)
        {
            _sizeTold = true;
            Report($"'{Show(first.Place)}' stands where a size is expected.", first.Place, "a size above 0, without a sign");
        }
        else
        {
            Report($"'{Show(first.Place)}' is one deviation; the other one is missing.", first.Place, $"both, such as {Show(first.Place)}/0");
        }

        return true;
    }

    /// <summary>Behind "±", "+/-" or "+-"; 0 where none of them stands here.</summary>
    private readonly int AfterPlusMinus()
    {
        int minus = CharAt(_at + 1) == '/' ? _at + 2 : _at + 1;
        return Current == '±' ? _at + 1 : Sign(Current) > 0 && Sign(CharAt(minus)) < 0 ? minus + 1 : 0;
    }

    /// <summary>A stroke or space, then a signed number or a plain zero.</summary>
    private readonly bool SecondDeviationFollows()
    {
        int at = AfterSpaces(_at);
        bool stroke = CharAt(at) == '/';
        at = stroke ? AfterSpaces(at + 1) : at;
        bool signed = Sign(CharAt(at)) != 0 && NumberAt(AfterSpaces(at + 1));
        return signed
            || (DecimalText.TryRead(_text[at..], out ExactDecimal plain, out int length) && plain.Units == 0 && (stroke || at + length == WordEnd(at)));
    }

    private void TakeSecondDeviation(Measured first, int firstSign)
    {
        SkipSpaces();
        if (Current == '/')
        {
            _at++;
            SkipSpaces();
        }

        int start = _at;
        int sign = Sign(Current);
        if (sign != 0)
        {
            _at = AfterSpaces(_at + 1);
        }

        if (!TryNumber(out Measured second))
        {
            return;
        }

        second = second with { Place = PlaceFrom(start) };
        first = first.Unit == WrittenUnit.None ? first with { Unit = second.Unit, IsUnitApart = second.IsUnitApart } : first;
        Note(ref _deviations, new PairNote(first, firstSign, second, sign == 0 ? 1 : sign), first.Place.To(second.Place), "pair of deviations");
    }
}
