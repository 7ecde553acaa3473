using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>How many more of a kind are ordered than are built in, as a ratio: what placing, testing and rework use up.</summary>
/// <param name="Ratios">The ratio of each kind, zero to one; kinds without one have none.</param>
public sealed record AttritionRates(ImmutableDictionary<PartKind, decimal> Ratios)
{
    /// <summary>No attrition.</summary>
    public static AttritionRates None { get; } = new(ImmutableDictionary<PartKind, decimal>.Empty);

    /// <summary>Usual rates: small passives 3 %, crystals and transistors 2 %, circuits 1 %; a port comes with its controller
    /// (common practice, from memory).</summary>
    public static AttritionRates Usual { get; } = new(ImmutableDictionary.CreateRange(new Dictionary<PartKind, decimal>
    {
        [PartKind.Capacitor] = 0.03m,
        [PartKind.Resistor] = 0.03m,
        [PartKind.Crystal] = 0.02m,
        [PartKind.Transistor] = 0.02m,
        [PartKind.Inverter] = 0.01m,
        [PartKind.Counter] = 0.01m,
    }));

    /// <summary>The ratio of a kind.</summary>
    /// <param name="kind">The kind.</param>
    public decimal Of(PartKind kind) => Ratios.GetValueOrDefault(kind);

    /// <summary>How many have to be ordered for a number that is built in: rounded up to a whole part.</summary>
    /// <param name="kind">The kind.</param>
    /// <param name="needed">How many are built in, zero or more.</param>
    public decimal Required(PartKind kind, long needed) => decimal.Ceiling(needed * (1 + Of(kind)));
}
