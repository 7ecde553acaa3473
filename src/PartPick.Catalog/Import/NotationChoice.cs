using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Finds the decimal sign of columns from all their cells.</summary>
internal static class NotationChoice
{
    /// <summary>What the cells of a column prove by themselves; unknown where they prove nothing, or both.</summary>
    public static NumberNotation Proved(IEnumerable<string> numbers, bool whole)
    {
        (bool point, bool comma) = (false, false);
        foreach (string cell in numbers)
        {
            NumberEvidence evidence = CellNumber.Weigh(cell);
            point |= evidence == NumberEvidence.Point || (whole && evidence == NumberEvidence.CommaOrThousands);
            comma |= evidence == NumberEvidence.Comma
                || (whole && evidence == NumberEvidence.PointOrThousands && !cell.Contains("000", StringComparison.Ordinal));
        }

        return point == comma ? NumberNotation.Unknown : point ? NumberNotation.Point : NumberNotation.Comma;
    }

    /// <summary>Whether some cells show a decimal point and others a decimal comma.</summary>
    public static bool IsMixed(IEnumerable<string> numbers)
    {
        NumberEvidence[] all = [.. numbers.Select(CellNumber.Weigh)];
        return all.Contains(NumberEvidence.Point) && all.Contains(NumberEvidence.Comma);
    }

    /// <summary>Whether the cells have numbers that can be read in two ways, and with which sign.</summary>
    public static (bool Comma, bool Point) Open(IEnumerable<string> numbers)
    {
        (bool comma, bool point) = (false, false);
        foreach (string cell in numbers)
        {
            NumberEvidence evidence = CellNumber.Weigh(cell);
            comma |= evidence == NumberEvidence.CommaOrThousands;
            point |= evidence == NumberEvidence.PointOrThousands;
        }

        return (comma, point);
    }

    /// <summary>The notation with which alone the cells are figures of a part; unknown where both or neither does.</summary>
    public static NumberNotation Plausibly(PartKind kind, string field, Dimension dimension, int? power, IReadOnlyList<string> cells)
    {
        if (Plausible.Of(kind, field) is null || cells.Count == 0)
        {
            return NumberNotation.Unknown;
        }

        bool Fits(NumberNotation notation)
        {
            int unit = power ?? UnitChoice.For(kind, field, dimension, notation, cells).Power;
            return cells.All(cell => CellNumber.Read(cell, dimension, unit, notation, true) is { IsOk: true } read
                && Plausible.Holds(kind, field, Math.Abs(read.Value)));
        }

        (bool point, bool comma) = (Fits(NumberNotation.Point), Fits(NumberNotation.Comma));
        return point == comma ? NumberNotation.Unknown : point ? NumberNotation.Point : NumberNotation.Comma;
    }
}
