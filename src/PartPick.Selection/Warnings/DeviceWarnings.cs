using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Warnings about a device of the catalogue outside what is specified for it.</summary>
internal static class DeviceWarnings
{
    public static IEnumerable<string> Of(CircuitDescription description) => description.Amplifier switch
    {
        AmplifierPart part => OfInverter(description, part),
        TransistorPart part => OfTransistor(description, part),
        _ => [],
    };

    private static IEnumerable<string> OfInverter(CircuitDescription description, AmplifierPart part)
    {
        double supply = description.Circuit.SupplyVolts;
        double lowest = part.Points[0].SupplyVolts;
        double highest = part.Points[^1].SupplyVolts;
        if (supply < lowest || supply > highest)
        {
            yield return $"The supply of {Say.Volts(supply)} is outside the {Say.Volts(lowest)} to {Say.Volts(highest)} "
                + $"for which {part.Id} is specified.";
        }
        else if (Clock(part, supply, description.Circuit.Crystal.NominalHz) is { } clock)
        {
            yield return clock;
        }

        if (part is PortPart port && Outside(description.Circuit.Crystal.NominalHz, port.FrequencyMinHz, port.FrequencyMaxHz))
        {
            yield return $"The crystal's {Say.Hertz(description.Circuit.Crystal.NominalHz)} is outside the port's "
                + $"{Say.Hertz(port.FrequencyMinHz ?? 0)} to {Say.Hertz(port.FrequencyMaxHz ?? double.PositiveInfinity)}.";
        }

        if (Temperature(description, part.Id, part.TemperatureMinCelsius, part.TemperatureMaxCelsius) is { } temperature)
        {
            yield return temperature;
        }
    }

    private static IEnumerable<string> OfTransistor(CircuitDescription description, TransistorPart part)
    {
        if (part.VoltageMaxVolts is { } most && description.Circuit.SupplyVolts > most)
        {
            yield return $"The supply of {Say.Volts(description.Circuit.SupplyVolts)} is above the {Say.Volts(most)} that {part.Id} bears.";
        }

        if (Temperature(description, part.Id, part.TemperatureMinCelsius, part.TemperatureMaxCelsius) is { } temperature)
        {
            yield return temperature;
        }
    }

    private static string? Clock(AmplifierPart part, double supply, double hertz)
    {
        double? guaranteed = InverterModel.GuaranteedClockHz(part, supply);
        double? typical = InverterModel.TypicalClockHz(part, supply);
        if (guaranteed is { } least && hertz > least)
        {
            string reach = typical is { } usual && hertz <= usual
                ? $"only typical devices reach it ({Say.Hertz(usual)})"
                : typical is { } known ? $"even typical devices reach only {Say.Hertz(known)}" : "no typical figure is stated";
            return $"The crystal's {Say.Hertz(hertz)} is above the {Say.Hertz(least)} that {part.Id} guarantees at "
                + $"{Say.Volts(supply)}; {reach}.";
        }

        return guaranteed is null && typical is { } only && hertz > only
            ? $"The crystal's {Say.Hertz(hertz)} is above the {Say.Hertz(only)} that is typical of {part.Id} at {Say.Volts(supply)}."
            : null;
    }

    private static string? Temperature(CircuitDescription description, string id, double? lowest, double? highest) =>
        Outside(description.Circuit.TemperatureCelsius, lowest, highest)
            ? $"{Say.Celsius(description.Circuit.TemperatureCelsius)} is outside the {Say.Celsius(lowest ?? -273.15)} to "
                + $"{Say.Celsius(highest ?? double.PositiveInfinity)} for which {id} is specified."
            : null;

    private static bool Outside(double value, double? lowest, double? highest) => value < lowest || value > highest;
}
