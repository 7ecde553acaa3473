using PartPick.Physics;

namespace PartPick.Selection;

/// <summary>Warnings about a crystal used otherwise than it is stated.</summary>
internal static class CrystalWarnings
{
    /// <summary>Share by which the load may differ from the rated one without a word.</summary>
    private const double UsualRatio = 0.1;

    public static IEnumerable<string> Of(CircuitDescription description, OscillatorResult result)
    {
        if (result.Steady is { } steady && AwayFromLoad(description.Circuit.Crystal, steady) is { } away)
        {
            yield return away;
        }

        double celsius = description.Circuit.TemperatureCelsius;
        if (description.Crystal is { } part && (celsius < part.TemperatureMinCelsius || celsius > part.TemperatureMaxCelsius))
        {
            yield return $"{Say.Celsius(celsius)} is outside the {Say.Celsius(part.TemperatureMinCelsius ?? -273.15)} to "
                + $"{Say.Celsius(part.TemperatureMaxCelsius ?? double.PositiveInfinity)} for which {part.Id} is specified.";
        }
    }

    private static string? AwayFromLoad(Crystal crystal, SteadyState steady)
    {
        double shift = (steady.FrequencyHz - crystal.NominalHz) / crystal.NominalHz;
        string seen = double.IsFinite(steady.LoadFarads) && steady.LoadFarads > 0
            ? $"sees {Say.Farads(steady.LoadFarads)} here, where the slope is "
                + Say.SignedPpm(crystal.TrimSensitivityPerFarad(steady.LoadFarads) * 1e-12) + "/pF"
            : "runs at or below its series resonance here";
        if (crystal.LoadFarads is not { } rated)
        {
            return $"The crystal is stated at series resonance and {seen}: it runs {Say.SignedPpm(shift)} from its nominal frequency.";
        }

        return Math.Abs(steady.LoadFarads - rated) <= UsualRatio * rated
            ? null
            : $"The crystal is stated at a load of {Say.Farads(rated)} and {seen}: it runs {Say.SignedPpm(shift)} "
                + "from its nominal frequency.";
    }
}
