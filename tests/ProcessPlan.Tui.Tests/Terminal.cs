using System.Text;
using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using Terminal.Gui.App;
using Terminal.Gui.Drawing;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;
using Terminal.Gui.Testing;
using Terminal.Gui.Text;
using Terminal.Gui.Time;

namespace ProcessPlan.Tui.Tests;

/// <summary>The bench on a terminal without a screen: keys in, characters out. Plans are made at once unless a test holds them back.</summary>
internal sealed class Terminal : IDisposable
{
    public static readonly ShopFloor Shop = HandbookShop.Load();

    private readonly IApplication _app;
    private readonly BenchView _view;
    private readonly SessionToken _session;

    public Terminal(ScreenOptions? options = null, int width = 80, int height = 24, Func<Feature, Plan>? plan = null, Action<Action>? aside = null)
    {
        options ??= new ScreenOptions();
        Bench = new Bench(Shop.Names, options.Line, options.Unit);
        _app = Application.Create(new VirtualTimeProvider());
        _app.Init(DriverRegistry.Names.ANSI);
        _app.Driver!.SetScreenSize(width, height);
        _app.Driver.Force16Colors = true;
        _view = new BenchView(Bench, options, plan ?? (feature => Planner.Plan(feature, Shop, 5)), aside ?? (static work => work()));
        _session = _app.Begin(_view)!;
        Settle();
    }

    public Bench Bench { get; }

    public IApplication App => _app;

    public int Width => _app.Driver!.Cols;

    public int Height => _app.Driver!.Rows;

    /// <summary>Lets the screen do what was asked of it, and paint.</summary>
    public Terminal Settle()
    {
        _app.TimedEvents!.RunTimers();
        _app.LayoutAndDraw();
        return this;
    }

    public bool IsRunning => !_view.StopRequested;

    /// <summary>A key by its name, without painting after it.</summary>
    public void Inject(string key) => _app.InjectKey(Named(key));

    /// <summary>Presses keys by the names that the help prints.</summary>
    public Terminal Press(params string[] keys)
    {
        foreach (string key in keys)
        {
            Inject(key);
            Settle();
        }

        return this;
    }

    public Terminal Type(string text)
    {
        foreach (Rune rune in text.EnumerateRunes())
        {
            _app.InjectKey(new Key(rune.Value));
        }

        return Settle();
    }

    /// <summary>Types a line in place of the one that stands there.</summary>
    public Terminal Retype(string line) => Press("Ctrl+A").Type(line);

    public Terminal Click(int x, int y)
    {
        _app.InjectSequence(InputInjectionExtensions.LeftButtonClick(new System.Drawing.Point(x, y)));
        return Settle();
    }

    public Terminal Resize(int width, int height)
    {
        _app.Driver!.SetScreenSize(width, height);
        _app.LayoutAndDraw(true);
        return Settle();
    }

    public string Row(int y)
    {
        StringBuilder row = new();
        Cell[,] cells = _app.Driver!.Contents!;
        for (int x = 0; x < Width; x++)
        {
            string grapheme = cells[y, x].Grapheme;
            row.Append(grapheme);
            x += Math.Max(0, grapheme.GetColumns() - 1);
        }

        return row.ToString().TrimEnd();
    }

    public string Text => string.Join('\n', Enumerable.Range(0, Height).Select(Row));

    public IEnumerable<Cell> Cells => _app.Driver!.Contents!.Cast<Cell>();

    /// <summary>What the terminal would be sent for the whole screen.</summary>
    public string Ansi => _app.Driver!.ToAnsi();

    public void Dispose()
    {
        _app.End(_session);
        _view.Dispose();
        _app.Dispose();
    }

    private static Key Named(string name) => name switch
    {
        "Up" => Key.CursorUp,
        "Down" => Key.CursorDown,
        "Left" => Key.CursorLeft,
        "Right" => Key.CursorRight,
        "Insert" => Key.InsertChar,
        "Shift+Left" => Key.CursorLeft.WithShift,
        "Ctrl+Left" => Key.CursorLeft.WithCtrl,
        { Length: 1 } letter => new Key(letter[0]),
        _ => Key.TryParse(name, out Key? key) ? key : throw new ArgumentException($"There is no key '{name}'.", nameof(name)),
    };
}
