using PartPick.Physics;

namespace PartPick.Selection.Tests.Pictures;

public class CandidatePictureTests
{
    public static TheoryData<string> Names => new("gate", "follower", "fork");

    [Theory]
    [MemberData(nameof(Names))]
    public void The_band_reaches_the_ranked_error_and_never_beyond(string name)
    {
        Candidate candidate = PicturedCandidates.Named(name);
        Chart chart = ErrorOverTemperature.Of(candidate, PicturedCandidates.For(name)).Value;

        double extreme = chart.Bands[0].Points.Max(point => Math.Max(Math.Abs(point.Low), Math.Abs(point.High)));
        Assert.Equal(candidate.Budget!.WorstRatio, extreme, 1e-12);
        Assert.Equal(candidate.Budget.WorstRatio, Math.Abs(chart.Marks[0].Point.Y), 1e-12);
        Assert.Equal(
            [PicturedCandidates.For(name).BudgetRatio, -PicturedCandidates.For(name).BudgetRatio], chart.Limits.Select(limit => limit.Value));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_band_spans_the_required_temperatures_round_the_centre(string name)
    {
        Candidate candidate = PicturedCandidates.Named(name);
        Chart chart = ErrorOverTemperature.Of(candidate, PicturedCandidates.For(name)).Value;

        Assert.Equal((-10, 60), (chart.Bands[0].Points[0].X, chart.Bands[0].Points[^1].X));
        Assert.All(
            chart.Bands[0].Points, point => Assert.Equal(candidate.Budget!.CentreRatio, (point.Low + point.High) / 2, 1e-12));
    }

    [Fact]
    public void At_25_degrees_what_comes_of_temperature_is_gone()
    {
        // Without a stated band, all terms that go over temperature are zero at 25 °C: a fork turns over there.
        ErrorBudget budget = PicturedCandidates.Fork.Budget!;
        double rest = budget.Terms.Where(term => !term.Term.Contains("temperature", StringComparison.Ordinal)).Sum(term => term.Ratio);

        Assert.Equal(rest, ErrorOverTemperature.HalfWidth(budget, 25), 1e-12);
        Assert.True(ErrorOverTemperature.HalfWidth(budget, 60) > rest + 40e-6);
    }

    [Fact]
    public void A_tuning_fork_falls_along_its_parabola()
    {
        Chart chart = ErrorOverTemperature.Of(PicturedCandidates.Fork, PicturedCandidates.ForFork).Value;
        double At(double celsius) => chart.Curves[0].Points.MinBy(point => Math.Abs(point.X - celsius)).Y;

        // −0.034 ppm/K² (common practice for tuning forks, from memory), 35 K and 17.5 K from the turnover.
        Assert.Equal(-0.034e-6 * 35 * 35, At(60) - PicturedCandidates.Fork.Budget!.CentreRatio, 1e-9);
        Assert.Equal(-0.034e-6 * 17.5 * 17.5, At(7.5) - PicturedCandidates.Fork.Budget.CentreRatio, 1e-7);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_least_margin_of_the_picture_is_the_candidates_own(string name)
    {
        Candidate candidate = PicturedCandidates.Named(name);
        Requirement wanted = PicturedCandidates.For(name);
        Chart chart = MarginOverSupply.Of(candidate, wanted, TestContext.Current.CancellationToken).Value;

        double atEnds = chart.Curves.SelectMany(curve => new[] { curve.Points[0], curve.Points[^1] }).Min(point => point.Y);
        Assert.Equal(candidate.Margin.Value, atEnds, 1e-12 * atEnds);
        Assert.Equal((wanted.SupplyMinVolts, wanted.SupplyMaxVolts), (chart.Curves[0].Points[0].X, chart.Curves[0].Points[^1].X));
        Assert.Contains(candidate.Margin.Corner, chart.Marks[0].Words, StringComparison.Ordinal);
        Assert.Equal(wanted.Margin, Assert.Single(chart.Limits).Value);
    }

    [Fact]
    public void A_follower_has_a_curve_at_each_end_of_the_temperatures_and_a_gate_one_for_each_device()
    {
        CancellationToken stop = TestContext.Current.CancellationToken;
        Assert.Equal(
            ["-10 °C, worst device", "60 °C, worst device", "typical device at 25 °C"],
            MarginOverSupply.Of(PicturedCandidates.Follower, PicturedCandidates.Wanted, stop).Value.Curves.Select(curve => curve.Name));
        Assert.Equal(
            ["weakest device", "typical", "strongest"],
            MarginOverSupply.Of(PicturedCandidates.Gate, PicturedCandidates.Wanted, stop).Value.Curves.Select(curve => curve.Name));
    }

    [Fact]
    public void Margins_stop_when_they_are_cancelled()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => MarginOverSupply.Of(PicturedCandidates.Gate, PicturedCandidates.Wanted, stop.Token));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Growth_at_the_first_rate_ends_at_the_start_up_time_and_the_running_amplitude(string name)
    {
        Candidate candidate = PicturedCandidates.Named(name);
        Chart chart = GrowthAfterSwitchOn.Of(candidate, TestContext.Current.CancellationToken).Value;
        OscillatorResult result = candidate.Result;

        ChartPoint reached = chart.Curves[1].Points[^1];
        Assert.Equal(result.StartUpTimeSeconds!.Value, reached.X, 1e-9);
        Assert.Equal(result.Steady!.CurrentRmsAmps * Math.Sqrt(2), reached.Y, 1e-6 * reached.Y);

        // Limiting only slows the growth down: nine tenths come after growth at the first rate would have reached them.
        double least = result.StartUpTimeSeconds.Value - Math.Log(1 / 0.9) / result.StartUp.GrowthRatePerSecond;
        Assert.InRange(chart.Marks[1].Point.X, least, 3 * least);
        Assert.Contains(candidate.StartUpTime!.Corner, chart.Notes[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Bars_are_the_centre_the_terms_from_the_largest_on_and_the_two_sums()
    {
        ErrorBudget budget = PicturedCandidates.Gate.Budget!;
        BudgetBar[] bars = [.. BudgetBars.Of(budget)];

        Assert.Equal(budget.Terms.Length + 3, bars.Length);
        Assert.Equal((budget.CentreRatio, budget.WorstRatio, budget.RssRatio), (bars[0].Ratio, bars[^2].Ratio, bars[^1].Ratio));
        Assert.Equal(budget.Terms.Select(term => term.Ratio).OrderDescending(), bars[1..^2].Select(bar => bar.Ratio));
        Assert.Equal(bars[^2].Ratio, Math.Abs(bars[0].Ratio) + bars[1..^2].Sum(bar => bar.Ratio), 1e-15);
    }
}
