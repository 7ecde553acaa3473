using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>One of several offers of the same part.</summary>
/// <param name="Offer">Prices and quantities, all offers in one currency.</param>
/// <param name="Most">The most that can be had of it, zero or more.</param>
public readonly record struct SplitOffer(Offer Offer, int Most);

/// <summary>The cheapest way to buy a quantity from several offers together, exactly.</summary>
/// <remarks>
/// Within one price the cost of an offer grows evenly. Where two offers are both farther from the ends of their price's range than
/// the least common multiple of their order multiples, that many parts can be moved from one to the other and back: in a cheapest
/// solution their prices are equal, and among the cheapest ones that with the greatest sum of squares has no such pair. So all
/// offers but one buy a quantity near an end of a range, as <see cref="SplitQuantities"/> lists them, and the remaining one buys
/// the cheapest quantity that covers what is left.
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
        decimal least = SplitQuantities.LowestPrice(offers);
        Found best = Greedy(offers, required);
        for (int last = 0; last < offers.Count; last++)
        {
            best = With(offers, required, least, last, best);
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

    // A solution to measure others by: the most of each offer, from the cheapest on, until one covers the rest.
    private static Found Greedy(IReadOnlyList<SplitOffer> offers, int required)
    {
        var quantities = new int[offers.Count];
        (int left, decimal cost) = (required, 0);
        foreach (int i in Enumerable.Range(0, offers.Count).OrderBy(i => SplitQuantities.LowestPrice([offers[i]])))
        {
            (Offer offer, int most) = (offers[i].Offer, offers[i].Most);
            if (offer.CheapestPurchase(left, most) is { } rest)
            {
                quantities[i] = rest.Quantity;
                return new Found(cost + rest.Total, quantities);
            }

            int whole = most / offer.Multiple * offer.Multiple;
            if (offer.HasPrices && whole >= Math.Max(offer.MinimumOrder, offer.Prices[0].Quantity))
            {
                quantities[i] = whole;
                left -= whole;
                cost += CostOf(offer, whole);
            }
        }

        return new Found(decimal.MaxValue, null);
    }

    // Every other offer at one of its few quantities; what is left comes from the last one.
    private static Found With(IReadOnlyList<SplitOffer> offers, int required, decimal least, int last, Found best)
    {
        var states = new List<State> { new(0, 0, new int[offers.Count]) };
        for (int i = 0; i < offers.Count; i++)
        {
            if (i != last)
            {
                states = Extend(states, i, SplitQuantities.Of(offers, i, required, least), required, least, best.Cost);
            }
        }

        foreach (State state in states)
        {
            if (state.Sum < required && offers[last].Offer.CheapestPurchase(required - state.Sum, offers[last].Most) is { } rest
                && state.Cost + rest.Total < best.Cost)
            {
                int[] found = [.. state.Quantities];
                found[last] = rest.Quantity;
                best = new Found(state.Cost + rest.Total, found);
            }
            else if (state.Sum >= required && state.Cost < best.Cost)
            {
                best = new Found(state.Cost, state.Quantities);
            }
        }

        return best;
    }

    private static List<State> Extend(
        List<State> states, int offer, List<SplitQuantity> quantities, int required, decimal least, decimal limit)
    {
        var next = new Dictionary<int, State>();
        foreach (State state in states)
        {
            decimal floor = state.Cost + (required - state.Sum) * least;
            foreach (SplitQuantity quantity in quantities)
            {
                // They are in the order of what they cost above the lowest price: the rest can only be dearer, and no dearer one is sought.
                if (floor + quantity.Above >= limit)
                {
                    break;
                }

                int sum = (int)Math.Min((long)state.Sum + quantity.Quantity, required);
                decimal cost = state.Cost + quantity.Cost;
                if (!next.TryGetValue(sum, out State? known) || cost < known.Cost)
                {
                    int[] chosen = [.. state.Quantities];
                    chosen[offer] = quantity.Quantity;
                    next[sum] = new State(sum, cost, chosen);
                }
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

    private sealed record State(int Sum, decimal Cost, int[] Quantities);

    private sealed record Found(decimal Cost, int[]? Quantities);
}
