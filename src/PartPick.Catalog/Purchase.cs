namespace PartPick.Catalog;

/// <summary>A purchase of one part.</summary>
/// <param name="Quantity">How many are bought.</param>
/// <param name="Total">What they cost together.</param>
public readonly record struct Purchase(int Quantity, decimal Total);
