using ProcessPlan.Core.Features;
using ProcessPlan.Core.Standards;
using ProcessPlan.Core.Values;
using static ProcessPlan.Core.Tests.Features.Line;

namespace ProcessPlan.Core.Tests.Features;

public sealed partial class FeatureLineTests
{
    private static readonly Feature Hole25H7 = new() { Kind = FeatureKind.Hole, Nominal = Mm(25), Class = Class("H7"), Limits = Limits(25, "H7") };

    private static readonly Feature Hole25 = new() { Kind = FeatureKind.Hole, Nominal = Mm(25), Limits = Limits(25, 25) };

    [Fact]
    public void Parse_HoleAsSpoken_ReadsEveryWord() => One("hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off").ShouldBe(Hole25H7 with
    {
        Extent = Mm(40),
        End = HoleEnd.Through,
        Finish = Ra(0.8m),
        Material = "42CrMo4",
        Hardness = Hrc(28),
        Quantity = 200,
    });

    [Fact]
    public void Parse_ShaftHardenedOnTheWay_ReadsTheTreatment() =>
        One("shaft 35 k6 x28 Ra 0.8 C45 hardened 58HRC runout 0.01 40 off").ShouldBe(new Feature
        {
            Kind = FeatureKind.Shaft,
            Nominal = Mm(35),
            Class = Class("k6"),
            Limits = Limits(35, "k6"),
            Extent = Mm(28),
            Finish = Ra(0.8m),
            Material = "C45",
            Treatment = new Treatment(TreatmentKind.Hardened, Hrc(58), null),
            Geometry = [new GeometryRequirement(GeometryKind.Runout, Mm(0.01m))],
            Quantity = 40,
        });

    [Fact]
    public void Parse_BoreWithDeviations_ReadsLimitsAndWall() =>
        One("bore 60 +0.030/0 x 50 wall 2 C45 cyl 0.01 12 off").ShouldBe(new Feature
        {
            Kind = FeatureKind.Hole,
            Nominal = Mm(60),
            Limits = Limits(60m, 60.03m),
            Extent = Mm(50),
            Wall = Mm(2),
            Material = "C45",
            Geometry = [new GeometryRequirement(GeometryKind.Cylindricity, Mm(0.01m))],
            Quantity = 12,
        });

    [Fact]
    public void Parse_Keyway_IsAnInternalWidth() => One("keyway 8 JS9 x 40 C45 1 off").ShouldBe(new Feature
    {
        Kind = FeatureKind.Slot,
        Nominal = Mm(8),
        Class = Class("JS9"),
        Limits = Limits(8, "JS9"),
        Extent = Mm(40),
        Material = "C45",
        Quantity = 1,
    });

    [Fact]
    public void Parse_CoatedShaft_ReadsBuildUpAndSide() =>
        One("shaft 30 f7 34CrNiMo6 38HRC coat zinc-nickel 8-12um before 60 off").ShouldBe(new Feature
        {
            Kind = FeatureKind.Shaft,
            Nominal = Mm(30),
            Class = Class("f7"),
            Limits = Limits(30, "f7"),
            Material = "34CrNiMo6",
            Hardness = Hrc(38),
            Coating = new Coating("zinc-nickel", Mm(0.008m), Mm(0.012m), CoatingLimits.Before),
            Quantity = 60,
        });

    [Fact]
    public void Parse_InchLine_KeepsTheInchAsMaster() => One("hole .2500 +.0005 -.0000 in x .5 6061 blind").ShouldBe(new Feature
    {
        Kind = FeatureKind.Hole,
        Nominal = Inch(0.25m),
        Limits = new SizeWindow(Inch(0.25m), Inch(0.2505m)),
        Unit = LengthUnit.Inch,
        Extent = Inch(0.5m),
        Material = "EN-AW-6061",
        End = HoleEnd.Blind,
    });

    [Theory]
    [InlineData("40 H7/k6 C45")]
    [InlineData("40H7/k6 C45")]
    [InlineData("40 H7 / k6 C45")]
    [InlineData("40 H7 k6 C45")]
    [InlineData("40 H 7 / k 6 C45")]
    [InlineData("C45 H7/k6 40")]
    [InlineData("40 k6/H7 C45")]
    [InlineData("fit=H7/k6 size=40 mat=C45")]
    public void Parse_Fit_IsTwoFeatures(string line)
    {
        FeatureRequest fit = Read(line);
        Feature hole = new() { Kind = FeatureKind.Hole, Nominal = Mm(40), Class = Class("H7"), Limits = Limits(40, "H7"), Material = "C45" };
        fit.First.ShouldBe(hole);
        fit.Mate!.ShouldBe(hole with { Kind = FeatureKind.Shaft, Class = Class("k6"), Limits = Limits(40, "k6") });
        fit.Features.Should().Equal(fit.First, fit.Mate!);
    }

    [Theory]
    [InlineData("25 N7/h6", "N7", "h6")]
    [InlineData("25N7/h6", "N7", "h6")]
    [InlineData("25 H8/d9", "H8", "d9")]
    [InlineData("25 d9/H8", "H8", "d9")]
    [InlineData("25 D8/h7", "D8", "h7")]
    [InlineData("25 H7/x6", "H7", "x6")]
    [InlineData("25H7/x6x40", "H7", "x6")]
    [InlineData("25 X7/h6", "X7", "h6")]
    [InlineData("25 H13/h9", "H13", "h9")]
    [InlineData("1 N7/h6 in", "N7", "h6")]
    public void Parse_FitOfLettersThatMeanOtherThingsToo_IsAFit(string line, string hole, string shaft)
    {
        FeatureRequest fit = Read(line);
        (fit.First.Class, fit.Mate?.Class).Should().Be((Class(hole), Class(shaft)));
        (fit.First.Finish, fit.First.Material).Should().Be((null, null));
    }

    [Fact]
    public void Parse_FitOfKeyAndKeyway_IsFlat()
    {
        FeatureRequest fit = Read("keyway 8 P9/h9 x40");
        (fit.First.Kind, fit.Mate!.Kind).Should().Be((FeatureKind.Slot, FeatureKind.Tongue));
        (fit.First.Extent, fit.Mate.Extent).Should().Be((Mm(40), Mm(40)));
    }

    [Fact]
    public void Parse_FitInABush_GivesWallAndEndToTheHoleOnly()
    {
        FeatureRequest fit = Read("40 H7/p6 x30 blind bottom 4 wall 5 Ra 0.8");
        (fit.First.End, fit.First.BottomRoom, fit.First.Wall, fit.First.Extent).Should().Be((HoleEnd.Blind, Mm(4), Mm(5), Mm(30)));
        (fit.Mate!.End, fit.Mate.BottomRoom, fit.Mate.Wall, fit.Mate.Extent, fit.Mate.Finish).Should().Be((null, null, null, Mm(30), Ra(0.8m)));
    }

    [Theory]
    [InlineData("hole", FeatureKind.Hole)]
    [InlineData("bore", FeatureKind.Hole)]
    [InlineData("shaft", FeatureKind.Shaft)]
    [InlineData("pin", FeatureKind.Shaft)]
    [InlineData("slot", FeatureKind.Slot)]
    [InlineData("keyway", FeatureKind.Slot)]
    [InlineData("key", FeatureKind.Tongue)]
    [InlineData("tongue", FeatureKind.Tongue)]
    public void Parse_WordOfKind_IsItsKind(string word, FeatureKind kind)
    {
        One($"{word} 25 ±0.1").Kind.Should().Be(kind);
        One($"25 ±0.1 kind={word}").Kind.Should().Be(kind);
        One($"{word.ToUpperInvariant()} 25 ±0.1").Kind.Should().Be(kind);
    }

    [Theory]
    [InlineData("25H7", FeatureKind.Hole)]
    [InlineData("25h6", FeatureKind.Shaft)]
    [InlineData("slot 25H7", FeatureKind.Slot)]
    [InlineData("key 25h9", FeatureKind.Tongue)]
    public void Parse_Class_SaysTheKindWhereNoWordDoes(string line, FeatureKind kind) => One(line).Kind.Should().Be(kind);

    [Theory]
    [InlineData("25H7")]
    [InlineData("25 H7")]
    [InlineData("Ø25H7")]
    [InlineData("ø 25 H7")]
    [InlineData("⌀25H7")]
    [InlineData("∅25H7")]
    [InlineData("φ25H7")]
    [InlineData("Φ25H7")]
    [InlineData("ϕ 25 H7")]
    [InlineData("25 H 7")]
    [InlineData("25H 7")]
    [InlineData("DIA. 25 H7")]
    [InlineData("dia: 25 H7")]
    [InlineData("dia 25 H7")]
    [InlineData("dia25H7")]
    [InlineData("diameter 25 H7")]
    [InlineData("D25 H7")]
    [InlineData("d 25 H7")]
    [InlineData("D25H7")]
    [InlineData("D=25 H7")]
    [InlineData("size=25 tol=H7")]
    [InlineData("size = 25 class = H7")]
    [InlineData("nominal=25 tolerance=H7")]
    [InlineData("tol=H7 size=25")]
    [InlineData("H7 25")]
    [InlineData("25.000H7")]
    [InlineData("25,000 H7")]
    [InlineData("025H7")]
    [InlineData("25mm H7")]
    [InlineData("25 mm H7")]
    [InlineData("25H7 mm")]
    [InlineData("unit=mm 25H7")]
    [InlineData("25000um H7")]
    [InlineData("25H7;")]
    [InlineData("  25H7,")]
    [InlineData("25H7.")]
    [InlineData("25\u00A0H7")]
    [InlineData("25\u202FH7\t")]
    [InlineData("kind=hole 25H7 thru=no interrupted=no")]
    public void Parse_SizeAndClass_InEverySpelling(string line) => One(line).ShouldBe(Hole25H7);

    [Theory]
    [InlineData("hole 25 +0.03/-0.01", 24.99, 25.03)]
    [InlineData("hole 25+0.03/-0.01", 24.99, 25.03)]
    [InlineData("hole 25 +0.03 -0.01", 24.99, 25.03)]
    [InlineData("hole 25 +0.03-0.01", 24.99, 25.03)]
    [InlineData("hole 25+0.03-0.01", 24.99, 25.03)]
    [InlineData("hole 25 + 0.03 / - 0.01", 24.99, 25.03)]
    [InlineData("hole 25 -0.01 +0.03", 24.99, 25.03)]
    [InlineData("hole 25 -0.01/+0.03", 24.99, 25.03)]
    [InlineData("hole 25 +0,03/-0,01", 24.99, 25.03)]
    [InlineData("hole 25 +30um/-10um", 24.99, 25.03)]
    [InlineData("hole 25 +30/-10um", 24.99, 25.03)]
    [InlineData("hole 25 +30/-10 µm", 24.99, 25.03)]
    [InlineData("hole 25 +30/-10 μm", 24.99, 25.03)]
    [InlineData("hole size=25 tol=+0.03/-0.01", 24.99, 25.03)]
    [InlineData("+0.03/-0.01 25 hole", 24.99, 25.03)]
    [InlineData("hole 25 +0.03/0", 25, 25.03)]
    [InlineData("hole 25 +0.03 0", 25, 25.03)]
    [InlineData("hole 25 +0.03 -0", 25, 25.03)]
    [InlineData("hole 25 +0.03/-0.000", 25, 25.03)]
    [InlineData("hole 25 0/+0.03", 25, 25.03)]
    [InlineData("hole 25 0/-0.03", 24.97, 25)]
    [InlineData("hole 25 0 -0.03", 24.97, 25)]
    [InlineData("0/-0.03 hole 25", 24.97, 25)]
    [InlineData("hole 25 -0.01/-0.03", 24.97, 24.99)]
    [InlineData("hole 25 −0.01/–0.03", 24.97, 24.99)]
    [InlineData("hole 25 ‐0.01/‑0.03", 24.97, 24.99)]
    [InlineData("hole 25 —0.01/－0.03", 24.97, 24.99)]
    [InlineData("hole 25 ＋0.03/﹣0.01", 24.99, 25.03)]
    [InlineData("hole 25 ±0.015", 24.985, 25.015)]
    [InlineData("hole 25±0.015", 24.985, 25.015)]
    [InlineData("hole 25 ± 0.015", 24.985, 25.015)]
    [InlineData("hole 25 +/-0.015", 24.985, 25.015)]
    [InlineData("hole 25 +/−0.015", 24.985, 25.015)]
    [InlineData("hole 25 +-0.015", 24.985, 25.015)]
    [InlineData("hole 25 ±15um", 24.985, 25.015)]
    [InlineData("tol=±0.015 hole 25", 24.985, 25.015)]
    public void Parse_Deviations_InEverySpelling(string line, double min, double max) =>
        One(line).ShouldBe(Hole25 with { Limits = Limits((decimal)min, (decimal)max) });

    [Theory]
    [InlineData("hole 60.000-60.030")]
    [InlineData("hole 60-60.03")]
    [InlineData("hole 60.000 - 60.030")]
    [InlineData("hole 60.000–60.030")]
    [InlineData("hole 60.000..60.030")]
    [InlineData("hole 60.000 .. 60.030")]
    [InlineData("hole 60.000...60.030")]
    [InlineData("hole 60.000…60.030")]
    [InlineData("hole 60.000 to 60.030")]
    [InlineData("hole 60,000/60,030")]
    [InlineData("hole 60.030/60")]
    [InlineData("hole 60.030-60.000")]
    [InlineData("hole limits=60.000-60.030")]
    [InlineData("hole tol=60.000-60.030")]
    [InlineData("hole 60.000-60.030mm")]
    public void Parse_TwoLimits_InEverySpelling(string line) =>
        One(line).ShouldBe(new Feature { Kind = FeatureKind.Hole, Nominal = Mm(60), Limits = Limits(60m, 60.03m) });

    [Theory]
    [InlineData("hole 24.99-25.03", 25)]
    [InlineData("hole 25.01-25.04", 25.01)]
    [InlineData("shaft 24.96-24.99", 24.99)]
    [InlineData("hole 24.985-24.995", 24.99)]
    [InlineData("hole 24.9851-24.9853", 24.9851)]
    [InlineData("shaft 99.5-210", 200)]
    public void Parse_TwoLimits_TakesTheRoundestSizeAsNominal(string line, double nominal) => One(line).Nominal.Should().Be(Mm((decimal)nominal));

    [Theory]
    [InlineData("hole 25 2768-m")]
    [InlineData("hole 25 ISO 2768-m")]
    [InlineData("hole 25 iso2768-M")]
    [InlineData("ISO-2768-m hole 25")]
    [InlineData("hole size=25 tol=2768-m")]
    public void Parse_GeneralTolerance_IsAskedForByName(string line)
    {
        Feature feature = One(line);
        (feature.Nominal, feature.General, feature.Class).Should().Be((Mm(25), GeneralTolerance.Medium, null));
        feature.Upper.Should().Be(-feature.Lower);
        feature.Upper.Should().BeGreaterThan(default(Deviation));
    }

    [Theory]
    [InlineData("x40")]
    [InlineData("x 40")]
    [InlineData("X40")]
    [InlineData("×40")]
    [InlineData("× 40")]
    [InlineData("*40")]
    [InlineData("* 40")]
    [InlineData("x=40")]
    [InlineData("depth=40")]
    [InlineData("deep 40")]
    [InlineData("length 40")]
    [InlineData("long 40")]
    [InlineData("x40mm")]
    [InlineData("x 40 mm")]
    [InlineData("x40.")]
    public void Parse_Extent_InEverySpelling(string words)
    {
        One($"25H7 {words}").ShouldBe(Hole25H7 with { Extent = Mm(40) });
        One($"{words} 25H7").ShouldBe(Hole25H7 with { Extent = Mm(40) });
    }

    [Theory]
    [InlineData("thru")]
    [InlineData("through")]
    [InlineData("end=thru")]
    [InlineData("end through")]
    [InlineData("thru=yes")]
    public void Parse_Through_InEverySpelling(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { End = HoleEnd.Through });

    [Theory]
    [InlineData("blind bottom 5")]
    [InlineData("blind bottom=5")]
    [InlineData("end=blind bottom5")]
    [InlineData("bottom 5mm blind")]
    public void Parse_BlindWithRoom_InEverySpelling(string words) =>
        One($"25H7 {words}").ShouldBe(Hole25H7 with { End = HoleEnd.Blind, BottomRoom = Mm(5) });

    [Theory]
    [InlineData("wall 2.5")]
    [InlineData("wall=2.5")]
    [InlineData("wall2.5")]
    [InlineData("od 30")]
    [InlineData("od=30")]
    public void Parse_WallOrOuterDiameter_IsTheWallPerSide(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Wall = Mm(2.5m) });

    [Theory]
    [InlineData("interrupted")]
    [InlineData("interrupted=yes")]
    public void Parse_Interrupted_IsSaid(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Interrupted = true });

    [Theory]
    [InlineData("Ra0.8")]
    [InlineData("Ra 0.8")]
    [InlineData("Ra 0,8")]
    [InlineData("RA0.8")]
    [InlineData("ra=0.8")]
    [InlineData("Ra<0.8")]
    [InlineData("Ra < 0.8")]
    [InlineData("Ra<=0.8")]
    [InlineData("Ra≤0,8")]
    [InlineData("Ra 0.8 max")]
    [InlineData("Ra 0.8um")]
    [InlineData("Ra 0.8 µm max")]
    [InlineData("finish=Ra0.8")]
    [InlineData("finish Ra 0.8")]
    public void Parse_Roughness_InEverySpelling(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Finish = Ra(0.8m) });

    [Theory]
    [InlineData("N6")]
    [InlineData("finish=N6")]
    public void Parse_RoughnessNumber_KeepsHowItWasStated(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Finish = Roughness.N(6) });

    // ISO 1302:2002, annex G: N1 to N12 are Ra 0.025 to 50 µm.
    [Theory]
    [InlineData(1, 0.025)]
    [InlineData(7, 1.6)]
    [InlineData(12, 50)]
    public void Parse_RoughnessNumber_IsItsRa(int number, double ra) => One($"25H7 N{number}").Finish!.Value.ToMicrometres().Should().Be(ra);

    [Fact]
    public void Parse_Rz_IsRead() => One("25H7 Rz 6.3").Finish.Should().Be(One("25H7 rz=6,3").Finish).And.NotBeNull();

    [Theory]
    [InlineData("25H7 N7", "H7", true)]
    [InlineData("25 N7", "N7", false)]
    [InlineData("N7 25", "N7", false)]
    [InlineData("25 N7 N7", "N7", true)]
    [InlineData("N7 25 N7", "N7", true)]
    [InlineData("25 tol=N7 finish=N7", "N7", true)]
    [InlineData("25 finish=N7 tol=N7", "N7", true)]
    [InlineData("25N7 thru", "N7", false)]
    [InlineData("25N7thru", "N7", false)]
    public void Parse_N7_IsTheClassOnlyWhereNoneIsGiven(string line, string toleranceClass, bool finish)
    {
        Feature feature = One(line);
        feature.Class.Should().Be(Class(toleranceClass));
        feature.Finish.Should().Be(finish ? Roughness.N(7) : null);
    }

    [Theory]
    [InlineData("shaft 25 x6", "x6", null)]
    [InlineData("25 x6", "x6", null)]
    [InlineData("25 x6 x40", "x6", 40.0)]
    [InlineData("25x6x40", "x6", 40.0)]
    [InlineData("shaft size=25 tol=x6", "x6", null)]
    [InlineData("tol=x6 size=25", "x6", null)]
    [InlineData("25h6 x6", "h6", 6.0)]
    [InlineData("25 x6 h6", "h6", 6.0)]
    [InlineData("x6 25h6", "h6", 6.0)]
    [InlineData("25H7x6", "H7", 6.0)]
    [InlineData("25 X7", "X7", null)]
    public void Parse_X6_IsTheClassOnlyBehindTheSizeWhereNoneIsGiven(string line, string toleranceClass, double? extent)
    {
        Feature feature = One(line);
        feature.Class.Should().Be(Class(toleranceClass));
        feature.Extent.Should().Be(extent is { } length ? Mm((decimal)length) : null);
    }

    [Theory]
    [InlineData("25 D8", "D8", 25)]
    [InlineData("D8 25", "D8", 25)]
    [InlineData("25 d9", "d9", 25)]
    [InlineData("D8 D25", "D8", 25)]
    [InlineData("D8 H7", "H7", 8)]
    [InlineData("d9 h6", "h6", 9)]
    [InlineData("D25 D8", "D8", 25)]
    public void Parse_D8_IsTheClassOnlyWhereNoneIsGiven(string line, string toleranceClass, int nominal)
    {
        Feature feature = One(line);
        (feature.Class, feature.Nominal).Should().Be((Class(toleranceClass), Mm(nominal)));
    }

    [Theory]
    [InlineData("25H7 C45", "C45")]
    [InlineData("25H7 c45", "C45")]
    [InlineData("25H7 42CRMO4", "42CrMo4")]
    [InlineData("25H7 4140", "42CrMo4")]
    [InlineData("4140 25H7", "42CrMo4")]
    [InlineData("25H7 1.4301", "X5CrNi18-10")]
    [InlineData("25H7 1,4301", "X5CrNi18-10")]
    [InlineData("25H7 X5CrNi18-10", "X5CrNi18-10")]
    [InlineData("25H7 x5crni1810", "X5CrNi18-10")]
    [InlineData("25H7 316L", "X2CrNiMo17-12-2")]
    [InlineData("25H7 6061", "EN-AW-6061")]
    [InlineData("25H7 AW6061", "EN-AW-6061")]
    [InlineData("25H7 EN AW 6061 x40", "EN-AW-6061")]
    [InlineData("25H7 EN AW-6061", "EN-AW-6061")]
    [InlineData("25H7 6061-T6", "EN-AW-6061")]
    [InlineData("25H7 6061 T6", "EN-AW-6061")]
    [InlineData("25H7 EN AW 6061 T651 x40", "EN-AW-6061")]
    [InlineData("25H7 mat=6061-T6", "EN-AW-6061")]
    [InlineData("6061-t6 25H7", "EN-AW-6061")]
    [InlineData("25H7 GG 25", "EN-GJL-250")]
    [InlineData("GG25 25H7", "EN-GJL-250")]
    [InlineData("25H7 PA6,6", "PA6.6")]
    [InlineData("25H7 H13", "X40CrMoV5-1")]
    [InlineData("H13 25H7", "X40CrMoV5-1")]
    [InlineData("25H7 D2", "X153CrMoV12")]
    [InlineData("25H7 mat=304", "X5CrNi18-10")]
    [InlineData("mat=304 25H7", "X5CrNi18-10")]
    [InlineData("material C15 25H7", "C15")]
    [InlineData("25H7 C15", "C15")]
    [InlineData("25H7 material=EN AW 6061", "EN-AW-6061")]
    public void Parse_Material_InEveryName(string line, string designation) => One(line).ShouldBe(
        Hole25H7 with { Material = designation, Extent = line.Contains("x40", StringComparison.Ordinal) ? Mm(40) : null });

    [Theory]
    [InlineData("25 H13", "H13", null)]
    [InlineData("25 H13 D2", "H13", "X153CrMoV12")]
    [InlineData("25 H13 mat=H13", "H13", "X40CrMoV5-1")]
    [InlineData("25 tol=H13 C45", "H13", "C45")]
    [InlineData("25H7 H13", "H7", "X40CrMoV5-1")]
    public void Parse_H13_IsTheClassOnlyWhereNoneIsGiven(string line, string toleranceClass, string? material)
    {
        Feature feature = One(line);
        (feature.Class, feature.Material).Should().Be((Class(toleranceClass), material));
    }

    [Theory]
    [InlineData("hole 304 H7 316", 304, "X2CrNiMo17-12-2")]
    [InlineData("hole 316 304 H7", 304, "X2CrNiMo17-12-2")]
    [InlineData("dia 304 H7 316", 304, "X2CrNiMo17-12-2")]
    [InlineData("H7 hole 316 size=304", 304, "X2CrNiMo17-12-2")]
    [InlineData("H7 hole 304 mat=316", 304, "X2CrNiMo17-12-2")]
    [InlineData("H7 1.4301 25", 25, "X5CrNi18-10")]
    [InlineData("hole 304 H7", 304, null)]
    public void Parse_NumberThatIsSizeAndMaterial_IsTheSizeBesideItsTolerance(string line, int nominal, string? material)
    {
        Feature feature = One(line);
        (feature.Nominal, feature.Material).Should().Be((Mm(nominal), material));
    }

    [Theory]
    [InlineData("28HRC")]
    [InlineData("28 HRC")]
    [InlineData("28hrc")]
    [InlineData("HRC28")]
    [InlineData("HRC 28")]
    [InlineData("hrc=28")]
    [InlineData("hardness=28HRC")]
    [InlineData("hardness 28 HRC")]
    [InlineData("hardness=HRC28")]
    public void Parse_HardnessAsDelivered_InEverySpelling(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Hardness = Hrc(28) });

    [Theory]
    [InlineData("200HB", HardnessScale.HB)]
    [InlineData("200 HBW", HardnessScale.HB)]
    [InlineData("HB 200", HardnessScale.HB)]
    [InlineData("HBW200", HardnessScale.HB)]
    [InlineData("200HV", HardnessScale.HV)]
    [InlineData("hv=200", HardnessScale.HV)]
    public void Parse_HardnessInOtherScales_IsRead(string words, HardnessScale scale) => One($"25H7 {words}").Hardness.Should().Be(Hard(200, scale));

    [Theory]
    [InlineData("hardened 58HRC")]
    [InlineData("hardened 58 HRC")]
    [InlineData("hardened HRC58")]
    [InlineData("hardened HRC 58")]
    [InlineData("hardened=58HRC")]
    [InlineData("HARDENED 58HRC")]
    public void Parse_Hardened_InEverySpelling(string words) =>
        One($"25H7 {words} 28HRC").ShouldBe(Hole25H7 with { Hardness = Hrc(28), Treatment = new Treatment(TreatmentKind.Hardened, Hrc(58), null) });

    [Theory]
    [InlineData("58+2HRC", 58, 60)]
    [InlineData("58+4 HRC", 58, 62)]
    [InlineData("58 +4 HRC", 58, 62)]
    [InlineData("58+4/0 HRC", 58, 62)]
    [InlineData("58+4-0 HRC", 58, 62)]
    [InlineData("60±2HRC", 58, 62)]
    [InlineData("60+/-2 HRC", 58, 62)]
    [InlineData("58-62HRC", 58, 62)]
    [InlineData("58 to 62 HRC", 58, 62)]
    [InlineData("HRC 58-62", 58, 62)]
    [InlineData("HRC 58+4", 58, 62)]
    [InlineData("HRC60±2", 58, 62)]
    public void Parse_RangeOfHardness_InEverySpelling(string words, int least, int most)
    {
        Treatment hardened = new(TreatmentKind.Hardened, Hrc(least), null) { HardnessTo = Hrc(most) };
        One($"25H7 {words} 200 off").ShouldBe(Hole25H7 with { Hardness = Hrc(least), HardnessTo = Hrc(most), Quantity = 200 });
        One($"25H7 hardened {words} 200 off").ShouldBe(Hole25H7 with { Treatment = hardened, Quantity = 200 });
        One($"25H7 case 0.8 {words} 200 off").ShouldBe(Hole25H7 with { Treatment = hardened with { Kind = TreatmentKind.CaseHardened, Depth = Mm(0.8m) }, Quantity = 200 });
    }

    [Theory]
    [InlineData("hole 25 ±0.1 HRC 28")]
    [InlineData("hole 25 +0.1/-0.1 HRC 28")]
    [InlineData("hole 25 +/-0.1 HRC 28")]
    [InlineData("hole HRC 28 ±0.1 25")]
    [InlineData("hole 28HRC ±0.1 25")]
    [InlineData("hole 25 ±0.1 28HRC")]
    public void Parse_DeviationsBesideAHardness_BelongToTheSize(string line) =>
        One(line).ShouldBe(Hole25 with { Limits = Limits(24.9m, 25.1m), Hardness = Hrc(28) });

    [Theory]
    [InlineData("25 +2.0/0 HRC 58 hole")]
    [InlineData("25 +2.0 -0 HRC 58 hole")]
    public void Parse_UpperDeviationBeforeAHardness_BelongsToTheSize(string line) =>
        One(line).ShouldBe(Hole25 with { Limits = Limits(25m, 27m), Hardness = Hrc(58) });

    [Fact]
    public void Parse_EqualEndsOfHardness_AreOneHardness() => One("25H7 58-58HRC").ShouldBe(Hole25H7 with { Hardness = Hrc(58) });

    [Theory]
    [InlineData("68HRC")]
    [InlineData("650HB")]
    [InlineData("940HV")]
    public void Parse_HardestOfTheScale_IsRead(string words) => One($"25H7 {words}").Hardness.Should().NotBeNull();

    [Fact]
    public void Parse_CaseAndNitriding_ReadDepthAndHardness()
    {
        One("25H7 case 0.8").Treatment.Should().Be(new Treatment(TreatmentKind.CaseHardened, null, Mm(0.8m)));
        One("25H7 case=0.8mm").Treatment.Should().Be(new Treatment(TreatmentKind.CaseHardened, null, Mm(0.8m)));
        One("25H7 case 0.8 60HRC").Treatment.Should().Be(new Treatment(TreatmentKind.CaseHardened, Hrc(60), Mm(0.8m)));
        One("25H7 case 60HRC").Treatment.Should().Be(new Treatment(TreatmentKind.CaseHardened, Hrc(60), null));
        One("25H7 nitrided 0.3 700HV").Treatment.Should().Be(new Treatment(TreatmentKind.Nitrided, Hard(700, HardnessScale.HV), Mm(0.3m)));
        One("25H7 nitrided 300um").Treatment.Should().Be(new Treatment(TreatmentKind.Nitrided, null, Mm(0.3m)));
        One("case 0.8 25H7").ShouldBe(Hole25H7 with { Treatment = new Treatment(TreatmentKind.CaseHardened, null, Mm(0.8m)) });
        One("case 0.8 200off 25H7").Quantity.Should().Be(200);
    }

    // Common practice, no source: a case is 45 HRC or harder, steel is delivered softer.
    [Fact]
    public void Parse_SoftHardnessBehindTheCaseDepth_IsThatAsDelivered() =>
        One("25H7 case 0.8 28HRC").ShouldBe(Hole25H7 with { Hardness = Hrc(28), Treatment = new Treatment(TreatmentKind.CaseHardened, null, Mm(0.8m)) });

    [Theory]
    [InlineData("coat zinc-nickel 8-12um", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat zinc-nickel 8-12", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat zinc-nickel 8 - 12 µm", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat zinc-nickel 8..12um", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat zinc-nickel 8 to 12 um", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat zinc-nickel, 8-12um", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coat=zinc-nickel 8-12um", "zinc-nickel", 0.008, 0.012)]
    [InlineData("coating hard chrome 20-30um", "hard chrome", 0.02, 0.03)]
    [InlineData("coat Fe/Zn8 8-12um", "Fe/Zn8", 0.008, 0.012)]
    [InlineData("coat TiN 2-4um", "TiN", 0.002, 0.004)]
    [InlineData("coat chrome 0.02-0.03mm", "chrome", 0.02, 0.03)]
    [InlineData("coat chrome 10-10um", "chrome", 0.01, 0.01)]
    public void Parse_Coating_ReadsNameAndBuildUp(string words, string name, double least, double most) =>
        One($"25H7 {words} x40 C45").ShouldBe(Hole25H7 with
        {
            Coating = new Coating(name, Mm((decimal)least), Mm((decimal)most), null),
            Extent = Mm(40),
            Material = "C45",
        });

    [Theory]
    [InlineData("coat zinc 8-12um before", CoatingLimits.Before)]
    [InlineData("coat zinc before 8-12um", CoatingLimits.Before)]
    [InlineData("before coat zinc 8-12um", CoatingLimits.Before)]
    [InlineData("coat zinc 8-12um limits=before", CoatingLimits.Before)]
    [InlineData("coat zinc 8-12um limits after", CoatingLimits.After)]
    [InlineData("coat zinc 8-12um after", CoatingLimits.After)]
    public void Parse_SideOfTheCoating_IsReadAnywhere(string words, CoatingLimits side) => One($"25H7 {words}").Coating!.Limits.Should().Be(side);

    [Theory]
    [InlineData("cyl 0.01", GeometryKind.Cylindricity)]
    [InlineData("cylindricity=0.01", GeometryKind.Cylindricity)]
    [InlineData("round 0.01", GeometryKind.Roundness)]
    [InlineData("roundness 10um", GeometryKind.Roundness)]
    [InlineData("runout 0.01", GeometryKind.Runout)]
    [InlineData("runout=0,01mm", GeometryKind.Runout)]
    [InlineData("coax 0.01", GeometryKind.Coaxiality)]
    [InlineData("coaxiality 0.01", GeometryKind.Coaxiality)]
    [InlineData("pos 0.01", GeometryKind.Position)]
    [InlineData("position=0.01", GeometryKind.Position)]
    [InlineData("perp 0.01", GeometryKind.Perpendicularity)]
    [InlineData("perpendicularity 0.01", GeometryKind.Perpendicularity)]
    public void Parse_FormOrPosition_IsRead(string words, GeometryKind kind)
    {
        Feature feature = One($"25H7 {words}");
        feature.ShouldBe(Hole25H7 with { Geometry = [new GeometryRequirement(kind, Mm(0.01m))] });
        feature.Asked(kind).Should().Be(Mm(0.01m));
        feature.Asked(kind == GeometryKind.Runout ? GeometryKind.Position : GeometryKind.Runout).Should().BeNull();
    }

    [Theory]
    [InlineData("25H7 solid", StartKind.Solid, null)]
    [InlineData("25H7 start=solid", StartKind.Solid, null)]
    [InlineData("25H7 cast 20", StartKind.Cast, 20)]
    [InlineData("25H7 cast=20", StartKind.Cast, 20)]
    [InlineData("25H7 start=cast 20", StartKind.Cast, 20)]
    [InlineData("25H7 cored 20mm", StartKind.Cored, 20)]
    [InlineData("25h6 bar 30", StartKind.Bar, 30)]
    [InlineData("25h6 bar=30", StartKind.Bar, 30)]
    [InlineData("slot 25H7 bar 60", StartKind.Bar, 60)]
    public void Parse_Start_IsRead(string line, StartKind kind, int? size) =>
        One(line).Start.Should().Be(new StartForm(kind, size is { } blank ? Mm(blank) : null));

    [Theory]
    [InlineData("200off")]
    [InlineData("200 off")]
    [InlineData("200OFF")]
    [InlineData("off 200")]
    [InlineData("off=200")]
    [InlineData("qty=200")]
    [InlineData("quantity 200")]
    [InlineData("200pcs")]
    [InlineData("200 pieces")]
    public void Parse_Quantity_InEverySpelling(string words) => One($"25H7 {words}").ShouldBe(Hole25H7 with { Quantity = 200 });

    [Theory]
    [InlineData("hole .5H7 in")]
    [InlineData("hole 0.5 H7 inch")]
    [InlineData("hole .5in H7")]
    [InlineData("hole .5\"H7")]
    [InlineData("hole .5″ H7")]
    [InlineData("hole 1/2 H7 in")]
    [InlineData("hole 1/2in H7")]
    [InlineData("hole 1/2\" H7")]
    [InlineData("in hole 32/64 H7")]
    [InlineData("hole 64/128 H7 unit=in")]
    [InlineData("hole 500thou H7")]
    [InlineData("hole .5 H7 inches")]
    public void Parse_HalfAnInch_InEverySpelling(string line)
    {
        Feature feature = One(line);
        (feature.Unit, feature.Nominal).Should().Be((LengthUnit.Inch, Inch(0.5m)));
    }

    [Theory]
    [InlineData("hole .25 ±.0005 in", 0.2495, 0.2505)]
    [InlineData("hole .25 ±.5thou", 0.2495, 0.2505)]
    [InlineData("hole .25 +.5/-0 thou", 0.25, 0.2505)]
    [InlineData("hole 1/4in +.0005/-.0002", 0.2498, 0.2505)]
    [InlineData("hole .2498-.2505in", 0.2498, 0.2505)]
    [InlineData("in hole .2498 to .2505", 0.2498, 0.2505)]
    public void Parse_InchTolerances_AreExact(string line, double min, double max) =>
        One(line).Limits.Should().Be(new SizeWindow(Inch((decimal)min), Inch((decimal)max)));

    [Theory]
    [InlineData("hole 1-1/2 H7 in x 3/4 off 5", 1.5, 0.75)]
    [InlineData("hole 1 N7 in x6", 1, 6)]
    [InlineData("hole 1H7 off 5 in x .5", 1, 0.5)]
    [InlineData("hole 1H7 HRC 28 in x .5", 1, 0.5)]
    [InlineData("hole 1H7 in x15.618 in", 1, 15.618)]
    [InlineData("hole 1in H7 x .5", 1, 0.5)]
    [InlineData("hole 1H7 in Ra 0.8 in C45 x .5", 1, 0.5)]
    [InlineData("hole 1 H7 x .5 unit=in", 1, 0.5)]
    [InlineData("hole 1 H7 C45 in x .5", 1, 0.5)]
    [InlineData("hole .25H7 x .5 in", 0.25, 0.5)]
    [InlineData("hole 1/4 H7 x 3/4in", 0.25, 0.75)]
    [InlineData("hole 1/2 H7 cyl 0.01mm x 3/4in", 0.5, 0.75)]
    [InlineData("hole .25H7 Ra 0.8 in x .5", 0.25, 0.5)]
    [InlineData("hole .25-.2505 x .5 in", 0.25, 0.5)]
    [InlineData("hole 1 ±.0005 in x .5", 1, 0.5)]
    [InlineData("hole 1H7 Ra 32uin in x .5", 1, 0.5)]
    public void Parse_UnitAnywhere_IsThatOfTheLine(string line, double nominal, double extent)
    {
        Feature feature = One(line);
        (feature.Unit, feature.Nominal, feature.Extent).Should().Be((LengthUnit.Inch, Inch((decimal)nominal), Inch((decimal)extent)));
    }

    [Theory]
    [InlineData("60 mm h7 x 1.5\"")]
    [InlineData("60 h7 mm x 1.5\"")]
    [InlineData("60 h7 x 1.5in mm")]
    [InlineData("mm 60 h7 x 1.5 in")]
    public void Parse_InchesBehindAnotherLength_CountForThatLengthOnly(string line)
    {
        Feature feature = One(line);
        (feature.Unit, feature.Nominal, feature.Extent).Should().Be((LengthUnit.Millimetre, Mm(60), Mm(38.1m)));
    }

    [Fact]
    public void Parse_MillimetresOnAnInchLine_CountForThatLengthOnly()
    {
        Feature feature = One("1 H7 in x 30mm wall .25");
        (feature.Unit, feature.Nominal, feature.Extent, feature.Wall).Should().Be((LengthUnit.Inch, Inch(1), Mm(30), Inch(0.25m)));
    }

    [Theory]
    [InlineData("hole 0.5 +.0005 -.0000")]
    [InlineData("hole .5mm +.0005 -.0000")]
    [InlineData("hole .5 +.0005 -.0000 x .75 mm")]
    [InlineData("hole .5 +.5um/0")]
    [InlineData("hole .5 +0.0125/0")]
    public void Parse_FineDeviations_AreMillimetresWhereTheLineSaysSo(string line)
    {
        Feature feature = One(line);
        (feature.Unit, feature.Nominal).Should().Be((LengthUnit.Millimetre, Mm(0.5m)));
    }

    [Theory]
    [InlineData("25H7 blind bottom 0")]
    [InlineData("25H7 blind bottom 0.0 mm")]
    public void Parse_BottomZero_IsAFlatBottom(string line) => One(line).ShouldBe(Hole25H7 with { End = HoleEnd.Blind, BottomRoom = Length.Zero });

    // 32 µin are 812.8 nm: a limit is converted to the stricter side.
    [Fact]
    public void Parse_Microinch_IsHeldToTheNanometreBelow() => One("hole 1H7 in Ra 32uin").Finish.Should().Be(Ra(0.812m));

    [Theory]
    [InlineData("HOLE 25H7 X40 THRU RA0,8 42CRMO4 28HRC 200OFF", "hole 25H7 x40 thru Ra0.8 42CrMo4 28HRC 200off")]
    [InlineData("SHAFT 35 k6 X28 RA 0.8 C45 HARDENED 58HRC RUNOUT 0.01 40 OFF", "shaft 35 k6 x28 Ra 0.8 C45 hardened 58HRC runout 0.01 40 off")]
    [InlineData("HOLE .2500 +.0005 -.0000 IN X .5 6061 BLIND", "hole .2500 +.0005 -.0000 in x .5 6061 blind")]
    [InlineData("KIND=HOLE SIZE=25 TOL=H7 DEPTH=40 QTY=200", "hole 25H7 x40 200off")]
    public void Parse_CapsLock_ReadsTheSame(string locked, string line) => Read(locked).ShouldBe(Read(line));

    [Theory]
    [InlineData("25H7x40thru", "hole 25 H7 x 40 thru")]
    [InlineData("25H7x40thru;Ra0.8;C45;200off", "hole 25 H7 x 40 thru Ra 0.8 C45 200 off")]
    [InlineData("hole25H7x40C45", "hole 25 H7 x 40 C45")]
    [InlineData("60+0.03/0x50wall2", "hole 60 +0.03/0 x 50 wall 2", "hole ")]
    [InlineData("25mmx40", "hole 25 H7 x 40", "H7 ")]
    [InlineData("hole 25H7 40 deep", "hole 25 H7 x 40")]
    [InlineData("25 h6 40 long", "shaft 25 h6 x 40")]
    [InlineData("25H7 40mm deep", "hole 25 H7 x 40")]
    [InlineData("25H7, x40, thru, C45.", "hole 25H7 x40 thru C45")]
    [InlineData("kind=hole size=25 tol=H7 depth=40 end=thru ra=0.8 mat=C45 hardness=28HRC hardened=58HRC cyl=0.01 start=cast 20 qty=12 unit=mm interrupted=yes wall=3 coat=zinc 5-8um limits=before",
        "hole 25H7 x40 thru Ra0.8 C45 28HRC hardened 58HRC cyl 0.01 cast 20 12off interrupted wall 3 coat zinc 5-8um before")]
    public void Parse_GluedSpacedOrNamed_ReadsTheSame(string line, string spoken, string before = "") => Read(before + line).ShouldBe(Read(spoken));
}
