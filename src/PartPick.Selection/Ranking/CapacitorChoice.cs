using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Load capacitors of one value.</summary>
/// <param name="Farads">The value.</param>
/// <param name="Parts">The parts on offer, by id.</param>
internal sealed record CapacitorValue(double Farads, ImmutableArray<CapacitorPart> Parts);

/// <summary>The load capacitors that a search tries: class 1 dielectrics of the wanted series.</summary>
internal static class CapacitorChoice
{
    /// <summary>By value, ascending.</summary>
    public static ImmutableArray<CapacitorValue> Of(Requirement requirement, Market market)
    {
        SeriesMembership membership = new(requirement.CapacitorSeries);
        return
        [
            .. market.Capacitors
                .Where(part => part.TemperatureCoefficientPerKelvin is not null && membership.Contains(part.ValueFarads))
                .GroupBy(part => part.ValueFarads)
                .OrderBy(group => group.Key)
                .Select(group => new CapacitorValue(group.Key, [.. group])),
        ];
    }
}
