using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The texts of a purchase list, the same in every form.</summary>
/// <param name="list">The list.</param>
/// <param name="decimalSign">The decimal sign.</param>
internal sealed class PurchaseCells(PurchaseList list, char decimalSign = '.')
{
    private bool IsOne => list.Circuits.Length == 1;

    /// <summary>Every order with its line, and whether it is the line's first.</summary>
    public IEnumerable<(PurchaseLine Line, PurchaseOrder Order, bool First)> Orders =>
        list.Lines.SelectMany(line => line.Orders.Select((order, i) => (line, order, i == 0)));

    /// <summary>The reference designators by circuit: "C1 C2", or "1: C1 C2; 3: C1" where there are several circuits.</summary>
    public string References(PurchaseLine line) => string.Join("; ", line.Uses.Select(use =>
        (IsOne ? "" : use.Circuit + ": ") + string.Join(' ', use.Designators)));

    /// <summary>How many stand on a board of each circuit.</summary>
    public static string PerBuild(PurchaseLine line) => string.Join("; ", line.Uses.Select(use => Figures.Whole(use.Designators.Length)));

    /// <summary>How many boards of each circuit are built.</summary>
    public static string Builds(PurchaseLine line) => string.Join("; ", line.Uses.Select(use => Figures.Whole(use.Builds)));

    /// <summary>The attrition in per cent.</summary>
    public string Attrition(PurchaseLine line) => Number(line.Attrition * 100, "0.###");

    /// <summary>A price of one part: at least two decimals, and as many as it has, at most eight.</summary>
    public string Price(decimal? price) => price is { } value ? Number(value, "0.00######") : "";

    /// <summary>An amount to the cent.</summary>
    public string Amount(decimal? amount) => amount is { } value ? Number(value, "0.00") : "";

    /// <summary>A stock; empty where it is not known.</summary>
    public static string Stock(PurchaseOrder order) => order.Part.Stock is { } stock ? Figures.Whole(stock) : "";

    /// <summary>Whether the stock covers an order.</summary>
    public static string Covers(PurchaseOrder order) => order.Covered switch
    {
        Coverage.Yes => "yes",
        Coverage.No => "no",
        _ => "unknown",
    };

    /// <summary>Parts that may take the place of the line's.</summary>
    public static string Alternates(PurchaseLine line) => string.Join(' ', line.Alternates);

    /// <summary>What there is to say about a line.</summary>
    public string Remark(PurchaseLine line, bool first) => !first ? "part of the line above"
        : line.IsGone ? "not in the catalogue any more"
        : line.Parts.Length > 1 ? "equal parts bought together: " + string.Join(' ', line.Parts.Select(part => part.Id))
        : line.Orders[0].Total is null ? "no price is known"
        : line.Parts[0] is PortPart && line.Orders[0].Total == 0 ? "counted as on the board already, at no cost"
        : !line.IsSplit ? line.Orders[0].Part.Id == line.Parts[0].Id ? "" : $"in the place of {line.Parts[0].Id}"
        : line.Saving is { } saving ? $"split over {line.Orders.Length} parts, saves {Amount(saving)} {list.Currency}"
        : $"split over {line.Orders.Length} parts; no single one suffices";

    /// <summary>Sentences for what a buyer has to look at.</summary>
    public ImmutableArray<string> Notes() =>
    [
        .. list.Uncovered.Select(line => $"Line {Figures.Whole(line.Number)}: {Shortage(line, line.Orders[0])}."),
        .. list.Unpriced.Where(line => !line.IsGone).Select(line =>
            $"Line {Figures.Whole(line.Number)}: {line.Orders[0].Part.Id} has no price and is not in the total."),
    ];

    private static string Shortage(PurchaseLine line, PurchaseOrder order) =>
        line.IsGone ? $"{order.Part.Id} is not in the catalogue any more, and not in the total"
        : order.Part.Excluded ? $"{order.Part.Id} is excluded in the catalogue"
        : $"the stock of {order.Part.Id} is {Stock(order)}, {Figures.Whole(order.Quantity)} are to be ordered";

    private string Number(decimal value, string format) =>
        value.ToString(format, CultureInfo.InvariantCulture).Replace('.', decimalSign);
}
