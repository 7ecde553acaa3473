using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>The best candidate for every number of boards.</summary>
public sealed record QuantityChoice
{
    /// <summary>The ranges, in order, without gaps from 1 on.</summary>
    public required ImmutableArray<ChoiceSpan> Spans { get; init; }

    /// <summary>The numbers of boards for which the whole catalogue was ranked; there the answer is exact.</summary>
    public required ImmutableArray<int> RankedAt { get; init; }

    /// <summary>
    /// Whether the answer is exact for every number of boards: every combination was among those compared. Otherwise it is, between
    /// the numbers ranked, the best of all that was on the front at any of them.
    /// </summary>
    public required bool IsExact { get; init; }

    /// <summary>Cost per unit of the best candidate, from one board on; null where none fits.</summary>
    public required ImmutableArray<decimal?> Costs { get; init; }

    /// <summary>Number of candidates compared.</summary>
    public required int Compared { get; init; }

    /// <summary>The range that holds a number of boards.</summary>
    /// <param name="builds">Number of boards, from 1 to the end of the last range.</param>
    public ChoiceSpan At(int builds) => Spans.First(span => builds >= span.From && builds <= span.To);
}
