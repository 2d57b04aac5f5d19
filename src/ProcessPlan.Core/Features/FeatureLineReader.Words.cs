using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <content>Whole words, what belongs to them, and what is no word of the line.</content>
internal ref partial struct FeatureLineReader
{
    /// <summary>A keyword with what belongs to it, or a material.</summary>
    private bool TryWord()
    {
        int start = AfterIso();
        int end = WordEnd(start);
        FeatureWord word = FeatureWords.Find(_text[start..end]);
        if (word == FeatureWord.None)
        {
            return TryMaterial() || TryPartOfMaterial();
        }

        Place place = new(_at, end - _at);
        _at = end;
        TakeWord(word, place);
        return true;
    }

    /// <summary>Behind "ISO" before the number of a standard, else here.</summary>
    private readonly int AfterIso()
    {
        const string Iso = "iso";
        if (!_text[_at..].StartsWith(Iso, StringComparison.OrdinalIgnoreCase))
        {
            return _at;
        }

        int number = AfterSpaces(_at + Iso.Length);
        number = CharAt(number) == '-' ? number + 1 : number;
        return DigitAt(number) ? number : _at;
    }

    /// <summary>A material. One whose name is a number is read as a number first.</summary>
    private bool TryMaterial()
    {
        if (!TryFindMaterial(out string material, out Place place) || !HasLetter(At(place)))
        {
            return false;
        }

        _at = place.End;
        if (ToleranceClass.TryRead(At(place), out ToleranceClass asClass, out int length) && length == place.Length)
        {
            AddEither(new EitherNote(asClass, EitherKind.Material, default, material, place));
        }
        else
        {
            Note(ref _material, material, place, "material");
        }

        return true;
    }

    /// <summary>"X5CrNi" is a piece of a material's name, not the length 5 and a word. Tells it.</summary>
    private bool TryPartOfMaterial()
    {
        const int Least = 5;
        Place place = new(_at, WordEnd(_at) - _at);
        ReadOnlySpan<char> word = At(place);
        // Roughness, fits and lengths glued to a class are met on every other line: they are no names, and the names are many.
        if (word.Length < Least || word.ContainsAny("./,") || word[1..].ContainsAny('x', 'X') || !char.IsLetter(word[0]) || !word.ContainsAnyInRange('0', '9') || _materials.Containing(word) is null)
        {
            return false;
        }

        _at = place.End;
        ReportUnknown(place);
        return true;
    }

    /// <summary>The longest name of a material that stands here, of up to four words, as "EN AW 6061 T6".</summary>
    private readonly bool TryFindMaterial(out string material, out Place place)
    {
        const int MostWords = 4;
        Span<int> ends = stackalloc int[MostWords];
        int words = 0;
        for (int at = _at; words < MostWords && at < _text.Length; at = AfterSpaces(ends[words++]))
        {
            ends[words] = WordEnd(at);
        }

        for (; words > 0; words--)
        {
            place = new Place(_at, ends[words - 1] - _at);
            if (_materials.TryFind(At(place), out material))
            {
                return true;
            }
        }

        (material, place) = ("", default);
        return false;
    }

    private static bool HasLetter(ReadOnlySpan<char> text)
    {
        foreach (char c in text)
        {
            if (char.IsLetter(c))
            {
                return true;
            }
        }

        return false;
    }

    private void TakeWord(FeatureWord word, Place place)
    {
        switch (word)
        {
            case FeatureWord.Hole or FeatureWord.Shaft or FeatureWord.Slot or FeatureWord.Tongue:
                NoteFlag(ref _kind, (FeatureKind)(word - FeatureWord.Hole), place, "kind of feature");
                break;
            case FeatureWord.Through or FeatureWord.Blind:
                NoteFlag(ref _end, (HoleEnd)(word - FeatureWord.Through), place, "end of the hole");
                break;
            case FeatureWord.Interrupted:
                NoteFlag(ref _interrupted, true, place, "interruption");
                break;
            case FeatureWord.Before or FeatureWord.After:
                NoteFlag(ref _coatingLimits, word == FeatureWord.Before ? CoatingLimits.Before : CoatingLimits.After, place, "side of the coating");
                break;
            case FeatureWord.Solid:
                NoteFlag(ref _start, new StartNote(StartKind.Solid, null), place, "start");
                break;
            case FeatureWord.GeneralTolerance:
                NoteFlag(ref _general, (GeneralTolerance)"fmcv".IndexOf(char.ToLowerInvariant(_text[place.End - 1])), place, "general tolerance");
                break;
            case FeatureWord.Millimetre or FeatureWord.Inch:
                if (!SaysNo(place))
                {
                    _units.Add(new UnitNote(word == FeatureWord.Inch ? LengthUnit.Inch : LengthUnit.Millimetre, place, place));
                }

                break;
            case FeatureWord.Kind or FeatureWord.Tolerance or FeatureWord.End or FeatureWord.Finish or FeatureWord.Limits or FeatureWord.Start
                or FeatureWord.Unit:
                TakeNamed(word, place);
                break;
            case FeatureWord.Material:
                TakeNamedMaterial(place);
                break;
            case FeatureWord.Size or FeatureWord.Diameter:
                TakeSize(word, place);
                break;
            case FeatureWord.Extent or FeatureWord.Deep:
                TakeMeasured(ref _extent, word, place, "length or depth");
                break;
            case FeatureWord.Bottom:
                TakeMeasured(ref _bottom, word, place, "room at the bottom");
                break;
            case FeatureWord.Wall:
                TakeMeasured(ref _wall, word, place, "wall");
                break;
            case FeatureWord.OuterDiameter:
                TakeMeasured(ref _outerDiameter, word, place, "outer diameter");
                break;
            case FeatureWord.Ra or FeatureWord.Rz:
                TakeRoughness(word, place);
                break;
            case FeatureWord.Hardness or FeatureWord.Hrc or FeatureWord.Hb or FeatureWord.Hv:
                TakeHardness(word, place);
                break;
            case FeatureWord.Hardened or FeatureWord.Case or FeatureWord.Nitrided:
                TakeTreatment(word, place);
                break;
            case FeatureWord.Coat:
                TakeCoating(place);
                break;
            case >= FeatureWord.Cylindricity and <= FeatureWord.Perpendicularity:
                TakeGeometry(word, place);
                break;
            case FeatureWord.Cast or FeatureWord.Cored or FeatureWord.Bar:
                if (TryMeasured(word, place, out Measured blank))
                {
                    Note(ref _start, new StartNote(StartKind.Cast + (word - FeatureWord.Cast), blank), place.To(blank.Place), "start");
                }

                break;
            case FeatureWord.Off:
                if (TryMeasured(word, place, out Measured pieces))
                {
                    NoteQuantity(pieces, place.To(pieces.Place));
                }

                break;
            default:
                throw new InvalidOperationException($"The word {word} is listed but nothing reads it.");
        }
    }

    private void NoteFlag<T>(ref Noted<T> slot, T value, Place place, string what)
    {
        if (!SaysNo(place))
        {
            Note(ref slot, value, place, what);
        }
    }

    /// <summary>Whether a word that needs nothing behind it is taken back: "thru=yes" is thru, "thru=no" is not.</summary>
    private bool SaysNo(Place word)
    {
        if (CharAt(AfterSpaces(_at)) != '=')
        {
            return false;
        }

        SkipToValue();
        Place value = new(_at, WordEnd(_at) - _at);
        bool no = At(value).Equals("no", StringComparison.OrdinalIgnoreCase);
        if (no || At(value).Equals("yes", StringComparison.OrdinalIgnoreCase))
        {
            _at = value.End;
            return no;
        }

        _at = NumberAt(value.At) ? _at : value.End;
        Report($"'{Show(word)}=' can be answered by yes or no only.", word, $"{Show(word)}, or {Show(word)}=yes");
        return true;
    }

    /// <summary>"kind=hole", "tol=N7": the name of what follows, which must be that and nothing else.</summary>
    private void TakeNamed(FeatureWord name, Place place)
    {
        SkipToValue();
        int start = _at;
        int problems = ProblemCount;
        if (SkipSeparators())
        {
            TakePart();
        }

        if (problems == ProblemCount && !IsNoted(name, start))
        {
            if (_sizes.Count > 0 && _sizes[_sizes.Count - 1].Place.At >= start)
            {
                DropLastSize();
            }

            string missing = start == _at ? "needs something behind it" : "is not understood";
            Report($"'{Show(PlaceFrom(place.At))}' {missing}.", place, FeatureWords.ExpectedBehind(name));
        }
    }

    /// <summary>Whether what <paramref name="name"/> stands for was read at <paramref name="from"/> or behind it.</summary>
    private bool IsNoted(FeatureWord name, int from) => name switch
    {
        FeatureWord.Kind => IsFrom(_kind, from),
        FeatureWord.End => IsFrom(_end, from),
        FeatureWord.Start => IsFrom(_start, from),
        FeatureWord.Unit => _units.Count > 0 && _units[_units.Count - 1].Place.At >= from,
        FeatureWord.Finish => IsFrom(_finish, from) || TakeEitherFrom(from, asClass: false),
        FeatureWord.Limits => IsFrom(_limits, from) || IsFrom(_coatingLimits, from),
        _ => (_classes.Count > 0 && _classes[_classes.Count - 1].Place.At >= from) || TakeEitherFrom(from, asClass: true)
            || IsFrom(_deviations, from) || IsFrom(_limits, from) || IsFrom(_general, from),
    };

    private static bool IsFrom<T>(Noted<T> slot, int from) => slot.Is && slot.Place.At >= from;

    private void TakeNamedMaterial(Place word)
    {
        SkipToValue();
        if (TryFindMaterial(out string material, out Place place))
        {
            _at = place.End;
            Note(ref _material, material, place, "material");
            return;
        }

        Place value = new(_at, WordEnd(_at) - _at);
        _at = value.End;
        if (value.Length == 0)
        {
            Report($"'{Show(word)}' needs a material behind it.", word, "a material of the shop book");
            return;
        }

        string? nearest = _materials.Containing(At(value)) ?? Spelling.Nearest(At(value), _materials.Designations);
        ReportNoMaterial(value, nearest is not null ? $"perhaps '{nearest}'" : MaterialsListed);
    }

    private void TakeUnknown()
    {
        int start = _at;
        if (IsUnprintable(Current) && !char.IsSurrogate(Current))
        {
            Report($"An invisible character (U+{(int)Current:X4}) stands in the line.", new Place(_at++, 1), "the line without it");
            return;
        }

        if (Current == '=')
        {
            Report("'=' stands alone.", new Place(_at++, 1), "a word before it, such as depth=40");
            return;
        }

        Place place = new(start, Math.Max(WordEnd(start), start + 1) - start);
        _at = place.End;
        if (LookAlike.Find(At(place)) is { } twin)
        {
            Report($"'{Show(place)}' has the {twin.Script} letter '{twin.Letter}'.", place, $"the Latin letter '{twin.Latin}'");
        }
        else if (!IsRightAfterSize(start) || !TryExplainClass(place))
        {
            ReportUnknown(WithNumberBefore(place));
        }
    }

    private const string MaterialsListed = "shop show materials lists them";

    private void ReportNoMaterial(Place place, string expected) => Report($"'{Show(place)}' is no material of the shop book.", place, expected);

    private void ReportUnknown(Place place)
    {
        ReadOnlySpan<char> word = At(place);
        bool likeMaterial = HasLetter(word) && word.ContainsAnyInRange('0', '9');
        string? nearest = (likeMaterial ? _materials.Containing(word) : null) ?? Spelling.Nearest(word, FeatureWords.All, _materials.Designations);
        if (nearest is null && likeMaterial && word.Length >= LeastOfMaterial)
        {
            ReportNoMaterial(place, MaterialsListed);
            return;
        }

        Report($"'{Show(place)}' is not understood.", place,
            nearest is not null ? $"perhaps '{nearest}'" : "a word of the feature line or a material of the shop book");
    }

    private const int LeastOfMaterial = 4;

    /// <summary>"304L" is one word, not the size 304 and an L.</summary>
    private Place WithNumberBefore(Place place)
    {
        if (_sizes.Count == 0 || _sizes[_sizes.Count - 1].Place.End != place.At || !LetterAt(place.At))
        {
            return place;
        }

        Place number = _sizes[_sizes.Count - 1].Place;
        DropLastSize();
        return number.To(place);
    }

    /// <summary>Letters and a number behind the size that look like a class but are none: Js7, H19, L6.</summary>
    private bool TryExplainClass(Place place)
    {
        ReadOnlySpan<char> word = At(place);
        int letters = word.IndexOfAnyInRange('0', '9');
        if (letters is not (1 or 2) || word[letters..].IndexOfAnyExceptInRange('0', '9') >= 0 || !char.IsAsciiLetter(word[0]) || !char.IsAsciiLetter(word[letters - 1]))
        {
            return false;
        }

        Span<char> folded = stackalloc char[place.Length];
        word.ToUpperInvariant(folded);
        string expected = ToleranceClass.TryRead(folded, out ToleranceClass hole, out _) ? $"{hole} for a hole or {hole.Mirror} for a shaft"
            : ToleranceClass.TryRead([.. folded[..letters], '7'], out _, out _) ? "a grade 01, 0 or 1 to 18 behind the letter, such as H7"
            : "a letter of ISO 286 and a grade, such as H7 for a hole or k6 for a shaft";
        Report($"'{Show(place)}' is no tolerance class.", place, expected);
        return true;
    }
}
