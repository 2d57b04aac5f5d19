using System.Globalization;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>
/// Goes over the line once and notes each part with its place; what a part means can depend on parts that come later
/// (the unit, "N7" as class or as roughness), so <see cref="Build"/> decides when all is read.
/// A method whose name begins with Try and that returns false has read nothing; one that begins with Take has read its part or told what is
/// wrong with it.
/// </summary>
internal ref partial struct FeatureLineReader
{
    private readonly ReadOnlySpan<char> _text;
    private readonly MaterialNames _materials;
    private int _at;
    private List<Problem>? _problems;

    private Noted<FeatureKind> _kind;
    private Several<UnitNote> _units;
    private Several<Measured> _sizes;
    private Several<ClassNote> _classes;
    private Several<EitherNote> _either;
    private Noted<PairNote> _deviations;
    private Noted<PairNote> _limits;
    private Noted<GeneralTolerance> _general;
    private Noted<Measured> _extent;
    private Noted<HoleEnd> _end;
    private Noted<Measured> _bottom;
    private Noted<Measured> _wall;
    private Noted<Measured> _outerDiameter;
    private Noted<bool> _interrupted;
    private Noted<FinishNote> _finish;
    private Noted<string> _material;
    private Noted<HardnessRange> _hardness;
    private Noted<TreatmentNote> _treatment;
    private Noted<CoatingNote> _coating;
    private Noted<CoatingLimits> _coatingLimits;
    private Several<GeometryNote> _geometry;
    private Noted<StartNote> _start;
    private Noted<int> _quantity;

    /// <summary>The number that is the size, among others that name materials; decided when all is read.</summary>
    private Measured? _size;

    /// <summary>The unit of the line, decided when all is read.</summary>
    private Noted<LengthUnit> _unit;

    /// <summary>Place of the number behind "dia" or "size", the first of them; -1 where there is none.</summary>
    private int _namedSizeAt;

    /// <summary>Place behind the stroke of a fit; -1 where there is none.</summary>
    private int _behindStroke;

    /// <summary>Whether something that may have been meant as the size has been told already.</summary>
    private bool _sizeTold;

    public FeatureLineReader(ReadOnlySpan<char> text, MaterialNames materials)
    {
        _text = text;
        _materials = materials;
        _behindStroke = -1;
        _namedSizeAt = -1;
    }

    private readonly record struct ClassNote(ToleranceClass Class, Place Place);

    /// <summary>A unit: behind a number, or standing alone, where <paramref name="Number"/> is the unit itself.</summary>
    private readonly record struct UnitNote(LengthUnit Unit, Place Place, Place Number)
    {
        public bool IsAlone => Place == Number;
    }

    /// <summary>Two signed numbers: deviations from the size, or two limits.</summary>
    private readonly record struct PairNote(Measured First, int FirstSign, Measured Second, int SecondSign);

    /// <summary>Ra or Rz with its number, or N with its class.</summary>
    private readonly record struct FinishNote(FeatureWord Word, Measured Number);

    private readonly record struct TreatmentNote(TreatmentKind Kind, HardnessRange? Hardness, Measured? Depth);

    private readonly record struct HardnessRange(Hardness Least, Hardness? Most);

    private readonly record struct CoatingNote(string Name, Measured Least, Measured Most);

    private readonly record struct GeometryNote(GeometryKind Kind, Measured Zone);

    private readonly record struct StartNote(StartKind Kind, Measured? Size);

    public void Read()
    {
        while (SkipSeparators())
        {
            TakePart();
        }
    }

    private void TakePart()
    {
        if (!TryWord() && !TryPiece())
        {
            TakeUnknown();
        }
    }

    private readonly bool AtEnd => _at >= _text.Length;

    private readonly char Current => _text[_at];

    private bool SkipSeparators()
    {
        while (!AtEnd && (char.IsWhiteSpace(Current) || Current is ';' || (Current is ',' && !DigitAt(_at + 1)) || (Current is '.' && SpaceAt(_at + 1))))
        {
            _at++;
        }

        return !AtEnd;
    }

    private readonly int AfterSpaces(int at)
    {
        while (at < _text.Length && char.IsWhiteSpace(_text[at]))
        {
            at++;
        }

        return at;
    }

    private void SkipSpaces() => _at = AfterSpaces(_at);

    /// <summary>Passes over "=", the point of "dia. 25" and spaces between a word and what belongs to it.</summary>
    private void SkipToValue()
    {
        if (CharAt(_at) is '.' or ':' && SpaceAt(_at + 1))
        {
            _at++;
        }

        SkipSpaces();
        if (CharAt(_at) == '=')
        {
            _at++;
            SkipSpaces();
        }
    }

    /// <summary>The character there; a line feed, which belongs to nothing, behind the end.</summary>
    private readonly char CharAt(int at) => at < _text.Length ? _text[at] : '\n';

    private readonly bool SpaceAt(int at) => char.IsWhiteSpace(CharAt(at));

    private readonly bool DigitAt(int at) => char.IsAsciiDigit(CharAt(at));

    private readonly bool LetterAt(int at) => char.IsLetter(CharAt(at));

    private readonly bool NumberAt(int at) => DigitAt(at) || (CharAt(at) is '.' or ',' && DigitAt(at + 1));

    /// <summary>End of the word that starts here: the next space, semicolon or equals sign, without a trailing comma, point or colon.</summary>
    private readonly int WordEnd(int from)
    {
        int end = from;
        while (!SpaceAt(end) && CharAt(end) is not ';' and not '=')
        {
            end++;
        }

        while (end > from + 1 && _text[end - 1] is ',' or '.' or ':')
        {
            end--;
        }

        return end;
    }

    private readonly ReadOnlySpan<char> At(Place place) => _text.Slice(place.At, place.Length);

    /// <summary>The characters of the line for a message: what cannot be printed as a question mark, and no more than forty.</summary>
    private readonly string Show(Place place)
    {
        const int Most = 40;
        ReadOnlySpan<char> part = _text.Slice(place.At, Math.Min(place.Length, Most));
        Span<char> shown = stackalloc char[Most];
        for (int i = 0; i < part.Length; i++)
        {
            shown[i] = IsUnprintable(part[i]) ? '?' : part[i];
        }

        return shown[..part.Length].ToString() + (place.Length > Most ? "…" : "");
    }

    private static bool IsUnprintable(char c) => char.IsControl(c) || char.GetUnicodeCategory(c) is UnicodeCategory.Format or UnicodeCategory.Surrogate
        or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator or UnicodeCategory.OtherNotAssigned or UnicodeCategory.PrivateUse;

    private readonly int ProblemCount => _problems?.Count ?? 0;

    private void Report(string message, Place place, string expected) =>
        (_problems ??= []).Add(new Problem(message, place.At, place.Length, expected));

    /// <summary>A place to go back to, with what a number read behind it may have noted.</summary>
    private readonly record struct Mark(int At, int Problems, int Units);

    private readonly Mark Here => new(_at, ProblemCount, _units.Count);

    private void GoBack(Mark mark)
    {
        _at = mark.At;
        DropUnits(mark.Units);
        _problems?.RemoveRange(mark.Problems, _problems.Count - mark.Problems);
    }

    private void Note<T>(ref Noted<T> slot, T value, Place place, string what)
    {
        if (slot.Is)
        {
            Report($"A second {what}: '{Show(place)}' after '{Show(slot.Place)}'.", place, $"one {what}");
            return;
        }

        slot = new Noted<T>(value, place);
    }

    private void DropUnits(int kept)
    {
        while (_units.Count > kept)
        {
            _units.RemoveAt(_units.Count - 1);
        }
    }
}
