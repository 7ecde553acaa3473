using System.Collections.Immutable;
using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

public class CircuitTests
{
    [Fact]
    public void Every_designator_and_value_of_the_network_is_in_the_drawing()
    {
        foreach (Candidate candidate in SampleRanking.All)
        {
            string drawing = string.Join('\n', Schematic.Draw(candidate, Glyphs.Drawn).Select(line => line.Text));
            foreach (PartUse use in candidate.Parts.Where(use => !use.Role.StartsWith("decoupling", StringComparison.Ordinal)))
            {
                Assert.Contains(use.Designator, drawing, StringComparison.Ordinal);
                Assert.All(use.Value.Split(' '), word => Assert.Contains(word, drawing, StringComparison.Ordinal));
            }
        }
    }

    [Fact]
    public void Every_drawing_has_the_same_shape_in_ascii()
    {
        foreach (Candidate candidate in SampleRanking.All)
        {
            ImmutableArray<Line> drawn = Schematic.Draw(candidate, Glyphs.Drawn);
            ImmutableArray<Line> ascii = Schematic.Draw(candidate, Glyphs.Ascii);
            Assert.Equal(drawn.Length, ascii.Length);
            Assert.All(drawn.Concat(ascii), line => Assert.Equal(Schematic.Width, line.Width));
            Assert.All(ascii, line => Assert.All(line.Text, sign => Assert.True(char.IsAscii(sign))));
        }
    }

    [Fact]
    public void A_damped_gate_draws_its_resistor_and_an_undamped_one_a_wire()
    {
        string damped = string.Join('\n', Schematic.Draw(SampleRanking.Counter, Glyphs.Drawn).Select(line => line.Text));
        string undamped = string.Join('\n', Schematic.Draw(SampleRanking.Undamped, Glyphs.Drawn).Select(line => line.Text));
        Assert.Contains("┌┴┐ R2", damped, StringComparison.Ordinal);
        Assert.DoesNotContain("┌┴┐", undamped, StringComparison.Ordinal);
        Assert.Contains("÷4096", damped, StringComparison.Ordinal);
    }

    [Fact]
    public void The_used_part_of_each_limit_is_the_figure_over_the_limit()
    {
        Candidate candidate = SampleRanking.Counter;
        ImmutableArray<LimitUse> uses = LimitUses.Of(candidate, SampleRanking.Wanted);
        Assert.Equal(candidate.Budget!.WorstRatio / 80e-6, uses[0].Used!.Value, 12);
        Assert.Equal(5 / candidate.Margin.Value, uses[1].Used!.Value, 12);
        Assert.Equal(candidate.Drive!.Value / candidate.RatedDriveWatts!.Value, uses[2].Used!.Value, 12);
        Assert.Equal(candidate.StartUpTime!.Value / 0.05, uses[3].Used!.Value, 12);
        Assert.Equal(0.83 / 2.5, uses[4].Used!.Value, 12);
        Assert.Equal(uses.MaxBy(use => use.Used), LimitUses.Nearest(uses));
    }

    [Fact]
    public void Without_a_limit_there_is_a_figure_and_no_bar()
    {
        Requirement free = SampleRanking.Wanted with { StartUpTimeSeconds = null, CostLimit = null };
        ImmutableArray<LimitUse> uses = LimitUses.Of(SampleRanking.Counter with { RatedDriveWatts = null }, free);
        Assert.All(uses[2..], use => Assert.Null(use.Used));
        Assert.Equal(["not rated", "no limit", "no limit"], uses[2..].Select(use => use.Unlimited));
        Assert.Equal(["ms", "EUR"], uses[3..].Select(use => use.Against));
        Assert.All(Bars.Draw(uses, 80, Glyphs.Drawn)[2..], line =>
        {
            Assert.DoesNotContain("■", line.Text, StringComparison.Ordinal);
            Assert.Matches("not rated|no limit", line.Text);
        });
    }

    [Fact]
    public void A_circuit_that_does_not_run_has_dashes()
    {
        Candidate dead = SampleRanking.Counter with { Budget = null, Drive = null, StartUpTime = null };
        ImmutableArray<LimitUse> uses = LimitUses.Of(dead, SampleRanking.Wanted);
        Assert.Equal(["-", "-", "-"], new[] { uses[0].Figure, uses[2].Figure, uses[3].Figure });
        ImmutableArray<Line> page = CircuitPage.Draw(dead, SampleRanking.Answer(SampleRanking.Wanted, dead), 80, Glyphs.Drawn);
        Assert.Contains(page, line => line.Text.Contains("as it does not run", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData(0.0, "··········")]
    [InlineData(0.01, "-·········")]
    [InlineData(0.06, "■·········")]
    [InlineData(0.5, "■■■■■·····")]
    [InlineData(1.0, "■■■■■■■■■■")]
    [InlineData(1.001, "■■■■■■■■■!")]
    [InlineData(double.PositiveInfinity, "■■■■■■■■■!")]
    public void A_bar_shows_the_used_part_and_marks_a_broken_limit(double used, string expected) =>
        Assert.Equal(expected, Bars.Bar(used, 10, Glyphs.Drawn));

    [Theory]
    [InlineData(36)]
    [InlineData(80)]
    [InlineData(120)]
    [InlineData(200)]
    public void No_line_of_a_circuit_is_wider_than_asked(int width)
    {
        foreach (Candidate candidate in SampleRanking.All)
        {
            Assert.All(
                Bars.Draw(LimitUses.Of(candidate, SampleRanking.Wanted), width, Glyphs.Ascii)
                    .Concat(Bars.DrawTall(LimitUses.Of(candidate, SampleRanking.Wanted), width, Glyphs.Ascii))
                    .Concat(CircuitPane.Below(candidate, SampleRanking.Wanted, width, Glyphs.Drawn)),
                line => Assert.True(line.Text.TrimEnd().Length <= width, line.Text));
        }
    }

    [Fact]
    public void The_reasons_name_the_nearest_limit_and_the_parts_of_the_score()
    {
        ImmutableArray<string> reasons =
            Reasons.Of(SampleRanking.Counter, SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter));
        Assert.Contains("nearest limit is the error", reasons[0], StringComparison.Ordinal);
        Assert.Contains("Score 1.900", reasons[1], StringComparison.Ordinal);
        Assert.Contains("No other fit circuit", reasons[2], StringComparison.Ordinal);
    }

    [Fact]
    public void At_80_columns_no_reason_of_a_counter_is_cut()
    {
        ImmutableArray<LimitUse> uses = [.. LimitUses.Of(SampleRanking.Counter, SampleRanking.Wanted)
            .Select(use => use with { Because = use.Because.Replace(", 50 °C", "", StringComparison.Ordinal) })];
        ImmutableArray<Line> lines = Bars.Draw(uses, 80, Glyphs.Drawn);
        Assert.All(lines, line => Assert.DoesNotContain("…", line.Text, StringComparison.Ordinal));
        Assert.EndsWith("least: 4.5 V, weak device, high C", lines[1].Text.TrimEnd(), StringComparison.Ordinal);
    }

    [Fact]
    public void Where_there_is_room_reasons_are_whole()
    {
        ImmutableArray<LimitUse> uses = LimitUses.Of(SampleRanking.Follower, SampleRanking.Wanted);
        Assert.EndsWith(uses[1].Because, Bars.Draw(uses, 120, Glyphs.Drawn)[1].Text.TrimEnd(), StringComparison.Ordinal);
        string tall = string.Join(' ', Bars.DrawTall(uses, 40, Glyphs.Drawn).Select(line => line.Text.Trim()));
        Assert.All(uses, use => Assert.Contains(use.Because, tall, StringComparison.Ordinal));
    }

    [Fact]
    public void At_80_columns_the_parts_stand_beside_the_drawing()
    {
        RankingResult answer = SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter);
        var swaps = new SwapModel();
        swaps.Show(SampleRanking.Counter, answer);
        ImmutableArray<Line> page = CircuitPage.Draw(SampleRanking.Counter, answer, 80, Glyphs.Drawn, swaps);
        Assert.Contains(page, line => line.Text.Contains("R1 1 MΩ", StringComparison.Ordinal)
            && line.Text[Schematic.Width..].Trim().Length > 0);
        Assert.All(page, line => Assert.True(line.ToString().Length <= 80, line.Text));
    }

    [Fact]
    public void A_carrier_and_a_margin_for_safety_have_their_cautions_and_a_time_base_has_not()
    {
        Assert.Single(Cautions.Of(SampleRanking.Wanted));
        Assert.Contains("licence", Cautions.Of(SampleRanking.Wanted with { OutputHz = 4e6 })[1], StringComparison.Ordinal);
        Assert.Contains("qualified", Cautions.Of(SampleRanking.Wanted with { Margin = 10 })[1], StringComparison.Ordinal);
    }
}
