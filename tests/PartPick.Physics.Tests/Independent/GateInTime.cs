using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Physics.Tests.Independent;

/// <summary>The gate circuit with its inverter's static characteristic, voltages counted from ground.</summary>
internal sealed class GateInTime : CircuitInTime
{
    private const int A = 0, B = 1;
    private readonly int _d;
    private readonly GateCircuit _gate;
    private readonly double _supply;
    private readonly Func<double, double, (double Amps, double ByInput, double ByOutput)> _law;

    public GateInTime(GateCircuit gate)
        : base(gate.SeriesOhms == 0 ? 2 : 3, A, B)
    {
        _gate = gate;
        _d = gate.SeriesOhms == 0 ? B : 2;
        Inverter inverter = gate.Inverter;
        Capacitor(A, -1, gate.C1Farads + inverter.InputFarads + gate.Strays.InputFarads);
        Capacitor(B, -1, gate.C2Farads + gate.Strays.OutputFarads);
        Capacitor(A, B, gate.Crystal.ShuntFarads + gate.Strays.AcrossFarads);
        Capacitor(A, _d, inverter.FeedbackFarads);
        Capacitor(_d, -1, inverter.OutputFarads);
        Resistor(A, _d, gate.FeedbackOhms);
        if (gate.SeriesOhms > 0)
        {
            Resistor(_d, B, gate.SeriesOhms);
        }

        switch (inverter)
        {
            case OneStageInverter one:
                _supply = one.SwingVolts ?? gate.SupplyVolts;
                _law = new ComplementarySquareLaw(one, _supply).OutputCurrent;
                break;
            case BufferedInverter buffered:
                _supply = gate.SupplyVolts;
                _law = (input, output) => Buffered(buffered, input, output);
                break;
            default:
                throw new ArgumentException("No such inverter.", nameof(gate));
        }
    }

    public override int DelayedNode => A;

    public override double DelaySeconds => _gate.Inverter.DelaySeconds;

    public override int OutputNode => _d;

    public override double[] Rest => [.. Enumerable.Repeat(_supply / 2, Nodes)];

    // The mean stays at mid-supply by symmetry, so nothing slow is excited; the fast nodes settle in a few cycles.
    public override double SlowestSeconds => 0;

    public override double StepLimitVolts => 0.5 * _supply;

    protected override void Device(double[] v, double delayed, double weight, NodalState state)
    {
        (double amps, double byInput, double byOutput) = _law(delayed, v[_d]);
        state.AddCurrent(_d, -1, A, -1, amps, byInput * weight);
        state.AddCurrent(_d, -1, _d, -1, 0, byOutput);
    }

    private (double Amps, double ByInput, double ByOutput) Buffered(BufferedInverter inverter, double input, double output)
    {
        double tanh = Math.Tanh(2 * inverter.Gain * (input - _supply / 2) / _supply);
        double source = _supply / 2 * (1 - tanh);
        return ((output - source) / inverter.Ron, inverter.Gain * (1 - tanh * tanh) / inverter.Ron, 1 / inverter.Ron);
    }
}
