namespace PartPick.Catalog;

/// <summary>A price that holds from a quantity on.</summary>
/// <param name="Quantity">The least quantity, 1 or more.</param>
/// <param name="UnitPrice">The price of one part, zero or more.</param>
public readonly record struct PriceBreak(int Quantity, decimal UnitPrice);
