using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// What keeps a crystal and an amplifier out together, before a circuit of them is looked at: stock, supply, temperature,
/// clock.
/// </summary>
internal static class PairHurdles
{
    private const double ClockStepVolts = 0.05;

    /// <summary>Lifts what can be lifted.</summary>
    /// <param name="lift">What was lifted before.</param>
    /// <param name="pair">The crystal and the amplifier.</param>
    public static Lift Of(Lift lift, Pairing pair)
    {
        foreach (Part part in new Part[] { pair.Crystal, pair.Amplifier })
        {
            if (part.Id != lift.Part.Id && part.Stock is { } stock && stock < lift.Requirement.Builds)
            {
                lift = PartHurdles.OverStock(lift, part.Id, stock);
            }
        }

        return OverClock(OverTemperature(OverSupply(lift, pair), pair), pair);
    }

    private static Lift OverSupply(Lift lift, Pairing pair)
    {
        Requirement wanted = lift.Requirement;
        if (IsSupplied(wanted, pair))
        {
            return lift;
        }

        (double low, double high) = pair.Amplifier switch
        {
            AmplifierPart inverter => Range(inverter),
            TransistorPart transistor => (0, transistor.VoltageMaxVolts ?? double.PositiveInfinity),
            _ => (double.NaN, double.NaN),
        };
        if (double.IsNaN(low))
        {
            return lift.Over(HurdleName.Supply, Volts(wanted), $"{pair.Amplifier.Id} has no figures at any supply", "", null);
        }

        double below = low - wanted.SupplyMinVolts;
        double above = wanted.SupplyMaxVolts - high;
        Requirement narrower = wanted with
        {
            SupplyMinVolts = Math.Clamp(wanted.SupplyMinVolts, low, high),
            SupplyMaxVolts = Math.Clamp(wanted.SupplyMaxVolts, low, high),
        };
        return lift.Over(
            HurdleName.Supply, Volts(wanted), $"{pair.Amplifier.Id} {Volts(low, high)}",
            Distance(below, above, Say.Volts, "starts", "ends"), IsSupplied(narrower, pair) ? narrower : null);
    }

    private static Lift OverTemperature(Lift lift, Pairing pair)
    {
        Requirement wanted = lift.Requirement;
        if (Specification.CoversTemperature(pair.Crystal, pair.Amplifier, wanted))
        {
            return lift;
        }

        (double? Low, double? High) other = pair.Amplifier switch
        {
            AmplifierPart inverter => (inverter.TemperatureMinCelsius, inverter.TemperatureMaxCelsius),
            TransistorPart transistor => (transistor.TemperatureMinCelsius, transistor.TemperatureMaxCelsius),
            _ => (null, null),
        };
        double low = Math.Max(pair.Crystal.TemperatureMinCelsius ?? -273, other.Low ?? -273);
        double high = Math.Min(pair.Crystal.TemperatureMaxCelsius ?? 1000, other.High ?? 1000);
        Part narrower = (pair.Crystal.TemperatureMinCelsius ?? -273) > wanted.TemperatureMinCelsius
            || (pair.Crystal.TemperatureMaxCelsius ?? 1000) < wanted.TemperatureMaxCelsius
            ? pair.Crystal
            : pair.Amplifier;
        Requirement? lifted = low > high ? null : wanted with
        {
            TemperatureMinCelsius = Math.Clamp(wanted.TemperatureMinCelsius, low, high),
            TemperatureMaxCelsius = Math.Clamp(wanted.TemperatureMaxCelsius, low, high),
        };
        return lift.Over(
            HurdleName.Temperature,
            $"{Say.Number(wanted.TemperatureMinCelsius)} to {Say.Celsius(wanted.TemperatureMaxCelsius)}",
            $"{narrower.Id} {Say.Number(low)} to {Say.Celsius(high)}",
            Distance(low - wanted.TemperatureMinCelsius, wanted.TemperatureMaxCelsius - high, value => Say.Number(value) + " K",
                "starts", "ends"),
            lifted);
    }

    private static Lift OverClock(Lift lift, Pairing pair)
    {
        Requirement wanted = lift.Requirement;
        double hertz = pair.Crystal.FrequencyHz;
        if (Specification.CoversClock(pair.Amplifier, hertz, wanted))
        {
            return lift;
        }

        if (pair.Amplifier is PortPart port && (hertz < port.FrequencyMinHz || hertz > port.FrequencyMaxHz))
        {
            return lift.Over(
                HurdleName.Clock, Say.Hertz(hertz),
                $"{port.Id} {Say.Hertz(port.FrequencyMinHz ?? 0)} to {Say.Hertz(port.FrequencyMaxHz ?? double.PositiveInfinity)}", "",
                    null);
        }

        double guaranteed = InverterModel.GuaranteedClockHz((AmplifierPart)pair.Amplifier, wanted.SupplyMinVolts) ?? 0;
        return lift.Over(
            HurdleName.Clock, $"{Say.Hertz(hertz)} at {Say.Volts(wanted.SupplyMinVolts)}",
            $"{pair.Amplifier.Id} guarantees {Say.Hertz(guaranteed)} there", $"{Say.Hertz(hertz - guaranteed)} beyond",
                Faster(wanted, pair));
    }

    // The lowest supply in twentieths of a volt, not above the highest one wanted, at which the clock is guaranteed.
    private static Requirement? Faster(Requirement wanted, Pairing pair)
    {
        for (int step = 1; ; step++)
        {
            double volts = Math.Round(wanted.SupplyMinVolts + step * ClockStepVolts, 6);
            if (volts > wanted.SupplyMaxVolts)
            {
                return null;
            }

            Requirement higher = wanted with { SupplyMinVolts = volts };
            if (Specification.CoversClock(pair.Amplifier, pair.Crystal.FrequencyHz, higher) && IsSupplied(higher, pair))
            {
                return higher;
            }
        }
    }

    private static bool IsSupplied(Requirement requirement, Pairing pair) =>
        CircuitTemplate.Create(requirement, pair.Kind, pair.Model, pair.Amplifier, double.PositiveInfinity) is not null;

    private static (double Low, double High) Range(AmplifierPart part)
    {
        double[] known =
        [
            .. part.Points.Select(point => point.SupplyVolts).Where(volts =>
                InverterModel.At(part, volts, DeviceStrength.Weakest) is not null
                    && InverterModel.At(part, volts, DeviceStrength.Strongest) is not null),
        ];
        return known.Length == 0 ? (double.NaN, double.NaN) : (known[0], known[^1]);
    }

    private static string Distance(double below, double above, Func<double, string> say, string low, string high) =>
        (below > 0, above > 0) switch
        {
            (true, true) => $"{low} {say(below)} too high, {high} {say(above)} too low",
            (true, false) => $"{low} {say(below)} too high",
            (false, true) => $"{high} {say(above)} too low",
            _ => "",
        };

    private static string Volts(Requirement wanted) => Volts(wanted.SupplyMinVolts, wanted.SupplyMaxVolts);

    private static string Volts(double low, double high) =>
        low == high ? Say.Volts(low) : low <= 0 ? $"up to {Say.Volts(high)}" : $"{Say.Number(low)} to {Say.Volts(high)}";
}
