using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>What is to be ordered for the circuits of a list.</summary>
/// <param name="Name">The name of the list.</param>
/// <param name="Currency">The currency of all prices; empty where no part has one.</param>
/// <param name="Circuits">The circuits.</param>
/// <param name="Lines">The lines, by kind, value and id.</param>
public sealed record PurchaseList(
    string Name, string Currency, ImmutableArray<PurchaseCircuit> Circuits, ImmutableArray<PurchaseLine> Lines)
{
    /// <summary>The sum of all orders that have a price: of totals to the cent, so that adding the column up gives the same.</summary>
    public decimal Total => Lines.SelectMany(line => line.Orders).Sum(order => order.Total ?? 0);

    /// <summary>The lines without a price.</summary>
    public ImmutableArray<PurchaseLine> Unpriced => [.. Lines.Where(line => line.Total is null)];

    /// <summary>The lines whose stock does not cover what is required.</summary>
    public ImmutableArray<PurchaseLine> Uncovered => [.. Lines.Where(line => line.Covered == Coverage.No)];
}
