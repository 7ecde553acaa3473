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
        CapacitorPart? decoupling = kind == CircuitKind.Port ? null : Cheapest(market, 100e-9, 1e-6);
        return kind == CircuitKind.Follower
            ? new SupportParts(null, decoupling, Cheapest(market, 10e-9, 100e-9))
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

    private static ResistorPart? Nearest(Market market, double ohms)
    {
        ResistorPart? best = market.Resistors
            .OrderBy(part => Math.Abs(Math.Log(part.ValueOhms / ohms)))
            .ThenBy(part => market.UnitCost(part, 1))
            .ThenBy(part => part.Id, StringComparer.Ordinal)
            .FirstOrDefault();
        return best is not null && Math.Abs(Math.Log(best.ValueOhms / ohms)) <= Math.Log(FeedbackReach) ? best : null;
    }

    // EIA-198: the third letters T, U and V stand for a loss of a third to four fifths over temperature.
    private static bool HoldsItsValue(CapacitorPart part) => part.Dielectric is not [.., 'T' or 'U' or 'V'];

    private static CapacitorPart? Cheapest(Market market, double leastFarads, double mostFarads) => market.Capacitors
        .Where(part => part.ValueFarads >= leastFarads * 0.999 && part.ValueFarads <= mostFarads * 1.001)
        .Where(HoldsItsValue)
        .OrderBy(part => market.UnitCost(part, 1))
        .ThenBy(part => part.ValueFarads)
        .ThenBy(part => part.Id, StringComparer.Ordinal)
        .FirstOrDefault();
}
