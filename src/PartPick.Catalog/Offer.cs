using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>At what prices and in what quantities a part is sold.</summary>
/// <param name="Currency">The currency, such as EUR; empty where no price is known.</param>
/// <param name="Prices">The prices by ascending quantity; empty where none is known.</param>
/// <param name="MinimumOrder">The least quantity sold, 1 or more.</param>
/// <param name="Multiple">Every quantity sold is a multiple of this, 1 or more.</param>
public sealed record Offer(string Currency, ImmutableArray<PriceBreak> Prices, int MinimumOrder, int Multiple)
{
    /// <summary>An offer without any price.</summary>
    public static Offer Unknown { get; } = new("", [], 1, 1);

    /// <summary>Whether any price is known.</summary>
    public bool HasPrices => !Prices.IsDefaultOrEmpty;

    /// <summary>
    /// The cheapest way to buy at least the quantity needed: buying more is taken where a lower price makes it cheaper in total.
    /// Of two equal totals the smaller quantity is taken.
    /// </summary>
    /// <param name="needed">How many are needed; zero or less costs nothing.</param>
    /// <param name="most">The most that can be had, such as the stock.</param>
    /// <returns>The purchase; null where no price is known, or the quantity is beyond what can be had or counted.</returns>
    public Purchase? CheapestPurchase(int needed, int most = int.MaxValue)
    {
        if (!HasPrices)
        {
            return null;
        }

        if (needed <= 0)
        {
            return new Purchase(0, 0);
        }

        // Within one price the total grows with the quantity, so only the least quantity of each price can be the cheapest.
        Purchase? best = null;
        for (int i = 0; i < Prices.Length; i++)
        {
            long least = Math.Max(Math.Max(needed, MinimumOrder), (long)Prices[i].Quantity);
            long quantity = (least + Multiple - 1) / Multiple * Multiple;
            long last = Math.Min(i + 1 < Prices.Length ? Prices[i + 1].Quantity - 1L : int.MaxValue, most);
            if (quantity > last)
            {
                continue;
            }

            decimal total = quantity * Prices[i].UnitPrice;
            if (best is null || total < best.Value.Total)
            {
                best = new Purchase((int)quantity, total);
            }
        }

        return best;
    }
}
