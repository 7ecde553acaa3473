using PartPick.Physics.Circuits;
using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The elements of a follower between its nodes B, I, E, in units of the thermal voltage and the emitter current at rest, and
/// what a step in time makes of them: voltages and charges that are linear in the currents of the transistor.
/// </summary>
internal sealed class FollowerElements
{
    /// <summary>Rows of a step's map: vBE and vI at three stages, then the charges of B, I and E at the end.</summary>
    public const int MapRows = 9;

    /// <summary>Length of a row of a step's map.</summary>
    public const int MapWidth = 12;

    // Columns: charges at the beginning, forward and reverse currents at three stages, constant currents into B and E.
    public const int ForwardColumn = 3;
    public const int ReverseColumn = 6;
    public const int BaseColumn = 9;
    public const int EmitterColumn = 10;

    private const int B = 0;
    private const int I = 1;
    private const int E = 2;
    private const double SmallestSpreading = 1e-9;
    private const int Order = 9;
    private const int Vectors = 5;
    private readonly double[] _capacitance = new double[9];
    private readonly double[] _conductance = new double[9];
    private readonly double[] _transit = new double[3];
    private readonly double[] _perForward = new double[3];
    private readonly double[] _perReverse = new double[3];
    private readonly bool _merged;
    private readonly double[] _work = new double[Order * 4 * Vectors];

    public FollowerElements(FollowerCircuit circuit, FollowerUnits units)
    {
        double unit = units.Ohms;

        // Without a spreading resistor I's charges and currents are B's, and I's own row says that both are one node.
        _merged = units.Spreading < SmallestSpreading;
        int inner = _merged ? B : I;
        double link = _merged ? 1 : 1 / units.Spreading;
        Add(_conductance, B, B, units.BaseLoad);
        Add(_conductance, E, E, units.EmitterLoad);
        Add(_conductance, I, I, link);
        Add(_conductance, I, B, -link);
        if (!_merged)
        {
            Add(_conductance, B, B, link);
            Add(_conductance, B, I, -link);
        }

        Add(_capacitance, B, B, (circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads) * unit);
        Add(_capacitance, E, E, (circuit.C2Farads + circuit.Strays.OutputFarads) * unit);
        Add(_capacitance, inner, I, circuit.Transistor.CollectorFarads * unit);
        AddBetween(_capacitance, B, B, circuit.C1Farads * unit);
        AddBetween(_capacitance, inner, I, circuit.Transistor.JunctionFarads * unit);
        _transit[inner] = circuit.Transistor.TransitSeconds;
        _transit[E] = -circuit.Transistor.TransitSeconds;
        _perForward[inner] = -1 / circuit.Transistor.Beta;
        _perForward[E] = 1 + 1 / circuit.Transistor.Beta;
        _perReverse[inner] = -1;
        _perReverse[E] = -1;
    }

    /// <summary>The charges at given voltages and forward current; time in radians.</summary>
    public void Charges(double radians, double vB, double vI, double vE, double forward, Span<double> charges)
    {
        for (int row = 0; row < 3; row++)
        {
            double charge = _capacitance[3 * row] * vB + _capacitance[3 * row + 1] * vI + _capacitance[3 * row + 2] * vE;
            charges[row] = radians * (charge + _transit[row] * forward);
        }
    }

    /// <summary>The base's voltage at given charges and voltages of I and E; I's where both are one node.</summary>
    public double BaseVolts(double radians, ReadOnlySpan<double> charges, double vI, double vE) => _merged
        ? vI
        : (charges[B] / radians - _capacitance[E] * vE) / _capacitance[B];

    /// <summary>
    /// Fills the map of a step: C z + τF F at each stage is the charge at the beginning and the currents' integral up to there.
    /// </summary>
    /// <param name="radians">Angular frequency in rad/s.</param>
    /// <param name="length">Length of the step in radians of the period.</param>
    /// <param name="map">Receives the rows; not numbers where the elements are too far apart to solve for.</param>
    public void Step(double radians, double length, Span<double> map)
    {
        Array.Clear(_work);
        for (int stage = 0; stage < 3; stage++)
        {
            for (int node = 0; node < 3; node++)
            {
                FillRow(radians, length, stage, node);
            }
        }

        if (!GaussJordan.Reduce(_work, Order, Vectors))
        {
            map.Fill(double.NaN);
            return;
        }

        map.Clear();
        for (int column = 0; column < EmitterColumn + 1; column++)
        {
            for (int stage = 0; stage < 3; stage++)
            {
                double inner = Solved(stage, I, column);
                map[stage * MapWidth + column] = inner - Solved(stage, E, column);
                map[(3 + stage) * MapWidth + column] = inner;
            }

            for (int row = 0; row < 3; row++)
            {
                double charge = column == ForwardColumn + 2 ? _transit[row] : 0;
                for (int node = 0; node < 3; node++)
                {
                    charge += _capacitance[3 * row + node] * Solved(2, node, column);
                }

                map[(6 + row) * MapWidth + column] = radians * charge;
            }
        }
    }

    private double Solved(int stage, int node, int column) => _work[(3 * stage + node) * 4 * Vectors + Order + column];

    private void FillRow(double radians, double length, int stage, int node)
    {
        Span<double> row = _work.AsSpan((3 * stage + node) * 4 * Vectors, 4 * Vectors);
        Span<double> right = row[Order..];
        for (int k = 0; k < 3; k++)
        {
            row[3 * stage + k] = radians * _capacitance[3 * node + k];
        }

        right[node] = 1;
        right[ForwardColumn + stage] = -radians * _transit[node];
        for (int other = 0; other < 3; other++)
        {
            double share = length * Radau.Matrix[3 * stage + other];
            for (int k = 0; k < 3; k++)
            {
                row[3 * other + k] += share * _conductance[3 * node + k];
            }

            right[ForwardColumn + other] += share * _perForward[node];
            right[ReverseColumn + other] += share * _perReverse[node];
        }

        if (node != I)
        {
            right[node == B ? BaseColumn : EmitterColumn] = length * Radau.Nodes[stage];
        }
    }

    private static void Add(double[] matrix, int row, int column, double value) => matrix[3 * row + column] += value;

    // A capacitance from a node (its row and its voltage's column) to the emitter.
    private static void AddBetween(double[] matrix, int row, int column, double value)
    {
        Add(matrix, row, column, value);
        Add(matrix, row, E, -value);
        Add(matrix, E, column, -value);
        Add(matrix, E, E, value);
    }
}
