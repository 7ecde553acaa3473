using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>
/// Finds the unit of numbers that have none, where the header names none either: the only one with which they are figures
/// of a part.
/// </summary>
internal static class UnitChoice
{
    /// <summary>
    /// The power of ten and its unit, and why; <see cref="ColumnUse.NoPlainNumbers"/> where none or more than one is possible.
    /// </summary>
    public static (int Power, string Unit, string Why) For(
        PartKind kind, string field, Dimension dimension, NumberNotation notation, IReadOnlyList<string> cells)
    {
        (int Power, string Unit)[] units = Units(dimension);
        if (units.Length == 1)
        {
            return (units[0].Power, units[0].Unit, "");
        }

        string[] plain = [.. cells.Where(CellNumber.HasNoUnit)];
        if (plain.Length == 0)
        {
            return (ColumnUse.NoPlainNumbers, "", "");
        }

        (int Power, string Unit)[] possible =
        [
            .. units.Where(unit => plain.All(cell =>
                CellNumber.Read(cell, dimension, unit.Power, notation, false) is { IsOk: true } read
                && (read.Value == 0 || Plausible.Holds(kind, field, read.Value)))),
        ];
        if (possible.Length > 1 && field == "frequency" && plain.All(cell => CellText.Bare(cell).TrimEnd('0').TrimEnd('.') == "32768"))
        {
            return (0, "Hz", "; no unit stated, taken as Hz for clock crystals");
        }

        return possible.Length == 1
            ? (possible[0].Power, possible[0].Unit, $"; no unit stated, taken as {possible[0].Unit}, the only one that fits its numbers")
            : (ColumnUse.NoPlainNumbers, "", possible.Length == 0
                ? "; no unit stated, and none fits its numbers"
                : $"; no unit stated, {string.Join(" or ", possible.Select(each => each.Unit))} possible: state it");
    }

    /// <summary>The units in which a dimension is written without naming it.</summary>
    public static (int Power, string Unit)[] Units(Dimension dimension) => dimension switch
    {
        Dimension.Frequency => [(0, "Hz"), (3, "kHz"), (6, "MHz")],
        Dimension.Capacitance => [(0, "F"), (-15, "fF"), (-12, "pF"), (-9, "nF"), (-6, "uF")],
        Dimension.Power => [(0, "W"), (-3, "mW"), (-6, "uW")],
        Dimension.Relative => [(0, "ratio"), (-2, "%"), (-6, "ppm")],
        Dimension.Current => [(0, "A"), (-3, "mA")],
        Dimension.RelativePerKelvin => [(0, "1/K"), (-6, "ppm/K")],
        Dimension.RelativePerSquareKelvin => [(0, "1/K2"), (-6, "ppm/K2")],
        Dimension.Transconductance => [(0, "S"), (-3, "mS"), (-6, "uS")],
        Dimension.Time => [(0, "s"), (-9, "ns"), (-12, "ps")],
        _ => [(0, "")],
    };
}
