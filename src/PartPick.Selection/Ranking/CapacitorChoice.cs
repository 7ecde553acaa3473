using System.Collections.Immutable;

namespace PartPick.Selection.Search;

/// <summary>Load capacitors of one value.</summary>
/// <param name="Farads">The value.</param>
/// <param name="Contenders">The parts that the search tries, by id.</param>
/// <param name="Parts">Number of parts on offer, those included that a contender stands for.</param>
internal sealed record CapacitorValue(double Farads, ImmutableArray<Contender> Contenders, int Parts);

/// <summary>
/// The load capacitors that a search tries: class 1 dielectrics of the wanted series, none smaller than the stray beside it, which
/// would set the frequency in its place (common practice).
/// </summary>
internal static class CapacitorChoice
{
    /// <summary>By value, ascending.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="market">What is on offer.</param>
    /// <param name="every">Whether every part is tried, also those that another one beats whatever the circuit.</param>
    public static ImmutableArray<CapacitorValue> Of(Requirement requirement, Market market, bool every)
    {
        SeriesMembership membership = new(requirement.CapacitorSeries);
        double least = Math.Max(requirement.Board.Strays.InputFarads, requirement.Board.Strays.OutputFarads);
        return
        [
            .. market.Capacitors
                .Where(part => part.TemperatureCoefficientPerKelvin is not null && part.ValueFarads >= least)
                .Where(part => membership.Contains(part.ValueFarads))
                .GroupBy(part => part.ValueFarads)
                .OrderBy(group => group.Key)
                .Select(group => new CapacitorValue(group.Key, Contender.Of([.. group], market, every), group.Count())),
        ];
    }
}
