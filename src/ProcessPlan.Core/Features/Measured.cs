using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Features;

/// <summary>Characters of the line, for a problem to point at.</summary>
internal readonly record struct Place(int At, int Length)
{
    public int End => At + Length;

    public Place To(Place last) => new(At, last.End - At);
}

/// <summary>The unit written behind a number, if any.</summary>
internal enum WrittenUnit
{
    None,
    Millimetre,
    Inch,
    Micrometre,
    Microinch,
}

/// <summary>A number as it was written, before the unit of the line is known.</summary>
/// <param name="Number">The decimal, or the whole inches of a fraction.</param>
/// <param name="Numerator">128ths behind the whole inches, where a fraction was written.</param>
/// <param name="IsFraction">Whether it was written as a fraction of an inch.</param>
/// <param name="Unit">The unit behind it.</param>
/// <param name="Place">Where it stands.</param>
internal readonly record struct Measured(ExactDecimal Number, int Numerator, bool IsFraction, WrittenUnit Unit, Place Place)
{
    private const long PicometresPer128th = Length.PicometresPerInch / 128; // 25 400 000 000 / 128 = 198 437 500, exact

    public bool TryLength(LengthUnit line, out Length length)
    {
        if (IsFraction)
        {
            bool whole = Number.TryScale(Length.PicometresPerInch, out long inches);
            length = new Length(inches + Numerator * PicometresPer128th);
            return whole;
        }

        long factor = Unit switch
        {
            WrittenUnit.Millimetre => Length.PicometresPerMillimetre,
            WrittenUnit.Inch => Length.PicometresPerInch,
            WrittenUnit.Micrometre => Length.PicometresPerMicrometre,
            WrittenUnit.Microinch => Length.PicometresPerMicroinch,
            _ => line == LengthUnit.Inch ? Length.PicometresPerInch : Length.PicometresPerMillimetre,
        };
        bool exact = Number.TryScale(factor, out long picometres);
        length = new Length(picometres);
        return exact;
    }
}
