using PartPick.Catalog;

namespace PartPick.Selection.Tests.Trade;

/// <summary>Common practice: a strong gate at 32.768 kHz needs a damping resistor of some hundreds of kilohms.</summary>
public class TuningForkOfTheTradeTests
{
    // Common practice for the resistance; the drive level is the rating of the part. Short series and the cylinders of usual
    // loads alone keep the search short.
    [Fact]
    public void The_ranking_arrives_at_such_a_resistor_by_itself()
    {
        var requirement = new Requirement
        {
            OutputHz = 32768,
            Circuits = [CircuitKind.Gate],
            BudgetRatio = 300e-6,
            CapacitorSeries = "E3",
            ResistorSeries = "E6",
        };

        var parts = new PartsCatalog(Bench.Parts.All.Where(part =>
            part is not CrystalPart crystal || crystal is { Holder: "cylinder 2x6", FrequencyHz: 32768, LoadFarads: > 8e-12 }));

        RankingResult ranking = Ranker.Rank(requirement, parts, cancellation: TestContext.Current.CancellationToken);

        Assert.All(ranking.Candidates.Take(5), candidate => Assert.InRange(candidate.Choice.Series!.ValueOhms, 100e3, 1e6));
        Assert.True(ranking.Candidates.Length >= 5);
        Assert.All(ranking.Candidates, candidate =>
        {
            Assert.True(candidate.Choice.Series!.ValueOhms > 20e3, candidate.Id);
            Assert.True(candidate.Drive!.Value <= candidate.Choice.Crystal.DriveLevelWatts, candidate.Id);
            Assert.True(candidate.IsFit, candidate.Id);
        });
    }
}
