using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>The parts that are glued together without spaces, as in "25H7x40": numbers, classes, deviations, and words with their number.</content>
internal ref partial struct FeatureLineReader
{
    private const int LongestWord = 20;

    private bool TryPiece()
    {
        char c = Current;
        if (c is 'Ø' or 'ø' or '⌀' or '∅')
        {
            Place place = new(_at++, 1);
            if (TryMeasured(place, out Measured size))
            {
                AddSize(size);
            }

            return true;
        }

        if (c == '±' || Sign(c) != 0)
        {
            return TryDeviations();
        }

        if (NumberAt(_at))
        {
            TakeNumber();
            return true;
        }

        return LetterOrTimes(c) && (TryEither() || TryClass() || TryWordWithNumber());
    }

    private static bool LetterOrTimes(char c) => char.IsLetter(c) || c is '×' or '*';

    /// <summary>+1 or -1 for every sign that keyboards and drawings use, 0 for other characters.</summary>
    private static int Sign(char c) => c switch
    {
        '+' or '＋' => 1,
        '-' or '−' or '–' or '—' or '‐' or '‑' or '﹣' or '－' => -1,
        _ => 0,
    };

    /// <summary>"x40", "D25" and "N7" are a length, a diameter and a roughness, or the classes x40 (none), D25 (none) and N7.</summary>
    private bool TryEither()
    {
        char c = Current;
        EitherKind? kind = c switch
        {
            'x' or 'X' or '×' or '*' => EitherKind.Extent,
            'd' or 'D' => EitherKind.Diameter,
            'N' => EitherKind.RoughnessNumber,
            _ => null,
        };
        if (kind is null || !NumberAt(_at + 1))
        {
            return false;
        }

        bool afterSize = IsRightAfterSize(_at);
        int start = _at;
        bool isClass = ToleranceClass.TryRead(_text[_at..], out ToleranceClass asClass, out int classLength);
        _at++;
        if (!TryNumber(out Measured number))
        {
            return true;
        }

        Place place = new(start, _at - start);
        if (isClass && place.Length == classLength && (kind != EitherKind.Extent || afterSize))
        {
            _either.Add(new EitherNote(asClass, kind.Value, number, afterSize, place));
            SkipFitStroke();
        }
        else
        {
            TakeEither(kind.Value, number, place);
        }

        return true;
    }

    private void TakeEither(EitherKind kind, Measured number, Place place)
    {
        switch (kind)
        {
            case EitherKind.Extent:
                Note(ref _extent, number, place, "length or depth");
                break;
            case EitherKind.Diameter:
                _sizes.Add(number);
                if (number.Place.End > _sizeEnd)
                {
                    _sizeEnd = number.Place.End;
                }

                break;
            default:
                TakeRoughnessNumber(number, place);
                break;
        }
    }

    private bool TryClass()
    {
        if (!ToleranceClass.TryRead(_text[_at..], out ToleranceClass read, out int length))
        {
            return false;
        }

        _classes.Add(new ClassNote(read, new Place(_at, length)));
        _at += length;
        SkipFitStroke();
        return true;
    }

    /// <summary>The stroke of a fit stands between two classes: H7/k6.</summary>
    private void SkipFitStroke()
    {
        int next = AfterSpaces(_at);
        if (next < _text.Length && _text[next] == '/' && LetterAt(AfterSpaces(next + 1)))
        {
            _at = AfterSpaces(next + 1);
        }
    }

    /// <summary>A known word glued to its number: "Ra0.8", "wall2", "HRC58".</summary>
    private bool TryWordWithNumber()
    {
        int end = _at;
        while (end < _text.Length && LetterOrTimes(_text[end]) && end - _at < LongestWord)
        {
            end++;
        }

        FeatureWord word = NumberAt(end) ? FeatureWords.Find(_text[_at..end]) : FeatureWord.None;
        if (word == FeatureWord.None)
        {
            return false;
        }

        Place place = new(_at, end - _at);
        _at = end;
        TakeWord(word, place, assigned: false);
        return true;
    }

    private void TakeNumber()
    {
        if (!TryNumber(out Measured number))
        {
            return;
        }

        if (TryScale(out HardnessScale scale))
        {
            Place place = new(number.Place.At, _at - number.Place.At);
            if (TryHardness(number, scale, place, out Hardness hardness))
            {
                Note(ref _hardness, hardness, place, "hardness");
            }
        }
        else if (TrySuffix("off") || TrySuffix("pcs") || TrySuffix("pieces"))
        {
            NoteQuantity(number, new Place(number.Place.At, _at - number.Place.At));
        }
        else if (number.Number.Units == 0 && !number.IsFraction && _sizes.Count > 0 && SecondDeviationFollows())
        {
            TakeSecondDeviation(number, 1);
        }
        else if (TryRange(number, out Measured second))
        {
            Note(ref _limitPair, new DeviationNote(number, 1, second, 1), number.Place.To(second.Place), "pair of limits");
            TakeUnitOf(second);
        }
        else
        {
            AddSize(number);
            TakeUnitOf(number);
        }
    }

    private void TakeUnitOf(Measured number)
    {
        if (number.Unit is WrittenUnit.Millimetre or WrittenUnit.Inch)
        {
            NoteUnit(number.Unit == WrittenUnit.Inch ? LengthUnit.Inch : LengthUnit.Millimetre, number.Place);
        }
    }

    /// <summary>A number, a fraction of an inch, and the unit behind it. Reports what is wrong with it and then returns false.</summary>
    private bool TryNumber(out Measured number)
    {
        int start = _at;
        number = default;
        if (!DecimalText.TryRead(_text[_at..], out ExactDecimal value, out int length))
        {
            Place whole = NumberRun(start);
            _at = Math.Max(whole.End, start + 1);
            Report($"'{Show(whole)}' has more digits than a size can hold.", whole, "at most 18 digits");
            return false;
        }

        _at += length;
        if (!AtEnd && Current is '.' or ',' && DigitAt(_at + 1))
        {
            Place whole = NumberRun(start);
            _at = whole.End;
            Report($"'{Show(whole)}' has more than one decimal mark.", whole, "one decimal point or comma, and no mark for thousands");
            return false;
        }

        int numerator = 0;
        bool fraction = value.Places == 0 && TryFraction(ref value, out numerator);
        WrittenUnit unit = ReadUnit();
        number = new Measured(value, numerator, fraction, unit, new Place(start, _at - start));
        return true;
    }

    private readonly Place NumberRun(int start)
    {
        int end = start;
        while (end < _text.Length && (char.IsAsciiDigit(_text[end]) || _text[end] is '.' or ','))
        {
            end++;
        }

        return new Place(start, end - start);
    }

    /// <summary>"1/4" or "1-1/2": 2, 4, 8 … 128 below the stroke, and a true fraction.</summary>
    private bool TryFraction(ref ExactDecimal whole, out int in128ths)
    {
        int at = _at;
        long top = whole.Units;
        long inches = 0;
        if (at < _text.Length && _text[at] == '-' && DecimalText.TryRead(_text[(at + 1)..], out ExactDecimal mixed, out int mixedLength) && mixed.Places == 0)
        {
            (inches, top) = (whole.Units, mixed.Units);
            at += 1 + mixedLength;
        }

        in128ths = 0;
        if (at >= _text.Length || _text[at] != '/'
            || !DecimalText.TryRead(_text[(at + 1)..], out ExactDecimal below, out int length)
            || below.Places > 0 || below.Units is not (2 or 4 or 8 or 16 or 32 or 64 or 128) || top <= 0 || top >= below.Units)
        {
            return false;
        }

        _at = at + 1 + length;
        whole = new ExactDecimal(inches, 0);
        in128ths = (int)(top * 128 / below.Units);
        return true;
    }

    private WrittenUnit ReadUnit()
    {
        if (!AtEnd && Current is '"' or '″')
        {
            _at++;
            return WrittenUnit.Inch;
        }

        return TrySuffix("mm") ? WrittenUnit.Millimetre
            : TrySuffix("inch") || TrySuffix("in") ? WrittenUnit.Inch
            : TrySuffix("um") || TrySuffix("µm") || TrySuffix("μm") ? WrittenUnit.Micrometre
            : TrySuffix("uin") || TrySuffix("µin") || TrySuffix("μin") ? WrittenUnit.Microinch
            : WrittenUnit.None;
    }

    /// <summary>Passes over the word, glued or after spaces, where it ends there.</summary>
    private bool TrySuffix(ReadOnlySpan<char> word)
    {
        int at = AfterSpaces(_at);
        int end = at + word.Length;
        if (end > _text.Length || !_text[at..end].Equals(word, StringComparison.OrdinalIgnoreCase)
            || (end < _text.Length && (char.IsLetterOrDigit(_text[end]) || _text[end] == '=')))
        {
            return false;
        }

        _at = end;
        return true;
    }

    private bool TryScale(out HardnessScale scale)
    {
        scale = HardnessScale.HRC;
        if (TrySuffix("hrc"))
        {
            return true;
        }

        scale = HardnessScale.HB;
        if (TrySuffix("hbw") || TrySuffix("hb"))
        {
            return true;
        }

        scale = HardnessScale.HV;
        return TrySuffix("hv");
    }

    private bool TryRange(Measured first, out Measured second)
    {
        second = default;
        int at = AfterSpaces(_at);
        if (at >= _text.Length)
        {
            return false;
        }

        int after = Sign(_text[at]) < 0 || _text[at] == '/' ? at + 1
            : _text[at] == '.' && at + 1 < _text.Length && _text[at + 1] == '.' ? at + 2
            : at > _at && at + 2 < _text.Length && _text.Slice(at, 3).Equals("to ", StringComparison.OrdinalIgnoreCase) ? at + 3
            : -1;
        bool glued = at == _at;
        if (after < 0 || !NumberAt(AfterSpaces(after)) || (!glued && AfterSpaces(after) == after && _text[at] != '/'))
        {
            // "60 -0.03" is a deviation; "60-60.03" and "60 - 60.03" are limits.
            return false;
        }

        int back = _at;
        int problems = _problems?.Count ?? 0;
        _at = AfterSpaces(after);
        if (TryNumber(out second) && second.Number.ToDouble() * 2 >= first.Number.ToDouble() && !second.IsFraction)
        {
            return true;
        }

        _problems?.RemoveRange(problems, _problems.Count - problems);
        _at = back;
        return false;
    }

    private bool TryDeviations()
    {
        int start = _at;
        if (Current == '±' || (Current == '+' && (_text[_at..].StartsWith("+/-") || _text[_at..].StartsWith("+-"))))
        {
            _at += Current == '±' ? 1 : _text[_at + 1] == '/' ? 3 : 2;
            SkipSpaces();
            if (!NumberAt(_at))
            {
                _at = start;
                return false;
            }

            if (TryNumber(out Measured both))
            {
                Note(ref _deviations, new DeviationNote(both, 1, both, -1), new Place(start, _at - start), "pair of deviations");
                TakeUnitOf(both);
            }

            return true;
        }

        int sign = Sign(Current);
        int number = AfterSpaces(_at + 1);
        if (!NumberAt(number))
        {
            return false;
        }

        _at = number;
        if (!TryNumber(out Measured first))
        {
            return true;
        }

        first = first with { Place = new Place(start, _at - start) };
        if (SecondDeviationFollows())
        {
            TakeSecondDeviation(first, sign);
        }
        else if (_sizes.Count == 0)
        {
            Report($"'{Show(first.Place)}' stands where a size is expected.", first.Place, "a size above 0, without a sign");
        }
        else
        {
            Report($"'{Show(first.Place)}' is one deviation; the other one is missing.", first.Place,
                $"both, such as {(sign > 0 ? "+" : "-")}{DecimalText.Format(first.Number.Units, first.Number.Places)}/0");
        }

        return true;
    }

    /// <summary>A stroke or space, then a signed number or a plain zero.</summary>
    private readonly bool SecondDeviationFollows()
    {
        int at = AfterSpaces(_at);
        bool stroke = at < _text.Length && _text[at] == '/';
        at = stroke ? AfterSpaces(at + 1) : at;
        if (at >= _text.Length)
        {
            return false;
        }

        bool signed = Sign(_text[at]) != 0 && NumberAt(AfterSpaces(at + 1));
        bool zero = DecimalText.TryRead(_text[at..], out ExactDecimal plain, out int length) && plain.Units == 0 && (stroke || at + length == WordEnd(at));
        return signed || zero;
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

        second = second with { Place = new Place(start, _at - start) };
        if (second.Unit == WrittenUnit.Micrometre && first.Unit == WrittenUnit.None)
        {
            first = first with { Unit = WrittenUnit.Micrometre };
        }

        Note(ref _deviations, new DeviationNote(first, firstSign, second, sign == 0 ? 1 : sign), first.Place.To(second.Place), "pair of deviations");
        TakeUnitOf(first);
        TakeUnitOf(second);
    }
}
