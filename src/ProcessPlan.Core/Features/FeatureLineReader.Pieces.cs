using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>The parts that may be glued together without spaces, as in "25H7x40": numbers, classes, and words with their number.</content>
internal ref partial struct FeatureLineReader
{
    private enum EitherKind
    {
        Extent,
        Diameter,
        RoughnessNumber,
        Material,
    }

    /// <summary>A part that is a tolerance class where one is still missing, and something else otherwise.</summary>
    private readonly record struct EitherNote(ToleranceClass Class, EitherKind Kind, Measured Number, string Material, Place Place);

    private bool TryPiece()
    {
        char c = Current;
        if (c is 'Ø' or 'ø' or '⌀' or '∅' or 'φ' or 'Φ' or 'ϕ')
        {
            TakeSize(FeatureWord.Diameter, new Place(_at++, 1));
            return true;
        }

        if (NumberAt(_at))
        {
            TakeNumber();
            return true;
        }

        return c == '±' || Sign(c) != 0 ? TryDeviations()
            : LetterOrTimes(c) && (TryBareR() || TryEither() || TryClass() || TryClassApart() || TryWordWithNumber());
    }

    private static bool LetterOrTimes(char c) => char.IsLetter(c) || c is '×' or '*';

    /// <summary>"x6", "D8" and "N7" are a length, a diameter and a roughness, or tolerance classes; "x40" can only be a length.</summary>
    private bool TryEither()
    {
        EitherKind? kind = Current switch
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

        int start = _at;
        bool isClass = ToleranceClass.TryRead(_text[start..], out ToleranceClass asClass, out int length);
        _at++;
        if (!TryNumber(out Measured number))
        {
            return true;
        }

        Place place = new(start, length);

        // In "1 N7 in" the unit stands behind the class.
        if (isClass && (number.Place.End == place.End || (number.IsUnitApart && SpaceAt(place.End))))
        {
            AddEither(new EitherNote(asClass, kind.Value, number, "", place));
        }
        else if (kind != EitherKind.Extent || !HasClass(new Place(start, 1), number))
        {
            TakeOther(new EitherNote(default, kind.Value, number, "", PlaceFrom(start)));
        }

        return true;
    }

    /// <summary>Beside the stroke of a fit stands a class and nothing else.</summary>
    private void AddEither(EitherNote note)
    {
        bool behindStroke = note.Place.At == _behindStroke;
        if (SkipFitStroke() || behindStroke)
        {
            _classes.Add(new ClassNote(note.Class, note.Place));
        }
        else
        {
            _either.Add(note);
        }
    }

    /// <summary>Takes the part as what it is when it is no tolerance class.</summary>
    private void TakeOther(EitherNote note)
    {
        Place place = note.Kind == EitherKind.Material ? note.Place : note.Place.To(note.Number.Place);
        switch (note.Kind)
        {
            case EitherKind.Extent:
                Note(ref _extent, note.Number, place, "length or depth");
                break;
            case EitherKind.Diameter:
                AddNamedSize(note.Number);
                break;
            case EitherKind.RoughnessNumber:
                Note(ref _finish, new FinishNote(FeatureWord.Finish, note.Number), place, "roughness");
                break;
            default:
                Note(ref _material, note.Material, place, "material");
                break;
        }
    }

    /// <summary>Decides the last such part at <paramref name="from"/> or behind it, where a word before it says what it is.</summary>
    private bool TakeEitherFrom(int from, bool asClass)
    {
        int last = _either.Count - 1;
        if (last < 0 || _either[last].Place.At < from || (!asClass && _either[last].Kind != EitherKind.RoughnessNumber))
        {
            return false;
        }

        EitherNote note = _either[last];
        _either.RemoveAt(last);
        if (asClass)
        {
            _classes.Add(new ClassNote(note.Class, note.Place));
        }
        else
        {
            TakeOther(note);
        }

        return true;
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

    /// <summary>"25 H 7": the letter right behind the size or a stroke, and its grade apart.</summary>
    private bool TryClassApart()
    {
        const int MostLetters = 2;
        const int MostDigits = 2;
        int letters = _at;
        while (char.IsAsciiLetter(CharAt(letters)))
        {
            letters++;
        }

        int digits = AfterSpaces(letters);
        int end = digits;
        while (DigitAt(end))
        {
            end++;
        }

        bool apart = letters - _at <= MostLetters && digits > letters && end - digits is > 0 and <= MostDigits
            && !LetterAt(end) && !(CharAt(end) is '.' or ',' && DigitAt(end + 1)) && (_at == _behindStroke || IsRightAfterSize(_at));
        if (!apart || !ToleranceClass.TryRead([.. _text[_at..letters], .. _text[digits..end]], out ToleranceClass read, out int length)
            || length != letters - _at + end - digits)
        {
            return false;
        }

        _classes.Add(new ClassNote(read, new Place(_at, end - _at)));
        _at = end;
        SkipFitStroke();
        return true;
    }

    /// <summary>"R0.8" is a roughness that lost a letter, or a radius; no grade has a point.</summary>
    private bool TryBareR()
    {
        int number = AfterSpaces(_at + 1);
        if (Current is not 'R' and not 'r' || !NumberAt(number) || !DecimalText.TryRead(_text[number..], out ExactDecimal value, out int length)
            || value.Places == 0)
        {
            return false;
        }

        Place place = new(_at, number + length - _at);
        _at = place.End;
        Report($"'{Show(place)}' is not understood.", place, $"perhaps 'Ra{Show(new Place(number, length))}'");
        return true;
    }

    /// <summary>The stroke of a fit stands between two classes: H7/k6.</summary>
    private bool SkipFitStroke()
    {
        int stroke = AfterSpaces(_at);
        int letter = AfterSpaces(stroke + 1);
        if (CharAt(stroke) != '/' || !LetterAt(letter))
        {
            return false;
        }

        (_at, _behindStroke) = (letter, letter);
        return true;
    }

    /// <summary>A known word glued to its number or to what stands before the number: "wall2", "HRC58", "Ra&lt;0.8", "x-40".</summary>
    private bool TryWordWithNumber()
    {
        int end = _at;
        while (LetterOrTimes(CharAt(end)))
        {
            end++;
        }

        bool glued = NumberAt(end) || CharAt(end) is '<' or '≤' or '>' or '≥' || (Sign(CharAt(end)) != 0 && NumberAt(end + 1));
        FeatureWord word = glued ? FeatureWords.Find(_text[_at..end]) : FeatureWord.None;
        if (word == FeatureWord.None)
        {
            return false;
        }

        Place place = new(_at, end - _at);
        _at = end;
        TakeWord(word, place);
        return true;
    }

    /// <summary>A number without a word before it: a hardness, a quantity, two limits, a zero deviation, or else a size.</summary>
    private void TakeNumber()
    {
        if (!TryNumber(out Measured number))
        {
            _sizeTold = true;
            return;
        }

        if (TryScale(out HardnessScale scale))
        {
            NoteHardness(new HardnessNote(number, null, RangeForm.To, scale, PlaceFrom(number.Place.At)));
        }
        else if (TrySpread(number, out HardnessNote spread))
        {
            NoteHardness(spread);
        }
        else if (TryPieces())
        {
            NoteQuantity(number, PlaceFrom(number.Place.At));
        }
        else if (TrySuffix("deep") || TrySuffix("long"))
        {
            TakeExtentBefore(number);
        }
        else if (number.IsZero && SecondDeviationFollows())
        {
            TakeSecondDeviation(number, 1);
        }
        else if (TrySecondLimit(number, out Measured second))
        {
            Place place = number.Place.To(second.Place);
            if (TryScale(out scale))
            {
                NoteHardness(new HardnessNote(number, second, RangeForm.To, scale, PlaceFrom(number.Place.At)));
            }
            else
            {
                Note(ref _limits, new PairNote(number, 1, second, 1), place, "pair of limits");
            }
        }
        else
        {
            _sizes.Add(number);
        }
    }

    /// <summary>"40 deep", "40 long"; in "40 deep 25" either number could be meant.</summary>
    private void TakeExtentBefore(Measured number)
    {
        Place place = PlaceFrom(number.Place.At);
        SkipToValue();
        if (NumberAt(_at) && TryNumber(out Measured second))
        {
            Place both = number.Place.To(second.Place);
            _sizeTold = true;
            Report($"'{Show(both)}' has a number before and behind.", both, "x before the length or depth, such as x 40");
            return;
        }

        Note(ref _extent, number, place, "length or depth");
    }

    private bool TryPieces() => TrySuffix("off") || TrySuffix("pcs") || TrySuffix("pieces");

    private void TakeSize(FeatureWord word, Place place)
    {
        if (TryMeasured(word, place, out Measured size))
        {
            AddNamedSize(size);
        }
        else
        {
            _sizeTold = true;
        }
    }

    private void AddNamedSize(Measured size)
    {
        _sizes.Add(size);
        _namedSizeAt = _namedSizeAt < 0 ? size.Place.At : _namedSizeAt;
    }

    private readonly Place PlaceFrom(int start) => new(start, _at - start);

    private readonly bool IsRightAfterSize(int at)
    {
        for (int i = 0; i < _sizes.Count; i++)
        {
            Measured size = _sizes[i];
            if (AfterSpaces(size.Place.End) == at)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Takes back the last size, which has turned out to be part of something that is told.</summary>
    private void DropLastSize()
    {
        _sizes.RemoveAt(_sizes.Count - 1);
        _sizeTold = true;
    }
}
