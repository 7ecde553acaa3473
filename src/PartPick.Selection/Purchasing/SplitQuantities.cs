using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>A quantity of an offer that a split may buy.</summary>
/// <param name="Quantity">The quantity; zero for none.</param>
/// <param name="Cost">What it costs.</param>
/// <param name="Above">What it costs more than as many at the lowest price of all offers.</param>
internal readonly record struct SplitQuantity(int Quantity, decimal Cost, decimal Above);

/// <summary>The quantities of an offer that can stand beside another offer in a cheapest split.</summary>
internal static class SplitQuantities
{
    /// <summary>The lowest price that the stock of any offer allows.</summary>
    public static decimal LowestPrice(IEnumerable<SplitOffer> offers) => offers
        .SelectMany(offer => offer.Offer.Prices.Where(price => price.Quantity <= offer.Most))
        .Select(price => price.UnitPrice)
        .DefaultIfEmpty()
        .Min();

    /// <summary>
    /// Nothing, and for each price what lies nearer to the ends of its range than the greatest common multiple with another offer;
    /// by what they cost above the lowest price.
    /// </summary>
    public static List<SplitQuantity> Of(IReadOnlyList<SplitOffer> offers, int which, int required, decimal least)
    {
        (Offer offer, int most) = (offers[which].Offer, offers[which].Most);
        long step = offers.Where((_, i) => i != which).Select(other => CommonMultiple(offer.Multiple, other.Offer.Multiple))
            .DefaultIfEmpty(offer.Multiple).Max();
        var found = new SortedSet<int> { 0 };
        for (int i = 0; i < offer.Prices.Length; i++)
        {
            long low = Up(Math.Max(offer.Prices[i].Quantity, offer.MinimumOrder), offer.Multiple);
            long end = i + 1 < offer.Prices.Length ? offer.Prices[i + 1].Quantity - 1L : int.MaxValue;
            long high = Math.Min(Math.Min(end, most), Up(Math.Max(required, low), offer.Multiple)) / offer.Multiple * offer.Multiple;
            for (long quantity = low; quantity <= high; quantity += offer.Multiple)
            {
                if (quantity >= low + step && quantity <= high - step)
                {
                    quantity = Up(high - step + 1, offer.Multiple);
                }

                found.Add((int)quantity);
            }
        }

        return
        [
            .. found.Select(quantity => (quantity, Cost: SplitBuy.CostOf(offer, quantity)))
                .Select(pair => new SplitQuantity(pair.quantity, pair.Cost, pair.Cost - pair.quantity * least))
                .OrderBy(each => each.Above),
        ];
    }

    private static long Up(long quantity, int multiple) => (quantity + multiple - 1) / multiple * multiple;

    private static long CommonMultiple(long one, long other)
    {
        (long a, long b) = (one, other);
        while (b != 0)
        {
            (a, b) = (b, a % b);
        }

        return one / a * other;
    }
}
