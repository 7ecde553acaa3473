namespace PartPick.Physics;

/// <summary>How a circuit starts.</summary>
public enum StartKind
{
    /// <summary>It does not start: no growth and no steady state.</summary>
    None,

    /// <summary>No growth at the bias point (too much gain), yet a steady state exists: a disturbance is needed.</summary>
    NeedsDisturbance,

    /// <summary>Oscillation builds up from noise.</summary>
    BuildsUp,
}

/// <summary>The small-signal figures of a circuit at its bias point.</summary>
public sealed record StartUp
{
    /// <summary>Frequency of the natural mode in hertz: Im s / 2π.</summary>
    public required double NaturalHz { get; init; }

    /// <summary>Growth rate σ = Re s, in 1/s; above zero where the oscillation builds up.</summary>
    public required double GrowthRatePerSecond { get; init; }

    /// <summary>Negative resistance −Re Zc(j Im s) in ohms.</summary>
    public required double NegativeResistanceOhms { get; init; }

    /// <summary>Start-up margin: negative resistance over the crystal's resistance.</summary>
    public required double Margin { get; init; }

    /// <summary>Transconductance at the bias point in siemens.</summary>
    public required double TransconductanceSiemens { get; init; }

    /// <summary>Smallest transconductance in siemens at which growth is zero; null where there is none.</summary>
    public required double? CriticalSiemens { get; init; }

    /// <summary>Larger transconductance in siemens at which growth falls back to zero; null where there is none.</summary>
    public required double? UpperSiemens { get; init; }

    /// <summary>Gain margin: transconductance over the critical one; null where there is none.</summary>
    public double? GainMargin => CriticalSiemens is { } critical ? TransconductanceSiemens / critical : null;
}

/// <summary>The large-signal steady state of a circuit.</summary>
public sealed record SteadyState
{
    /// <summary>Frequency at the crystal in hertz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>Load capacitance in farads at which this crystal would run at <see cref="FrequencyHz"/>.</summary>
    public required double LoadFarads { get; init; }

    /// <summary>Motional current in amperes rms.</summary>
    public required double CurrentRmsAmps { get; init; }

    /// <summary>Drive level in watts: Rm I²rms.</summary>
    public required double DriveWatts { get; init; }

    /// <summary>Output swing in volts peak to peak: at the inverter's output, or at the emitter.</summary>
    public required double OutputSwingVolts { get; init; }

    /// <summary>Lowest output voltage of the period in volts: an inverter's against half the supply, an emitter's against ground.</summary>
    public double OutputLowVolts { get; init; }

    /// <summary>Highest output voltage of the period in volts, against the same.</summary>
    public double OutputHighVolts { get; init; }

    /// <summary>The figures that corners and sensitivities ask for.</summary>
    public RunningFigures Figures => new(FrequencyHz, LoadFarads, CurrentRmsAmps, DriveWatts);

    /// <summary>True where the collector junction conducts within the cycle (vBC above 0.4 V).</summary>
    public required bool LimitedBySupply { get; init; }
}

/// <summary>Everything the model says of one circuit at one operating point.</summary>
public sealed record OscillatorResult
{
    /// <summary>Small-signal figures.</summary>
    public required StartUp StartUp { get; init; }

    /// <summary>How it starts.</summary>
    public required StartKind Start { get; init; }

    /// <summary>Largest −Re Zc(I)/Rm over the amplitude.</summary>
    public required double RunningMargin { get; init; }

    /// <summary>Start-up time in seconds from a settled supply; null unless it builds up.</summary>
    public required double? StartUpTimeSeconds { get; init; }

    /// <summary>The steady state; null where there is none.</summary>
    public required SteadyState? Steady { get; init; }

    /// <summary>DC emitter current in amperes at the bias point; null for an inverter.</summary>
    public double? EmitterCurrentAmps { get; init; }
}
