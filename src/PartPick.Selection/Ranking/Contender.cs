using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// A load capacitor that the search tries. One that another of its value beats whatever the circuit is left out: the same
/// tolerance, no smaller change over temperature and strictly dearer, whether one or two are used. Every figure of a circuit with
/// it is then no better, and its cost worse, so it is neither on the front nor the best of a group.
/// </summary>
/// <param name="Part">The capacitor.</param>
/// <param name="Tolerance">Its tolerance as a ratio.</param>
/// <param name="Coefficient">Its temperature coefficient in 1/K, as a magnitude.</param>
/// <param name="One">Cost per unit where one is used.</param>
/// <param name="Two">Cost per unit where two are used.</param>
/// <param name="Stands">Number of parts it stands for, itself included.</param>
internal sealed record Contender(CapacitorPart Part, double Tolerance, double Coefficient, decimal One, decimal Two, int Stands)
{
    /// <summary>The contenders among parts of one value.</summary>
    public static ImmutableArray<Contender> Of(ImmutableArray<CapacitorPart> parts, Market market, bool every)
    {
        ImmutableArray<Contender> all =
        [
            .. parts.Select(part => new Contender(
                part,
                BudgetBuilder.Tolerance(part),
                BudgetBuilder.Coefficient(part),
                market.UnitCost(part, 1),
                market.UnitCost(part, 2),
                1)),
        ];
        if (every)
        {
            return all;
        }

        var left = all.Where(part => !all.Any(other => other.Beats(part, market))).ToArray();
        foreach (Contender beaten in all.Except(left))
        {
            int by = Array.FindIndex(left, other => other.Beats(beaten, market));
            left[by] = left[by] with { Stands = left[by].Stands + 1 };
        }

        return [.. left];
    }

    /// <summary>Tolerance and change over temperatures that reach so many kelvins from 25 °C, together, as a ratio.</summary>
    public double Spread(double reachKelvins) => Tolerance + Coefficient * reachKelvins;

    // Transitive, so whoever is beaten is beaten by one who is not.
    private bool Beats(Contender other, Market market) =>
        Tolerance == other.Tolerance
        && Coefficient <= other.Coefficient
        && One < other.One
        && Two < other.Two
        && market.Covers(Part, 2);
}
