using CsCheck;
using PartPick.Catalog;

namespace PartPick.Selection.Tests.Purchasing;

public sealed class SplitBuyTests
{
    private static readonly Gen<Offer> AnyOffer =
        from breaks in Gen.Int[1, 20].Array[1, 3]
        from prices in Gen.Int[1, 60].Array[3]
        from minimum in Gen.Int[1, 12]
        from multiple in Gen.OneOf(Gen.Const(1), Gen.Int[1, 10])
        let each = breaks.Distinct().Order().Select((quantity, i) => new PriceBreak(quantity, prices[i] / 100m))
        select new Offer("EUR", [.. each], minimum, multiple);

    private static readonly Gen<SplitOffer> AnySplit =
        from offer in AnyOffer
        from most in Gen.Int[0, 45]
        select new SplitOffer(offer, most);

    [Fact]
    public void It_costs_what_trying_every_combination_finds() =>
        Gen.Select(AnySplit.Array[1, 3], Gen.Int[1, 60]).Sample(
            (offers, required) =>
            {
                decimal? expected = EveryCombination(offers, 0, required);
                int[]? found = SplitBuy.Cheapest(offers, required) is { } quantities ? [.. quantities] : null;
                if (expected is null || found is null)
                {
                    return expected is null && found is null;
                }

                return found.Sum() >= required
                    && found.Select((quantity, i) => IsSold(offers[i], quantity)).All(sold => sold)
                    && found.Select((quantity, i) => SplitBuy.CostOf(offers[i].Offer, quantity)).Sum() == expected;
            },
            iter: 3000);

    [Fact]
    public void Four_offers_cost_what_trying_every_combination_finds() =>
        Gen.Select(AnySplit.Array[4], Gen.Int[20, 40]).Sample(
            (offers, required) =>
            {
                decimal? found = SplitBuy.Cheapest(offers, required) is { } quantities
                    ? quantities.Select((quantity, i) => SplitBuy.CostOf(offers[i].Offer, quantity)).Sum()
                    : null;
                return found == EveryCombination(offers, 0, required);
            },
            iter: 60);

    [Fact]
    public void Two_half_stocks_make_one_build()
    {
        // 300 of the cheaper one, and the 200 that are missing from the other: 300 x 0.10 + 200 x 0.12 = 54.
        SplitOffer[] offers = [new(Sample.Price("1:0.10"), 300), new(Sample.Price("1:0.12"), 1000)];
        Assert.Equal([300, 200], SplitBuy.Cheapest(offers, 500)!.Value);
    }

    [Fact]
    public void Fewer_of_the_cheaper_one_can_be_cheaper_together()
    {
        // All 90 of the first leave 30, which the second sells at 0.50: 9 + 15 = 24. With 50 of it at 0.20 the first gives 70: 7 + 10.
        SplitOffer[] offers = [new(Sample.Price("1:0.10"), 90), new(Sample.Price("1:0.50;50:0.20"), 1000)];
        Assert.Equal([70, 50], SplitBuy.Cheapest(offers, 120)!.Value);
    }

    [Fact]
    public void What_all_stocks_together_do_not_cover_is_not_bought() =>
        Assert.Null(SplitBuy.Cheapest([new(Sample.Price("1:0.10"), 300), new(Sample.Price("1:0.12"), 100)], 500));

    [Fact]
    public void Many_offers_of_awkward_multiples_are_solved_in_a_moment()
    {
        int[] multiples = [1, 7, 25, 49, 100, 121, 250, 1000];
        SplitOffer[] offers =
        [
            .. multiples.Select((multiple, i) => new SplitOffer(
                Sample.Price("1:0.12;100:0.10;1000:0.08;5000:0.07", multiple, multiple), 20_000 + 777 * i)),
        ];
        var watch = System.Diagnostics.Stopwatch.StartNew();
        Assert.NotNull(SplitBuy.Cheapest(offers, 100_003));
        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(20), $"took {watch.Elapsed}");
    }

    private static decimal? EveryCombination(SplitOffer[] offers, int from, int left)
    {
        if (from == offers.Length)
        {
            return left <= 0 ? 0 : null;
        }

        decimal? best = null;
        for (int quantity = 0; quantity <= offers[from].Most; quantity++)
        {
            if (IsSold(offers[from], quantity) && EveryCombination(offers, from + 1, left - quantity) is { } rest)
            {
                decimal price = 0;
                foreach (PriceBreak each in offers[from].Offer.Prices)
                {
                    price = each.Quantity <= quantity ? each.UnitPrice : price;
                }

                decimal cost = quantity * price + rest;
                best = best is null || cost < best ? cost : best;
            }
        }

        return best;
    }

    private static bool IsSold(SplitOffer offer, int quantity) => quantity == 0 || (quantity <= offer.Most
        && quantity >= offer.Offer.MinimumOrder && quantity % offer.Offer.Multiple == 0 && quantity >= offer.Offer.Prices[0].Quantity);
}
