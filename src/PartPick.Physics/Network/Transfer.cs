using System.Numerics;

namespace PartPick.Physics.Network;

/// <summary>
/// A linear network with one controlled source, seen at one complex frequency. The source current is g times the
/// control voltage; with the source off the network is described by four transfer impedances. This is the Möbius form
/// of the crystal's impedance in the transconductance g.
/// </summary>
/// <param name="Own">Voltage across the crystal per crystal current, source off.</param>
/// <param name="Control">Control voltage per crystal current, source off.</param>
/// <param name="Coupling">Voltage across the crystal per source current.</param>
/// <param name="Loop">Control voltage per source current.</param>
internal readonly record struct Transfer(Complex Own, Complex Control, Complex Coupling, Complex Loop)
{
    /// <summary>Impedance Zc between the crystal's terminals for a transconductance g in siemens.</summary>
    public Complex Impedance(double siemens) => Own + siemens * Coupling * Control / (1 - siemens * Loop);

    /// <summary>Control voltage per crystal current for a transconductance g in siemens.</summary>
    public Complex ControlPerCurrent(double siemens) => Control / (1 - siemens * Loop);
}
