using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// What a circuit costs per unit for every number of boards, always with the same parts: each number is bought anew, so every step
/// of prices, minimum orders and multiples is in it.
/// </summary>
public sealed class CostCurve
{
    private readonly decimal[] _costs;

    private CostCurve(decimal[] costs, ImmutableArray<CostBreak> breaks, int? coveredTo)
    {
        _costs = costs;
        Breaks = breaks;
        CoveredTo = coveredTo;
    }

    /// <summary>Largest number of boards.</summary>
    public int Most => _costs.Length - 1;

    /// <summary>Where the cost turns, by number of boards and then by the order of the parts.</summary>
    public ImmutableArray<CostBreak> Breaks { get; }

    /// <summary>Largest number of boards that the stock of all parts covers; null where no stock is known.</summary>
    public int? CoveredTo { get; }

    /// <summary>Cost per unit.</summary>
    /// <param name="builds">Number of boards, from 1 to <see cref="Most"/>.</param>
    public decimal UnitCost(int builds) => _costs[builds];

    /// <summary>The curve of a circuit; null where a part of it has no price, or one in another currency.</summary>
    /// <param name="board">Its parts.</param>
    /// <param name="most">Largest number of boards, one or more.</param>
    public static CostCurve? Of(BoardParts board, int most)
    {
        ArgumentNullException.ThrowIfNull(board);
        ArgumentOutOfRangeException.ThrowIfLessThan(most, 1);
        List<(Part Part, int Count)> counts = BillOfParts.Counts(board.Choice, board.Support);
        if (!counts.TrueForAll(entry => entry.Part.Offer.HasPrices)
            || counts.Select(entry => entry.Part.Offer.Currency).Distinct().Skip(1).Any())
        {
            return null;
        }

        decimal[] costs = new decimal[most + 1];
        for (int builds = 1; builds <= most; builds++)
        {
            costs[builds] = counts.Sum(entry => Market.UnitCost(entry.Part, entry.Count, builds));
        }

        var breaks = ImmutableArray.CreateBuilder<CostBreak>();
        for (int builds = 2; builds <= most; builds++)
        {
            foreach ((Part part, int count) in counts)
            {
                if (part.Offer.CheapestPurchase(count * builds) is { } now)
                {
                    breaks.AddRange(Turns(part, count, builds, now).Select(kind => new CostBreak(
                        builds, part, kind, now.Quantity, now.Total / now.Quantity, costs[builds - 1], costs[builds])));
                }
            }
        }

        int[] covered = [.. counts.Where(entry => entry.Part.Stock is not null).Select(entry => entry.Part.Stock!.Value / entry.Count)];
        return new CostCurve(costs, breaks.ToImmutable(), covered.Length == 0 ? null : covered.Min());
    }

    private static IEnumerable<CostBreakKind> Turns(Part part, int count, int builds, Purchase now)
    {
        int needed = count * builds;
        if (part.Offer.CheapestPurchase(needed - count) is { } before)
        {
            if (before.Total * now.Quantity != now.Total * before.Quantity)
            {
                yield return CostBreakKind.Price;
            }
            else if (part.Offer.Multiple > 1 && now.Quantity > before.Quantity)
            {
                yield return CostBreakKind.Multiple;
            }
            else if (part.Offer.Multiple == 1 && before.Quantity > needed - count && now.Quantity == needed)
            {
                yield return CostBreakKind.UsedUp;
            }
        }

        if (part.Stock / count == builds - 1)
        {
            yield return CostBreakKind.Stock;
        }
    }
}
