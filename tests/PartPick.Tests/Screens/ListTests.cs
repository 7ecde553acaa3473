using PartPick.Screens;

namespace PartPick.Tests.Screens;

public class ListTests
{
    [Fact]
    public void Figures_stand_in_line_on_their_points()
    {
        CandidateColumns columns = CandidateColumns.Of(SampleRanking.All, SampleRanking.Wanted);
        Assert.Single(columns.Rows
            .Select(row => row.FrequencyMegaHertz.PadRight(20).IndexOf('.', StringComparison.Ordinal))
            .Where(at => at >= 0)
            .Distinct());
        Assert.Single(columns.Rows.Select(row => row.FrequencyMegaHertz.Length).Distinct());
        Assert.Single(columns.Rows.Select(row => row.Margin.IndexOf('.', StringComparison.Ordinal)).Distinct());
    }

    [Fact]
    public void The_heading_stands_over_its_columns_and_fits_80()
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, [.. SampleRanking.All]));
        string heading = list.Heading(Glyphs.Drawn).Text;
        string row = list.Draw(5, true, false, Glyphs.Drawn)[0].Text;
        Assert.True(row.Length <= 80 && heading.Length <= 80);
        Assert.Equal(heading.IndexOf("amplifier", StringComparison.Ordinal), row.IndexOf("CNT-14-HC", StringComparison.Ordinal));
        Assert.Equal(heading.IndexOf('÷', StringComparison.Ordinal), row.IndexOf("4096", StringComparison.Ordinal) + 3);
        Assert.Equal(heading.TrimEnd().Length, row.TrimEnd().Length);
    }

    [Fact]
    public void The_first_stays_chosen_until_another_one_is_picked_which_then_stays()
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter, SampleRanking.Undamped));
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Follower, SampleRanking.Counter, SampleRanking.Undamped));
        Assert.Equal(SampleRanking.Follower, list.Chosen);
        list.Move(2);
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Follower));
        Assert.Equal(SampleRanking.Follower, list.Chosen);
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Undamped, SampleRanking.Follower));
        Assert.Equal(SampleRanking.Undamped, list.Chosen);
    }

    [Fact]
    public void The_same_group_stays_chosen_where_its_capacitors_have_changed()
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter, SampleRanking.Undamped));
        list.Move(1);
        list.Show(SampleRanking.Answer(
            SampleRanking.Wanted, SampleRanking.Counter, SampleRanking.Port, SampleRanking.Undamped with { Id = "other" }));
        Assert.Equal(2, list.At);
    }

    [Theory]
    [InlineData(4_123_000, "4.1 million")]
    [InlineData(999, "999")]
    [InlineData(2.5e9, "2.5 billion")]
    public void Large_counts_are_said_in_words(double count, string expected) => Assert.Equal(expected, Figures.Count(count));

    [Theory]
    [InlineData(177.3, "177")]
    [InlineData(41.24, "41.2")]
    [InlineData(9.995, "10.0")]
    [InlineData(0.834, "0.83")]
    [InlineData(99.96, "100")]
    public void Figures_have_about_three_digits(double value, string expected) => Assert.Equal(expected, Figures.Three(value));

    [Fact]
    public void The_chosen_row_is_always_in_sight()
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, [.. Enumerable.Range(0, 6).SelectMany(_ => SampleRanking.All)]));
        foreach (int step in new[] { 7, 20, -3, -24, 100, -100 })
        {
            list.Move(step);
            Assert.Single(list.Draw(4, true, false, Glyphs.Drawn), line => line.Text.StartsWith('►'));
        }
    }

    [Theory]
    [InlineData(40)]
    [InlineData(50)]
    [InlineData(60)]
    [InlineData(70)]
    [InlineData(78)]
    [InlineData(79)]
    public void However_narrow_the_list_error_margin_and_cost_stay_under_their_headings(int width)
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, [.. SampleRanking.All]));
        string heading = list.Heading(Glyphs.Drawn, width).Text;
        string row = list.Draw(5, true, false, Glyphs.Drawn, width)[0].Text;
        Assert.True(row.Length <= width && heading.Length <= width, $"{row.Length} {heading.Length}");
        Assert.Equal(heading.Length, row.Length);
        Assert.EndsWith("0.83", row, StringComparison.Ordinal);
        CandidateCells cells = CandidateColumns.Of(SampleRanking.All, SampleRanking.Wanted).Rows[0];
        Assert.Contains(cells.ErrorPpm.Trim(), row, StringComparison.Ordinal);
        Assert.Contains(cells.Margin.Trim(), row, StringComparison.Ordinal);
    }

    [Fact]
    public void The_chosen_row_keeps_its_accent_within_the_reverse()
    {
        var list = new CandidateList();
        list.Show(SampleRanking.Answer(SampleRanking.Wanted, SampleRanking.Counter));
        Line row = list.Draw(1, true, false, Glyphs.Drawn)[0];
        Assert.All(row.Spans, span => Assert.True(span.Tone is Tone.Chosen or Tone.ChosenAccent));
        Assert.Contains(row.Spans, span => span.Tone == Tone.ChosenAccent);
    }
}
