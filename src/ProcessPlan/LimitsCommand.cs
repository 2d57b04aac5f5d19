using System.CommandLine;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Shop;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary><c>limits FEATURE</c>: the limits of size that a feature line means.</summary>
internal static class LimitsCommand
{
    public static Command Create(Streams streams)
    {
        FeatureQuestion question = new();
        Command limits = new("limits", "Says the limits of size of a feature, or of the two features of a fit");
        question.AddTo(limits);
        limits.SetAction(parsed => question.Answer(
            parsed,
            streams,
            Materials,
            static (json, request) =>
            {
                LimitsJson.Write(json, request);
                return ExitCode.Done;
            },
            static (text, request, unit) =>
            {
                LimitsText.Write(text, request, unit);
                return ExitCode.Done;
            }));
        return limits;
    }

    private static MaterialNames Materials() => new(Named());

    private static IEnumerable<(string Designation, IReadOnlyList<string> Aliases)> Named()
    {
        foreach (Material material in HandbookShop.Materials())
        {
            yield return (material.Designation, material.Aliases);
        }
    }
}
