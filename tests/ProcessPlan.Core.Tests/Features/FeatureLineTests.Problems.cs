using ProcessPlan.Core.Features;
using ProcessPlan.Core.Text;
using static ProcessPlan.Core.Tests.Features.Line;

namespace ProcessPlan.Core.Tests.Features;

public sealed partial class FeatureLineTests
{
    private const string NoKind = "The line does not say whether this is a hole or a shaft.";
    private const string KindExpected = "hole, shaft, slot or tongue, or a tolerance class, whose letter says it";
    private const string NoSize = "There is no size.";
    private const string SizeExpected = "a size with its tolerance, such as 25H7 or 60 +0.030/0";
    private const string WordExpected = "a word of the feature line or a material of the shop book";
    private const string ListsThem = "shop show materials lists them";
    private const string OneTolerance = "one tolerance: a class, deviations, limits or a general tolerance";
    private const string OneSize = "one size; a length is written x 40, a wall wall 2, a quantity 200off";
    private const string FitExpected = "the fit without this, or one class; the other part in a line of its own";

    [Theory]
    [InlineData("", 0)]
    [InlineData("   \t", 4)]
    public void Parse_EmptyLine_SaysSo(string line, int length) =>
        Parse(line).Problems.Should().Equal(new Problem("The line is empty.", 0, length, "a feature, such as hole 25H7 x40 thru"));

    [Fact]
    public void Parse_TooLongALine_PointsAtWhatIsTooMuch()
    {
        string line = "hole 25H7" + new string(' ', FeatureLine.MostCharacters) + "x40";
        Parse(line).Problems.Should().Equal(new Problem("The line has 1012 characters.", 1000, 12, "at most 1000 characters"));
        Read(line[..FeatureLine.MostCharacters]).First.ShouldBe(Hole25H7);
    }

    [Theory]

    // the word and the letter disagree
    [InlineData("SHAFT 25H7", "H7", "'SHAFT' is external, but H7 is a class for internal features.", "h7 for a shaft, or another word for H7")]
    [InlineData("hole 25k6", "k6", "'hole' is internal, but k6 is a class for external features.", "K6 for a hole, or another word for k6")]
    [InlineData("keyway 8 h9", "h9", "'keyway' is internal, but h9 is a class for external features.", "H9 for a slot, or another word for h9")]
    [InlineData("key 8H9", "H9", "'key' is external, but H9 is a class for internal features.", "h9 for a tongue, or another word for H9")]
    [InlineData("hole 25 tol=x6", "x6", "'hole' is internal, but x6 is a class for external features.", "X6 for a hole, or another word for x6")]

    // what is missing
    [InlineData("hole H7 x40", "hole H7 x40", NoSize, SizeExpected)]
    [InlineData("25 ±0.1", "25 ±0.1", NoKind, KindExpected)]
    [InlineData("25H7 kind", "kind", "'kind' needs something behind it.", "hole, shaft, slot or tongue")]
    [InlineData("hole 25 +0.03", "+0.03", "'+0.03' is one deviation; the other one is missing.", "both, such as +0.03/0")]
    [InlineData("hole 25 -0.03 C45", "-0.03", "'-0.03' is one deviation; the other one is missing.", "both, such as -0.03/0")]
    [InlineData("25H7 x", "x", "'x' needs a number behind it.", "a number, such as x 40")]
    [InlineData("25H7 depth thru", "depth", "'depth' needs a number behind it.", "a number, such as depth 40")]
    [InlineData("25H7 bottom", "bottom", "'bottom' needs a number behind it.", "a number, such as bottom 5")]
    [InlineData("25H7 wall=", "wall", "'wall' needs a number behind it.", "a number, such as wall 2")]
    [InlineData("25H7 od", "od", "'od' needs a number behind it.", "a number, such as od 50")]
    [InlineData("25H7 Ra", "Ra", "'Ra' needs a number behind it.", "a number, such as Ra 0.8")]
    [InlineData("25H7 Rz C45", "Rz", "'Rz' needs a number behind it.", "a number, such as Rz 6.3")]
    [InlineData("25H7 cyl", "cyl", "'cyl' needs a number behind it.", "a number, such as cyl 0.01")]
    [InlineData("25H7 perp", "perp", "'perp' needs a number behind it.", "a number, such as perp 0.01")]
    [InlineData("25H7 case", "case", "'case' needs a number behind it.", "a number, such as case 0.5")]
    [InlineData("25H7 nitrided", "nitrided", "'nitrided' needs a number behind it.", "a number, such as nitrided 0.5")]
    [InlineData("25H7 cast", "cast", "'cast' needs a number behind it.", "a number, such as cast 20")]
    [InlineData("25H7 bar", "bar", "'bar' needs a number behind it.", "a number, such as bar 30")]
    [InlineData("25H7 off", "off", "'off' needs a number behind it.", "a number, such as off 200")]
    [InlineData("hole H7 dia", "dia", "'dia' needs a number behind it.", "a number, such as dia 25")]
    [InlineData("hole H7 Ø", "Ø", "'Ø' needs a number behind it.", "a number, such as Ø 25")]
    [InlineData("25H7 HRC", "HRC", "'HRC' needs a hardness behind it.", "a hardness, such as HRC 58")]
    [InlineData("25H7 hardness", "hardness", "'hardness' needs a hardness behind it.", "a hardness, such as hardness 58HRC")]
    [InlineData("25H7 hardened", "hardened", "'hardened' needs a hardness behind it.", "a hardness, such as hardened 58HRC")]
    [InlineData("25H7 hardened 58", "58", "'hardened 58' does not say its scale.", "58HRC, 58HB or 58HV")]
    [InlineData("25H7 hardened 58-62", "58-62", "'hardened 58-62' does not say its scale.", "58HRC, 58HB or 58HV")]
    [InlineData("25H7 hardness=28", "28", "'hardness=28' does not say its scale.", "28HRC, 28HB or 28HV")]
    [InlineData("25H7 mat", "mat", "'mat' needs a material behind it.", "a material of the shop book")]
    [InlineData("25H7 coat", "coat", "'coat' needs a name and its build-up per surface behind it.", "such as coat zinc-nickel 8-12um")]
    [InlineData("25H7 coat 8-12um", "coat", "'coat' needs the name of the coating before its build-up.", "such as coat zinc-nickel 8-12um")]
    [InlineData("25H7 coat zinc C45 60off", "coat zinc", "'coat zinc' needs its build-up per surface behind it.", "such as coat zinc-nickel 8-12um")]
    [InlineData("25H7 coat zinc 60 off", "coat zinc", "'coat zinc' needs its build-up per surface behind it.", "such as coat zinc-nickel 8-12um")]
    [InlineData("25H7 coat zinc 28HRC", "coat zinc", "'coat zinc' needs its build-up per surface behind it.", "such as coat zinc-nickel 8-12um")]
    [InlineData("coat zinc 25h6", "coat zinc", "'coat zinc' needs its build-up per surface behind it.", "such as coat zinc-nickel 8-12um")]
    [InlineData("25H7 coat zinc 8um", "8um", "'8um' is one thickness; a coating varies.", "least and greatest build-up per surface, such as 8-12um")]
    [InlineData("25H7 before", "before", "'before' without a coating.", "a coating, such as coat zinc-nickel 8-12um before")]

    // numbers
    [InlineData("99999999999999999999H7", "99999999999999999999", "'99999999999999999999' has more digits than a size can hold.", "at most 18 digits")]
    [InlineData("25.000.5H7", "25.000.5", "'25.000.5' has more than one decimal mark.", "one decimal point or comma, and no mark for thousands")]
    [InlineData("1.000,5 H7", "1.000,5", "'1.000,5' has more than one decimal mark.", "one decimal point or comma, and no mark for thousands")]
    [InlineData("0H7", "0", "'0' is no size.", "a size above 0")]
    [InlineData("25H7 x0", "0", "'0' is no size.", "a size above 0")]
    [InlineData("25H7 cyl 0.000", "0.000", "'0.000' is no size.", "a size above 0")]
    [InlineData("-25H7", "-25", "'-25' stands where a size is expected.", "a size above 0, without a sign")]
    [InlineData("−25 H7", "−25", "'−25' stands where a size is expected.", "a size above 0, without a sign")]
    [InlineData("dia -25 H7", "-25", "'-25' behind 'dia' has a sign.", "a number above 0, without a sign")]
    [InlineData("25H7 x-40", "-40", "'-40' behind 'x' has a sign.", "a number above 0, without a sign")]
    [InlineData("25H7 wall +2", "+2", "'+2' behind 'wall' has a sign.", "a number above 0, without a sign")]
    [InlineData("25.0000000001H7", "25.0000000001", "'25.0000000001' is finer than a length can hold.", "at most nine decimal places of a millimetre")]
    [InlineData("hole 25 +0.00000000001/0", "+0.00000000001", "'+0.00000000001' is finer than a length can hold.", "at most nine decimal places of a millimetre")]
    [InlineData("hole 100001 ±0.1", "100001", "'100001' is too large.", "a length of up to 100 m")]
    [InlineData("hole 999999999999999999 ±0.1", "999999999999999999", "'999999999999999999' is too large.", "a length of up to 100 m")]
    [InlineData("hole 4000 ±0.1 in", "4000", "'4000' is too large.", "a length of up to 100 m")]
    [InlineData("25H7 2.5off", "2.5off", "'2.5off' is no number of pieces.", "a whole number from 1, such as 200off")]
    [InlineData("25H7 0 off", "0 off", "'0 off' is no number of pieces.", "a whole number from 1, such as 200off")]
    [InlineData("25H7 qty=99999999999", "qty=99999999999", "'qty=99999999999' is no number of pieces.", "a whole number from 1, such as 200off")]
    [InlineData("25H7 off 5mm", "off 5mm", "'off 5mm' is no number of pieces.", "a whole number from 1, such as 200off")]
    [InlineData("25H7 N13", "N13", "'N13' is no roughness class.", "N1 to N12")]
    [InlineData("25H7 N99999999999", "N99999999999", "'N99999999999' is no roughness class.", "N1 to N12")]
    [InlineData("25H7 Ra 99999999999", "Ra 99999999999", "'Ra 99999999999' is no roughness that can be made.", "Ra 0.006 to 100 µm")]
    [InlineData("25H7 Ra0.8mm", "Ra0.8mm", "'Ra0.8mm' is no roughness that can be made.", "Ra 0.006 to 100 µm")]
    [InlineData("25H7 Rz 0", "Rz 0", "'Rz 0' is no roughness that can be made.", "Rz 0.25 to 400 µm")]
    [InlineData("25H7 Ra>0.8", "Ra>", "'Ra' asks for a least roughness.", "the greatest one, such as Ra 0.8")]
    [InlineData("1H7 in Ra 32", "Ra 32", "'Ra 32' on an inch line: micrometres or microinches?", "32uin or 32um")]
    [InlineData("25H7 62-58HRC", "62-58HRC", "'62-58HRC' has the greatest hardness first.", "the least hardness first, such as 58-62 HRC")]
    [InlineData("25H7 70HRC", "70HRC", "'70HRC' is outside the scale.", "20 to 68 HRC")]
    [InlineData("25H7 58+12HRC", "58+12HRC", "'58+12HRC' is outside the scale.", "20 to 68 HRC")]
    [InlineData("25H7 hardened 20±1HRC", "20±1HRC", "'20±1HRC' is outside the scale.", "20 to 68 HRC")]
    [InlineData("25H7 700HB", "700HB", "'700HB' is outside the scale.", "30 to 650 HB; harder steel is given in HRC or HV")]
    [InlineData("25H7 29HB", "29HB", "'29HB' is outside the scale.", "30 to 650 HB; harder steel is given in HRC or HV")]
    [InlineData("25H7 941HV", "941HV", "'941HV' is outside the scale.", "30 to 940 HV")]
    [InlineData("25H7 hardened 58+2", "58+2", "'hardened 58+2' does not say its scale.", "58HRC, 58HB or 58HV")]

    // tolerances
    [InlineData("25Js7", "Js7", "'Js7' is no tolerance class.", "JS7 for a hole or js7 for a shaft")]
    [InlineData("hole 25 Js7", "Js7", "'Js7' is no tolerance class.", "JS7 for a hole or js7 for a shaft")]
    [InlineData("hole 25H19", "H19", "'H19' is no tolerance class.", "a grade 01, 0 or 1 to 18 behind the letter, such as H7")]
    [InlineData("hole 25L7", "L7", "'L7' is no tolerance class.", "a letter of ISO 286 and a grade, such as H7 for a hole or k6 for a shaft")]
    [InlineData("4000H7", "H7", "ISO 286-1 gives H7 for sizes over 0 up to and including 3150 mm, not for 4000 mm.", "a size up to 3150 mm")]
    [InlineData("3150.001H7", "H7", "ISO 286-1 gives H7 for sizes over 0 up to and including 3150 mm, not for 3150.001 mm.", "a size up to 3150 mm")]
    [InlineData("25J5", "J5", "ISO 286-1 gives no J5 at 25 mm: J is given in grades 6, 7 and 8 only; nearest is J6.", "J6")]
    [InlineData("hole 25 ±0", "±0", "'±0' leaves no tolerance.", "two different deviations, such as +0.030/0")]
    [InlineData("hole 25 +0.1/+0.1", "+0.1/+0.1", "'+0.1/+0.1' leaves no tolerance.", "two different deviations, such as +0.030/0")]
    [InlineData("hole 25-25.000", "25-25.000", "'25-25.000' leaves no tolerance.", "two different limits, such as 60.000-60.030")]
    [InlineData("hole 25 +0.1/-25.0", "+0.1/-25.0", "With '+0.1/-25.0' the smallest size is not above 0.", "deviations smaller than the size")]
    [InlineData("hole 25 +30/0", "+30", "The deviation '+30' is a large part of the size itself.", "30um, or 30.0 if millimetres are meant")]
    [InlineData("hole 60 +5/0 mm", "+5", "The deviation '+5' is a large part of the size itself.", "5um, or 5.0 if millimetres are meant")]
    [InlineData("hole 1 ±1 in", "±1 in", "The deviation '±1 in' is a large part of the size itself.", "1thou, or 1.0 if inches are meant")]
    [InlineData("hole 25 H7 +0.03/0", "+0.03/0", "'+0.03/0' is a second tolerance beside 'H7'.", OneTolerance)]
    [InlineData("hole 25 H7 2768-m", "2768-m", "'2768-m' is a second tolerance beside 'H7'.", OneTolerance)]
    [InlineData("hole 25 ±0.1 2768-m", "2768-m", "'2768-m' is a second tolerance beside '±0.1'.", OneTolerance)]
    [InlineData("hole 60-60.03 H7", "60-60.03", "'60-60.03' is a second tolerance beside 'H7'.", OneTolerance)]
    [InlineData("hole 25 ±0.1 +0.2/0", "+0.2/0", "A second pair of deviations: '+0.2/0' after '±0.1'.", "one pair of deviations")]
    [InlineData("hole 60-60.03 60", "60", "'60' is a size beside the limits '60-60.03'.", "either a size or two limits")]
    [InlineData("40 H7/G6", "G6", "'G6' is a second class for internal features.", "one class, or a fit such as H7/g6")]
    [InlineData("40 h7/k6", "k6", "'k6' is a second class for external features.", "one class, or a fit such as H7/k6")]
    [InlineData("40 H7/k6/m6", "m6", "'m6' is a third tolerance class.", "one class, or two for a fit such as H7/k6")]
    [InlineData("hole 40 H7/k6", "hole", "'hole' is said of one feature, but H7 and k6 are two.", FitExpected)]
    [InlineData("40 H7/k6 coat zinc 5-8um", "coat zinc 5-8um", "'coat zinc 5-8um' is said of one feature, but H7 and k6 are two.", FitExpected)]
    [InlineData("40 H7/k6 bar 60", "bar 60", "'bar 60' is said of one feature, but H7 and k6 are two.", FitExpected)]

    // one too many
    [InlineData("hole 25H7 shaft", "shaft", "A second kind of feature: 'shaft' after 'hole'.", "one kind of feature")]
    [InlineData("25H7 40", "40", "'40' is a second size beside '25'.", OneSize)]
    [InlineData("40 25H7", "40", "'40' is a second size beside '25'.", OneSize)]
    [InlineData("D8 25H7", "25", "'25' is a second size beside '8'.", OneSize)]
    [InlineData("25x40H7", "40H7", "'40H7' behind 'x' is a size with its tolerance class.", "40 alone, and the class behind the size")]
    [InlineData("hole 25H7 wall 2H7", "2H7", "'2H7' behind 'wall' is a size with its tolerance class.", "2 alone, and the class behind the size")]
    [InlineData("40 deep 25 H7", "40 deep 25", "'40 deep 25' has a number before and behind.", "x before the length or depth, such as x 40")]
    [InlineData("H7 hole 304 316", "304", "'304' and '316' could each be the size.", "the tolerance right behind the size, and the material as mat=304")]
    [InlineData("hole 25 316 H7", "316", "'316' and '25' could each be the size.", "the tolerance right behind the size, and the material as mat=316")]
    [InlineData("25H7 x40 x50", "x50", "A second length or depth: 'x50' after 'x40'.", "one length or depth")]
    [InlineData("25H7 thru blind", "blind", "A second end of the hole: 'blind' after 'thru'.", "one end of the hole")]
    [InlineData("25H7 C45 4140", "4140", "A second material: '4140' after 'C45'.", "one material")]
    [InlineData("25H7 cyl 0.01 cylindricity 0.02", "cylindricity 0.02", "A second 'cylindricity'.", "each form or position once")]
    [InlineData("25H7 28HRC 30HRC", "30HRC", "A second hardness: '30HRC' after '28HRC'.", "one hardness")]
    [InlineData("25H7 hardened 58HRC case 0.8", "case 0.8", "A second treatment: 'case 0.8' after 'hardened 58HRC'.", "one treatment")]
    [InlineData("25H7 Ra0.8 N6", "N6", "A second roughness: 'N6' after 'Ra0.8'.", "one roughness")]
    [InlineData("25H7 2off 3off", "3off", "A second number of pieces: '3off' after '2off'.", "one number of pieces")]
    [InlineData("25H7 solid cast 20", "cast 20", "A second start: 'cast 20' after 'solid'.", "one start")]
    [InlineData("25mm H7 in", "in", "'in' after 'mm': the line has two units.", "mm or in, the same in the whole line")]
    [InlineData("in hole 25mm H7", "mm", "'mm' after 'in': the line has two units.", "mm or in, the same in the whole line")]
    [InlineData("hole 25mm +.0005/0 in", "in", "'in' after 'mm': the line has two units.", "mm or in, the same in the whole line")]
    [InlineData("25mm H7 Ra 0.8 in", "in", "'in' after 'mm': the line has two units.", "mm or in, the same in the whole line")]
    [InlineData("shaft 60 h7 x 1.5\"", "1.5\"", "'1.5\"' is in inches, but the size '60' has no unit.", "60 mm or 60 in")]
    [InlineData("25 H7 x 40 in", "40 in", "'40 in' is in inches, but the size '25' has no unit.", "25 mm or 25 in")]
    [InlineData("25H7 x6 in", "6 in", "'6 in' is in inches, but the size '25' has no unit.", "25 mm or 25 in")]
    [InlineData("60 h7 Ra 0.8 in", "0.8 in", "'0.8 in' is in inches, but the size '60' has no unit.", "60 mm or 60 in")]
    [InlineData("60 h7 cyl .5thou x 1.5in", ".5thou", "'.5thou' is in inches, but the size '60' has no unit.", "60 mm or 60 in")]
    [InlineData("hole 60-60.03 wall 1in", "1in", "'1in' is in inches, but the size '60-60.03' has no unit.", "60-60.03 mm or 60-60.03 in")]

    // inches, forgotten
    [InlineData("hole .5 +.0005 -.0000 x .75", ".5 +.0005 -.0000", "'.5 +.0005 -.0000' has no unit; inches meant?", "in behind the deviations, or 0.5 for millimetres")]
    [InlineData("+.0005/-.0002 hole .5", "+.0005/-.0002 hole .5", "'+.0005/-.0002 hole .5' has no unit; inches meant?", "in behind the deviations, or 0.5 for millimetres")]
    [InlineData("hole .5 ±.1", ".5 ±.1", "'.5 ±.1' has no unit; inches meant?", "in behind the deviations, or 0.5 for millimetres")]
    [InlineData("hole 1.5 +.0005/0", "1.5 +.0005/0", "'1.5 +.0005/0' has no unit; inches meant?", "in behind the deviations, or 1.5 mm for millimetres")]
    [InlineData("25H7 interrupted interrupted", "interrupted", "A second interruption: 'interrupted' after 'interrupted'.", "one interruption")]

    // words that do not go together
    [InlineData("25h6 thru", "thru", "'thru' is said of a shaft.", "thru or blind for a hole only")]
    [InlineData("slot 25H7 blind", "blind", "'blind' is said of a slot.", "thru or blind for a hole only")]
    [InlineData("25h6 bottom 5", "bottom 5", "'bottom 5' is said of a shaft.", "room at the bottom of a hole only")]
    [InlineData("25h6 wall 5", "wall 5", "'wall 5' is said of a shaft.", "a wall around a hole or slot only")]
    [InlineData("key 25h9 od 50", "od 50", "'od 50' is said of a tongue.", "an outer diameter around a hole only")]
    [InlineData("25H7 thru bottom 5", "bottom 5", "'bottom 5' in a hole that goes through.", "blind, or no room at the bottom")]
    [InlineData("25H7 wall 5 od 50", "od 50", "'od 50' beside 'wall 5'.", "the wall or the outer diameter, not both")]
    [InlineData("25H7 od 25", "od 25", "'od 25' is not larger than the hole.", "an outer diameter above 25 mm")]
    [InlineData("25H7 cast 25", "cast 25", "'cast 25' leaves no metal to cut.", "a blank below 25 mm")]
    [InlineData("hole 25H7 bar 30", "bar 30", "'bar 30' is the outside of the part, not of the hole.", "od 30")]
    [InlineData("25H7 start=bar 30mm", "bar 30mm", "'bar 30mm' is the outside of the part, not of the hole.", "od 30mm")]
    [InlineData("shaft 40 h6 bar 38", "bar 38", "'bar 38' is smaller than the shaft.", "a bar above 40 mm")]
    [InlineData("shaft 40 h6 bar 40", "bar 40", "'bar 40' leaves no metal to cut.", "a bar above 40 mm")]
    [InlineData("shaft 40 k6 cast 38", "cast 38", "'cast 38' is smaller than the shaft.", "a blank above 40.018 mm")]
    [InlineData("25h6 cast 25", "cast 25", "'cast 25' leaves no metal to cut.", "a blank above 25 mm")]
    [InlineData("25H7 coat zinc 12-8um", "coat zinc 12-8um", "'coat zinc 12-8um' has the greatest build-up first.", "the least build-up first, such as 8-12um")]
    [InlineData("25H7 x 1/2", "1/2", "'1/2' is a fraction without a unit.", "1/2in")]
    [InlineData("25mm H7 x 1/2", "1/2", "'1/2' is a fraction without a unit.", "1/2in")]

    // words that are none
    [InlineData("25H7 dpeth", "dpeth", "'dpeth' is not understood.", "perhaps 'depth'")]
    [InlineData("25H7 trhu", "trhu", "'trhu' is not understood.", "perhaps 'thru'")]
    [InlineData("hoel 25H7", "hoel", "'hoel' is not understood.", "perhaps 'hole'")]
    [InlineData("25H7 R0.8", "R0.8", "'R0.8' is not understood.", "perhaps 'Ra0.8'")]
    [InlineData("25H7 R 0,8", "R 0,8", "'R 0,8' is not understood.", "perhaps 'Ra0,8'")]
    [InlineData("25H7 42CrM", "42CrM", "'42CrM' is not understood.", "perhaps '42CrMo4'")]
    [InlineData("25H7 GJL-250", "GJL-250", "'GJL-250' is not understood.", "perhaps 'EN-GJL-250'")]
    [InlineData("25H7 X5CrNi", "X5CrNi", "'X5CrNi' is not understood.", "perhaps 'X5CrNi18-10'")]
    [InlineData("25H7 34CrNiMo6+QT", "34CrNiMo6+QT", "'34CrNiMo6+QT' is not understood.", "perhaps '34CrNiMo6'")]
    [InlineData("25H7 GJL250x", "GJL250x", "'GJL250x' is no material of the shop book.", ListsThem)]
    [InlineData("25H7 31CrMoV9", "31CrMoV9", "'31CrMoV9' is no material of the shop book.", ListsThem)]
    [InlineData("25H7 mat=CrNiMo17", "CrNiMo17", "'CrNiMo17' is no material of the shop book.", "perhaps 'X2CrNiMo17-12-2'")]
    [InlineData("25H7 1.4462", "1.4462", "'1.4462' is no material of the shop book.", ListsThem)]
    [InlineData("1.4462 hole 25H7", "1.4462", "'1.4462' is no material of the shop book.", ListsThem)]
    [InlineData("hole 60-60.03 1.4462", "1.4462", "'1.4462' is no material of the shop book.", ListsThem)]
    [InlineData("25H7 in 1.4462", "1.4462", "'1.4462' is a second size beside '25'.", OneSize)]
    [InlineData("25H7 2024", "2024", "'2024' is no material of the shop book, and a second size beside '25'.", "a material that shop show materials lists; a length is written x 2024")]
    [InlineData("25H7 C45-T6", "C45-T6", "'C45-T6' is no material of the shop book.", ListsThem)]
    [InlineData("25H7 42CrMo", "42CrMo", "'42CrMo' is not understood.", "perhaps '42CrMo4'")]
    [InlineData("42CrMo 25H7", "42CrMo", "'42CrMo' is not understood.", "perhaps '42CrMo4'")]
    [InlineData("25H7 mat=C46", "C46", "'C46' is no material of the shop book.", "perhaps 'C45'")]
    [InlineData("25H7 mat=302", "302", "'302' is no material of the shop book.", ListsThem)]
    [InlineData("25H7 kind=25", "kind", "'kind=25' is not understood.", "hole, shaft, slot or tongue")]
    [InlineData("25H7 end=hole", "end", "'end=hole' is not understood.", "thru or blind")]
    [InlineData("25H7 start=C45", "start", "'start=C45' is not understood.", "solid, cast 20, cored 20 or bar 30")]
    [InlineData("25H7 finish=28HRC", "finish", "'finish=28HRC' is not understood.", "Ra 0.8, Rz 6.3 or N7")]
    [InlineData("25H7 unit=blind", "unit", "'unit=blind' is not understood.", "mm or in")]
    [InlineData("25H7 limits=7", "limits", "'limits=7' is not understood.", "two limits such as 60.000-60.030, or before or after the coating")]
    [InlineData("hole 25 tol=0.5", "tol", "'tol=0.5' is not understood.", "a class such as H7, deviations such as +0.030/0, or a general tolerance such as 2768-m")]
    [InlineData("25H7 thru=maybe", "thru", "'thru=' can be answered by yes or no only.", "thru, or thru=yes")]
    [InlineData("25H7 =", "=", "'=' stands alone.", "a word before it, such as depth=40")]
    [InlineData("25Н7 hole", "Н7", "'Н7' has the Cyrillic letter 'Н'.", "the Latin letter 'H'")]
    [InlineData("hole 25Η7", "Η7", "'Η7' has the Greek letter 'Η'.", "the Latin letter 'H'")]
    [InlineData("25H7 С45", "С45", "'С45' has the Cyrillic letter 'С'.", "the Latin letter 'C'")]
    [InlineData("25H7\u200B", "\u200B", "An invisible character (U+200B) stands in the line.", "the line without it")]
    [InlineData("\uFEFF25H7", "\uFEFF", "An invisible character (U+FEFF) stands in the line.", "the line without it")]
    [InlineData("25H7 \u0007", "\u0007", "An invisible character (U+0007) stands in the line.", "the line without it")]
    [InlineData("25H7 \uD83D\uDD29", "\uD83D\uDD29", "'??' is not understood.", WordExpected)]
    public void Parse_BadLine_SaysWhatWhereAndWhatWouldDo(string line, string at, string message, string expected) =>
        Problems(line).Should().Equal((at, message, expected));

    [Fact]
    public void Parse_SizeWithoutTolerance_OffersTheGeneralOnesByName()
    {
        (string at, string message, string expected) = Problems("hole 25 x40").Should().ContainSingle().Subject;
        (at, message).Should().Be(("25", "'25' has no tolerance."));
        expected.Should().MatchRegex(@"^a class, deviations or limits; or by name ISO 2768-f \(±0\.\d+ mm\), ISO 2768-m \(±0\.\d+ mm\), ISO 2768-c \(±0\.\d+ mm\), ISO 2768-v \(±0?\.?\d+ mm\)$");
    }

    [Fact]
    public void Parse_SeveralProblems_TellsAllInTheirOrder() =>
        Problems("shaft 25 H7 foo x-40 Ra 5000 wall 2 cast 0 qty=0 Н8 +").Should().Equal(
            ("H7", "'shaft' is external, but H7 is a class for internal features.", "h7 for a shaft, or another word for H7"),
            ("foo", "'foo' is not understood.", WordExpected),
            ("-40", "'-40' behind 'x' has a sign.", "a number above 0, without a sign"),
            ("Ra 5000", "'Ra 5000' is no roughness that can be made.", "Ra 0.006 to 100 µm"),
            ("0", "'0' is no size.", "a size above 0"),
            ("qty=0", "'qty=0' is no number of pieces.", "a whole number from 1, such as 200off"),
            ("Н8", "'Н8' has the Cyrillic letter 'Н'.", "the Latin letter 'H'"),
            ("+", "'+' is not understood.", WordExpected));

    [Fact]
    public void Parse_NothingThatIsUnderstood_TellsEveryWordAndWhatIsMissing() => Problems("foo bar").Should().Equal(
        ("foo", "'foo' is not understood.", WordExpected),
        ("foo bar", NoKind, KindExpected),
        ("foo bar", NoSize, SizeExpected),
        ("bar", "'bar' needs a number behind it.", "a number, such as bar 30"));

    [Fact]
    public void Parse_EveryMisfitOfAShaft_IsTold() => Problems("shaft 25h6 wall 3 thru bottom 2 od 40 before").Select(static problem => problem.At).Should()
        .Equal("wall 3", "thru", "bottom 2", "od 40", "before");

    [Fact]
    public void Parse_BothDeviationsTooLarge_AsksForBoth() => Problems("hole 25 +30/-20").Select(static problem => problem.Expected).Should()
        .Equal("30um, or 30.0 if millimetres are meant", "20um, or 20.0 if millimetres are meant");

    // A Fact, because attributes cannot hold half a surrogate pair.
    [Fact]
    public void Parse_HalfASurrogatePair_IsShownAsAQuestionMark() =>
        Problems("25H7 \uD83D").Should().Equal(("\uD83D", "'?' is not understood.", WordExpected));

    [Fact]
    public void Parse_LongUnknownWord_IsShortenedInTheMessage()
    {
        (string at, string message, _) = Problems("25H7 " + new string('q', 100)).Should().ContainSingle().Subject;
        (at.Length, message).Should().Be((100, $"'{new string('q', 40)}…' is not understood."));
    }
}
