namespace PartPick.Catalog;

/// <summary>A bipolar transistor.</summary>
public sealed record TransistorPart : Part
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Transistor;

    /// <summary>The smallest current gain.</summary>
    public double? BetaMin { get; init; }

    /// <summary>The current gain.</summary>
    public required double Beta { get; init; }

    /// <summary>The largest current gain.</summary>
    public double? BetaMax { get; init; }

    /// <summary>The transition frequency, Hz.</summary>
    public double? TransitionFrequencyHz { get; init; }

    /// <summary>The capacitance of the emitter junction, F.</summary>
    public double? CjeFarads { get; init; }

    /// <summary>The forward transit time, s.</summary>
    public double? TfSeconds { get; init; }

    /// <summary>The capacitance from collector to base, F.</summary>
    public double? CmuFarads { get; init; }

    /// <summary>The resistance of the base, Ω.</summary>
    public double? RbbOhms { get; init; }

    /// <summary>The voltage from base to emitter, V.</summary>
    public double? VbeVolts { get; init; }

    /// <summary>The largest collector current, A.</summary>
    public double? CurrentMaxAmperes { get; init; }

    /// <summary>The largest voltage from collector to emitter, V.</summary>
    public double? VoltageMaxVolts { get; init; }

    /// <summary>The lowest temperature, °C.</summary>
    public double? TemperatureMinCelsius { get; init; }

    /// <summary>The highest temperature, °C.</summary>
    public double? TemperatureMaxCelsius { get; init; }
}
