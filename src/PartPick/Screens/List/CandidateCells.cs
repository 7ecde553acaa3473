using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>One row of the list as texts.</summary>
public sealed record CandidateCells
{
    /// <summary>The circuit's word.</summary>
    public required string Circuit { get; init; }

    /// <summary>Crystal frequency in MHz.</summary>
    public required string FrequencyMegaHertz { get; init; }

    /// <summary>Load capacitance of the crystal in pF; a dash for a series part.</summary>
    public required string LoadPicofarads { get; init; }

    /// <summary>The crystal's case in at most four signs; empty where it is not known.</summary>
    public required string Case { get; init; }

    /// <summary>Id of the amplifier.</summary>
    public required string Amplifier { get; init; }

    /// <summary>Divider; empty for the oscillator itself.</summary>
    public required string Divider { get; init; }

    /// <summary>Frequency error in ppm.</summary>
    public required string ErrorPpm { get; init; }

    /// <summary>Start-up margin.</summary>
    public required string Margin { get; init; }

    /// <summary>Cost for one board.</summary>
    public required string Cost { get; init; }

    /// <summary>How much of each limit is used.</summary>
    public required ImmutableArray<LimitUse> Uses { get; init; }
}
