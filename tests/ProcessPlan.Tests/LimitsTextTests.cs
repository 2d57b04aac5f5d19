using CsCheck;

namespace ProcessPlan.Tests;

public class LimitsTextTests
{
    [Fact]
    public void The_three_sizes_of_a_class_come_first_then_the_same_in_inches_then_where_they_stand()
    {
        Answer answer = Answer.To("limits", "25H7");

        answer.Should().Be(new Answer(0, """
            hole Ø25 H7, IT7 (on diameter, at 20 °C)

                                mm       µm
              max          25.021     +21
              min          25.000       0
              middle       25.0105    +10.5
              tolerance     0.021      21

                               in    rounded inwards
              max          0.9850
              min          0.9843
              middle       0.9847
              tolerance    0.0007

            ISO 286-1:2010, Table 1, over 18 to 30 mm, IT7
            ISO 286-1:2010, Table 2, over 24 to 30 mm, H

            """, ""));
    }

    [Fact]
    public void A_fit_shows_both_parts_side_by_side_and_says_in_words_how_they_meet()
    {
        Answer answer = Answer.To("limits", "40 H7/k6");

        answer.Should().Be(new Answer(0, """
            hole and shaft Ø40 H7/k6, IT7/IT6 (on diameter, at 20 °C)

                           hole mm       µm    shaft mm     µm
              max          40.025     +25        40.018    +18
              min          40.000       0        40.002     +2
              middle       40.0125    +12.5      40.010    +10
              tolerance     0.025      25         0.016     16

                           hole in    shaft in    rounded inwards
              max           1.5757      1.5755
              min           1.5749      1.5749
              middle        1.5753      1.5752
              tolerance     0.0008      0.0006

            transition fit: clearance or interference, as the sizes fall
              greatest clearance    23 µm = 0.00091 in       largest hole on smallest shaft
              greatest interference 18 µm = 0.00071 in       smallest hole on largest shaft

            ISO 286-1:2010, Table 1, over 30 to 50 mm, IT7
            ISO 286-1:2010, Table 2, over 30 to 40 mm, H
            ISO 286-1:2010, Table 1, over 30 to 50 mm, IT6
            ISO 286-1:2010, Table 5, over 30 to 40 mm, k

            """, ""));
    }

    [Fact]
    public void Inches_that_were_typed_stay_as_they_are_and_the_millimetres_are_rounded_inwards()
    {
        Answer answer = Answer.To("limits", "hole .2500 +.0005 -.0000 in x .5 6061 blind");

        answer.Should().Be(new Answer(0, """
            hole Ø0.2500 in +0.0005/0 in, nearest grade IT7 (on diameter, at 20 °C)

                                in          in
              max          0.2505     +0.0005
              min          0.2500      0
              middle       0.25025    +0.00025
              tolerance    0.0005      0.0005

                              mm        µm    rounded inwards
              max          6.362    +12.7
              min          6.350      0
              middle       6.356     +6.35
              tolerance    0.012     12.7

            ISO 286-1:2010, Table 1, over 6 to 10 mm, IT7

            """, ""));
    }

    [Fact]
    public void A_keyway_is_measured_on_width_and_typed_limits_are_shown_as_typed()
    {
        Answer answer = Answer.To("limits", "keyway", "8", "±0.018");

        answer.Output.Should().StartWith("slot 8 ±18 µm, nearest grade IT9 (on width, at 20 °C)\n");
        answer.Output.Should().Contain("\nISO 286-1:2010, Table 1, over 6 to 10 mm, IT9\n");
    }

    [Fact]
    public void A_general_tolerance_is_called_by_its_name_and_cited()
    {
        Answer answer = Answer.To("limits", "hole 25 2768-m");

        answer.Output.Should().StartWith("hole Ø25 ISO 2768-m, nearest grade IT14 (on diameter, at 20 °C)\n");
        answer.Output.Should().Contain("\nISO 2768-1:1989, Table 1, over 6 to 30 mm, m\n");
    }

    [Theory]
    [InlineData("40 H7/g6", "clearance fit: the shaft goes in with room to spare", "greatest clearance", "least clearance")]
    [InlineData("40 H7/h6", "clearance fit: the shaft goes in; at the closest it is size on size", "greatest clearance", "least clearance")]
    [InlineData("40 H7/k6", "transition fit: clearance or interference, as the sizes fall", "greatest clearance", "greatest interference")]
    [InlineData("40 H7/s6", "interference fit: the shaft is always the larger", "greatest interference", "least interference")]
    [InlineData("keyway 8 P9/h9", "transition fit: clearance or interference, as the sizes fall", "greatest clearance", "greatest interference")]
    public void Every_character_of_a_fit_is_said_in_words(string fit, string character, string first, string second)
    {
        Answer answer = Answer.To("limits", fit);

        answer.Output.Should().MatchRegex($"\n{character}\n  {first} .*\n  {second} .*\n");
    }

    [Fact]
    public void The_unit_asked_for_comes_first()
    {
        string output = Answer.To("limits", "25H7", "--unit", "in").Output;

        output.IndexOf("0.9850", StringComparison.Ordinal).Should().BePositive().And.BeLessThan(output.IndexOf("25.021", StringComparison.Ordinal));
        Answer.To("limits", "25H7", "--unit", "mm").Should().Be(Answer.To("limits", "25H7"));
    }

    [Fact]
    public void Five_decimals_of_an_inch_are_shown_where_four_leave_no_tolerance()
    {
        Answer answer = Answer.To("limits", "hole 10 +0.002/0");

        // 10 mm is 0.393701 in and 10.002 mm is 0.393779 in: no two decimals of four places lie between.
        answer.Output.Should().Contain("  max          0.39377\n  min          0.39371\n");
    }

    [Fact]
    public void Plain_characters_are_all_that_ascii_writes()
    {
        Answer typed = Answer.To("limits", "hole 60 ±0.015", "--ascii");

        typed.Output.Should().StartWith("hole dia 60 +/-15 um, nearest grade IT7 (on diameter, at 20 deg C)\n").And.Contain(" um\n");
        typed.Output.Should().MatchRegex("^[\n -~]+$");
        Answer.To("limits", "Ø25 H7 größer", "--ascii").Error.Should().MatchRegex("^[\n -~]+$");
    }

    [Fact]
    public void Words_need_no_quotes()
    {
        Answer.To("limits", "hole", "60", "+0.03", "-0", "x", "50").Should().Be(Answer.To("limits", "hole 60 +0.03 -0 x 50"));
    }

    [Fact]
    public void No_line_is_wider_than_eighty_columns_and_a_screen_holds_the_answer()
    {
        Requests.Any.Sample(line =>
        {
            Answer answer = Answer.To("limits", line);
            string[] lines = (answer.Output + answer.Error).Split('\n');
            lines.Should().OnlyContain(one => one.Length <= 80, line);
            (answer.Exit == 0 ? lines.Length : 0).Should().BeLessThanOrEqualTo(25, line);
        });
    }

    [Fact]
    public void Inches_never_lie_outside_the_millimetres_they_come_from()
    {
        Requests.Millimetres.Sample(line =>
        {
            string[] rows = Answer.To("limits", line).Output.Split('\n');
            decimal[] max = Figures(rows, "  max ");
            decimal[] min = Figures(rows, "  min ");
            (max[1] * 25.4m).Should().BeLessThanOrEqualTo(max[0], line);
            (min[1] * 25.4m).Should().BeGreaterThanOrEqualTo(min[0], line);
        });

        // The first figure of each row with this label: millimetres, then inches.
        static decimal[] Figures(string[] rows, string label) => [.. rows.Where(row => row.StartsWith(label, StringComparison.Ordinal))
            .Select(row => decimal.Parse(row.Split(' ', StringSplitOptions.RemoveEmptyEntries)[1], System.Globalization.CultureInfo.InvariantCulture))];
    }
}
