using PartPick.Catalog;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>A small random catalogue drawn from the built-in parts, and a requirement that some of it may meet.</summary>
internal sealed record SmallWorld(Requirement Requirement, PartsCatalog Catalog)
{
    private static readonly double[] Outputs = [1000, 4e6, 8e6, 32768, 16e6, 12e6];

    /// <summary>Draws a world; the same seed always draws the same.</summary>
    public static SmallWorld Draw(int seed)
    {
        var random = new Random(seed);
        double output = Pick(random, Outputs);
        CircuitKind kind = output == 1000 ? CircuitKind.Counter : (CircuitKind)random.Next(4);
        kind = output == 32768 && kind == CircuitKind.Follower ? CircuitKind.Gate : kind;
        return Draw(random, output, kind, capacitors: 3, damping: 2);
    }

    /// <summary>Draws a world of one circuit; the same seed always draws the same.</summary>
    public static SmallWorld Draw(int seed, CircuitKind kind, int capacitors, int damping)
    {
        var random = new Random(seed);
        double[] outputs = kind switch
        {
            CircuitKind.Counter => [1000],
            CircuitKind.Follower => [4e6, 8e6, 16e6, 12e6],
            _ => [4e6, 8e6, 32768, 16e6, 12e6],
        };
        return Draw(random, Pick(random, outputs), kind, capacitors, damping);
    }

    private static SmallWorld Draw(Random random, double output, CircuitKind kind, int capacitors, int damping)
    {
        PartsCatalog all = PartsCatalog.BuiltIn();
        bool clock = output == 32768;
        double factor = clock ? 1.5 : 1;
        double supply = kind == CircuitKind.Port ? 3.3 : Pick(random, [3.3, 5.0, 5.0, 12.0]);
        var requirement = new Requirement
        {
            OutputHz = output,
            BudgetRatio = Pick(random, [60e-6, 100e-6, 150e-6, 300e-6]) * factor,
            SupplyMinVolts = supply * 0.95,
            SupplyMaxVolts = supply * 1.05,
            Margin = Pick(random, [3.0, 5.0]),
            Builds = Pick(random, [1, 20, 200]),
            CostLimit = random.Next(3) == 0 ? 1m : null,
            StartUpTimeSeconds = random.Next(3) == 0 ? (clock ? 3 : 0.01) : null,
            Board = Pick(random, [.. Board.Presets]),
            Circuits = [kind],
            CapacitorSeries = "E24",
            BiasSeries = "E12",
            Weights = new Weights(random.Next(1, 4), random.Next(0, 3), random.Next(0, 3)),
        };
        Part[] parts =
        [
            .. Sample(random, 2, all.Crystals.Where(part => Near(part, output, kind))),
            .. Amplifiers(random, all, kind),
            .. Sample(random, capacitors, all.Capacitors.Where(part => part.Dielectric == "C0G" && Usual(part, clock, kind))),
            .. Sample(random, damping, all.Resistors.Where(part => Damping(part, clock, kind))),
            .. all.Resistors.Where(part => part.ValueOhms is 1e6 or 4.7e6 or 1e7),
            .. all.Resistors.Where(part => kind == CircuitKind.Follower && part.ValueOhms is 2200 or 100e3),
            .. Sample(random, 1, all.Capacitors.Where(part => part.ValueFarads is > 90e-9 and < 110e-9)),
            .. Sample(random, 1, all.Capacitors.Where(part => part.ValueFarads is > 9e-9 and < 11e-9)),
        ];
        return new SmallWorld(requirement, new PartsCatalog(parts.DistinctBy(part => part.Id)));
    }

    private static bool Near(CrystalPart part, double output, CircuitKind kind)
    {
        double ratio = part.FrequencyHz / output;
        return kind == CircuitKind.Counter && output == 1000 ? ratio is 4096 or 8192 or 2048 : Math.Abs(ratio - 1) < 1e-4;
    }

    private static bool Usual(CapacitorPart part, bool clock, CircuitKind kind) => kind == CircuitKind.Follower
        ? part.ValueFarads is > 40e-12 and < 300e-12
        : part.ValueFarads is > 7e-12 and < 60e-12 && (!clock || part.ValueFarads < 40e-12);

    private static bool Damping(ResistorPart part, bool clock, CircuitKind kind) => (clock, kind) switch
    {
        (_, CircuitKind.Follower) => part.ValueOhms is > 900 and < 300e3,
        (true, CircuitKind.Gate) => part.ValueOhms is > 50e3 and < 2e6,
        (true, _) => part.ValueOhms is > 1e3 and < 500e3,
        _ => part.ValueOhms is > 90 and < 5e3,
    };

    private static IEnumerable<Part> Amplifiers(Random random, PartsCatalog all, CircuitKind kind) => kind switch
    {
        CircuitKind.Gate => Sample(random, 2, all.Inverters),
        CircuitKind.Counter => Sample(random, 2, all.Counters),
        CircuitKind.Port => Sample(random, 3, all.Ports),
        _ => Sample(random, 1, all.Transistors),
    };

    private static IEnumerable<T> Sample<T>(Random random, int count, IEnumerable<T> from)
    {
        T[] array = [.. from];
        random.Shuffle(array);
        return array.Take(count);
    }

    private static T Pick<T>(Random random, T[] from) => from[random.Next(from.Length)];
}
