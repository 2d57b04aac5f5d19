using System.Globalization;
using Terminal.Gui.Input;
using Terminal.Gui.Text;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;

namespace ProcessPlan.Tui;

/// <summary>The line that a feature is typed on: the library's text field, which asks the bench first what a key means.</summary>
internal sealed class FeatureField : TextField
{
    private readonly Func<Key, bool> _take;
    private readonly bool _ascii;

    public FeatureField(Func<Key, bool> take, bool ascii)
    {
        (_take, _ascii) = (take, ascii);
        Autocomplete = null;
    }

    /// <summary>Characters of the text before the caret; the field itself counts what the eye sees as one.</summary>
    public int Caret => StartOf(InsertionPoint);

    /// <summary>Column of a character of the text within the field; negative or beyond its width where it is scrolled away.</summary>
    public int ColumnOf(int character)
    {
        int column = 0;
        int at = 0;
        for (int element = 0; at < Text.Length; element++)
        {
            int length = StringInfo.GetNextTextElementLength(Text, at);
            if (at + length > character)
            {
                return element < ScrollOffset ? -1 : column;
            }

            column += element < ScrollOffset ? 0 : CellsOf(Text.Substring(at, length));
            at += length;
        }

        return column + character - Text.Length;
    }

    /// <summary>
    /// Whether the text is an example that nobody has touched yet. It stands there marked, so that the first character typed replaces it, while a key
    /// that moves the caret keeps it.
    /// </summary>
    public bool IsExample { get; set; }

    /// <summary>Puts another text in, with the caret behind it.</summary>
    public void Replace(string text)
    {
        IsExample = false;
        Text = text;
        MoveEnd();
    }

    protected override bool OnKeyDown(Key key)
    {
        bool taken = _take(key);
        IsExample &= taken && key != Key.Enter;
        return taken || base.OnKeyDown(key);
    }

    protected override bool OnMouseEvent(Mouse mouse)
    {
        IsExample &= !mouse.Flags.HasFlag(MouseFlags.LeftButtonPressed);
        SuperView?.SetNeedsDraw();
        return base.OnMouseEvent(mouse);
    }

    /// <summary>
    /// In place of what the library does here: it marks the whole text, so that the next letter would wipe it out, and builds a menu that knows nothing
    /// of our keys. Only an example stays marked.
    /// </summary>
    protected override void OnHasFocusChanged(bool newHasFocus, View? previousFocusedView, View? focusedView)
    {
        if (App?.Mouse.IsGrabbed(this) == true)
        {
            App.Mouse.UngrabMouse();
        }

        if (IsExample)
        {
            SelectAll();
            return;
        }

        ClearAllSelection();
        InsertionPoint = Math.Min(InsertionPoint, Text.Length); // setting it shows or hides the caret
    }

    protected override bool OnDrawingContent(DrawContext? context)
    {
        bool drawn = base.OnDrawingContent(context);
        if (_ascii)
        {
            ReplaceForeignCharacters();
        }

        return drawn;
    }

    /// <summary>What was typed stays in the text; only its picture is made of plain characters.</summary>
    private void ReplaceForeignCharacters()
    {
        if (App?.Driver is not { Contents: { } cells } screen)
        {
            return;
        }

        System.Drawing.Rectangle place = FrameToScreen();
        for (int column = Math.Max(0, place.X); column < Math.Min(place.Right, screen.Cols) && place.Y < screen.Rows; column++)
        {
            string grapheme = cells[place.Y, column].Grapheme;
            if (grapheme.Any(static c => c > '~'))
            {
                AddStr(column - place.X, 0, new string('?', CellsOf(grapheme)));
            }
        }
    }

    private static int CellsOf(string element) => Math.Max(1, element.GetColumns());

    private int StartOf(int element)
    {
        int at = 0;
        for (; element > 0 && at < Text.Length; element--)
        {
            at += StringInfo.GetNextTextElementLength(Text, at);
        }

        return at;
    }
}
