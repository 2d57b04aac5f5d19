using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>Characters of the line, for a problem to point at.</summary>
internal readonly record struct Place(int At, int Length)
{
    public int End => At + Length;

    public Place To(Place last) => new(At, last.End - At);
}

/// <summary>A part of the line that may stand once, with its place.</summary>
internal readonly record struct Noted<T>(T Value, Place Place)
{
    public bool Is => Place.Length > 0;
}

/// <summary>The unit written behind a number, if any.</summary>
internal enum WrittenUnit
{
    None,
    Millimetre,
    Inch,
    Micrometre,
    Microinch,
    Thou,
}

/// <summary>A number as it was written, before the unit of the line is known.</summary>
/// <param name="Number">The decimal, or the whole inches of a fraction.</param>
/// <param name="In128ths">128ths of an inch behind the whole inches, where a fraction was written; else 0.</param>
/// <param name="Unit">The unit behind it.</param>
/// <param name="IsUnitApart">Whether that is mm or in behind a space, which may as well be that of the whole line.</param>
/// <param name="Place">Where it stands.</param>
internal readonly record struct Measured(ExactDecimal Number, int In128ths, WrittenUnit Unit, bool IsUnitApart, Place Place)
{
    private const long PicometresPer128th = Length.PicometresPerInch / 128; // 25 400 000 000 / 128 = 198 437 500, exact
    private const long PicometresPerThou = Length.PicometresPerInch / 1000;

    public bool IsFraction => In128ths > 0;

    public bool IsZero => Number.Units == 0 && !IsFraction;

    /// <summary>A number without a unit of its own: a count, a hardness, or a length in the unit of the line.</summary>
    public bool IsBare => !IsFraction && (Unit == WrittenUnit.None || IsUnitApart);

    public bool IsBareWhole => IsBare && Number.Places == 0;

    /// <summary>The length in the unit behind the number, else in that of the line; false where it is not exact to the picometre or out of range.</summary>
    public bool TryLength(LengthUnit line, out Length length)
    {
        long unit = Unit switch
        {
            WrittenUnit.Millimetre => Length.PicometresPerMillimetre,
            WrittenUnit.Micrometre => Length.PicometresPerMicrometre,
            WrittenUnit.Microinch => Length.PicometresPerMicroinch,
            WrittenUnit.Thou => PicometresPerThou,
            _ => IsFraction || Unit == WrittenUnit.Inch || line == LengthUnit.Inch ? Length.PicometresPerInch : Length.PicometresPerMillimetre,
        };
        long fraction = In128ths * PicometresPer128th;
        bool exact = Number.TryScale(unit, out long picometres) && picometres <= long.MaxValue - fraction;
        length = exact ? new Length(picometres + fraction) : default;
        return exact;
    }
}

/// <summary>Parts that should stand once but may be written more often.</summary>
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

    public readonly void Sort(Comparison<T> comparison)
    {
        if (Count > 1)
        {
            _items.AsSpan(0, Count).Sort(comparison);
        }
    }

    public void RemoveAt(int index)
    {
        Array.Copy(_items!, index + 1, _items!, index, Count - index - 1);
        Count--;
    }
}
