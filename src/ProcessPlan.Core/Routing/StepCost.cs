using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Costing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Core.Routing;

/// <summary>What one step costs on one piece.</summary>
/// <param name="Cut">What is cut.</param>
/// <param name="Cutting">The time under the tool.</param>
/// <param name="Checking">Minutes for measuring.</param>
/// <param name="Handling">Minutes for loading; zero where the part is on the machine already.</param>
/// <param name="Machine">The machine.</param>
/// <param name="SetUp">Minutes once a lot; zero where the part is on the machine already.</param>
/// <param name="Wear">Cost of the wear on the tool.</param>
internal readonly record struct StepCost(Cut Cut, CutTime Cutting, double Checking, double Handling, Machine Machine, double SetUp, double Wear)
{
    /// <summary>Run time of a piece.</summary>
    public double Minutes => Cutting.Minutes + Machine.ToolChangeMinutes + Checking + Handling;

    /// <param name="step">The step.</param>
    /// <param name="entering">Sizes that it starts from; null in solid metal.</param>
    /// <param name="arrives">Whether the part comes onto the machine for it.</param>
    /// <param name="job">The job.</param>
    /// <param name="data">Speeds and feeds of its material.</param>
    public static StepCost Of(Step step, MetalWindow? entering, bool arrives, Job job, CuttingData data)
    {
        Process process = step.Process;
        MetalWindow window = step.Window;
        Cut cut = new(
            process,
            data,
            step.Tool?.Stamped ?? Diameter(process, entering, job),
            job.Extent,
            entering is { } from ? new Stock(from.Most - step.Reach.Least) : null,
            step.IsLast ? process.Ra(step.Effort) : process.LeftRa,
            step.Effort);
        Machine machine = step.Machine!;
        CutTime time = CutTime.For(cut);
        return new StepCost(cut, time, step.Checking(job),
            arrives ? machine.HandlingMinutes : 0, machine, arrives ? machine.SetUpMinutes : 0, ToolWear.Of(cut, step.Tool, time.Minutes));
    }

    /// <summary>
    /// Diameter for the speed: of a roughing cut outside the blank's, for the rest the feature's own, so that no time moves with the last hundredth.
    /// </summary>
    private static Length Diameter(Process process, MetalWindow? entering, Job job) =>
        entering is { } from && process.StartsRough && !job.IsInternal ? MetalWindow.Size(from.Most) : job.Nominal;

    /// <summary>Cost of a good piece: run time and wear over the yield to the end of the route, and its share of the set-up.</summary>
    public double PerGoodPiece(double yieldToEnd, int quantity) => (Machine.RatePerMinute * Minutes + Wear) / yieldToEnd + Machine.RatePerMinute * SetUp / quantity;
}
