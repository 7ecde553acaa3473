using System.Numerics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>
/// The forced state of a follower with the transistor of Ebers and Moll, by shooting: the charges at the beginning of the
/// period are sought with which it ends as it began.
/// </summary>
internal sealed partial class FollowerPeriod : ForcedState
{
    private const int LogAmps = FollowerPass.LogAmps;
    private const double GivenTolerance = 1e-3;
    private const double MeshTolerance = 0.02;
    private const double MeshSlack = 2;
    private const double SupplyLimitVolts = 0.4;
    private const double JunctionVolts = 1;
    private const double LargestSwing = 20;
    private const double Halving = 1.0 / 16;
    private readonly FollowerCircuit _circuit;
    private readonly FollowerBias _bias;
    private readonly FollowerUnits _units;
    private readonly FollowerNetwork _network;
    private readonly FollowerElements _elements;
    private readonly FollowerPass _pass;
    private readonly FollowerShooting _shooting;
    private readonly FollowerOrbit _remembered;
    private readonly double[] _rememberedValues = new double[FollowerPass.Unknowns];
    private readonly double _meshTolerance;
    private FollowerPorts _ports;

    /// <param name="circuit">The circuit.</param>
    /// <param name="bias">Its DC operating point.</param>
    /// <param name="meshTolerance">How closely the steps of the period follow the currents.</param>
    public FollowerPeriod(FollowerCircuit circuit, FollowerBias bias, double meshTolerance = MeshTolerance)
    {
        _circuit = circuit;
        _bias = bias;
        _meshTolerance = meshTolerance;
        _units = new FollowerUnits(circuit, bias);
        _network = new FollowerNetwork(circuit);
        _elements = new FollowerElements(circuit, _units);
        _pass = new FollowerPass(_units, _elements, circuit.Transistor.Beta);
        _shooting = new FollowerShooting(_pass, new FollowerEquations(_units), meshTolerance);
        _remembered = new FollowerOrbit(_shooting.Now.Mesh);
    }

    /// <inheritdoc/>
    public override double LinearPeakAmps => 0.2 * _units.Volts / Complex.Abs(LinearControl());

    /// <inheritdoc/>
    public override double LargestPeakAmps =>
        LargestSwing * (_circuit.SupplyVolts + JunctionVolts) / Complex.Abs(_ports.Own);

    /// <inheritdoc/>
    public override bool FallsForGood => true;

    /// <inheritdoc/>
    public override bool Stays => ResistanceSlope > 0;

    /// <inheritdoc/>
    public override bool LimitedBySupply =>
        (_shooting.Now.Extremes().Reverse - _units.JunctionShift) * _units.Volts > SupplyLimitVolts;

    /// <summary>Number of steps in the period.</summary>
    public int Steps => _shooting.Now.Mesh.Count;

    private double[] Values => _shooting.Values;

    /// <summary>The same circuit with every step halved, from this state.</summary>
    public FollowerPeriod Refined()
    {
        var finer = new FollowerPeriod(_circuit, _bias, _meshTolerance * Halving);
        finer.SetFrequency(Radians);
        finer._shooting.Now.Copy(_shooting.Now);
        finer._shooting.Use(_shooting.Now.Mesh.Halved());
        Values.CopyTo(finer.Values, 0);
        finer.PeakAmps = PeakAmps;
        return finer;
    }

    /// <inheritdoc/>
    public override void SetFrequency(double radians)
    {
        Radians = radians;
        _ports = _network.Ports(new Complex(0, radians));
        _pass.SetFrequency(radians, _ports);
    }

    /// <inheritdoc/>
    public override void Remember()
    {
        _remembered.Copy(_shooting.Now);
        Values.CopyTo(_rememberedValues, 0);
    }

    /// <inheritdoc/>
    public override void Recall()
    {
        _shooting.Now.Copy(_remembered);
        _rememberedValues.CopyTo(Values, 0);
        Array.Clear(_shooting.AlongAmps);
        PeakAmps = _units.Amps * Math.Exp(Values[LogAmps]);
    }

    /// <inheritdoc/>
    public override bool SolveAt(double peakAmps)
    {
        _shooting.Foresee(Math.Log(peakAmps / _units.Amps));
        return Solve(null, GivenTolerance, 1);
    }

    /// <inheritdoc/>
    public override bool SolveRunning(double resistanceOhms, double tolerance = FineTolerance) =>
        Solve(resistanceOhms, Math.Sqrt(tolerance), MeshSlack);

    /// <inheritdoc/>
    public override bool StepTowardsRunning(double resistanceOhms)
    {
        bool stepped = _shooting.StepOnce(resistanceOhms);
        if (stepped)
        {
            Note(resistanceOhms);
        }

        return stepped;
    }

    /// <inheritdoc/>
    public override (double Low, double High) OutputRangeVolts()
    {
        (_, double low, double high) = _shooting.Now.Extremes();
        return ((low + _units.Supply) * _units.Volts, (high + _units.Supply) * _units.Volts);
    }

    /// <inheritdoc/>
    public override void Release()
    {
        _shooting.Release();
        _remembered.Release();
    }

    private Complex LinearControl() =>
        _network.At(new Complex(0, Radians)).ControlPerCurrent(_bias.TransconductanceSiemens);

    private bool Solve(double? resistanceOhms, double tolerance, double slack)
    {
        bool solved = _shooting.Solve(resistanceOhms, tolerance, slack);
        if (solved)
        {
            Note(resistanceOhms);
        }

        return solved;
    }

    private void Note(double? resistanceOhms)
    {
        PassIntegrals sums = _pass.Sums;
        double real = 0;
        double imaginary = 0;
        double slope = 0;
        for (int k = 0; k < FollowerPass.Unknowns; k++)
        {
            real += sums.ResistanceSlopes[k] * _shooting.LastStep[k];
            imaginary += sums.ReactanceSlopes[k] * _shooting.LastStep[k];
            slope += sums.ResistanceSlopes[k] * _shooting.AlongAmps[k];
        }

        PeakAmps = _units.Amps * Math.Exp(Values[LogAmps]);
        Impedance = sums.Impedance + new Complex(real, imaginary);
        ResistanceSlope = resistanceOhms is { } resistance ? -resistance * _shooting.RunningSlope : slope;
    }
}
