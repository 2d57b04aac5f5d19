using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Tui.Pages;
using ProcessPlan.Tui.Paper;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;

namespace ProcessPlan.Tui;

/// <summary>The bench on a terminal: hands keys and text to it, and paints the page that it shows.</summary>
internal sealed class BenchView : Runnable
{
    private readonly Bench _bench;
    private readonly FeatureField _field;
    private readonly Reckoner _reckoner;
    private readonly Palette _palette;
    private readonly Pen _pen;
    private Sheet? _shown;

    /// <param name="bench">What is shown.</param>
    /// <param name="options">How it is shown, and the line it starts with.</param>
    /// <param name="plan">Plans one feature.</param>
    /// <param name="aside">Runs planning away from the screen.</param>
    public BenchView(Bench bench, ScreenOptions options, Func<Feature, Plan> plan, Action<Action> aside)
    {
        _bench = bench;
        _palette = new Palette(options.NoColour);
        _pen = options.Ascii ? Pen.Ascii : Pen.Blocks;
        _reckoner = new Reckoner(plan, aside, work => App?.Invoke(_ => work()), Deliver);
        Arrangement = ViewArrangement.Fixed;
        SetScheme(_palette.Scheme);
        _field = new FeatureField(Take, options.Ascii) { X = BenchPage.FieldColumn, Y = 0, Width = Dim.Fill(BenchPage.FieldEnd), Text = options.Line, IsExample = options.Line == ScreenOptions.FirstLine };
        _field.SetScheme(_palette.Scheme);
        _field.ValueChanged += (_, change) => Read(change.NewValue ?? "");
        Add(_field);
    }

    /// <summary>Reads the line that the field starts with, once the screen has been painted: a person can type before the first plan is there.</summary>
    protected override void OnIsRunningChanged(bool newIsRunning)
    {
        base.OnIsRunningChanged(newIsRunning);
        if (newIsRunning)
        {
            App?.AddTimeout(TimeSpan.Zero, () =>
            {
                Read(_field.Text);
                return false;
            });
        }
    }

    protected override bool OnKeyDown(Key key)
    {
        Take(key);
        return true;
    }

    /// <summary>A click on an operation looks at it, a click on the line goes there, the wheel turns the lower text.</summary>
    protected override bool OnMouseEvent(Mouse mouse)
    {
        if (mouse.Flags.HasFlag(MouseFlags.WheeledDown) || mouse.Flags.HasFlag(MouseFlags.WheeledUp))
        {
            _bench.ScrollBy(mouse.Flags.HasFlag(MouseFlags.WheeledDown) ? 1 : -1);
        }
        else if (mouse.Flags.HasFlag(MouseFlags.LeftButtonPressed) && mouse.Position is { } place && _bench.Page == Page.Bench)
        {
            if (place.Y == 0)
            {
                _bench.GoTo(Hand.Line);
            }
            else if (_shown?.OperationAt(place.Y) is { } operation)
            {
                _bench.GoTo(Hand.Route);
                _bench.ChooseOperation(operation);
            }
        }

        Show();
        SetNeedsDraw();
        return true;
    }

    /// <summary>Every cell is painted, so nothing needs to be cleared before.</summary>
    protected override bool OnClearingViewport() => true;

    protected override bool OnDrawingContent(DrawContext? context)
    {
        Sheet sheet = new(Viewport.Width, Viewport.Height, _pen);
        Paint(sheet);
        _shown = sheet;
        for (int y = 0; y < sheet.Height; y++)
        {
            ReadOnlySpan<Ink> inks = sheet.Inks(y);
            for (int from = 0, to; from < sheet.Width; from = to)
            {
                to = from + 1;
                while (to < sheet.Width && inks[to] == inks[from])
                {
                    to++;
                }

                SetAttribute(_palette[inks[from]]);
                AddStr(from, y, sheet.Row(y)[from..to].ToString());
            }
        }

        return true;
    }

    protected override void OnSubViewsLaidOut(LayoutEventArgs args)
    {
        base.OnSubViewsLaidOut(args);
        ShowField();
    }

    private bool IsTooSmall => SmallPage.IsTooSmall(Viewport.Width, Viewport.Height);

    private void Paint(Sheet sheet)
    {
        if (SmallPage.IsTooSmall(sheet.Width, sheet.Height))
        {
            SmallPage.Draw(sheet);
            return;
        }

        switch (_bench.Page)
        {
            case Page.BigDigits:
                BigPage.Draw(sheet, _bench);
                break;
            case Page.Help:
                HelpPage.DrawHelp(sheet, _bench);
                break;
            case Page.Words:
                HelpPage.DrawWords(sheet, _bench);
                break;
            case Page.Keys:
                HelpPage.DrawKeys(sheet, _bench);
                break;
            default:
                BenchPage.Draw(sheet, _bench, new LineSight(_field.Caret, at => BenchPage.FieldColumn + _field.ColumnOf(at), BenchPage.FieldColumn, sheet.Width - BenchPage.FieldEnd));
                break;
        }
    }

    /// <summary>A key for the bench; the field keeps what the bench has no use for, except keys that would lead the library elsewhere.</summary>
    private bool Take(Key key)
    {
        string name = NameOf(key);
        bool taken = (!IsTooSmall || name == KeyChart.Leave) && KeyChart.Press(_bench, name);
        if (taken)
        {
            Show();
        }

        SetNeedsDraw();
        KeyCode bare = key.NoShift.NoCtrl.NoAlt.KeyCode;
        return taken || IsTooSmall || key.IsAlt || bare == KeyCode.Tab || bare is >= KeyCode.F1 and <= KeyCode.F24;
    }

    private static string NameOf(Key key) => key.ToString() switch
    {
        "CursorUp" => "Up",
        "CursorDown" => "Down",
        string name => name,
    };

    private void Read(string text)
    {
        _bench.Type(text);
        if (_bench.Waiting is { } request)
        {
            _reckoner.Ask(text, request);
        }

        SetNeedsDraw();
    }

    private void Deliver(Answer answer)
    {
        _bench.Take(answer);
        SetNeedsDraw();
    }

    private void Show()
    {
        if (_bench.QuitAsked)
        {
            App?.RequestStop(this);
            return;
        }

        if (_field.Text != _bench.Text)
        {
            _field.Replace(_bench.Text);
        }

        ShowField();
    }

    /// <summary>The field is there on the bench only, and has the keys only while the hand is on the line.</summary>
    private void ShowField()
    {
        _field.Visible = _bench.Page == Page.Bench && !IsTooSmall;
        bool typing = _field.Visible && _bench.Hand == Hand.Line;
        _field.CanFocus = typing;
        if (typing)
        {
            _field.SetFocus();
        }
    }
}
