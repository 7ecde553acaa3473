using PartPick.Physics.Devices;

namespace PartPick.Physics.Circuits;

/// <summary>
/// The Pierce oscillator round an inverter: logic gate, the oscillator inverter of a ripple counter, or a
/// microcontroller's pins. Nodes A (input), B (crystal's far side), D (inverter output).
/// </summary>
public sealed record GateCircuit : OscillatorCircuit
{
    /// <summary>The amplifier.</summary>
    public required Inverter Inverter { get; init; }

    /// <summary>Damping resistor Rs from D to B in ohms; zero joins the two nodes.</summary>
    public double SeriesOhms { get; init; }

    /// <summary>Feedback resistor Rf from A to D in ohms; positive infinity when ideal.</summary>
    public double FeedbackOhms { get; init; } = double.PositiveInfinity;
}
