using PartPick.Catalog;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>Small worlds of all circuits in turn, half of them with something that an order or a bound could trip over.</summary>
internal static class OddWorld
{
    private const int FirstSeed = 1000;

    /// <summary>Draws a world; the same number always draws the same.</summary>
    /// <param name="number">From zero; circuits and oddities go round.</param>
    public static SmallWorld Draw(int number)
    {
        var kind = (CircuitKind)(number % 4);
        var random = new Random(number);
        SmallWorld world = SmallWorld.Draw(FirstSeed + number, kind, capacitors: 2 + random.Next(2), damping: 1 + random.Next(2));
        IEnumerable<Part> parts = (number / 4 % 10) switch
        {
            0 => EqualCosts(world.Catalog.All),
            1 => Twins(world.Catalog.All, samePrice: false),
            2 => Twins(world.Catalog.All, samePrice: true),
            3 => WithoutAKind(world, random),
            4 => OneOfEach(world.Catalog.All),
            _ => world.Catalog.All,
        };
        return new SmallWorld(number % 3 == 0 ? world.Requirement : Easier(world.Requirement, kind), new PartsCatalog(parts));
    }

    /// <summary>What is odd about a world, for the names of tests.</summary>
    public static string Oddity(int number) => (number / 4 % 10) switch
    {
        0 => "equal costs",
        1 => "equal errors",
        2 => "equal errors and costs",
        3 => "an empty kind",
        4 => "single parts",
        _ => "nothing odd",
    };

    // Few of the values drawn load their crystal rightly: in two worlds of three more of them may be fit.
    private static Requirement Easier(Requirement requirement, CircuitKind kind) => requirement with
    {
        BudgetRatio = requirement.BudgetRatio * 3,
        Margin = 2,
        SupplyMinVolts = kind == CircuitKind.Port ? 3.2 : 4.75,
        SupplyMaxVolts = kind == CircuitKind.Port ? 3.4 : 5.25,
        CostLimit = null,
        StartUpTimeSeconds = null,
    };

    private static IEnumerable<Part> EqualCosts(IEnumerable<Part> parts) =>
        parts.Select(part => part with { Offer = new Offer("EUR", [new PriceBreak(1, 0.10m)], 1, 1) });

    // Each crystal and small capacitor a second time: the same figures under another id.
    private static IEnumerable<Part> Twins(IEnumerable<Part> parts, bool samePrice) => parts.SelectMany(part =>
        part is CrystalPart or CapacitorPart { ValueFarads: < 1e-9 }
            ? [part, part with { Id = part.Id + "-TWIN", Offer = samePrice ? part.Offer : Dearer(part.Offer) }]
            : new[] { part });

    private static Offer Dearer(Offer offer) =>
        offer with { Prices = [.. offer.Prices.Select(price => price with { UnitPrice = price.UnitPrice * 1.25m })] };

    private static IEnumerable<Part> WithoutAKind(SmallWorld world, Random random)
    {
        PartsCatalog catalog = world.Catalog;
        IEnumerable<Part> gone = random.Next(4) switch
        {
            0 => catalog.Crystals,
            1 => catalog.Capacitors,
            2 => catalog.Resistors,
            _ => catalog.All.Where(part => part is AmplifierPart or TransistorPart),
        };
        return catalog.All.Except(gone);
    }

    // Crystal, amplifier and load capacitor once; the resistors and large capacitors that a circuit cannot do without stay.
    private static IEnumerable<Part> OneOfEach(IEnumerable<Part> parts) => parts
        .GroupBy(part => part switch
        {
            CrystalPart => "crystal",
            AmplifierPart or TransistorPart => "amplifier",
            CapacitorPart { ValueFarads: < 1e-9 } => "capacitor",
            _ => part.Id,
        })
        .Select(group => group.First());
}
