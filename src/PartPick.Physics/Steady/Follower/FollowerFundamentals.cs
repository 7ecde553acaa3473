using System.Numerics;
using PartPick.Physics.Network;
using PartPick.Physics.SmallSignal;

namespace PartPick.Physics.Steady;

/// <summary>
/// The fundamentals of a follower's voltages with the critical transconductance, to which limiting brings the transistor down:
/// what the states of two circuits differ in first of all. In volts, for a motional current of one ampere at angle zero.
/// </summary>
/// <param name="Terminal">Voltage of the base terminal.</param>
/// <param name="Junction">Voltage of the base–emitter junction.</param>
/// <param name="Internal">Voltage of the internal base.</param>
/// <param name="Forward">The forward current, in amperes.</param>
internal readonly record struct FollowerFundamentals(Complex Terminal, Complex Junction, Complex Internal, Complex Forward)
{
    /// <summary>Those of a circuit.</summary>
    /// <param name="ports">Its ports at the frequency.</param>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    /// <param name="siemens">Transconductance at the bias point, where none is critical.</param>
    public static FollowerFundamentals Of(in FollowerPorts ports, double resistanceOhms, double siemens)
    {
        double effective = GrowthWindow.Critical(ports.Forward, resistanceOhms) ?? siemens;
        Complex forward = effective * ports.Forward.ControlPerCurrent(effective);
        return new FollowerFundamentals(
            ports.Own + ports.OwnPerForward * forward,
            ports.Junction + ports.JunctionPerForward * forward,
            ports.Internal + ports.InternalPerForward * forward,
            forward);
    }
}
