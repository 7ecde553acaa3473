using System.Collections.Immutable;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>A figure at its worst corner.</summary>
/// <param name="Value">The figure, SI.</param>
/// <param name="Corner">The corner in words: "4.5 V, 50 °C, weakest device, capacitances high".</param>
/// <param name="Point">The corner itself; null where only its words are known.</param>
public sealed record AtCorner(double Value, string Corner, OperatingPoint? Point = null);

/// <summary>A fully analysed combination of parts.</summary>
public sealed record Candidate
{
    /// <summary>Identifier made of the part ids; the same choice always has the same one.</summary>
    public required string Id { get; init; }

    /// <summary>The choice.</summary>
    public required CandidateParts Choice { get; init; }

    /// <summary>All parts on the board, in the order of their designators.</summary>
    public required ImmutableArray<PartUse> Parts { get; init; }

    /// <summary>Whether every price is in its currency, so that its cost is a sum.</summary>
    public bool IsInOneCurrency => Parts.All(use => !use.Part.Offer.HasPrices || use.Part.Offer.Currency == Currency);

    /// <summary>The nominal circuit: the mid supply, 25 °C, typical device, nominal values.</summary>
    public required OscillatorCircuit Nominal { get; init; }

    /// <summary>The nominal circuit's figures.</summary>
    public required OscillatorResult Result { get; init; }

    /// <summary>Frequency error, centre and spreads; null where there is no steady state.</summary>
    public required ErrorBudget? Budget { get; init; }

    /// <summary>Start-up margin at its worst corner.</summary>
    public required AtCorner Margin { get; init; }

    /// <summary>Drive level in watts at its worst corner; null where a corner has no steady state.</summary>
    public required AtCorner? Drive { get; init; }

    /// <summary>Start-up time in seconds at its worst corner; null where a corner does not build up.</summary>
    public required AtCorner? StartUpTime { get; init; }

    /// <summary>Rated drive level of the crystal in watts; null where it states none.</summary>
    public required double? RatedDriveWatts { get; init; }

    /// <summary>Cost per unit in the catalogue's currency.</summary>
    public required decimal Cost { get; init; }

    /// <summary>Currency of the cost.</summary>
    public required string Currency { get; init; }

    /// <summary>The limits it breaks; empty where it is fit.</summary>
    public required ImmutableArray<Miss> Misses { get; init; }

    /// <summary>Warnings: sentences with the numbers in them.</summary>
    public required ImmutableArray<string> Warnings { get; init; }

    /// <summary>Score (lower is better); NaN where it is unfit.</summary>
    public double Score { get; init; } = double.NaN;

    /// <summary>Whether it is on the front.</summary>
    public bool OnFront { get; init; }

    /// <summary>True where every hard limit holds.</summary>
    public bool IsFit => Misses.IsEmpty;

    /// <summary>Output frequency in hertz after the divider; null where there is no steady state.</summary>
    public double? OutputHz => Result.Steady is { } steady ? steady.FrequencyHz / Math.Pow(2, Choice.Tap) : null;
}
