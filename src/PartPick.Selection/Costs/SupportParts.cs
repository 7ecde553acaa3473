using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// The parts that a circuit cannot do without and that the ranking does not vary: feedback resistor, decoupling capacitor,
/// the follower's output coupling capacitor. Null where the catalogue holds none that would do.
/// </summary>
/// <param name="Feedback">Feedback resistor of gate, counter and port.</param>
/// <param name="Decoupling">Decoupling capacitor at the supply.</param>
/// <param name="Coupling">Output coupling capacitor of the follower.</param>
public sealed record SupportParts(ResistorPart? Feedback, CapacitorPart? Decoupling, CapacitorPart? Coupling)
{
    private const double FeedbackReach = 5;

    /// <summary>Chooses the support parts of a circuit at a crystal frequency.</summary>
    /// <param name="kind">The circuit.</param>
    /// <param name="crystalHz">Crystal frequency in hertz.</param>
    /// <param name="market">What can be bought.</param>
    public static SupportParts For(CircuitKind kind, double crystalHz, Market market)
    {
        ArgumentNullException.ThrowIfNull(market);
        CapacitorPart? decoupling = kind == CircuitKind.Port ? null : Cheapest(market, IsDecoupling);
        return kind == CircuitKind.Follower
            ? new SupportParts(null, decoupling, Cheapest(market, IsCoupling))
            : new SupportParts(Nearest(market, UsualFeedbackOhms(crystalHz)), decoupling, null);
    }

    /// <summary>
    /// The usual feedback resistance in ohms: 10 MΩ for tuning forks, falling with frequency (ST AN2867, Table 3: 10–25 MΩ at
    /// 32.768 kHz, 5–10 at 1 MHz, 1–5 at 10 MHz, 0.47–5 at 20 MHz; 1 MΩ at 4 MHz is common practice).
    /// </summary>
    public static double UsualFeedbackOhms(double crystalHz) => crystalHz switch
    {
        < 100e3 => 10e6,
        < 3e6 => 4.7e6,
        _ => 1e6,
    };

    /// <summary>Whether a resistor can be the feedback resistor: within a factor of five of the usual one.</summary>
    /// <param name="part">The resistor.</param>
    /// <param name="crystalHz">Crystal frequency in hertz.</param>
    public static bool IsFeedback(ResistorPart part, double crystalHz)
    {
        ArgumentNullException.ThrowIfNull(part);
        return IsNear(part, UsualFeedbackOhms(crystalHz));
    }

    /// <summary>Whether a capacitor can decouple the supply: 100 nF to 1 µF, of a dielectric that keeps its value.</summary>
    public static bool IsDecoupling(CapacitorPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return IsBetween(part, 100e-9, 1e-6);
    }

    /// <summary>Whether a capacitor can couple a follower's output: 10 to 100 nF, of a dielectric that keeps its value.</summary>
    public static bool IsCoupling(CapacitorPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return IsBetween(part, 10e-9, 100e-9);
    }

    private static ResistorPart? Nearest(Market market, double ohms)
    {
        ResistorPart? best = market.Resistors
            .OrderBy(part => Math.Abs(Math.Log(part.ValueOhms / ohms)))
            .ThenBy(part => market.UnitCost(part, 1))
            .ThenBy(part => part.Id, StringComparer.Ordinal)
            .FirstOrDefault();
        return best is not null && IsNear(best, ohms) ? best : null;
    }

    private static bool IsNear(ResistorPart part, double ohms) => Math.Abs(Math.Log(part.ValueOhms / ohms)) <= Math.Log(FeedbackReach);

    private static bool IsBetween(CapacitorPart part, double leastFarads, double mostFarads) =>
        part.ValueFarads >= leastFarads * 0.999 && part.ValueFarads <= mostFarads * 1.001 && HoldsItsValue(part);

    // EIA-198: the third letters T, U and V stand for a loss of a third to four fifths over temperature.
    private static bool HoldsItsValue(CapacitorPart part) => part.Dielectric is not [.., 'T' or 'U' or 'V'];

    private static CapacitorPart? Cheapest(Market market, Func<CapacitorPart, bool> serves) => market.Capacitors
        .Where(serves)
        .OrderBy(part => market.UnitCost(part, 1))
        .ThenBy(part => part.ValueFarads)
        .ThenBy(part => part.Id, StringComparer.Ordinal)
        .FirstOrDefault();
}
