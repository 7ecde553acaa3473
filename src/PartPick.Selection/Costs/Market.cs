using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// The parts that can be bought for a build: not excluded, priced in the one currency of the list, and enough of them in stock
/// for one a board. Costs are what the build pays per unit, under price breaks, minimum order and multiple.
/// </summary>
public sealed class Market
{
    private readonly Dictionary<(string Id, int Count), decimal> _costs = new();
    private readonly Lock _gate = new();
    private readonly int _builds;

    /// <param name="catalog">The catalogue.</param>
    /// <param name="builds">Number of boards built, one or more.</param>
    public Market(PartsCatalog catalog, int builds)
    {
        ArgumentNullException.ThrowIfNull(catalog);
        ArgumentOutOfRangeException.ThrowIfLessThan(builds, 1);
        _builds = builds;
        Currency = catalog.Currency;
        Capacitors = [.. catalog.Capacitors.Where(IsOffered)];
        Resistors = [.. catalog.Resistors.Where(IsOffered)];
    }

    /// <summary>The currency in which most parts are priced; parts in another one are left out.</summary>
    public string Currency { get; }

    /// <summary>Capacitors on offer, by id.</summary>
    public ImmutableArray<CapacitorPart> Capacitors { get; }

    /// <summary>Resistors on offer, by id.</summary>
    public ImmutableArray<ResistorPart> Resistors { get; }

    /// <summary>Whether a part can be bought at all: priced in the currency and not excluded.</summary>
    public bool IsListed(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return !part.Excluded
            && part.Offer.HasPrices
            && part.Offer.Currency == Currency
            && part.Offer.CheapestPurchase(_builds) is not null;
    }

    /// <summary>Whether the stock covers a number of the part on every board; an unknown stock does.</summary>
    public bool Covers(Part part, int count)
    {
        ArgumentNullException.ThrowIfNull(part);
        return part.Stock is not { } stock || stock >= (long)count * _builds;
    }

    /// <summary>Cost per unit of a number of the part on every board.</summary>
    public decimal UnitCost(Part part, int count)
    {
        ArgumentNullException.ThrowIfNull(part);
        lock (_gate)
        {
            if (_costs.TryGetValue((part.Id, count), out decimal known))
            {
                return known;
            }

            decimal cost = UnitCost(part, count, _builds);
            _costs.Add((part.Id, count), cost);
            return cost;
        }
    }

    /// <summary>
    /// Cost per unit of a number of a part on every board, for any number of boards; beyond all cost where it has no price.
    /// </summary>
    internal static decimal UnitCost(Part part, int count, int builds)
    {
        long needed = Math.Min((long)count * builds, int.MaxValue);
        return part.Offer.CheapestPurchase((int)needed) is { } purchase ? purchase.Total / builds : decimal.MaxValue / 1000;
    }

    private bool IsOffered(Part part) => IsListed(part) && Covers(part, 1);
}
