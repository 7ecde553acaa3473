using System.Numerics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>
/// The forced state of a follower with the transistor of Ebers and Moll, by shooting: the charges at the beginning of the
/// period are sought with which it ends as it began.
/// </summary>
internal sealed class FollowerPeriod : ForcedState
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
    public override void StartLinear(double peakAmps)
    {
        double baseAmps = _units.Collector / _circuit.Transistor.Beta;
        double inner = _units.Base - baseAmps * _units.Spreading;
        double junction = Math.Log(_units.Collector);
        double emitter = inner - junction + _units.JunctionShift;
        _shooting.Now.Use(PeriodMesh.Coarsest);
        _shooting.Now.Start(junction, LinearControl() * peakAmps / _units.Volts, inner + _units.InnerShift);
        _elements.Charges(Radians, _units.Base, inner, emitter, _units.Collector, Values);
        PutAmplitude(peakAmps);
        PutSources(_units.Base, emitter, baseAmps);
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
    public override double OutputSwingVolts() => _shooting.Now.Extremes().Swing * _units.Volts;

    /// <inheritdoc/>
    public override RunningState Keep()
    {
        FollowerOrbit orbit = _shooting.Now;
        double[] kept = new double[2 + orbit.Volts.Length];
        orbit.Volts.CopyTo(kept.AsSpan(2));
        double junction = orbit.Volts[^4] - _units.JunctionShift;
        double inner = orbit.Volts[^1] - _units.InnerShift;
        (double ownDrive, double innerDrive, double junctionDrive) = Drives();
        double still = inner - innerDrive;
        double terminal = ownDrive + _elements.BaseVolts(Radians, Values, still, still - junction + junctionDrive);
        kept[0] = (terminal - _units.Base) * _units.Volts;
        kept[1] = (terminal - inner) * _units.Volts;
        return new RunningState(Radians, PeakAmps, kept, orbit.Mesh, _units.GivenCurrent);
    }

    /// <summary>Takes the state of a circuit like this one.</summary>
    public void TakeState(RunningState state, PeriodMesh mesh)
    {
        FollowerOrbit orbit = _shooting.Now;
        orbit.Use(mesh);
        state.State[2..].CopyTo(orbit.Volts);
        SetFrequency(state.Radians);
        PutAmplitude(state.PeakAmps);
        (double ownDrive, double innerDrive, double junctionDrive) = Drives();
        double terminal = _units.Base + state.State[0] / _units.Volts;
        double inner = terminal - state.State[1] / _units.Volts - innerDrive;
        double emitter = inner - (orbit.Volts[^4] - _units.JunctionShift - junctionDrive);
        _elements.Charges(Radians, terminal - ownDrive, inner, emitter, Math.Exp(orbit.Volts[^4]), Values);
        (double meanJunction, double meanInner, double meanBase) = orbit.Means(_circuit.Transistor.Beta);
        double mean = meanInner - _units.InnerShift;
        PutSources(mean + meanBase * _units.Spreading, mean - meanJunction + _units.JunctionShift, meanBase);
    }

    private void PutAmplitude(double peakAmps)
    {
        PeakAmps = peakAmps;
        Values[LogAmps] = Math.Log(peakAmps / _units.Amps);
    }

    // The constant sources from the mean voltages of base and emitter and the mean base current.
    private void PutSources(double terminal, double emitter, double baseAmps)
    {
        Values[3] = _units.GivenCurrent ? _units.EmitterLoad * emitter - 1 : emitter;
        Values[4] = _units.GivenCurrent ? _units.BaseLoad * terminal + baseAmps : 0;
        Array.Clear(_shooting.AlongAmps);
    }

    private (double Own, double Inner, double Junction) Drives()
    {
        double scale = PeakAmps / _units.Volts;
        return (_ports.Own.Real * scale, _ports.Internal.Real * scale, _ports.Junction.Real * scale);
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
