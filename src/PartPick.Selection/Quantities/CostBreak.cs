using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Why the cost per unit of a circuit turns at a number of boards.</summary>
public enum CostBreakKind
{
    /// <summary>Another price holds: the quantity of a price break is needed, or bought because it is cheaper in total.</summary>
    Price,

    /// <summary>One more multiple has to be bought.</summary>
    Multiple,

    /// <summary>Everything bought is used: the minimum order, or the quantity that was bought for its lower price, is needed.</summary>
    UsedUp,

    /// <summary>The stock does not cover this number of boards; the cost goes on as before.</summary>
    Stock,
}

/// <summary>A number of boards at which the cost per unit of a circuit turns.</summary>
/// <param name="Builds">The first number of boards for which it holds.</param>
/// <param name="Part">The part that causes it.</param>
/// <param name="Kind">Why.</param>
/// <param name="Ordered">How many of the part are bought from there.</param>
/// <param name="UnitPrice">What one of them costs.</param>
/// <param name="Before">Cost per unit of the whole circuit for one board fewer.</param>
/// <param name="After">Cost per unit of the whole circuit for this number.</param>
public sealed record CostBreak(
    int Builds, Part Part, CostBreakKind Kind, int Ordered, decimal UnitPrice, decimal Before, decimal After);
