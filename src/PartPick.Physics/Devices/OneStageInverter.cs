namespace PartPick.Physics.Devices;

/// <summary>An inverter of one stage: unbuffered logic, a counter's oscillator inverter, or a microcontroller's pins.</summary>
/// <param name="Gm">Transconductance at mid-supply in siemens, above zero.</param>
/// <param name="Ro">Output resistance at mid-supply in ohms; positive infinity when ideal.</param>
public sealed record OneStageInverter(double Gm, double Ro) : Inverter
{
    /// <summary>Threshold voltage Vt of both transistors, in volts.</summary>
    public double ThresholdVolts { get; init; } = 0.7;

    /// <summary>Largest output swing in volts where the part states one; it stands for the supply in the characteristic.</summary>
    public double? SwingVolts { get; init; }

    /// <inheritdoc/>
    public override double TransconductanceSiemens => Gm;

    /// <inheritdoc/>
    public override double OutputOhms => Ro;
}
