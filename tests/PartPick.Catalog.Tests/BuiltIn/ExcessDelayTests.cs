namespace PartPick.Catalog.Tests.BuiltIn;

/// <summary>
/// Makers measure the propagation delay of a gate with fast edges. A crystal's sine crosses the threshold slowly, and a stage
/// then takes longer to turn round (Hedenstierna, Jeppson, IEEE Trans. CAD 6(2), 1987; from memory).
/// </summary>
public class ExcessDelayTests
{
    // Propagation delays with 50 pF that are usual for the families: common practice, from memory, but for HC at 5 V, where
    // makers' data sheets say 7 ns (between the points).
    [Theory]
    [InlineData("INV-HC-B-1", 3, 0.7, 14e-9, 10e6)]
    [InlineData("INV-HC-B-1", 4.5, 0.75, 9e-9, 10e6)]
    [InlineData("INV-HC-B-1", 6, 0.75, 7e-9, 10e6)]
    [InlineData("INV-HCT-B-1", 4.5, 0.7, 10e-9, 10e6)]
    [InlineData("INV-FC-B-1", 4.5, 0.6, 4.5e-9, 10e6)]
    [InlineData("INV-BS-B-1", 10, 1, 33e-9, 4e6)]
    public void A_buffered_chain_is_as_slow_as_it_is_for_a_sine(
        string id, double supply, double threshold, double propagation, double hertz)
    {
        var part = (AmplifierPart)BuiltInParts.Catalog.Find(id)!;
        SupplyPoint point = Assert.Single(part.Points, point => point.SupplyVolts == supply);

        double delay = new SlowEdgeChain(supply, threshold, point.RonOhms!.Value, propagation).ExcessDelay(hertz);

        Assert.InRange(point.DelaySeconds!.Value / delay, 0.85, 1.15);
        Assert.Equal(Basis.Assumed, part.BasisOf("delay"));
    }

    [Fact]
    public void A_slower_sine_is_delayed_more()
    {
        var chain = new SlowEdgeChain(4.5, 0.75, 45, 9e-9);

        Assert.True(chain.ExcessDelay(4e6) > 1.2 * chain.ExcessDelay(10e6));
        Assert.True(chain.ExcessDelay(10e6) > 1.2 * chain.ExcessDelay(27e6));
    }
}
