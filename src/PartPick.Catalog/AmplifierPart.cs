using System.Collections.Immutable;

namespace PartPick.Catalog;

/// <summary>A part with an inverting amplifier: an inverter, a counter or a port.</summary>
public abstract record AmplifierPart : Part
{
    /// <summary>The figures by ascending supply; the first and the last are the specified range. At least one.</summary>
    public required ImmutableArray<SupplyPoint> Points { get; init; }

    /// <summary>The number of stages: 1, or 3 for a buffered inverter.</summary>
    public required int Stages { get; init; }

    /// <summary>The threshold voltage of the transistors, V.</summary>
    public double? ThresholdVolts { get; init; }

    /// <summary>The capacitance of the input, F.</summary>
    public double? InputFarads { get; init; }

    /// <summary>The capacitance of the output, F.</summary>
    public double? OutputFarads { get; init; }

    /// <summary>The capacitance from output to input, F.</summary>
    public double? FeedbackFarads { get; init; }

    /// <summary>The lowest temperature, °C.</summary>
    public double? TemperatureMinCelsius { get; init; }

    /// <summary>The highest temperature, °C.</summary>
    public double? TemperatureMaxCelsius { get; init; }

    /// <summary>Whether there is more than one stage.</summary>
    public bool IsBuffered => Stages > 1;
}
