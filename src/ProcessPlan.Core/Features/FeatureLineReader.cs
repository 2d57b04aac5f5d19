using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>
/// Goes over the line once and notes each part with its place; what a part means can depend on parts that come later
/// (the unit, "N7" as class or as roughness), so <see cref="Build"/> decides when all is read.
/// </summary>
internal ref partial struct FeatureLineReader
{
    private readonly ReadOnlySpan<char> _text;
    private readonly MaterialNames _materials;
    private int _at;
    private List<Problem>? _problems;

    private Noted<FeatureKind> _kind;
    private LengthUnit _unit;
    private Place? _unitPlace;
    private Several<Measured> _sizes;
    private Several<ClassNote> _classes;
    private Several<EitherNote> _either;
    private Noted<DeviationNote> _deviations;
    private Noted<DeviationNote> _limitPair;
    private Noted<GeneralTolerance> _general;
    private Noted<Measured> _extent;
    private Noted<HoleEnd> _end;
    private Noted<Measured> _bottom;
    private Noted<Measured> _wall;
    private Noted<Measured> _outerDiameter;
    private bool _interrupted;
    private Noted<FinishNote> _finish;
    private Noted<string> _material;
    private Noted<Hardness> _hardness;
    private Noted<TreatmentNote> _treatment;
    private Noted<CoatingNote> _coating;
    private Noted<CoatingLimits> _coatingLimits;
    private List<(GeometryKind Kind, Measured Zone)>? _geometry;
    private Noted<(StartKind Kind, Measured? Size)> _start;
    private Noted<int> _quantity;
    private int _sizeEnd;

    public FeatureLineReader(ReadOnlySpan<char> text, MaterialNames materials)
    {
        _text = text;
        _materials = materials;
        _sizeEnd = -1;
    }

    private readonly record struct ClassNote(ToleranceClass Class, Place Place);

    /// <summary>A part that is a tolerance class where one is still missing, and something else otherwise.</summary>
    private readonly record struct EitherNote(ToleranceClass Class, EitherKind Kind, Measured Number, bool AfterSize, Place Place);

    private enum EitherKind
    {
        Extent,
        Diameter,
        RoughnessNumber,
    }

    /// <summary>Two signed numbers: deviations from the size, or two limits.</summary>
    private readonly record struct DeviationNote(Measured First, int FirstSign, Measured Second, int SecondSign);

    private readonly record struct TreatmentNote(TreatmentKind Kind, Hardness? Hardness, Measured? Depth);

    private readonly record struct CoatingNote(string Name, Measured Least, Measured Most);

    public void Read()
    {
        while (SkipSeparators())
        {
            int start = _at;
            if (TryWord() || TryPiece())
            {
                continue;
            }

            if (_at == start)
            {
                Unknown();
            }
        }
    }

    private readonly bool AtEnd => _at >= _text.Length;

    private readonly char Current => _text[_at];

    private bool SkipSeparators()
    {
        while (!AtEnd && (char.IsWhiteSpace(Current) || Current is ';' || (Current is ',' && !DigitAt(_at + 1))))
        {
            _at++;
        }

        return !AtEnd;
    }

    private void SkipSpaces()
    {
        while (!AtEnd && Current is ' ' or '\t' or '\u00A0')
        {
            _at++;
        }
    }

    private readonly bool DigitAt(int at) => at < _text.Length && char.IsAsciiDigit(_text[at]);

    private readonly bool LetterAt(int at) => at < _text.Length && char.IsLetter(_text[at]);

    private readonly bool NumberAt(int at) => DigitAt(at) || (at < _text.Length && _text[at] is '.' or ',' && DigitAt(at + 1));

    /// <summary>End of the word that starts here: the next space, semicolon or equals sign, without a trailing comma or point.</summary>
    private readonly int WordEnd(int from)
    {
        int end = from;
        while (end < _text.Length && !char.IsWhiteSpace(_text[end]) && _text[end] is not ';' and not '=')
        {
            end++;
        }

        while (end > from + 1 && _text[end - 1] is ',' or '.' or ':')
        {
            end--;
        }

        return end;
    }

    private void Report(string message, Place place, string expected) =>
        (_problems ??= []).Add(new Problem(message, place.At, place.Length, expected));

    private void Note<T>(ref Noted<T> slot, T value, Place place, string what)
    {
        if (slot.Is)
        {
            Report($"A second {what}: '{Show(place)}' after '{Show(slot.Place)}'.", place, $"one {what}");
            return;
        }

        slot = new Noted<T>(value, place);
    }

    private readonly string Show(Place place)
    {
        const int Most = 40;
        ReadOnlySpan<char> part = _text.Slice(place.At, Math.Min(place.Length, Most));
        Span<char> shown = stackalloc char[Most];
        for (int i = 0; i < part.Length; i++)
        {
            shown[i] = char.IsControl(part[i]) || char.IsSurrogate(part[i]) ? '?' : part[i];
        }

        return shown[..part.Length].ToString() + (place.Length > Most ? "…" : "");
    }

    private void Unknown()
    {
        int end = Math.Max(WordEnd(_at), _at + 1);
        Place place = new(_at, end - _at);
        _at = end;
        ReadOnlySpan<char> word = _text.Slice(place.At, place.Length);
        if (word.Length == 1 && (char.IsControl(word[0]) || word[0] == '='))
        {
            Report(word[0] == '=' ? "'=' stands alone." : $"A control character (code {(int)word[0]}) stands in the line.", place,
                word[0] == '=' ? "a word before it, such as depth=40" : "plain text");
            return;
        }

        if (LookAlike.Find(word) is { } twin)
        {
            Report($"'{Show(place)}' has the {twin.Script} letter '{twin.Letter}'.", place, $"the Latin letter '{twin.Latin}'");
            return;
        }

        string? nearest = FeatureWords.Nearest(word, _materials);
        Report($"'{Show(place)}' is not understood.", place,
            nearest is not null ? $"perhaps '{nearest}'" : "a word of the feature line or a material of the shop book");
    }

    /// <summary>A whole word: a keyword (with what belongs to it) or a material.</summary>
    private bool TryWord()
    {
        int end = WordEnd(_at);
        ReadOnlySpan<char> chunk = _text[_at..end];
        bool assigned = end < _text.Length && _text[end] == '=';
        FeatureWord word = FeatureWords.Find(chunk);
        if (word == FeatureWord.None && chunk.StartsWith("iso", StringComparison.OrdinalIgnoreCase))
        {
            word = FeatureWords.Find(chunk[3..].TrimStart('-'));
        }

        if (word is FeatureWord.Diameter && chunk.Length == 1 && !assigned && !NumberAt(AfterSpaces(end)))
        {
            word = FeatureWord.None;
        }

        if (word != FeatureWord.None)
        {
            Place place = new(_at, end - _at);
            _at = end;
            TakeWord(word, place, assigned);
            return true;
        }

        return TryMaterial(end);
    }

    private bool TryMaterial(int end)
    {
        if (!HasLetter(_text[_at..end]))
        {
            return false;
        }

        // Designations such as "EN AW-6061" are two words.
        int second = AfterSpaces(end);
        int secondEnd = second < _text.Length ? WordEnd(second) : second;
        if (second < _text.Length && _materials.TryFind(_text[_at..secondEnd], out string two))
        {
            Note(ref _material, two, new Place(_at, secondEnd - _at), "material");
            _at = secondEnd;
            return true;
        }

        if (!_materials.TryFind(_text[_at..end], out string one))
        {
            return false;
        }

        Note(ref _material, one, new Place(_at, end - _at), "material");
        _at = end;
        return true;
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

    private readonly int AfterSpaces(int at)
    {
        while (at < _text.Length && _text[at] is ' ' or '\t' or '\u00A0')
        {
            at++;
        }

        return at;
    }

    /// <summary>Passes over "=" and spaces between a word and what belongs to it.</summary>
    private void SkipToValue()
    {
        SkipSpaces();
        if (!AtEnd && Current == '=')
        {
            _at++;
            SkipSpaces();
        }
    }

    private void TakeWord(FeatureWord word, Place place, bool assigned)
    {
        switch (word)
        {
            case FeatureWord.Hole:
                Note(ref _kind, FeatureKind.Hole, place, "kind of feature");
                break;
            case FeatureWord.Shaft:
                Note(ref _kind, FeatureKind.Shaft, place, "kind of feature");
                break;
            case FeatureWord.Slot:
                Note(ref _kind, FeatureKind.Slot, place, "kind of feature");
                break;
            case FeatureWord.Tongue:
                Note(ref _kind, FeatureKind.Tongue, place, "kind of feature");
                break;
            case FeatureWord.Through:
                Note(ref _end, HoleEnd.Through, place, "end of the hole");
                break;
            case FeatureWord.Blind:
                Note(ref _end, HoleEnd.Blind, place, "end of the hole");
                break;
            case FeatureWord.Kind or FeatureWord.End or FeatureWord.Unit or FeatureWord.Material or FeatureWord.Tolerance or FeatureWord.Limits
                or FeatureWord.Start:
                // Only the name of what follows; the value says itself what it is.
                SkipToValue();
                break;
            case FeatureWord.Size or FeatureWord.Diameter:
                if (TryMeasured(place, out Measured size))
                {
                    AddSize(size);
                }

                break;
            case FeatureWord.Extent:
                TakeMeasured(ref _extent, place, "length or depth");
                break;
            case FeatureWord.Bottom:
                TakeMeasured(ref _bottom, place, "room at the bottom");
                break;
            case FeatureWord.Wall:
                TakeMeasured(ref _wall, place, "wall");
                break;
            case FeatureWord.OuterDiameter:
                TakeMeasured(ref _outerDiameter, place, "outer diameter");
                break;
            case FeatureWord.Interrupted:
                _interrupted = true;
                break;
            case FeatureWord.Ra or FeatureWord.Rz:
                TakeRoughness(word, place);
                break;
            case FeatureWord.Hardness:
                TakeHardness(place);
                break;
            case FeatureWord.Hardened or FeatureWord.Case or FeatureWord.Nitrided:
                TakeTreatment(word, place);
                break;
            case FeatureWord.Coat:
                TakeCoating(place);
                break;
            case FeatureWord.Before:
                Note(ref _coatingLimits, CoatingLimits.Before, place, "side of the coating");
                break;
            case FeatureWord.After:
                Note(ref _coatingLimits, CoatingLimits.After, place, "side of the coating");
                break;
            case >= FeatureWord.Cylindricity and <= FeatureWord.Perpendicularity:
                TakeGeometry((GeometryKind)(word - FeatureWord.Cylindricity), place);
                break;
            case FeatureWord.Solid:
                Note(ref _start, (StartKind.Solid, null), place, "start");
                break;
            case FeatureWord.Cast or FeatureWord.Cored or FeatureWord.Bar:
                if (TryMeasured(place, out Measured blank))
                {
                    StartKind kind = word == FeatureWord.Cast ? StartKind.Cast : word == FeatureWord.Cored ? StartKind.Cored : StartKind.Bar;
                    Note(ref _start, (kind, blank), place.To(blank.Place), "start");
                }

                break;
            case FeatureWord.Off:
                TakeQuantityAfter(place);
                break;
            case FeatureWord.Millimetre:
                NoteUnit(LengthUnit.Millimetre, place);
                break;
            case FeatureWord.Inch:
                NoteUnit(LengthUnit.Inch, place);
                break;
            case FeatureWord.GeneralTolerance:
                char letter = char.ToLowerInvariant(_text[place.End - 1]);
                Note(ref _general, (GeneralTolerance)"fmcv".IndexOf(letter), place, "general tolerance");
                break;
            default:
                throw new InvalidOperationException($"The word {word} is listed but nothing reads it{(assigned ? " with '='" : "")}.");
        }
    }

    private void NoteUnit(LengthUnit unit, Place place)
    {
        if (_unitPlace is { } first && _unit != unit)
        {
            Report($"'{Show(place)}' after '{Show(first)}': the line has two units.", place, "mm or in, once");
            return;
        }

        (_unit, _unitPlace) = (unit, place);
    }

    private void AddSize(Measured size)
    {
        _sizes.Add(size);
        _sizeEnd = size.Place.End;
    }

    private readonly bool IsRightAfterSize(int at) => _sizeEnd >= 0 && AfterSpaces(_sizeEnd) == at;
}

/// <summary>A part of the line that may stand once, with its place.</summary>
internal readonly record struct Noted<T>(T Value, Place Place)
{
    public bool Is => Place.Length > 0;
}

/// <summary>Parts that should stand once but may be written more often; the first eight are kept without allocation beyond one array.</summary>
internal struct Several<T>
{
    private T[]? _items;

    public int Count { get; private set; }

    public readonly T this[int index] => _items![index];

    public void Add(T item)
    {
        _items ??= new T[2];
        if (Count == _items.Length)
        {
            Array.Resize(ref _items, Count * 2);
        }

        _items[Count++] = item;
    }

    public void RemoveAt(int index)
    {
        Array.Copy(_items!, index + 1, _items!, index, Count - index - 1);
        Count--;
    }
}
