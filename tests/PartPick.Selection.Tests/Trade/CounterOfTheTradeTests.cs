using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection.Tests.Trade;

/// <summary>Common practice: a B-series counter with its own oscillator at 12 V.</summary>
public class CounterOfTheTradeTests
{
    private const string Counter = "CNT-14-BS";

    // Common practice; the division is arithmetic: 18.432 MHz / 4096 = 4500 Hz and 4.096 MHz / 4096 = 1000 Hz.
    [Theory]
    [InlineData(18.432e6, 4500, 220)]
    [InlineData(4.096e6, 1000, 1000)]
    public void The_twelfth_stage_gives_a_round_frequency(double hertz, double output, double rs)
    {
        Assert.Equal(output, hertz / Math.Pow(2, 12));
        Assert.Contains(12, Bench.Parts.Counters.Single(part => part.Id == Counter).Taps);
        Assert.All(Bench.FullSize(hertz).Where(part => part.LoadFarads == 18 * Bench.Pico), crystal =>
        {
            OscillatorResult found = OscillatorAnalysis.Analyse(Bench.Gate(crystal, Counter, 12, rs));

            Assert.Equal(StartKind.BuildsUp, found.Start);
            Assert.InRange(found.Steady!.FrequencyHz / 4096 / output - 1, -100e-6, 100e-6);
        });
    }

    // Common practice: 18.432 MHz works on most devices at 12 V, 22 MHz is beyond them.
    [Fact]
    public void Eighteen_megahertz_is_reached_by_typical_devices_alone_and_22_MHz_by_none()
    {
        Assert.Contains(Clock(18.432e6), warning => warning.Contains("only typical devices reach it", StringComparison.Ordinal));
        Assert.Contains(Clock(22e6), warning => warning.Contains("even typical devices reach only", StringComparison.Ordinal));
        Assert.DoesNotContain(Clock(4.096e6), warning => warning.Contains("guarantees", StringComparison.Ordinal));
    }

    // Common practice: what no device guarantees is left out of a ranking.
    [Theory]
    [InlineData(4500)]
    [InlineData(22e6 / 4096)]
    public void A_ranking_takes_no_crystal_beyond_the_guaranteed_clock(double output)
    {
        var requirement = new Requirement
        {
            OutputHz = output, SupplyMinVolts = 11.4, SupplyMaxVolts = 12.6, Circuits = [CircuitKind.Counter], BudgetRatio = 1e-3,
        };

        RankingResult ranking = Ranker.Rank(requirement, Bench.Parts, cancellation: TestContext.Current.CancellationToken);

        Assert.DoesNotContain(ranking.Candidates, candidate => candidate.Choice.Crystal.FrequencyHz > 12e6);
        Assert.True(ranking.Rejections[Limit.Clock] > 0);
    }

    private static string[] Clock(double hertz)
    {
        CrystalPart crystal = Bench.FullSize(hertz).First(part => part.LoadFarads == 18 * Bench.Pico);
        return Bench.Warnings(crystal, Counter, 12, 220, 12);
    }
}
