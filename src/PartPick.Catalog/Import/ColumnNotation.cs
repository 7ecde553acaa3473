using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Decides the decimal sign of each column, and says by what.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="sample">The rows that speak.</param>
/// <param name="stated">What the user stated; unknown for nothing.</param>
internal sealed class ColumnNotation(PartKind kind, ColumnSample sample, NumberNotation stated)
{
    /// <summary>The sign that the columns of a file prove; unknown where they prove none, or both.</summary>
    public NumberNotation OfFile(IEnumerable<ColumnUse> uses)
    {
        if (stated != NumberNotation.Unknown)
        {
            return stated;
        }

        var proved = uses.Where(use => use.Field is not null && ImportFields.IsNumeric(kind, use.Field))
            .Select(use => NotationChoice.Proved(sample.Numbers(use), IsCount(use.Field!)))
            .Where(notation => notation != NumberNotation.Unknown).Distinct().ToList();
        return proved.Count == 1 ? proved[0] : NumberNotation.Unknown;
    }

    /// <summary>The sign of a column, and how it was found.</summary>
    public (NumberNotation Notation, string How) Of(ColumnUse use, int? power, NumberNotation file)
    {
        if (stated != NumberNotation.Unknown)
        {
            return (stated, $"; decimal {Word(stated)} as stated");
        }

        string[] numbers = [.. sample.Numbers(use)];
        (bool comma, bool point) = NotationChoice.Open(numbers);
        NumberNotation proved = NotationChoice.Proved(numbers, IsCount(use.Field!));
        if (proved != NumberNotation.Unknown)
        {
            return (proved, comma || point || proved == NumberNotation.Comma ? $"; decimal {Word(proved)}, as its other cells show" : "");
        }

        if (NotationChoice.IsMixed(numbers))
        {
            return (
                NumberNotation.Unknown, "; its cells show both a decimal point and a decimal comma: what can be read in two ways is rejected");
        }

        if (!comma && !point)
        {
            return (file, "");
        }

        NumberNotation plausible = ImportFields.DimensionOf(kind, use.Field!) is { } measured
            ? NotationChoice.Plausibly(kind, use.Field!, measured, power, numbers)
            : NumberNotation.Unknown;
        if (plausible != NumberNotation.Unknown)
        {
            return (plausible, $"; decimal {Word(plausible)}, since the other reading is no figure of a part");
        }

        if (file != NumberNotation.Unknown)
        {
            return (file, $"; decimal {Word(file)}, as the other columns show");
        }

        return comma
            ? (NumberNotation.Unknown, "; a comma before three digits is open: state --decimal point or comma")
            : (NumberNotation.Point, "; decimal point, as nothing in the file shows another");
    }

    private bool IsCount(string field) => ImportFields.DimensionOf(kind, field) == Dimension.Count;

    private static string Word(NumberNotation notation) => notation == NumberNotation.Comma ? "comma" : "point";
}
