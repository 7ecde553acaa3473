namespace PartPick.Physics.Devices;

/// <summary>A logic inverter used as an amplifier: its pins' capacitances and its excess delay.</summary>
public abstract record Inverter
{
    /// <summary>Input capacitance in farads.</summary>
    public double InputFarads { get; init; }

    /// <summary>Output capacitance in farads.</summary>
    public double OutputFarads { get; init; }

    /// <summary>Capacitance from input to output in farads.</summary>
    public double FeedbackFarads { get; init; }

    /// <summary>Excess delay τ in seconds between the input voltage and the output source.</summary>
    public double DelaySeconds { get; init; }

    /// <summary>Small-signal transconductance at mid-supply, in siemens.</summary>
    public abstract double TransconductanceSiemens { get; }

    /// <summary>Small-signal output resistance at mid-supply, in ohms; positive infinity when ideal.</summary>
    public abstract double OutputOhms { get; }
}
