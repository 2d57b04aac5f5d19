using System.CommandLine;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary><c>limits FEATURE</c>: the limits of size that a feature line means.</summary>
internal static class LimitsCommand
{
    public static Command Create(Streams streams)
    {
        FeatureQuestion question = new();
        Command limits = new("limits", "Says the limits of size of a feature, or of the two features of a fit");
        ShopChoice choice = new();
        question.AddTo(limits);
        limits.Options.Add(choice.Shop);
        limits.SetAction(parsed => question.Answer(
            parsed,
            streams,
            () => choice.Materials(parsed),
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
}
