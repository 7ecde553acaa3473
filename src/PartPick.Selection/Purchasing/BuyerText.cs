using System.Globalization;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>What a part is, in the words of an order: kind, value, tolerance, dielectric or load, holder, package.</summary>
public static class BuyerText
{
    /// <summary>The description.</summary>
    /// <param name="part">The part.</param>
    public static string Of(Part part) => string.Join(", ", (part switch
    {
        CrystalPart crystal => Crystal(crystal),
        CapacitorPart capacitor => Capacitor(capacitor),
        ResistorPart resistor => Resistor(resistor),
        InverterPart => Device(part, "inverter"),
        CounterPart => Device(part, "counter"),
        PortPart => Device(part, "microcontroller"),
        TransistorPart => Device(part, "transistor"),
        _ => [part.Description],
    }).Append(part.Package ?? "").Where(piece => piece.Length > 0));

    private static IEnumerable<string> Crystal(CrystalPart part)
    {
        yield return "Quartz crystal " + ValueText.FormatExact(part.FrequencyHz, Dimension.Frequency);
        yield return part.Cut == CrystalCut.Fork ? "tuning fork" : part.Cut + " cut";
        yield return part.Overtone == 1 ? "fundamental" : string.Create(CultureInfo.InvariantCulture, $"overtone {part.Overtone}");
        yield return part.LoadFarads is { } load ? "load " + Say.Farads(load) : "series resonance";
        if (part.ToleranceRatio is { } tolerance)
        {
            yield return $"±{Ratio(tolerance)} at 25 °C";
        }

        if (part.StabilityRatio is { } stability)
        {
            yield return "±" + Ratio(stability) + (part is { TemperatureMinCelsius: { } low, TemperatureMaxCelsius: { } high }
                ? string.Create(CultureInfo.InvariantCulture, $" from {low} to {high} °C")
                : " over temperature");
        }

        if (part.ResistanceOhms is { } resistance)
        {
            yield return "at most " + Say.Ohms(resistance);
        }

        if (part.DriveLevelWatts is { } drive)
        {
            yield return "drive level " + Say.Watts(drive);
        }

        yield return part.Holder is { Length: > 0 } holder ? "holder " + holder : "";
    }

    private static IEnumerable<string> Capacitor(CapacitorPart part)
    {
        string tolerance = part.ToleranceRatio is { } ratio ? " ±" + Ratio(ratio)
            : part.ToleranceFarads is { } farads ? " ±" + Say.Farads(farads)
            : "";
        yield return $"Capacitor {ValueText.FormatExact(part.ValueFarads, Dimension.Capacitance)}{tolerance}";
        yield return part.Dielectric ?? "";
        yield return part.VoltageVolts is { } volts ? Say.Volts(volts) : "";
    }

    private static IEnumerable<string> Resistor(ResistorPart part) =>
        [$"Resistor {ValueText.FormatExact(part.ValueOhms, Dimension.Resistance)} ±{Ratio(part.ToleranceRatio)}"];

    // What a device is stands in its description, at least beside the word for its kind.
    private static IEnumerable<string> Device(Part part, string word) =>
        part.Description.Contains(word, StringComparison.OrdinalIgnoreCase)
            ? [char.ToUpperInvariant(part.Description[0]) + part.Description[1..]]
            : [char.ToUpperInvariant(word[0]) + word[1..], part.Description];

    // From a tenth of a per cent on, per cent are the trade's unit.
    private static string Ratio(double ratio) => ratio >= 1e-3
        ? (ratio * 100).ToString("0.###", CultureInfo.InvariantCulture) + " %"
        : (ratio * 1e6).ToString("0.###", CultureInfo.InvariantCulture) + " ppm";
}
