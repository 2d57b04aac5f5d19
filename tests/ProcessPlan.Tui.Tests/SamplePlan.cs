using ProcessPlan.Core;
using ProcessPlan.Core.Capability;
using ProcessPlan.Core.Features;
using ProcessPlan.Core.Routing;
using ProcessPlan.Core.Shop;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;

namespace ProcessPlan.Tui.Tests;

/// <summary>A plan with invented, fixed figures: the pictures of the screen must not move when a table of the planner does.</summary>
internal static class SamplePlan
{
    private const string Euro = "EUR";

    public static Plan For(Feature feature)
    {
        bool refused = feature.Class is { } asked && asked.Grade <= ToleranceGrade.It(3);
        return new Plan
        {
            Job = new Job(feature, Terminal.Shop),
            Routes = refused ? [] : [Make(1, feature, 2.53m, extra: false), Make(2, feature, 2.79m, extra: true)],
            Refusal = refused
                ? new Refusal("25 H3 with Ra 0.1", "No process of this shop finishes 25 H3.", "IT5 (9 µm) by fine honing; Ra 0.05 by lapping",
                    ["a jig grinder, or an outside supplier", "Ask the designer whether a wider tolerance serves."])
                : null,
            Rejected = [new Rejection("twist drilling", "holds IT11, 130 µm; asked are 21 µm"), new Rejection("broaching", "no machine of this shop does it")],
            Queries = feature.Finish is null ? ["No roughness is given. Which one is needed?"] : [],
            Cautions = ["Typical values: prove them on the first part.", "Drawing and order win; a competent person releases."],
            Assumptions = ["cut in solid metal", "sizes at 20 °C; stock and sizes on diameter"],
            Expanded = 1,
        };
    }

    private static Route Make(int rank, Feature feature, decimal cost, bool extra)
    {
        long side = feature.IsInternal ? -1 : 1;
        SizeWindow Left(long least, long most) => side < 0
            ? new SizeWindow(feature.Limits.Max - Deviation.FromMicrometres(most), feature.Limits.Max - Deviation.FromMicrometres(least))
            : new SizeWindow(feature.Limits.Min + Deviation.FromMicrometres(least), feature.Limits.Min + Deviation.FromMicrometres(most));

        List<Operation> operations =
        [
            Cut(10, "roughing", "lathe 2", Left(1800, 1930), 12, 12_500, null, null, 1.29, 1.32m),
            Cut(20, "finish cutting", "machining centre", Left(120, 172), 9, 3_200, 1628, 1810, 0.56, 0.52m),
        ];
        if (extra)
        {
            operations.Add(new Operation
            {
                Number = 30,
                Process = "stress relief",
                Machine = "outside",
                Condition = Condition.Soft,
                Minutes = default,
                SetUp = default,
                Cost = new Money(0.26m, Euro),
                Inspection = "size on return",
                Because = ["the drawing asks for it; 5 days away"],
                Cautions = [],
                Why = [],
            });
        }

        Length stamped = new(feature.Nominal.Picometres);
        operations.Add(Cut(extra ? 40 : 30, "sizing", "lathe 2", feature.Limits, 7, 800, 99, 172, 0.74, 0.69m) with
        {
            Tool = new Tool("machine reamer", ToolUse.Ream, stamped, new SizeWindow(stamped, stamped), "H7", "HSS", 62, 45),
            Cautions = ["Make a trial hole with a tool that is new to this material."],
        });
        return new Route(rank, operations, new Money(cost, Euro), new Minutes(2.59), new Minutes(25), 0.9986, 201, "solid metal");
    }

    private static Operation Cut(int number, string process, string machine, SizeWindow size, int grade, long ra, long? least, long? most, double minutes, decimal cost) => new()
    {
        Number = number,
        Process = process,
        Machine = machine,
        Condition = Condition.Soft,
        Size = size,
        Aim = size.Middle,
        Grade = ToleranceGrade.It(grade),
        Ra = Roughness.Ra(ra),
        StockMin = least is { } from ? Stock.FromMicrometres(from) : null,
        StockMax = most is { } to ? Stock.FromMicrometres(to) : null,
        Minutes = new Minutes(minutes),
        SetUp = new Minutes(25),
        Cost = new Money(cost, Euro),
        Inspection = $"bore gauge, U 2 µm; first piece, then 1 in {number}",
        Because = [$"holds IT{grade} with routine effort"],
        Cautions = [],
        Why =
        [
            new Reason("size", $"the next operation's limit and least stock, then IT{grade} into the metal [a table of a handbook, over 18 to 30 mm]"),
            new Reason("minutes", $"cut: travel 44 mm · 2 / (0.18 mm · π·D·n by 144 m/min) = {minutes:0.00} min"),
        ],
    };
}
