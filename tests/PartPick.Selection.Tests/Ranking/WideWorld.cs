using PartPick.Catalog;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// A catalogue with one crystal, one amplifier and many values in a row, one part each, so that the search has to judge combinations
/// from those round them.
/// </summary>
internal static class WideWorld
{
    /// <summary>Makes the world of a circuit.</summary>
    /// <param name="kind">The circuit.</param>
    /// <param name="amplifier">Id of the amplifier.</param>
    /// <param name="crystal">Id of the crystal.</param>
    /// <param name="smallest">Smallest load capacitor in farads.</param>
    /// <param name="series">Series of the load capacitors.</param>
    /// <param name="smallestOhms">Smallest resistor in ohms.</param>
    public static SmallWorld Of(CircuitKind kind, string amplifier, string crystal, double smallest, string series, double smallestOhms)
    {
        PartsCatalog all = PartsCatalog.BuiltIn();
        CrystalPart quartz = all.Crystals.Single(part => part.Id == crystal);
        bool fork = quartz.Cut == CrystalCut.Fork;
        double supply = kind == CircuitKind.Port ? 3.3 : 5;
        var requirement = new Requirement
        {
            OutputHz = kind == CircuitKind.Counter ? quartz.FrequencyHz / 4096 : quartz.FrequencyHz,
            BudgetRatio = fork ? 250e-6 : 120e-6,
            SupplyMinVolts = supply * 0.95,
            SupplyMaxVolts = supply * 1.05,
            Margin = 3,
            Circuits = [kind],
            BiasSeries = "E3",
        };
        Part[] parts =
        [
            quartz,
            all.All.Single(part => part.Id == amplifier),
            .. InARow(all.Capacitors.Where(part => part.Dielectric == "C0G"), part => part.ValueFarads, smallest, 7, series),
            .. kind == CircuitKind.Follower
                ? InARow(all.Resistors, part => part.ValueOhms, smallestOhms, 7, "E3")
                : InARow(all.Resistors, part => part.ValueOhms, smallestOhms, 8, "E12"),
            .. all.Resistors.Where(part => part.ValueOhms is 1e6 or 4.7e6 or 1e7),
            all.Capacitors.First(part => part.ValueFarads is > 90e-9 and < 110e-9),
            all.Capacitors.First(part => part.ValueFarads is > 9e-9 and < 11e-9),
        ];
        return new SmallWorld(requirement, new PartsCatalog(parts.DistinctBy(part => part.Id)));
    }

    private static IEnumerable<T> InARow<T>(IEnumerable<T> parts, Func<T, double> value, double smallest, int count, string series)
        where T : Part
    {
        var membership = new Search.SeriesMembership(series);
        return parts
            .Where(part => value(part) > smallest * 0.99 && membership.Contains(value(part)))
            .GroupBy(value)
            .OrderBy(group => group.Key)
            .Take(count)
            .Select(group => group.OrderBy(part => part.Id, StringComparer.Ordinal).First());
    }
}
