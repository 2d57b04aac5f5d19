using System.Buffers.Text;

namespace ProcessPlan.Core.Text;

/// <summary>Exact decimals as text: an integer and the number of its decimal places. No binary floating point, no culture.</summary>
public static class DecimalText
{
    private const int MostDigits = 18;

    /// <summary>
    /// Reads digits with at most one decimal mark (point or comma) from the start of <paramref name="text"/>; no sign, no exponent.
    /// </summary>
    /// <param name="text">The text; reading stops before the first character that does not belong to the number.</param>
    /// <param name="number">The number read, of at most 18 significant digits.</param>
    /// <param name="read">Characters read; 0 where no number stands there or it has too many digits.</param>
    public static bool TryRead(ReadOnlySpan<char> text, out ExactDecimal number, out int read)
    {
        long units = 0;
        int places = 0;
        int significant = 0;
        int digits = 0;
        bool mark = false;
        int at = 0;
        for (; at < text.Length; at++)
        {
            char c = text[at];
            if (char.IsAsciiDigit(c))
            {
                significant = significant == 0 && c == '0' ? 0 : significant + 1;
                if (significant > MostDigits || (mark && places == MostDigits))
                {
                    number = default;
                    read = 0;
                    return false;
                }

                units = units * 10 + (c - '0');
                places += mark ? 1 : 0;
                digits++;
            }
            else if (c is '.' or ',' && !mark)
            {
                // A mark belongs to the number only with a digit behind it: "25," ends a word, "25,5" is a size.
                if (at + 1 >= text.Length || !char.IsAsciiDigit(text[at + 1]))
                {
                    break;
                }

                mark = true;
            }
            else
            {
                break;
            }
        }

        number = new ExactDecimal(units, places);
        read = digits > 0 ? at : 0;
        return digits > 0;
    }

    /// <summary>Writes <paramref name="units"/> · 10^-<paramref name="places"/> with no trailing zeros and a point.</summary>
    /// <returns>The number of bytes written; 24 bytes always suffice.</returns>
    public static int Write(Span<byte> target, long units, int places)
    {
        int length = 0;
        if (units < 0)
        {
            target[length++] = (byte)'-';
        }

        ulong rest = units < 0 ? (ulong)(-(units + 1)) + 1 : (ulong)units;
        while (places > 0 && rest % 10 == 0)
        {
            rest /= 10;
            places--;
        }

        if (places == 0)
        {
            Utf8Formatter.TryFormat(rest, target[length..], out int whole);
            return length + whole;
        }

        ulong scale = ExactDecimal.PowerOfTen(places);
        Utf8Formatter.TryFormat(rest / scale, target[length..], out int written);
        length += written;
        target[length++] = (byte)'.';
        ulong fraction = rest % scale;
        for (int at = places - 1; at >= 0; at--)
        {
            target[length + at] = (byte)('0' + (int)(fraction % 10));
            fraction /= 10;
        }

        return length + places;
    }

    /// <summary>The same as text, with at least <paramref name="least"/> decimal places.</summary>
    public static string Format(long units, int places, int least = 0)
    {
        Span<byte> buffer = stackalloc byte[24];
        int length = Write(buffer, units, places);
        int point = buffer[..length].IndexOf((byte)'.');
        int have = point < 0 ? 0 : length - point - 1;
        string text = System.Text.Encoding.ASCII.GetString(buffer[..length]);
        return have >= least ? text : text + (point < 0 ? "." : "") + new string('0', least - have);
    }
}
