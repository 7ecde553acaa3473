using System.Collections.Immutable;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Mapping;

namespace PartPick.Catalog.Browsing;

/// <summary>A part as a line of a list.</summary>
/// <param name="Kind">Its kind.</param>
/// <param name="Cells">The texts of its text columns, empty where there is none; in the order of <see cref="ListColumns.Of"/>.</param>
/// <param name="Numbers">
/// The numbers of its number columns in SI units, NaN where there is none; in the order of <see cref="ListColumns.Of"/>.
/// </param>
/// <param name="Marks">What it is marked with.</param>
public sealed record PartRow(PartKind Kind, ImmutableArray<string> Cells, ImmutableArray<double> Numbers, RowMarks Marks)
{
    /// <summary>The id of the part.</summary>
    public string Id => Cells[0];

    /// <summary>The row of a part.</summary>
    /// <param name="part">The part.</param>
    public static PartRow Of(Part part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return Of(part.Kind, PartShape.Of(part.Kind).DraftOf(part), false);
    }

    internal static PartRow Of(StoredPart stored) => Of(stored.Kind, stored.Figures(), stored.HasHandwork);

    internal static PartRow Of(PartKind kind, PartDraft figures, bool setByHand)
    {
        ImmutableArray<ListColumn> columns = ListColumns.Of(kind);
        var cells = ImmutableArray.CreateBuilder<string>(columns.Length);
        var numbers = ImmutableArray.CreateBuilder<double>(columns.Length);
        foreach (ListColumn column in columns)
        {
            if (!column.IsNumber)
            {
                cells.Add(figures.Text(column.Key) ?? "");
            }
            else
            {
                numbers.Add(column.Key == "price" ? PriceOf(figures) : figures.Number(column.Key) ?? double.NaN);
            }
        }

        RowMarks marks = (figures.Has("excluded") ? RowMarks.Excluded : RowMarks.None)
            | (setByHand ? RowMarks.SetByHand : RowMarks.None);
        return new PartRow(kind, cells.ToImmutable(), numbers.ToImmutable(), marks);
    }

    private static double PriceOf(PartDraft figures)
    {
        ImmutableArray<PriceBreak> prices = PricesText.Read(figures.Text("prices"), new DraftReader(figures, key => key));
        return prices.IsEmpty ? double.NaN : (double)prices[0].UnitPrice;
    }
}
