using System.Text;

namespace ProcessPlan.Documents;

/// <summary>
/// Passes text on in the ninety-five characters that every terminal and printer has: µ as u, ± as +/-, Ø as dia, anything else unknown as a question mark.
/// </summary>
public sealed class PlainLetters(TextWriter target) : TextWriter(target.FormatProvider)
{
    public override Encoding Encoding => target.Encoding;

    public override void Write(char value)
    {
        if (value < '\u0080')
        {
            target.Write(value);
            return;
        }

        target.Write(value switch
        {
            'Ø' or 'ø' or '⌀' => "dia ",
            'µ' or 'μ' => "u",
            '±' => "+/-",
            '−' or '–' or '—' or '‑' => "-",
            '×' => "x",
            '·' => "*",
            '…' => "...",
            '°' => "deg ",
            'Δ' => "delta",
            '≤' => "<=",
            '≥' => ">=",
            'σ' => "sigma",
            'ρ' => "rho",
            '²' => "^2",
            '³' => "^3",
            '½' => "1/2",
            '\u00A0' => " ",
            _ => "?",
        });
    }

    public override void Flush() => target.Flush();
}
