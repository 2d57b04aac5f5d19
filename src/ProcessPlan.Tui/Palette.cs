using ProcessPlan.Tui.Paper;
using Terminal.Gui.Drawing;
using Attribute = Terminal.Gui.Drawing.Attribute;

namespace ProcessPlan.Tui;

/// <summary>How each ink looks. On the terminal's own ground, in its own sixteen colours, or in none at all.</summary>
internal sealed class Palette
{
    private readonly Attribute[] _looks;

    public Palette(bool noColour)
    {
        Attribute Look(ColorName16 colour, TextStyle style = TextStyle.None) => new(noColour ? Color.None : new Color(colour), Color.None, style);
        Attribute Bare(TextStyle style) => new(Color.None, Color.None, style);
        _looks = new Attribute[Enum.GetValues<Ink>().Length];
        _looks[(int)Ink.Plain] = Bare(TextStyle.None);
        _looks[(int)Ink.Faint] = Bare(TextStyle.Faint);
        _looks[(int)Ink.Strong] = Bare(TextStyle.Bold);
        _looks[(int)Ink.Heading] = Look(ColorName16.Cyan, TextStyle.Bold);
        _looks[(int)Ink.Chosen] = Bare(TextStyle.Reverse);
        _looks[(int)Ink.Problem] = Look(ColorName16.BrightRed, TextStyle.Bold);
        _looks[(int)Ink.Caution] = Look(ColorName16.Yellow);
        _looks[(int)Ink.Zone] = Look(ColorName16.Green);
        _looks[(int)Ink.Metal] = Look(ColorName16.Blue);
        Scheme = new Scheme
        {
            Normal = this[Ink.Plain],
            HotNormal = this[Ink.Plain],
            Focus = this[Ink.Plain],
            HotFocus = this[Ink.Plain],
            Active = this[Ink.Chosen],
            HotActive = this[Ink.Chosen],
            Highlight = this[Ink.Strong],
            Disabled = this[Ink.Faint],
            Editable = Bare(TextStyle.Underline),
            ReadOnly = this[Ink.Plain],
        };
    }

    /// <summary>The look of the library's own parts: the field and the ground.</summary>
    public Scheme Scheme { get; }

    public Attribute this[Ink ink] => _looks[(int)ink];
}
