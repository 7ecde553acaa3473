using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>Where the shooting starts from: small signals, or the state of a circuit like this one.</summary>
internal sealed partial class FollowerPeriod
{
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
        return new RunningState(Radians, PeakAmps, kept, orbit.Mesh, _units.GivenCurrent, Fundamentals());
    }

    /// <summary>Takes the state of a circuit like this one.</summary>
    public void TakeState(RunningState state, PeriodMesh mesh)
    {
        FollowerOrbit orbit = _shooting.Now;
        orbit.Use(mesh);
        state.State[2..].CopyTo(orbit.Volts);
        SetFrequency(state.Radians);
        FollowerFundamentals from = state.Fundamentals;
        FollowerFundamentals to = Fundamentals();
        PutAmplitude(state.PeakAmps * (LimitedBySupply
            ? Complex.Abs(from.Internal) / Complex.Abs(to.Internal)
            : Complex.Abs(from.Forward) / Complex.Abs(to.Forward)));
        Complex junctionTurn = (to.Junction * PeakAmps - from.Junction * state.PeakAmps) / _units.Volts;
        Complex innerTurn = (to.Internal * PeakAmps - from.Internal * state.PeakAmps) / _units.Volts;
        Complex terminalTurn = (to.Terminal * PeakAmps - from.Terminal * state.PeakAmps) / _units.Volts;
        double before = Complex.Abs(from.Junction) * state.PeakAmps / _units.Volts;
        double after = Complex.Abs(to.Junction) * PeakAmps / _units.Volts;
        orbit.Turn(LogMean(before) - LogMean(after), junctionTurn, innerTurn);
        (double ownDrive, double innerDrive, double junctionDrive) = Drives();
        double terminal = _units.Base + state.State[0] / _units.Volts + terminalTurn.Real;
        double inner = terminal - state.State[1] / _units.Volts - (terminalTurn - innerTurn).Real - innerDrive;
        double emitter = inner - (orbit.Volts[^4] - _units.JunctionShift - junctionDrive);
        _elements.Charges(Radians, terminal - ownDrive, inner, emitter, Math.Exp(orbit.Volts[^4]), Values);
        (double meanJunction, double meanInner, double meanBase) = orbit.Means(_circuit.Transistor.Beta);
        double mean = meanInner - _units.InnerShift;
        PutSources(mean + meanBase * _units.Spreading, mean - meanJunction + _units.JunctionShift, meanBase);
    }

    // ln I0(x): by how much the mean of a current that is exponential in a sine exceeds that at its middle.
    private static double LogMean(double x) =>
        x < 20 ? Math.Log(MathNet.Numerics.SpecialFunctions.BesselI0(x)) : x - 0.5 * Math.Log(2 * Math.PI * x);

    private FollowerFundamentals Fundamentals() =>
        FollowerFundamentals.Of(_ports, _circuit.Crystal.ResistanceOhms, _bias.TransconductanceSiemens);

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
}
