using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection.Search;

/// <summary>
/// What a family's crystal would see with the critical transconductance: in closed form, and near what it sees when running, as
/// limiting brings the device down to about that transconductance.
/// </summary>
internal sealed class CriticalLoad
{
    private const double SlopeStep = 0.01;
    private readonly CircuitTemplate _template;
    private readonly OperatingPoint _nominal;
    private readonly double _hertz;

    /// <param name="template">Circuit, crystal and amplifier.</param>
    /// <param name="nominal">The nominal operating point.</param>
    /// <param name="hertz">The crystal's frequency in hertz.</param>
    public CriticalLoad(CircuitTemplate template, OperatingPoint nominal, double hertz)
    {
        _template = template;
        _nominal = nominal;
        _hertz = hertz;
    }

    /// <summary>The load with the crystal's shunt capacitance, in farads; null where no transconductance starts it.</summary>
    public double? Farads(in CircuitValues values) => Farads(_template.At(values, _nominal));

    /// <summary>How much the load at least grows with the capacitances; null where no transconductance starts it.</summary>
    /// <param name="values">Nominal values.</param>
    /// <param name="leastFarads">The least load, with the crystal's shunt capacitance, in farads.</param>
    /// <param name="fineness">How far the slopes may be below those of the critical load.</param>
    public LoadSlopes? Slopes(in CircuitValues values, double leastFarads, GridFineness fineness)
    {
        OscillatorCircuit circuit = _template.At(values, _nominal);
        double byC1 = SlopeStep * circuit.C1Farads;
        double byC2 = SlopeStep * circuit.C2Farads;
        double byAcross = SlopeStep * (circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads);
        Strays wider = circuit.Strays with { AcrossFarads = circuit.Strays.AcrossFarads + byAcross };
        if (Farads(circuit) is not { } critical
            || Farads(circuit with { C1Farads = circuit.C1Farads + byC1 }) is not { } first
            || Farads(circuit with { C2Farads = circuit.C2Farads + byC2 }) is not { } second
            || Farads(circuit with { Strays = wider }) is not { } across)
        {
            return null;
        }

        double share = leastFarads / critical;
        return new LoadSlopes(
            fineness.SlopeShare * share * Math.Abs(first - critical) / byC1,
            fineness.SlopeShare * share * Math.Abs(second - critical) / byC2,
            fineness.AcrossShare * share * Math.Abs(across - critical) / byAcross);
    }

    private double? Farads(OscillatorCircuit circuit) => OscillatorAnalysis.FindCriticalLoadFarads(circuit, _hertz);
}
