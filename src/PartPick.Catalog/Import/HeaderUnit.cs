using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Tells units and currencies in headers from other words.</summary>
internal static class HeaderUnit
{
    private static readonly Dimension[] Measured =
    [
        Dimension.Frequency, Dimension.Capacitance, Dimension.Resistance, Dimension.Relative, Dimension.Power, Dimension.Voltage,
        Dimension.Current, Dimension.Temperature, Dimension.RelativePerKelvin, Dimension.RelativePerSquareKelvin,
        Dimension.Transconductance, Dimension.Time,
    ];

    /// <summary>Whether a text is a unit of something that parts have.</summary>
    public static bool IsUnit(string text) => text.Length is > 0 and < 14 && !char.IsAsciiDigit(text[0])
        && (text is "pcs" or "k" or "K" || Currencies.IsName(text)
            || Array.Exists(Measured, dimension => UnitSpelling.PowerOf(text, dimension) is not null));
}
