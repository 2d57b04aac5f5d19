using ProcessPlan.Tui.Paper;

namespace ProcessPlan.Tui.Pages;

/// <summary>What is shown where the bench has no room.</summary>
internal static class SmallPage
{
    public const int LeastWidth = 60;
    public const int LeastHeight = 16;

    public static bool IsTooSmall(int width, int height) => width < LeastWidth || height < LeastHeight;

    public static void Draw(Sheet sheet)
    {
        string[] texts = [$"Window too small: {sheet.Width} x {sheet.Height}.", $"Make it {LeastWidth} x {LeastHeight} or larger.", "Ctrl+Q leaves."];
        int row = 0;
        foreach (string text in texts)
        {
            foreach (string line in sheet.Wrap(text, sheet.Width))
            {
                sheet.Write(0, row++, line);
            }
        }
    }
}
