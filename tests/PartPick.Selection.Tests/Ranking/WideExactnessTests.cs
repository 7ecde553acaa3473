namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// The search judges most combinations from estimates of others round them; front and order still equal what trying every combination
/// gives (arithmetic: both by the same definitions).
/// </summary>
public class WideExactnessTests
{
    [Theory]
    [InlineData(CircuitKind.Gate, "INV-HC-U-1", "X-04M0-20-H49-10", 10e-12, "E12", 220.0)]
    [InlineData(CircuitKind.Gate, "INV-FC-B-1", "X-04M0-16-L49-20", 6.8e-12, "E3", 1000.0)]
    [InlineData(CircuitKind.Gate, "INV-HC-U-1", "X-32K768-12P5-C26-20", 6.8e-12, "E12", 100e3)]
    [InlineData(CircuitKind.Counter, "CNT-14-HC", "X-04M096-20-H49-10", 15e-12, "E12", 220.0)]
    [InlineData(CircuitKind.Port, "MCU-MHZ-C", "X-04M0-16-L49-20", 10e-12, "E12", 470.0)]
    [InlineData(CircuitKind.Follower, "TR-GP-0250-A", "X-04M0-20-H49-10", 33e-12, "E12", 470.0)]
    public void Many_values_in_a_row_are_ranked_as_trying_every_combination_would(
        CircuitKind kind, string amplifier, string crystal, double smallestFarads, string series, double smallestOhms)
    {
        SmallWorld world = WideWorld.Of(kind, amplifier, crystal, smallestFarads, series, smallestOhms);
        var every = new EveryCombination(world.Requirement, world.Catalog);
        RankingResult best = Ranker.Rank(world.Requirement, world.Catalog, cancellation: TestContext.Current.CancellationToken);

        Assert.True(every.Fit > 10, $"{every.Fit} of {every.Tried} are fit");
        Assert.Equal(every.Front(), best.Front);
        Assert.Equal(every.BestOfGroups(), best.Candidates.Select(candidate => candidate.Id));
    }
}
