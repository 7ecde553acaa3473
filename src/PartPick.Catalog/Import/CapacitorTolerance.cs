using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>A capacitor's tolerance: a ratio, a capacitance, or a letter.</summary>
internal static class CapacitorTolerance
{
    // Letters of IEC 60062; F and G are left out, as below 10 pF they mean a capacitance and above it a ratio.
    private static readonly Dictionary<string, (double Value, bool Absolute)> Letters = new(StringComparer.Ordinal)
    {
        ["B"] = (0.1e-12, true), ["C"] = (0.25e-12, true), ["D"] = (0.5e-12, true),
        ["J"] = (0.05, false), ["K"] = (0.1, false), ["M"] = (0.2, false),
    };

    /// <summary>The tolerance to both sides; null where it cannot be read with certainty.</summary>
    public static (double Value, bool Absolute)? Read(string cell, string unit, NumberNotation notation)
    {
        if (Letters.TryGetValue(cell, out (double Value, bool Absolute) letter))
        {
            return letter;
        }

        string text = CellNumber.HasNoUnit(cell) ? $"{cell} {(unit.Length > 0 ? unit : "%")}" : cell;
        Result<double> ratio = CellNumber.Read(text, Dimension.Relative, ColumnUse.NoPlainNumbers, notation, false);
        if (ratio.IsOk)
        {
            return Plausible.Holds(PartKind.Capacitor, "tolerance", ratio.Value) ? (ratio.Value, false) : null;
        }

        Result<double> farads = CellNumber.Read(text, Dimension.Capacitance, ColumnUse.NoPlainNumbers, notation, false);
        return farads.IsOk && Plausible.Holds(PartKind.Capacitor, "toleranceAbsolute", farads.Value) ? (farads.Value, true) : null;
    }
}
