using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;

namespace PartPick.Physics.Steady;

/// <summary>
/// A follower's bias in units of the thermal voltage and of the emitter current at rest. A junction's voltage then becomes the
/// logarithm of its current by a shift.
/// </summary>
internal sealed class FollowerUnits
{
    public FollowerUnits(FollowerCircuit circuit, FollowerBias bias)
    {
        Volts = bias.ThermalVolts;
        Amps = bias.EmitterAmps;
        Ohms = Volts / Amps;
        GivenCurrent = circuit.EmitterCurrentAmps is not null;
        Supply = circuit.SupplyVolts / Volts;
        Base = bias.BaseVolts / Volts;
        Spreading = circuit.Transistor.BaseSpreadingOhms / Ohms;
        BaseLoad = Ohms / circuit.BaseTopOhms + Ohms / circuit.BaseBottomOhms;
        EmitterLoad = Ohms / circuit.EmitterOhms + Ohms / circuit.LoadOhms;
        EmitterSiemens = Ohms / circuit.EmitterOhms;
        JunctionShift = Math.Log(bias.SaturationAmps / Amps);
        Collector = bias.TransconductanceSiemens * Ohms;
        BaseFeed = GivenCurrent ? 0 : Supply * Ohms / circuit.BaseTopOhms;
        BasePerSource = GivenCurrent ? 1 : 0;
        EmitterPerSource = GivenCurrent ? 1 : Ohms / circuit.LoadOhms;
    }

    /// <summary>The unit of voltage in volts.</summary>
    public double Volts { get; }

    /// <summary>The unit of current in amperes.</summary>
    public double Amps { get; }

    /// <summary>The unit of resistance in ohms.</summary>
    public double Ohms { get; }

    /// <summary>Whether the mean emitter current is given: no resistor answers to it, and half the supply stands at the base.</summary>
    public bool GivenCurrent { get; }

    /// <summary>Supply voltage.</summary>
    public double Supply { get; }

    /// <summary>Base voltage at rest.</summary>
    public double Base { get; }

    /// <summary>Collector current at rest.</summary>
    public double Collector { get; }

    /// <summary>Base spreading resistance.</summary>
    public double Spreading { get; }

    /// <summary>Conductance that loads the base.</summary>
    public double BaseLoad { get; }

    /// <summary>Conductance that loads the emitter's signal.</summary>
    public double EmitterLoad { get; }

    /// <summary>Conductance that leads the mean emitter current off.</summary>
    public double EmitterSiemens { get; }

    /// <summary>What is added to vBE to make it the logarithm of the forward current.</summary>
    public double JunctionShift { get; }

    /// <summary>What is added to the internal base's voltage to make it the logarithm of the reverse current.</summary>
    public double InnerShift => JunctionShift - Supply;

    /// <summary>Constant current into the base.</summary>
    public double BaseFeed { get; }

    /// <summary>
    /// Share of the second constant source in the current into the base: where the emitter current is given, that source holds
    /// the base's mean voltage.
    /// </summary>
    public double BasePerSource { get; }

    /// <summary>
    /// Current into the emitter per unit of the first source: the mean emitter voltage, to which a load behind a capacitor does
    /// not answer; or the source that draws the given current.
    /// </summary>
    public double EmitterPerSource { get; }
}
