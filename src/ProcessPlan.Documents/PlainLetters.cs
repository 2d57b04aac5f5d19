using System.Text;

namespace ProcessPlan.Documents;

/// <summary>
/// Passes text on in the ninety-five characters that every terminal and printer has: µ as u, ± as +/-, Ø as dia, anything else unknown as a question mark.
/// </summary>
public sealed class PlainLetters : TextWriter
{
    private readonly TextWriter _target;

    public PlainLetters(TextWriter target)
        : base(target.FormatProvider)
    {
        _target = target;
        NewLine = target.NewLine;
    }

    public override Encoding Encoding => _target.Encoding;

    public override void Write(char value)
    {
        if (value < '\u0080')
        {
            _target.Write(value);
            return;
        }

        _target.Write(value switch
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

    public override void Flush() => _target.Flush();
}
