using System.Globalization;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>Parts as tables for people.</summary>
internal static class PartTable
{
    /// <summary>Prints parts of one kind, a line each, with the figures by which one chooses among them.</summary>
    public static void WriteList(TextWriter output, PartKind kind, IReadOnlyList<CatalogEntry> entries)
    {
        (string Key, string Heading, double Unit)[] figures = FiguresOf(kind);
        TextColumn[] columns =
        [
            new("id"), .. figures.Select(figure => new TextColumn(figure.Heading, true)), new("stock", true), new("price at 1", true),
            new("currency"), new("description"),
        ];
        TextTable.Write(output, columns, [.. entries.Select(entry => Row(entry.Part, figures))]);
    }

    /// <summary>Prints one part, a line for each figure, with what it rests on and where it came from.</summary>
    public static void WriteOne(TextWriter output, CatalogEntry entry)
    {
        string[] assumed = [.. PartFigures.AssumedOf(entry.Part)];
        var rows = PartFigures.Of(entry.Part).Where(figure => figure.Key != "basis").Select(figure => new[]
        {
            figure.Key,
            figure.ToString(),
            figure is { Dimension: null or Dimension.Count, Basis: Basis.Stated } ? "" : BasisWord(figure.Basis),
            entry.Origin.GetValueOrDefault(figure.Key, ""),
        }).ToList();
        rows.AddRange(assumed.Where(key => !rows.Exists(row => row[0].Split(' ')[0] == key))
            .Select(key => new[] { key, Figures.None, "assumed", "not stated: usual of its class" }));
        TextTable.Write(output, [new("figure"), new("value"), new("basis"), new("origin")], rows);
    }

    private static string BasisWord(Basis basis) => basis switch
    {
        Basis.Minimum => "minimum",
        Basis.Typical => "typical",
        Basis.Maximum => "maximum",
        Basis.Assumed => "assumed",
        _ => "stated",
    };

    private static string[] Row(Part part, (string Key, string Heading, double Unit)[] figures)
    {
        var known = PartFigures.Of(part).ToDictionary(figure => figure.Key);
        return
        [
            part.Id,
            .. figures.Select(figure => known.TryGetValue(figure.Key, out PartFigure? found)
                ? found.Text ?? Figures.Short(found.Number, figure.Unit)
                : Figures.None),
            part.Stock?.ToString(CultureInfo.InvariantCulture) ?? Figures.None,
            part.Offer.HasPrices ? part.Offer.Prices[0].UnitPrice.ToString(CultureInfo.InvariantCulture) : Figures.None,
            part.Offer.Currency,
            part.Description,
        ];
    }

    private static (string Key, string Heading, double Unit)[] FiguresOf(PartKind kind) => kind switch
    {
        PartKind.Crystal =>
        [
            ("frequency", "frequency (MHz)", 1e6), ("load", "load (pF)", 1e-12), ("resistance", "resistance (ohm)", 1),
            ("tolerance", "tolerance (ppm)", 1e-6), ("stability", "stability (ppm)", 1e-6),
        ],
        PartKind.Capacitor =>
        [
            ("value", "value (pF)", 1e-12), ("tolerance", "tolerance (%)", 0.01), ("toleranceAbsolute", "tolerance (pF)", 1e-12),
            ("dielectric", "dielectric", 1), ("voltage", "voltage (V)", 1),
        ],
        PartKind.Resistor => [("value", "value (ohm)", 1), ("tolerance", "tolerance (%)", 0.01)],
        PartKind.Transistor =>
        [
            ("beta", "beta", 1), ("transitionFrequency", "fT (MHz)", 1e6), ("currentMax", "current (mA)", 1e-3),
            ("voltageMax", "voltage (V)", 1),
        ],
        _ => [("stages", "stages", 1), ("cin", "cin (pF)", 1e-12), ("supply 1", "from (V)", 1), ("gm 1", "gm there (mS)", 1e-3)],
    };
}
