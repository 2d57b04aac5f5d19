using ProcessPlan.Core;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Text;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui;

/// <summary>What the whole screen shows.</summary>
internal enum Page
{
    Bench,
    BigDigits,
    Help,
    Words,
    Keys,
}

/// <summary>Where the keys go: into the line, or to the table of operations.</summary>
internal enum Hand
{
    Line,
    Route,
}

/// <summary>What stands below the route.</summary>
internal enum Below
{
    Reasons,
    Notes,
}

/// <summary>
/// The planner's bench without its screen: the line being typed, the last answer to a line that was read whole, and what of it is looked at.
/// </summary>
internal sealed class Bench
{
    private readonly MaterialNames _materials;
    private readonly List<string> _recent = [];
    private string _draft = "";
    private int _recall;

    /// <param name="materials">The materials that a line may name.</param>
    /// <param name="line">The line that stands there at first, not read yet.</param>
    /// <param name="unit">The unit shown at first.</param>
    public Bench(MaterialNames materials, string line = "", LengthUnit unit = LengthUnit.Millimetre)
    {
        _materials = materials;
        Text = line;
        Unit = unit;
    }

    public string Text { get; private set; }

    /// <summary>Whether the text has been read at all; only the first one stands unread for a moment.</summary>
    public bool IsRead { get; private set; }

    /// <summary>What is wrong with the text, from left to right; nothing for a text that was read, and for an empty one.</summary>
    public IReadOnlyList<Problem> Problems { get; private set; } = [];

    /// <summary>The request of the present text while it waits for its answer.</summary>
    public FeatureRequest? Waiting { get; private set; }

    /// <summary>The answer to the last line that was read whole.</summary>
    public Answer? Answer { get; private set; }

    /// <summary>Whether the answer belongs to the text as it stands.</summary>
    public bool IsCurrent => Answer is not null && Answer.Line == Text;

    public LengthUnit Unit { get; private set; }

    public Page Page { get; private set; }

    public Hand Hand { get; private set; }

    public Below Below { get; private set; }

    /// <summary>First line shown of the text below the route or of the help.</summary>
    public int Scroll { get; private set; }

    public int FeatureAt { get; private set; }

    public int RouteAt { get; private set; }

    public int OperationAt { get; private set; }

    /// <summary>Whether the big digits show the drawing's size or that of the operation looked at.</summary>
    public bool BigDrawing { get; private set; } = true;

    public bool QuitAsked { get; private set; }

    public Feature? Feature => Answer?.Request.Features.ElementAt(FeatureAt);

    public Plan? Plan => Answer?.Plans[FeatureAt];

    public Route? Route => Plan is { Routes.Count: > 0 } plan ? plan.Routes[RouteAt] : null;

    public Operation? Operation => Route?.Operations[OperationAt];

    public bool IsFit => Answer?.Request.Mate is not null;

    /// <summary>Takes the text as it stands after a key. A text that was read waits for its answer from then on.</summary>
    public void Type(string text)
    {
        if (IsRead && text == Text)
        {
            return;
        }

        (Text, IsRead) = (text, true);
        Problems = [];
        Waiting = null;
        if (string.IsNullOrWhiteSpace(text))
        {
            return;
        }

        Parsed<FeatureRequest> read = FeatureLine.Parse(text, _materials);
        Problems = [.. read.Problems.OrderBy(static problem => problem.At)];
        Scroll = Problems.Count > 0 ? 0 : Scroll;
        Waiting = IsCurrent ? null : read.Value;
    }

    /// <summary>Takes an answer, unless the text has gone on since.</summary>
    public void Take(Answer answer)
    {
        if (answer.Line != Text || Waiting is null)
        {
            return;
        }

        Answer = answer;
        Waiting = null;
        FeatureAt = Math.Min(FeatureAt, answer.Plans.Count - 1);
        ChooseRoute(0);
    }

    /// <summary>The problem whose text the caret stands in, else the first one: behind a word the caret is still typing it.</summary>
    public Problem? ProblemTold(int caret) =>
        Problems.FirstOrDefault(problem => caret >= problem.At && caret < problem.At + problem.Length) ?? (Problems.Count > 0 ? Problems[0] : null);

    public void FlipUnit() => Unit = Unit == LengthUnit.Inch ? LengthUnit.Millimetre : LengthUnit.Inch;

    public void NextRoute()
    {
        if (Plan is { Routes.Count: > 0 } plan)
        {
            ChooseRoute((RouteAt + 1) % plan.Routes.Count);
        }
    }

    public void OtherFeature()
    {
        if (Answer is not null)
        {
            FeatureAt = (FeatureAt + 1) % Answer.Plans.Count;
            ChooseRoute(0);
        }
    }

    public void NextOperation() => ChooseOperation(OperationAt + 1);

    public void PreviousOperation() => ChooseOperation(OperationAt - 1);

    public void ChooseOperation(int at)
    {
        if (Route is { } route)
        {
            OperationAt = Math.Clamp(at, 0, route.Operations.Count - 1);
            Scroll = 0;
        }
    }

    public void FlipBelow() => (Below, Scroll) = (Below == Below.Notes ? Below.Reasons : Below.Notes, 0);

    public void Turn(Page page) => (Page, Scroll) = (Page == page ? Page.Bench : page, 0);

    /// <summary>From the keys to the words of the line, and back.</summary>
    public void TurnHelp() => Turn(Page == Page.Words ? Page.Help : Page.Words);

    /// <summary>Opens the big digits on what is looked at: the operation from the route, the drawing from the line.</summary>
    public void Enlarge()
    {
        BigDrawing = Hand == Hand.Line || Operation is null;
        Turn(Page.BigDigits);
    }

    /// <summary>From the drawing's size to the operations, in the order of the work.</summary>
    public void NextBig()
    {
        if (BigDrawing)
        {
            BigDrawing = Operation is null;
            ChooseOperation(0);
        }
        else
        {
            NextOperation();
        }
    }

    public void PreviousBig()
    {
        BigDrawing |= OperationAt == 0;
        PreviousOperation();
    }

    public void GoTo(Hand hand) => Hand = hand == Hand.Route && Route is null ? Hand.Line : hand;

    /// <summary>From any page to the bench, from the route to the line; it never leaves the program.</summary>
    public void Back()
    {
        if (Page != Page.Bench)
        {
            Turn(Page.Bench);
        }
        else
        {
            Hand = Hand.Line;
        }
    }

    public void ScrollBy(int lines) => Scroll = Math.Max(0, Scroll + lines);

    /// <summary>The screen says how far its text goes, so that no key press is lost beyond its end.</summary>
    public void LimitScroll(int most) => Scroll = Math.Clamp(Scroll, 0, Math.Max(0, most));

    public void Quit() => QuitAsked = true;

    /// <summary>Keeps the line for later, where it was read, and goes on to its route.</summary>
    public void Enter()
    {
        if (Problems.Count > 0 || string.IsNullOrWhiteSpace(Text))
        {
            return;
        }

        Keep(Text);
        GoTo(Hand.Route);
    }

    /// <summary>Goes to the line and empties it; a line that was read is kept, so that it can be brought back.</summary>
    public void StartNew()
    {
        if (Problems.Count == 0 && !string.IsNullOrWhiteSpace(Text))
        {
            Keep(Text);
        }

        (_recall, _draft) = (_recent.Count, "");
        (Page, Hand, Scroll) = (Page.Bench, Hand.Line, 0);
        Type("");
    }

    /// <summary>Brings back the line kept before the one shown; the text being typed is not lost by it.</summary>
    public void Earlier() => Recall(_recall - 1);

    public void Later() => Recall(_recall + 1);

    private void Recall(int at)
    {
        if (at < 0 || at > _recent.Count)
        {
            return;
        }

        _draft = _recall == _recent.Count ? Text : _draft;
        _recall = at;
        Type(at < _recent.Count ? _recent[at] : _draft);
    }

    private void Keep(string line)
    {
        _recent.Remove(line);
        _recent.Add(line);
        _recall = _recent.Count;
        _draft = "";
    }

    private void ChooseRoute(int at)
    {
        RouteAt = at;
        Scroll = 0;
        OperationAt = Route is { } route ? Math.Clamp(OperationAt, 0, route.Operations.Count - 1) : 0;
        Hand = Route is null ? Hand.Line : Hand;
    }
}
