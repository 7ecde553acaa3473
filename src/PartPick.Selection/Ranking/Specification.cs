using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Whether parts are specified where a requirement uses them. A guaranteed limit is never replaced by a typical one.</summary>
public static class Specification
{
    /// <summary>Whether crystal and amplifier are specified over the required temperatures; what states no range covers all.</summary>
    public static bool CoversTemperature(CrystalPart crystal, Part amplifier, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(crystal);
        (double? low, double? high) = amplifier switch
        {
            AmplifierPart inverter => (inverter.TemperatureMinCelsius, inverter.TemperatureMaxCelsius),
            TransistorPart transistor => (transistor.TemperatureMinCelsius, transistor.TemperatureMaxCelsius),
            _ => (null, null),
        };
        return Covers(crystal.TemperatureMinCelsius, crystal.TemperatureMaxCelsius, requirement) && Covers(low, high, requirement);
    }

    /// <summary>Whether the amplifier is guaranteed to clock at a crystal frequency, at the lowest supply and in range.</summary>
    public static bool CoversClock(Part amplifier, double crystalHz, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        if (amplifier is PortPart port
            && (crystalHz < port.FrequencyMinHz || crystalHz > port.FrequencyMaxHz))
        {
            return false;
        }

        return amplifier is not AmplifierPart inverter
            || InverterModel.GuaranteedClockHz(inverter, requirement.SupplyMinVolts) is not { } clock
            || crystalHz <= clock;
    }

    /// <summary>
    /// Whether a crystal can run at a frequency within a budget: whatever the load, it runs between its series and its
    /// antiresonant frequency.
    /// </summary>
    /// <param name="model">The crystal.</param>
    /// <param name="targetHz">Wanted frequency at the crystal in hertz.</param>
    /// <param name="budgetRatio">Largest frequency error as a ratio.</param>
    public static bool ReachesFrequency(CrystalModel model, double targetHz, double budgetRatio)
    {
        ArgumentNullException.ThrowIfNull(model);
        double series = model.Crystal.SeriesHz;
        double highest = series * Math.Sqrt(1 + model.Crystal.MotionalFarads / model.Crystal.ShuntFarads);
        return targetHz * (1 + budgetRatio) >= series && targetHz * (1 - budgetRatio) <= highest;
    }

    private static bool Covers(double? low, double? high, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return (low ?? double.NegativeInfinity) <= requirement.TemperatureMinCelsius
            && (high ?? double.PositiveInfinity) >= requirement.TemperatureMaxCelsius;
    }
}
