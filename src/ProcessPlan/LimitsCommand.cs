using System.CommandLine;
using ProcessPlan.Core.Features;
using ProcessPlan.Documents;

namespace ProcessPlan;

/// <summary><c>limits FEATURE</c>: the limits of size that a feature line means.</summary>
internal static class LimitsCommand
{
    public const string Name = "limits";

    public static Command Create(Streams streams)
    {
        FeatureQuestion question = new();
        Command limits = new(Name, "Says the limits of size of a feature, or of the two features of a fit");
        ShopChoice choice = new();
        question.AddTo(limits);
        limits.Options.Add(choice.Shop);
        limits.SetAction(parsed => Answer(question.In(parsed), streams, () => choice.Materials(parsed)));
        return limits;
    }

    /// <summary>Answers a line without options; who asks this often should not wait for the parser of options, which takes longer than the answer.</summary>
    public static int Answer(string[] words, Streams streams) => Answer(new FeatureAsked(words), streams, ShopChoice.UsualMaterials);

    private static int Answer(FeatureAsked asked, Streams streams, Func<MaterialNames> materials) => FeatureQuestion.Answer(
        asked,
        streams,
        materials,
        static (json, request) =>
        {
            LimitsJson.Write(json, request);
            return ExitCode.Done;
        },
        static (text, request, unit) =>
        {
            LimitsText.Write(text, request, unit);
            return ExitCode.Done;
        });
}
