using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>
/// Catalogues of some 100 000 combinations drawn from the built-in parts: several crystals, amplifiers and parts of a value.
/// </summary>
internal static class MidWorld
{
    /// <summary>The worlds: inverters, buffered ones among them; counters and ports; followers.</summary>
    public static string[] Names => ["gates", "ports", "followers"];

    /// <summary>Makes a world.</summary>
    /// <param name="name">One of <see cref="Names"/>.</param>
    public static SmallWorld Named(string name) => name switch
    {
        "gates" => Of(CircuitKind.Gate, 8e6, 4.5, 5.5, 7, capacitors: 10, resistors: 9),
        "ports" => Of(CircuitKind.Port, 8e6, 3.1, 3.5, 4, capacitors: 12, resistors: 9),
        "followers" => Of(CircuitKind.Follower, 4e6, 4.5, 5.5, 4, capacitors: 10, resistors: 6),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "Not a world."),
    };

    private static SmallWorld Of(
        CircuitKind kind, double hertz, double lowVolts, double highVolts, int amplifiers, int capacitors, int resistors)
    {
        PartsCatalog all = PartsCatalog.BuiltIn();
        var requirement = new Requirement
        {
            OutputHz = hertz,
            BudgetRatio = 120e-6,
            SupplyMinVolts = lowVolts,
            SupplyMaxVolts = highVolts,
            Margin = 3,
            Circuits = [kind],
        };
        bool follower = kind == CircuitKind.Follower;
        Part[] parts =
        [
            .. Spread(all.Crystals.Where(part => part.FrequencyHz == hertz && part.LoadFarads is not null), 5),
            .. Spread(Amplifiers(all, kind), amplifiers),
            .. Values(all.Capacitors.Where(part => part.Dielectric == "C0G"), part => part.ValueFarads, follower ? 33e-12 : 9e-12, "E12",
                capacitors, each: 2),
            .. Values(all.Resistors, part => part.ValueOhms, follower ? 900 : 95, follower ? "E3" : "E6", resistors, each: 1),
            .. all.Resistors.Where(part => part.ValueOhms is 1e6 or 100e3),
            all.Capacitors.First(part => part.ValueFarads is > 90e-9 and < 110e-9),
            all.Capacitors.First(part => part.ValueFarads is > 9e-9 and < 11e-9),
        ];
        return new SmallWorld(requirement, new PartsCatalog(parts.DistinctBy(part => part.Id)));
    }

    private static IEnumerable<Part> Amplifiers(PartsCatalog all, CircuitKind kind) => kind switch
    {
        CircuitKind.Gate => all.Inverters,
        CircuitKind.Port => all.Ports.Where(part => part.FrequencyMaxHz > 1e6),
        _ => all.Transistors,
    };

    // So many from the first to the last, evenly.
    private static IEnumerable<T> Spread<T>(IEnumerable<T> parts, int count)
    {
        T[] from = [.. parts];
        return Enumerable.Range(0, count).Select(i => from[i * from.Length / count]).Distinct();
    }

    private static IEnumerable<T> Values<T>(
        IEnumerable<T> parts, Func<T, double> value, double smallest, string series, int count, int each)
        where T : Part
    {
        var membership = new SeriesMembership(series);
        return parts
            .Where(part => value(part) > smallest && membership.Contains(value(part)))
            .GroupBy(value)
            .OrderBy(group => group.Key)
            .Take(count)
            .SelectMany(group => Spread(group.OrderBy(part => part.Id, StringComparer.Ordinal), each));
    }
}
