using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>How a purchase list is made.</summary>
public sealed record PurchaseOptions
{
    /// <summary>Attrition of each kind.</summary>
    public AttritionRates Attrition { get; init; } = AttritionRates.Usual;

    /// <summary>The currency, and what others are worth in it.</summary>
    public CurrencyRates Rates { get; init; } = CurrencyRates.None;

    /// <summary>Whether a line whose stock does not cover is bought from several equal parts.</summary>
    public bool Splits { get; init; } = true;

    /// <summary>Parts that may be bought in the place of others, by the id of the part, beside the equal ones.</summary>
    public ImmutableDictionary<string, ImmutableArray<string>> Alternates { get; init; } =
        ImmutableDictionary<string, ImmutableArray<string>>.Empty;
}
