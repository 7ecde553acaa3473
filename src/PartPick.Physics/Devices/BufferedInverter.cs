namespace PartPick.Physics.Devices;

/// <summary>A buffered inverter: a chain of stages with a large voltage gain behind its output resistance.</summary>
/// <param name="Gain">Voltage gain of the whole chain at mid-supply, above zero.</param>
/// <param name="Ron">Output on-resistance in ohms, above zero.</param>
public sealed record BufferedInverter(double Gain, double Ron) : Inverter
{
    /// <inheritdoc/>
    public override double TransconductanceSiemens => Gain / Ron;

    /// <inheritdoc/>
    public override double OutputOhms => Ron;
}
