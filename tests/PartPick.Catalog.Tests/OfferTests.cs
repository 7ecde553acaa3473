using System.Collections.Immutable;
using CsCheck;

namespace PartPick.Catalog.Tests;

public sealed class OfferTests
{
    private static readonly Gen<Offer> AnyOffer = Gen.Select(
        Gen.Select(Gen.Int[1, 60], Gen.Int[0, 40]).Array[1, 5], Gen.Int[1, 30], Gen.Int[1, 12], (breaks, minimum, multiple) => new Offer(
            "EUR",
            [.. breaks.DistinctBy(entry => entry.Item1).OrderBy(entry => entry.Item1)
                .Select(entry => new PriceBreak(entry.Item1, entry.Item2 / 10m))],
            minimum, multiple));

    [Theory]
    [InlineData(1, 5, 2.10)]
    [InlineData(7, 10, 3.10)]
    [InlineData(66, 100, 20.5)]
    [InlineData(61, 65, 20.15)]
    [InlineData(101, 105, 21.525)]
    public void Buying_more_is_taken_where_it_costs_less(int needed, int quantity, double total) =>
        Assert.Equal(new Purchase(quantity, (decimal)total), Samples.Offer.CheapestPurchase(needed));

    [Fact]
    public void The_cheapest_purchase_is_the_best_of_all_quantities() =>
        Gen.Select(AnyOffer, Gen.Int[1, 90]).Sample((offer, needed) => offer.CheapestPurchase(needed) == BestOfAll(offer, needed));

    [Fact]
    public void Nothing_needed_costs_nothing() => Assert.Equal(new Purchase(0, 0), Samples.Offer.CheapestPurchase(0));

    [Fact]
    public void Without_a_price_or_beyond_counting_there_is_no_purchase()
    {
        Assert.Null(Offer.Unknown.CheapestPurchase(1));
        Assert.Null((Samples.Offer with { Multiple = int.MaxValue - 1 }).CheapestPurchase(int.MaxValue));
    }

    private static Purchase? BestOfAll(Offer offer, int needed)
    {
        Purchase? best = null;
        for (int quantity = needed; quantity < 1000; quantity++)
        {
            ImmutableArray<PriceBreak> valid = [.. offer.Prices.Where(price => price.Quantity <= quantity)];
            if (quantity < offer.MinimumOrder || quantity % offer.Multiple != 0 || valid.IsEmpty)
            {
                continue;
            }

            decimal total = quantity * valid[^1].UnitPrice;
            if (best is null || total < best.Value.Total)
            {
                best = new Purchase(quantity, total);
            }
        }

        return best;
    }
}
