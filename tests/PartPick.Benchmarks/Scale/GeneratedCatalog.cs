using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Benchmarks;

/// <summary>
/// A catalogue of any size whose parts are near built-in ones: each takes one of them and moves its figures and price by usual steps.
/// The same size and seed always give the same parts.
/// </summary>
internal sealed class GeneratedCatalog
{
    private const int Seed = 20260301;
    private readonly Random _random;

    private GeneratedCatalog(int seed) => _random = new Random(seed);

    /// <summary>
    /// What is wanted of it: one frequency for every circuit. Gates, ports and followers run at it; counters at 16 times.
    /// </summary>
    public static Requirement Wanted { get; } = new() { Name = "1.024 MHz", OutputHz = 1.024e6 };

    /// <summary>
    /// Of 20 000 crystals, so many are of the frequencies that <see cref="Wanted"/> can use; the rest is spread evenly over the others.
    /// </summary>
    private static readonly (double Hertz, int Of20000)[] Used = [(1.024e6, 150), (16.384e6, 220), (32.768e6, 30)];

    /// <summary>Generates one.</summary>
    /// <param name="size">How many parts.</param>
    public static PartsCatalog Of(ScaleSize size)
    {
        PartsCatalog near = PartsCatalog.BuiltIn();
        // Each kind has a seed of its own: a longer list of one leaves the others as they are.
        IEnumerable<Part> parts =
        [
            .. new GeneratedCatalog(Seed).Crystals(near, size.Crystals),
            .. new GeneratedCatalog(Seed + 1).Capacitors(near, size.Capacitors),
            .. new GeneratedCatalog(Seed + 2).Amplifiers(near, size.Amplifiers),
            .. new GeneratedCatalog(Seed + 3).Resistors(near, size.Resistors),
        ];
        return new PartsCatalog(parts);
    }

    private IEnumerable<Part> Crystals(PartsCatalog near, int count)
    {
        var byFrequency = near.Crystals.GroupBy(part => part.FrequencyHz).ToDictionary(group => group.Key, group => group.ToArray());
        double[] others = [.. byFrequency.Keys.Except(Used.Select(one => one.Hertz)).Order()];
        var frequencies = Used.SelectMany(one => Enumerable.Repeat(one.Hertz, (int)Math.Ceiling(one.Of20000 * count / 20_000.0))).ToList();
        frequencies.AddRange(Enumerable.Range(0, count - frequencies.Count).Select(i => others[i % others.Length]));
        var vary = new PartVariation(_random);
        return frequencies.Select((hertz, i) => vary.Crystal(Any(byFrequency[hertz]), PartVariation.Id("X", i)));
    }

    private IEnumerable<Part> Capacitors(PartsCatalog near, int count)
    {
        var vary = new PartVariation(_random);
        return InTurn(near.Capacitors, count).Select((part, i) => vary.Capacitor(part, PartVariation.Id("C", i)));
    }

    private IEnumerable<Part> Resistors(PartsCatalog near, int count)
    {
        var vary = new PartVariation(_random);
        return InTurn(near.Resistors, count).Select((part, i) => vary.Resistor(part, PartVariation.Id("R", i)));
    }

    // Two fifths inverters, a quarter transistors, a quarter ports, the rest counters.
    private IEnumerable<Part> Amplifiers(PartsCatalog near, int count)
    {
        var vary = new PartVariation(_random);
        (int inverters, int transistors, int ports) = (count * 2 / 5, count / 4, count / 4);
        return
        [
            .. InTurn(near.Inverters, inverters).Select((part, i) => vary.Inverter(part, PartVariation.Id("INV", i))),
            .. InTurn(near.Transistors, transistors).Select((part, i) => vary.Transistor(part, PartVariation.Id("TR", i))),
            .. InTurn(near.Ports, ports).Select((part, i) => vary.Port(part, PartVariation.Id("MCU", i))),
            .. InTurn(near.Counters, count - inverters - transistors - ports)
                .Select((part, i) => vary.Counter(part, PartVariation.Id("CNT", i))),
        ];
    }

    // Every built-in part before any a second time, so that each value and kind is there.
    private IEnumerable<T> InTurn<T>(IEnumerable<T> parts, int count)
    {
        T[] order = [.. parts];
        _random.Shuffle(order);
        return Enumerable.Range(0, count).Select(i => order[i % order.Length]);
    }

    private T Any<T>(T[] from) => from[_random.Next(from.Length)];
}
