using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Whether the stock covers what is ordered.</summary>
public enum Coverage
{
    /// <summary>It does.</summary>
    Yes,

    /// <summary>It does not.</summary>
    No,

    /// <summary>The stock is not known.</summary>
    Unknown,
}

/// <summary>One order of one part.</summary>
/// <param name="Part">The part.</param>
/// <param name="Quantity">How many are ordered, after minimum order and multiple.</param>
/// <param name="UnitPrice">The price of one at this quantity, in the currency of the list; null where none is known.</param>
/// <param name="Total">Quantity times price, to the cent, half a cent up; null where no price is known.</param>
/// <param name="Covered">Whether the stock covers it.</param>
public sealed record PurchaseOrder(Part Part, int Quantity, decimal? UnitPrice, decimal? Total, Coverage Covered);

/// <summary>A line of a purchase list: one part for all circuits, ordered once, or in several orders of equal parts.</summary>
public sealed record PurchaseLine
{
    /// <summary>Its number, from 1.</summary>
    public required int Number { get; init; }

    /// <summary>The parts that the circuits name; several only where equal parts are bought together.</summary>
    public required ImmutableArray<Part> Parts { get; init; }

    /// <summary>What the part is, for a buyer.</summary>
    public required string Description { get; init; }

    /// <summary>Where the circuits use it.</summary>
    public required ImmutableArray<PurchaseUse> Uses { get; init; }

    /// <summary>How many are built in.</summary>
    public required int Needed { get; init; }

    /// <summary>How many more are ordered for attrition, as a ratio.</summary>
    public required decimal Attrition { get; init; }

    /// <summary>How many are needed with attrition.</summary>
    public required int Required { get; init; }

    /// <summary>The orders; one, unless the stock of one part does not cover what is required.</summary>
    public required ImmutableArray<PurchaseOrder> Orders { get; init; }

    /// <summary>The cheapest order of one equal part alone whose stock covers; null where none does, or nothing is split.</summary>
    public decimal? SingleTotal { get; init; }

    /// <summary>Parts that may be bought in its place, by id.</summary>
    public required ImmutableArray<string> Alternates { get; init; }

    /// <summary>Whether the part is not in the catalogue any more.</summary>
    public bool IsGone { get; init; }

    /// <summary>Whether it is bought in several orders.</summary>
    public bool IsSplit => Orders.Length > 1;

    /// <summary>The sum of its orders; null where one has no price.</summary>
    public decimal? Total => Orders.Aggregate((decimal?)0, (sum, order) => sum + order.Total);

    /// <summary>What the split saves against the cheapest single order; null where there is none.</summary>
    public decimal? Saving => IsSplit && SingleTotal is { } single && Total is { } total ? single - total : null;

    /// <summary>Whether stock covers all of its orders.</summary>
    public Coverage Covered => Orders.Any(order => order.Covered == Coverage.No) ? Coverage.No
        : Orders.Any(order => order.Covered == Coverage.Unknown) ? Coverage.Unknown
        : Coverage.Yes;
}
