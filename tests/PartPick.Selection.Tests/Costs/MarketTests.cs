using CsCheck;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.Costs;

/// <summary>What a build pays per unit (arithmetic throughout).</summary>
public class MarketTests
{
    [Theory]
    [InlineData(1, 1, "1:0.10;10:0.05", 1, 1, 0.10)]
    [InlineData(9, 1, "1:0.10;10:0.05", 1, 1, 0.5 / 9)]
    [InlineData(10, 1, "1:0.10;10:0.05", 1, 1, 0.05)]
    [InlineData(3, 2, "1:0.10;10:0.05", 1, 1, 0.5 / 3)]
    [InlineData(10, 1, "1:0.10", 25, 1, 0.25)]
    [InlineData(11, 1, "1:0.10", 1, 10, 2.0 / 11)]
    [InlineData(7, 2, "5:0.10;20:0.08", 5, 5, 1.5 / 7)]
    public void Breaks_minimum_order_and_multiple_are_the_builds(
        int builds, int count, string prices, int minimum, int multiple, double expected)
    {
        CapacitorPart part = Sample.Capacitor(22e-12, "C") with { Offer = Sample.Price(prices, minimum, multiple) };

        Assert.Equal(expected, (double)new Market(new PartsCatalog([part]), builds).UnitCost(part, count), 1e-12);
    }

    [Fact]
    public void Cost_is_that_of_the_best_quantity_of_all() => Gen.Select(
        Gen.Int[1, 40], Gen.Int[1, 3], Gen.Select(Gen.Int[1, 60], Gen.Int[1, 40]).Array[1, 4], Gen.Int[1, 30], Gen.Int[1, 12]).Sample(
        (builds, count, breaks, minimum, multiple) =>
        {
            string prices = string.Join(';', breaks.DistinctBy(entry => entry.Item1).OrderBy(entry => entry.Item1)
                .Select(entry => $"{entry.Item1}:0.{entry.Item2:00}"));
            CapacitorPart part = Sample.Capacitor(22e-12, "C") with { Offer = Sample.Price(prices, minimum, multiple) };
            decimal best = Enumerable.Range(count * builds, 2000)
                .Where(quantity => quantity >= minimum && quantity % multiple == 0 && quantity >= part.Offer.Prices[0].Quantity)
                .Min(quantity => quantity * part.Offer.Prices.Last(price => price.Quantity <= quantity).UnitPrice);
            return new Market(new PartsCatalog([part]), builds).UnitCost(part, count) == best / builds;
        },
        iter: 500);

    [Fact]
    public void Parts_in_another_currency_without_a_price_or_excluded_are_not_listed()
    {
        CapacitorPart[] parts =
        [
            Sample.Capacitor(1e-12, "A"), Sample.Capacitor(1e-12, "B"),
            Sample.Capacitor(1e-12, "dollars") with { Offer = Sample.Price("1:0.01", currency: "USD") },
            Sample.Capacitor(1e-12, "unpriced") with { Offer = Offer.Unknown },
            Sample.Capacitor(1e-12, "excluded") with { Excluded = true },
            Sample.Capacitor(1e-12, "short", stock: 9),
            Sample.Capacitor(1e-12, "enough", stock: 10),
        ];
        var market = new Market(new PartsCatalog(parts), 10);

        Assert.Equal("EUR", market.Currency);
        Assert.Equal(["A", "B", "enough"], market.Capacitors.Select(part => part.Id));
    }

    [Theory]
    [InlineData(20, 2, true)]
    [InlineData(19, 2, false)]
    [InlineData(null, 1000, true)]
    public void Stock_has_to_cover_the_whole_build(int? stock, int count, bool covers) =>
        Assert.Equal(covers, new Market(PartsCatalog.Empty, 10).Covers(Sample.Capacitor(1e-12, "C", stock: stock), count));

    [Fact]
    public void A_build_beyond_counting_costs_something_and_does_not_overflow()
    {
        CapacitorPart part = Sample.Capacitor(1e-12, "C");

        Assert.True(new Market(new PartsCatalog([part]), int.MaxValue).UnitCost(part, 4) > 0);
    }
}
