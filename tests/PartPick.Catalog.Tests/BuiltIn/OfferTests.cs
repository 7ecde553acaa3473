namespace PartPick.Catalog.Tests.BuiltIn;

public class OfferTests
{
    private static Part[] Priced => [.. BuiltInParts.Catalog.All.Where(part => part.Kind != PartKind.Port)];

    [Fact]
    public void Every_part_has_prices_in_euros() => Assert.All(BuiltInParts.Catalog.All, part =>
    {
        Assert.True(part.Offer.HasPrices, part.Id);
        Assert.Equal("EUR", part.Offer.Currency);
    });

    [Fact]
    public void Larger_quantities_cost_less_each() => Assert.All(Priced, part =>
    {
        Assert.True(part.Offer.Prices.Length >= 3, part.Id);
        Assert.All(part.Offer.Prices.Neighbours(), pair => Assert.True(pair.Second.UnitPrice < pair.First.UnitPrice, part.Id));
    });

    [Fact]
    public void The_least_order_has_a_price_and_is_a_whole_number_of_multiples() => Assert.All(BuiltInParts.Catalog.All, part =>
    {
        Assert.Equal(part.Offer.MinimumOrder, part.Offer.Prices[0].Quantity);
        Assert.Equal(0, part.Offer.MinimumOrder % part.Offer.Multiple);
    });

    [Theory]
    [InlineData(PartKind.Crystal, 0.15, 1.2)]
    [InlineData(PartKind.Capacitor, 0.009, 0.15)]
    [InlineData(PartKind.Resistor, 0.005, 0.025)]
    [InlineData(PartKind.Inverter, 0.08, 0.4)]
    [InlineData(PartKind.Counter, 0.35, 0.7)]
    [InlineData(PartKind.Transistor, 0.03, 0.4)]
    public void First_prices_are_plausible(PartKind kind, double least, double most) => Assert.All(
        BuiltInParts.Catalog.OfKind(kind),
        part => Assert.InRange(part.Offer.Prices[0].UnitPrice, (decimal)least, (decimal)most));

    [Theory]
    [InlineData(PartKind.Crystal)]
    [InlineData(PartKind.Capacitor)]
    [InlineData(PartKind.Resistor)]
    public void Some_parts_are_out_of_stock_and_some_nearly(PartKind kind)
    {
        Part[] parts = [.. BuiltInParts.Catalog.OfKind(kind)];
        Assert.InRange(parts.Count(part => part.Stock == 0), 1, parts.Length / 10);
        Assert.InRange(parts.Count(part => part.Stock is > 0 and < 50), 1, parts.Length / 8);
        Assert.True(parts.Count(part => part.Stock >= 1000) > parts.Length / 2);
    }

    [Fact]
    public void Some_parts_come_in_multiples_only() =>
        Assert.InRange(Priced.Count(part => part.Offer.Multiple > 1), 20, Priced.Length / 3);

    [Fact]
    public void No_part_is_excluded() => Assert.All(BuiltInParts.Catalog.All, part => Assert.False(part.Excluded));
}
