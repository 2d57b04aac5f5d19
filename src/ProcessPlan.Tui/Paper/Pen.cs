using System.Text;

namespace ProcessPlan.Tui.Paper;

/// <summary>The characters that pictures are drawn with, and how text is put on this terminal.</summary>
internal sealed record Pen
{
    public static readonly Pen Blocks = new()
    {
        Line = '─',
        ZeroLine = '│',
        Zone = '▒',
        Metal = '█',
        Aim = '◆',
        Block = '█',
        Pointer = '▸',
        Tick = '┴',
        More = '↓',
    };

    public static readonly Pen Ascii = new()
    {
        IsAscii = true,
        Line = '-',
        ZeroLine = '|',
        Zone = '=',
        Metal = '#',
        Aim = 'o',
        Block = '#',
        Pointer = '>',
        Tick = '+',
        More = 'v',
    };

    public bool IsAscii { get; private init; }

    public required char Line { get; init; }

    public required char ZeroLine { get; init; }

    public required char Zone { get; init; }

    public required char Metal { get; init; }

    public required char Aim { get; init; }

    public required char Block { get; init; }

    public required char Pointer { get; init; }

    public required char Tick { get; init; }

    public required char More { get; init; }

    /// <summary>The text in characters of one cell each, and in the plain ones where this pen has no others.</summary>
    public string Put(string text)
    {
        foreach (char c in text)
        {
            if (c is < ' ' or > '~')
            {
                return Translate(text);
            }
        }

        return text;
    }

    private string Translate(string text)
    {
        StringBuilder put = new(text.Length + 8);
        for (int i = 0; i < text.Length; i++)
        {
            char c = text[i];
            if (char.IsHighSurrogate(c) && i + 1 < text.Length && char.IsLowSurrogate(text[i + 1]))
            {
                i++;
            }

            _ = c is >= ' ' and <= '~' ? put.Append(c)
                : IsAscii ? put.Append(Plain(c))
                : put.Append(IsNarrow(c) ? c : '?');
        }

        return put.ToString();
    }

    /// <summary>Latin, Greek, punctuation, signs and block characters take one cell each; of the rest no terminal is sure.</summary>
    private static bool IsNarrow(char c) => c is (>= '\u00A0' and < '\u0300' and not '\u00AD') or (>= '\u0370' and < '\u0483') or (>= '\u2010' and < '\u2028')
        or (>= '\u2030' and < '\u2060') or (>= '\u2190' and < '\u2300') or (>= '\u2500' and < '\u25FD');

    private static string Plain(char c) => c switch
    {
        'µ' or 'μ' => "u",
        '·' => "*",
        '×' => "x",
        '±' => "+/-",
        '≤' => "<=",
        '≥' => ">=",
        '…' => "...",
        '–' or '—' or '−' => "-",
        '°' => "deg ",
        'Ø' or 'ø' => "dia ",
        '√' => "sqrt",
        '²' => "^2",
        'π' => "pi",
        'ρ' => "rho",
        'ε' => "eps",
        '’' or '‘' => "'",
        '\u00A0' => " ",
        _ => "?",
    };
}
