using PartPick.Physics.Devices;

namespace PartPick.Physics.Circuits;

/// <summary>
/// The Colpitts oscillator round an NPN emitter follower, its collector at AC ground. Nodes B (base terminal),
/// I (internal base), E (emitter).
/// </summary>
public sealed record FollowerCircuit : OscillatorCircuit
{
    /// <summary>The amplifier.</summary>
    public required Transistor Transistor { get; init; }

    /// <summary>Bias resistor from the supply to the base in ohms; positive infinity where absent.</summary>
    public double BaseTopOhms { get; init; } = double.PositiveInfinity;

    /// <summary>Bias resistor from the base to ground in ohms; positive infinity where absent (one base resistor).</summary>
    public double BaseBottomOhms { get; init; } = double.PositiveInfinity;

    /// <summary>Emitter resistor RE in ohms; positive infinity where absent (only with a given emitter current).</summary>
    public double EmitterOhms { get; init; } = double.PositiveInfinity;

    /// <summary>AC load at the emitter in ohms, through a large capacitor; positive infinity where absent.</summary>
    public double LoadOhms { get; init; } = double.PositiveInfinity;

    /// <summary>
    /// Mean emitter current in amperes where it is given: it replaces the DC solution, and the bias resistors load
    /// the signal only.
    /// </summary>
    public double? EmitterCurrentAmps { get; init; }
}
