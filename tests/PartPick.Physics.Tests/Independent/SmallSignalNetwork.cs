using MathNet.Numerics.LinearAlgebra;
using PartPick.Physics.Circuits;
using Complex = System.Numerics.Complex;

namespace PartPick.Physics.Tests.Independent;

/// <summary>
/// The linear network of a circuit as lists of elements, stamped into full nodal matrices. Node −1 is ground.
/// Written from the element list of each circuit alone; nothing is reduced by hand.
/// </summary>
internal sealed class SmallSignalNetwork
{
    private readonly List<(int A, int B, double Farads)> _capacitors = [];
    private readonly List<(int A, int B, double Siemens)> _conductances = [];
    private readonly List<(int From, int To, int Plus, int Minus, double Siemens, double Delay)> _sources = [];

    private SmallSignalNetwork(int nodes, int crystalPlus, int crystalMinus)
    {
        Nodes = nodes;
        CrystalPlus = crystalPlus;
        CrystalMinus = crystalMinus;
    }

    public int Nodes { get; }

    public int CrystalPlus { get; }

    public int CrystalMinus { get; }

    public double DelaySeconds => _sources.Max(source => source.Delay);

    public static SmallSignalNetwork Of(OscillatorCircuit circuit, double transconductance) => circuit switch
    {
        GateCircuit gate => Gate(gate, transconductance),
        FollowerCircuit follower => Follower(follower, transconductance),
        _ => throw new ArgumentException("No such circuit.", nameof(circuit)),
    };

    /// <summary>Capacitances as a nodal matrix in farads.</summary>
    public Matrix<double> Capacitance()
    {
        var matrix = Matrix<double>.Build.Dense(Nodes, Nodes);
        foreach ((int a, int b, double farads) in _capacitors)
        {
            Stamp(matrix, a, b, a, b, farads);
        }

        return matrix;
    }

    /// <summary>Conductances and sources as a nodal matrix in siemens, each delay taken at the complex frequency s.</summary>
    public Matrix<Complex> Conductance(Complex s)
    {
        var real = Matrix<double>.Build.Dense(Nodes, Nodes);
        foreach ((int a, int b, double siemens) in _conductances)
        {
            Stamp(real, a, b, a, b, siemens);
        }

        Matrix<Complex> matrix = real.ToComplex();
        foreach ((int from, int to, int plus, int minus, double siemens, double delay) in _sources)
        {
            var unit = Matrix<double>.Build.Dense(Nodes, Nodes);
            Stamp(unit, from, to, plus, minus, siemens);
            matrix += unit.ToComplex() * Complex.Exp(-s * delay);
        }

        return matrix;
    }

    /// <summary>Impedance between the crystal's terminals in ohms, by a solution of the full nodal matrix.</summary>
    public Complex Impedance(Complex s) =>
        Voltage(s, CrystalPlus) - (CrystalMinus >= 0 ? Voltage(s, CrystalMinus) : Complex.Zero);

    /// <summary>Voltage of a node per ampere through the crystal's terminals, in ohms.</summary>
    public Complex Voltage(Complex s, int node)
    {
        Matrix<Complex> admittance = Conductance(s) + Capacitance().ToComplex() * s;
        var current = Vector<Complex>.Build.Dense(Nodes);
        current[CrystalPlus] = 1;
        if (CrystalMinus >= 0)
        {
            current[CrystalMinus] = -1;
        }

        return admittance.Solve(current)[node];
    }

    private static SmallSignalNetwork Gate(GateCircuit gate, double transconductance)
    {
        bool joined = gate.SeriesOhms == 0;
        const int A = 0, B = 1;
        int d = joined ? B : 2;
        var net = new SmallSignalNetwork(joined ? 2 : 3, A, B);
        net.Capacitor(A, -1, gate.C1Farads + gate.Inverter.InputFarads + gate.Strays.InputFarads);
        net.Capacitor(B, -1, gate.C2Farads + gate.Strays.OutputFarads);
        net.Capacitor(A, B, gate.Crystal.ShuntFarads + gate.Strays.AcrossFarads);
        net.Capacitor(A, d, gate.Inverter.FeedbackFarads);
        net.Capacitor(d, -1, gate.Inverter.OutputFarads);
        net.Resistor(A, d, gate.FeedbackOhms);
        net.Resistor(d, -1, gate.Inverter.OutputOhms);
        if (!joined)
        {
            net.Resistor(d, B, gate.SeriesOhms);
        }

        net._sources.Add((d, -1, A, -1, transconductance, gate.Inverter.DelaySeconds));
        return net;
    }

    private static SmallSignalNetwork Follower(FollowerCircuit follower, double transconductance)
    {
        bool joined = follower.Transistor.BaseSpreadingOhms == 0;
        const int B = 0, E = 1;
        int i = joined ? B : 2;
        var net = new SmallSignalNetwork(joined ? 2 : 3, B, -1);
        net.Capacitor(B, -1, follower.Crystal.ShuntFarads + follower.Strays.AcrossFarads);
        net.Resistor(B, -1, follower.BaseTopOhms);
        net.Resistor(B, -1, follower.BaseBottomOhms);
        net.Capacitor(B, E, follower.C1Farads);
        net.Capacitor(E, -1, follower.C2Farads + follower.Strays.OutputFarads);
        net.Resistor(E, -1, follower.EmitterOhms);
        net.Resistor(E, -1, follower.LoadOhms);
        if (!joined)
        {
            net.Resistor(B, i, follower.Transistor.BaseSpreadingOhms);
        }

        net.Resistor(i, E, follower.Transistor.Beta / transconductance);
        net.Capacitor(i, E, follower.Transistor.JunctionFarads + transconductance * follower.Transistor.TransitSeconds);
        net.Capacitor(i, -1, follower.Transistor.CollectorFarads);
        net._sources.Add((-1, E, i, E, transconductance, 0));
        return net;
    }

    private static void Stamp(Matrix<double> matrix, int from, int to, int plus, int minus, double value)
    {
        Add(matrix, from, plus, value);
        Add(matrix, from, minus, -value);
        Add(matrix, to, plus, -value);
        Add(matrix, to, minus, value);
    }

    private static void Add(Matrix<double> matrix, int row, int column, double value)
    {
        if (row >= 0 && column >= 0)
        {
            matrix[row, column] += value;
        }
    }

    private void Capacitor(int a, int b, double farads) => _capacitors.Add((a, b, farads));

    private void Resistor(int a, int b, double ohms) => _conductances.Add((a, b, 1 / ohms));
}
