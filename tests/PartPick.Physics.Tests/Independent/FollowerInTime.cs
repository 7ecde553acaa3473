using PartPick.Physics.Circuits;

namespace PartPick.Physics.Tests.Independent;

/// <summary>
/// The follower with its transistor after Ebers and Moll. A load behind a large capacitor has that capacitor here, some
/// thirty cycles long. A given emitter current is drawn by a constant source, the base fed by a constant current; resistors
/// that then load the signal only stand behind the same kind of capacitor.
/// </summary>
internal sealed class FollowerInTime : CircuitInTime
{
    private const int B = 0, E = 1;
    private const double CouplingCycles = 30;
    private readonly int _i;
    private readonly FollowerCircuit _circuit;
    private readonly FollowerBias _bias;
    private readonly double _couplingSeconds;

    /// <summary>What the coupling capacitor's reactance adds at the emitter, taken off again there, in farads.</summary>
    private readonly double _compensation;

    public FollowerInTime(FollowerCircuit circuit)
        : base(CountNodes(circuit), B, -1)
    {
        _circuit = circuit;
        _bias = FollowerBias.Of(circuit);
        int next = 2;
        _i = circuit.Transistor.BaseSpreadingOhms > 0 ? next++ : B;
        Capacitor(B, -1, circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads);
        Capacitor(B, E, circuit.C1Farads);
        Capacitor(_i, -1, circuit.Transistor.CollectorFarads);
        Capacitor(_i, E, circuit.Transistor.JunctionFarads);
        if (_i != B)
        {
            Resistor(B, _i, circuit.Transistor.BaseSpreadingOhms);
        }

        Resistor(B, -1, circuit.BaseTopOhms);
        Resistor(B, -1, circuit.BaseBottomOhms);
        bool given = circuit.EmitterCurrentAmps is not null;
        if (!given)
        {
            Resistor(E, -1, circuit.EmitterOhms);
        }

        double coupled = CoupledSiemens(circuit);
        if (coupled > 0)
        {
            _couplingSeconds = CouplingCycles / circuit.Crystal.NominalHz;
            double cyclesPerRadian = 1 / (2 * Math.PI * CouplingCycles);
            _compensation = -coupled * cyclesPerRadian / (2 * Math.PI * circuit.Crystal.NominalHz);
            Capacitor(E, next, _couplingSeconds * coupled);
            Resistor(next, -1, 1 / coupled);
        }

        Capacitor(E, -1, circuit.C2Farads + circuit.Strays.OutputFarads + _compensation);
    }

    public override int OutputNode => E;

    public override double[] Rest
    {
        get
        {
            double[] rest = new double[Nodes];
            rest[B] = _bias.BaseVolts;
            rest[E] = _bias.EmitterVolts;
            if (_i != B)
            {
                rest[_i] = _bias.BaseVolts
                    - _bias.CollectorAmps / _circuit.Transistor.Beta * _circuit.Transistor.BaseSpreadingOhms;
            }

            return rest;
        }
    }

    public override double SlowestSeconds
    {
        get
        {
            double feed = 1 / (1 / _circuit.BaseTopOhms + 1 / _circuit.BaseBottomOhms);
            double @base = double.IsFinite(feed) ? feed * (_circuit.C1Farads + _circuit.C2Farads) : 0;
            return Math.Max(@base, _couplingSeconds);
        }
    }

    public override double StepLimitVolts => 0.1;

    public override double Watched(double[] v) => v[_i] - _circuit.SupplyVolts;

    protected override void Device(double[] v, double delayed, double weight, NodalState state)
    {
        double vt = _bias.ThermalVolts, saturation = _bias.SaturationAmps;
        double forward = saturation * Math.Exp((v[_i] - v[E]) / vt);
        double reverse = saturation * Math.Exp((v[_i] - _circuit.SupplyVolts) / vt);
        double beta = _circuit.Transistor.Beta, transit = _circuit.Transistor.TransitSeconds;
        state.AddCurrent(_i, E, _i, E, forward / beta, forward / beta / vt);
        state.AddCurrent(_i, -1, _i, -1, reverse, reverse / vt);
        state.AddCurrent(-1, E, _i, E, forward, forward / vt);
        state.AddCurrent(-1, E, _i, -1, -reverse, -reverse / vt);
        state.AddCharge(_i, E, _i, E, transit * forward, transit * forward / vt);
        if (_circuit.EmitterCurrentAmps is { } given)
        {
            state.AddCurrent(E, -1, -1, -1, given, 0);
            double middle = _circuit.SupplyVolts / 2;
            double leak = 1 / _circuit.BaseTopOhms + 1 / _circuit.BaseBottomOhms;
            state.AddCurrent(B, -1, -1, -1, -middle * leak - given / (beta + 1), 0);
        }
        else
        {
            state.AddCurrent(B, -1, -1, -1, -_circuit.SupplyVolts / _circuit.BaseTopOhms, 0);
        }
    }

    private static double CoupledSiemens(FollowerCircuit circuit) =>
        1 / circuit.LoadOhms + (circuit.EmitterCurrentAmps is null ? 0 : 1 / circuit.EmitterOhms);

    private static int CountNodes(FollowerCircuit circuit) =>
        2 + (circuit.Transistor.BaseSpreadingOhms > 0 ? 1 : 0) + (CoupledSiemens(circuit) > 0 ? 1 : 0);
}
