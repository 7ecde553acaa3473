using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>One of several offers of the same part.</summary>
/// <param name="Offer">Prices and quantities, all offers in one currency.</param>
/// <param name="Most">The most that can be had of it, zero or more.</param>
public readonly record struct SplitOffer(Offer Offer, int Most);

/// <summary>
/// The cheapest way to buy a quantity from several offers together, exactly.
/// </summary>
/// <remarks>
/// Within one price the cost of an offer grows evenly. Let M be the least common multiple of all order multiples. Where two offers
/// are both M or more away from the ends of their price's range, M parts can be moved from the dearer to the cheaper one, at no
/// more cost, until one of them is not. So in some cheapest solution all offers but one buy a quantity less than M from an end of
/// a range, and the remaining one buys the cheapest quantity that covers what is left.
/// </remarks>
public static class SplitBuy
{
    /// <summary>The cheapest quantities.</summary>
    /// <param name="offers">The offers.</param>
    /// <param name="required">How many are needed at least, one or more.</param>
    /// <returns>The quantity of each offer, zero for none; null where all of them together do not cover it.</returns>
    public static ImmutableArray<int>? Cheapest(IReadOnlyList<SplitOffer> offers, int required)
    {
        ArgumentNullException.ThrowIfNull(offers);
        ArgumentOutOfRangeException.ThrowIfLessThan(required, 1);
        long common = offers.Aggregate(1L, (sofar, offer) => LeastCommonMultiple(sofar, offer.Offer.Multiple));
        int[][] quantities = [.. offers.Select(offer => Quantities(offer, required, common))];
        decimal[] lowest = [.. offers.Select(offer => offer.Offer.HasPrices ? offer.Offer.Prices.Min(price => price.UnitPrice) : 0)];
        var best = new Best(decimal.MaxValue, null);
        for (int last = 0; last < offers.Count; last++)
        {
            best = With(offers, required, quantities, lowest, last, best);
        }

        return best.Quantities is { } found ? [.. found] : null;
    }

    /// <summary>What a quantity of an offer costs.</summary>
    /// <param name="offer">The offer.</param>
    /// <param name="quantity">The quantity, one that is sold, or zero.</param>
    public static decimal CostOf(Offer offer, int quantity)
    {
        ArgumentNullException.ThrowIfNull(offer);
        return quantity == 0 ? 0 : quantity * offer.Prices.Last(price => price.Quantity <= quantity).UnitPrice;
    }

    // Every other offer at one of its few quantities; what is left comes from the last one.
    private static Best With(
        IReadOnlyList<SplitOffer> offers, int required, int[][] quantities, decimal[] lowest, int last, Best best)
    {
        var states = new List<State> { new(0, 0, new int[offers.Count]) };
        for (int i = 0; i < offers.Count; i++)
        {
            if (i != last)
            {
                states = Extend(states, i, offers[i].Offer, quantities[i], required, lowest, best.Cost);
            }
        }

        foreach (State state in states)
        {
            if (offers[last].Offer.CheapestPurchase(required - state.Sum, offers[last].Most) is { } rest
                && state.Cost + rest.Total < best.Cost)
            {
                int[] found = [.. state.Quantities];
                found[last] = rest.Quantity;
                best = new Best(state.Cost + rest.Total, found);
            }
            else if (state.Sum >= required && state.Cost < best.Cost)
            {
                best = new Best(state.Cost, state.Quantities);
            }
        }

        return best;
    }

    private static List<State> Extend(
        List<State> states, int offer, Offer prices, int[] quantities, int required, decimal[] lowest, decimal limit)
    {
        decimal least = lowest.Min();
        var next = new Dictionary<int, State>();
        foreach (State state in states)
        {
            foreach (int quantity in quantities)
            {
                int sum = (int)Math.Min((long)state.Sum + quantity, required);
                decimal cost = state.Cost + CostOf(prices, quantity);
                if (cost + (required - sum) * least > limit || (next.TryGetValue(sum, out State? known) && known.Cost <= cost))
                {
                    continue;
                }

                int[] chosen = [.. state.Quantities];
                chosen[offer] = quantity;
                next[sum] = new State(sum, cost, chosen);
            }
        }

        // What covers less for as much is never better.
        var kept = new List<State>();
        decimal cheapest = decimal.MaxValue;
        foreach (State state in next.Values.OrderByDescending(state => state.Sum))
        {
            if (state.Cost < cheapest)
            {
                cheapest = state.Cost;
                kept.Add(state);
            }
        }

        return kept;
    }

    private static int[] Quantities(SplitOffer offer, int required, long common)
    {
        var found = new SortedSet<int> { 0 };
        Offer prices = offer.Offer;
        for (int i = 0; i < prices.Prices.Length; i++)
        {
            long low = Up(Math.Max(prices.Prices[i].Quantity, prices.MinimumOrder), prices.Multiple);
            long end = i + 1 < prices.Prices.Length ? prices.Prices[i + 1].Quantity - 1L : int.MaxValue;
            long high = Math.Min(Math.Min(end, offer.Most), Up(Math.Max(required, low), prices.Multiple)) / prices.Multiple * prices.Multiple;
            for (long quantity = low; quantity <= high; quantity += prices.Multiple)
            {
                if (quantity >= low + common && quantity <= high - common)
                {
                    quantity = Math.Max(quantity, Up(high - common + 1, prices.Multiple));
                }

                found.Add((int)quantity);
            }
        }

        return [.. found];
    }

    private static long Up(long quantity, int multiple) => (quantity + multiple - 1) / multiple * multiple;

    private static long LeastCommonMultiple(long one, long other)
    {
        (long a, long b) = (one, other);
        while (b != 0)
        {
            (a, b) = (b, a % b);
        }

        return Math.Min(one / a * other, int.MaxValue);
    }

    private sealed record State(int Sum, decimal Cost, int[] Quantities);

    private sealed record Best(decimal Cost, int[]? Quantities);
}
