using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>One circuit–crystal–amplifier group of the search.</summary>
internal sealed class FamilyMember
{
    /// <summary>The crystal.</summary>
    public required CrystalPart Crystal { get; init; }

    /// <summary>The crystal's model.</summary>
    public required CrystalModel Model { get; init; }

    /// <summary>Circuit, crystal and amplifier on the board.</summary>
    public required CircuitTemplate Template { get; init; }

    /// <summary>By how much estimates of its circuits may be off.</summary>
    public required EstimateQuality Quality { get; init; }

    /// <summary>Divider stage.</summary>
    public required int Tap { get; init; }

    /// <summary>Spreads of the crystal alone.</summary>
    public required ImmutableArray<BudgetTerm> Terms { get; init; }

    /// <summary>Sum of the spreads of the crystal alone, as a ratio.</summary>
    public required double TermsRatio { get; init; }

    /// <summary>Cost per unit of crystal, amplifier and support parts.</summary>
    public required decimal BaseCost { get; init; }

    /// <summary>Wanted frequency at the crystal in hertz.</summary>
    public required double TargetHz { get; init; }
}
