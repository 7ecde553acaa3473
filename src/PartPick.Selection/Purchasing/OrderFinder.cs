using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Finds the cheapest orders for a quantity of a part, or of equal parts, that the stock allows.</summary>
/// <param name="catalog">Today's parts.</param>
/// <param name="options">How the list is made.</param>
/// <param name="currency">The currency of the list.</param>
internal sealed class OrderFinder(PartsCatalog catalog, PurchaseOptions options, string currency)
{
    /// <summary>Whether a part alone can be had in a quantity; a part without a price counts by its stock.</summary>
    public bool IsCovered(Part part, int required) => Available(part) is { } now
        && (OfferOf(now) is { HasPrices: true } offer
            ? offer.CheapestPurchase(required, MostOf(now)) is not null
            : MostOf(now) >= required);

    /// <summary>The orders, and the cheapest single one where there are several.</summary>
    /// <param name="parts">The parts that are asked for; several only where they are equal.</param>
    /// <param name="required">How many are needed.</param>
    public (ImmutableArray<PurchaseOrder> Orders, decimal? Single) Find(ImmutableArray<Part> parts, int required)
    {
        Part? first = Available(parts[0]);
        if (parts.Length == 1 && first is not null && IsCovered(first, required))
        {
            return ([OrderOf(first, required, MostOf(first))], null);
        }

        if (options.Splits && Split(parts, required) is { } split)
        {
            return split;
        }

        // A part that is gone has no price any more.
        PurchaseOrder order = first is not null
            ? OrderOf(first, required, int.MaxValue) with { Covered = Coverage.No }
            : new PurchaseOrder(parts[0], required, null, null, Coverage.No);
        return ([order], null);
    }

    /// <summary>The cheapest orders of equal parts together, and the cheapest single one; null where they do not suffice.</summary>
    /// <param name="parts">The parts that are asked for, all of them equal.</param>
    /// <param name="required">How many are needed.</param>
    public (ImmutableArray<PurchaseOrder> Orders, decimal? Single)? Split(ImmutableArray<Part> parts, int required)
    {
        Part[] equal =
        [
            .. parts.Select(Available).OfType<Part>()
                .Concat(parts.SelectMany(part => EqualParts.Of(part, catalog)))
                .DistinctBy(part => part.Id)
                .Where(part => !part.Excluded && OfferOf(part) is { HasPrices: true }),
        ];
        if (equal.Length == 0
            || SplitBuy.Cheapest([.. equal.Select(part => new SplitOffer(OfferOf(part)!, MostOf(part)))], required) is not { } quantities)
        {
            return null;
        }

        PurchaseOrder[] orders =
        [
            .. equal.Select((part, i) => (part, Quantity: quantities[i]))
                .Where(pair => pair.Quantity > 0)
                .Select(pair => Order(pair.part, pair.Quantity)),
        ];
        decimal? single = equal.Min(part => OfferOf(part)!.CheapestPurchase(required, MostOf(part))?.Total);
        return ([.. orders], orders.Length > 1 && single is { } total ? Cents(total) : null);
    }

    private PurchaseOrder OrderOf(Part part, int required, int most)
    {
        Offer? offer = OfferOf(part);
        return offer?.CheapestPurchase(required, most) is { } purchase
            ? Order(part, purchase.Quantity)
            : new PurchaseOrder(part, Whole(part.Offer, required), null, null, CoverageOf(part, required));
    }

    private PurchaseOrder Order(Part part, int quantity)
    {
        Offer offer = OfferOf(part)!;
        decimal price = offer.Prices.Last(each => each.Quantity <= quantity).UnitPrice;
        return new PurchaseOrder(part, quantity, price, Cents(quantity * price), CoverageOf(part, quantity));
    }

    private static Coverage CoverageOf(Part part, int quantity) =>
        part.Stock is not { } stock ? Coverage.Unknown : stock >= quantity ? Coverage.Yes : Coverage.No;

    private static int Whole(Offer offer, int required)
    {
        long least = Math.Max(required, offer.MinimumOrder);
        return (int)Math.Min(int.MaxValue, (least + offer.Multiple - 1) / offer.Multiple * offer.Multiple);
    }

    private static decimal Cents(decimal amount) => decimal.Round(amount, 2, MidpointRounding.AwayFromZero);

    private static int MostOf(Part part) => part.Excluded ? 0 : part.Stock ?? int.MaxValue;

    private Part? Available(Part part) => catalog.Find(part.Id) is { } found && found.Kind == part.Kind ? found : null;

    private Offer? OfferOf(Part part) => options.Rates.Convert(part.Offer, currency);
}
