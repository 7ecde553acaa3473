using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Makes the values of the sentence that are the ends of a range. An end that is moved past the other one takes it along, so
/// that either may be typed first.
/// </summary>
internal static class RangeFields
{
    private const double MostVolts = 100;
    private const double LeastCelsius = -273.15;
    private const double MostCelsius = 300;

    public static TypedField SupplyMin() => End(
        "lowest supply", "above 0 and up to 100 V", Dimension.Voltage, r => r.SupplyMinVolts,
        (r, v) => r with { SupplyMinVolts = v, SupplyMaxVolts = Math.Max(v, r.SupplyMaxVolts) },
        InVolts, r => r.SupplyMaxVolts);

    public static TypedField SupplyMax() => End(
        "highest supply", "above 0 and up to 100 V", Dimension.Voltage, r => r.SupplyMaxVolts,
        (r, v) => r with { SupplyMaxVolts = v, SupplyMinVolts = Math.Min(v, r.SupplyMinVolts) },
        InVolts);

    public static TypedField TemperatureMin() => End(
        "lowest temperature", "-273.15 to 300 °C", Dimension.Temperature, r => r.TemperatureMinCelsius,
        (r, v) => r with { TemperatureMinCelsius = v, TemperatureMaxCelsius = Math.Max(v, r.TemperatureMaxCelsius) },
        InCelsius, r => r.TemperatureMaxCelsius);

    public static TypedField TemperatureMax() => End(
        "highest temperature", "-273.15 to 300 °C", Dimension.Temperature, r => r.TemperatureMaxCelsius,
        (r, v) => r with { TemperatureMaxCelsius = v, TemperatureMinCelsius = Math.Min(v, r.TemperatureMinCelsius) },
        InCelsius);

    private static string? InVolts(double volts) => volts is > 0 and <= MostVolts ? null : "is out of range";

    private static string? InCelsius(double celsius) =>
        celsius is >= LeastCelsius and <= MostCelsius ? null : "is out of range";

    // The lower end leaves out the unit that the upper one, right behind it, has too.
    private static TypedField End(
        string name,
        string fits,
        Dimension dimension,
        Func<Requirement, double> get,
        Func<Requirement, double, Requirement> set,
        Func<double, string?> check,
        Func<Requirement, double>? upper = null)
    {
        return TypedFields.Value(name, fits, dimension, get, set, (_, v) => check(v), upper is null ? null : Show);

        string Show(Requirement requirement)
        {
            string text = ValueText.FormatExact(get(requirement), dimension);
            string other = ValueText.FormatExact(upper(requirement), dimension);
            int space = text.IndexOf(' ', StringComparison.Ordinal);
            return space > 0 && other.EndsWith(text[space..], StringComparison.Ordinal) ? text[..space] : text;
        }
    }
}
