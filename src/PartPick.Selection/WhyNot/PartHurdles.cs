using System.Globalization;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>What keeps a part out by itself, whatever stands beside it.</summary>
internal static class PartHurdles
{
    /// <summary>Lifts what can be lifted: exclusion, and a stock that serves fewer boards.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="part">The part.</param>
    /// <param name="currency">The currency of the catalogue.</param>
    public static Lift Of(Requirement requirement, Part part, string currency)
    {
        var lift = new Lift(requirement, part with { Excluded = false }, []);
        if (part.Excluded)
        {
            lift = lift.Over(HurdleName.Excluded, "", "excluded in the catalogue", "", requirement);
        }

        if (part is CrystalPart { Overtone: > 1 } crystal)
        {
            lift = lift.Over(
                HurdleName.Overtone, "fundamental", string.Create(CultureInfo.InvariantCulture, $"overtone {crystal.Overtone}"), "", null);
        }

        if (!part.Offer.HasPrices || part.Offer.Currency != currency || part.Offer.CheapestPurchase(requirement.Builds) is null)
        {
            string has = !part.Offer.HasPrices ? "no price"
                : part.Offer.Currency != currency ? $"a price in {part.Offer.Currency}"
                : "no price for so many";
            lift = lift.Over(HurdleName.Price, currency.Length == 0 ? "a price" : $"a price in {currency}", has, "", null);
        }

        return part.Stock is { } stock && stock < requirement.Builds ? OverStock(lift, part.Id, stock) : lift;
    }

    /// <summary>Fewer boards, as many as a stock serves.</summary>
    public static Lift OverStock(Lift lift, string id, int stock)
    {
        int builds = lift.Requirement.Builds;
        return lift.Over(
            HurdleName.Stock,
            string.Create(CultureInfo.InvariantCulture, $"{builds} for {builds} boards"),
            string.Create(CultureInfo.InvariantCulture, $"{stock} of {id}"),
            string.Create(CultureInfo.InvariantCulture, $"{builds - stock} too few"),
            stock > 0 ? lift.Requirement with { Builds = stock } : null);
    }
}
