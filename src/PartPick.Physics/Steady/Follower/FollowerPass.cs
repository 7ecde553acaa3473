using System.Numerics;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>
/// Goes once through the period, step by step from the charges at its beginning, and carries along how everything depends on
/// the unknowns: the three charges, two constant currents, the logarithm of the motional current.
/// </summary>
internal sealed class FollowerPass
{
    /// <summary>Number of unknowns.</summary>
    public const int Unknowns = 6;

    /// <summary>The unknown that is the logarithm of the motional current.</summary>
    public const int LogAmps = 5;

    private const int Width = JunctionStep.Width;
    private const int Stages = Radau.Stages;
    private const int Voltages = JunctionStep.Voltages;
    private readonly FollowerUnits _units;
    private readonly FollowerElements _elements;
    private readonly double[]?[] _maps = new double[PeriodMesh.FinestLevel + 1][];
    private readonly bool[] _mapped = new bool[PeriodMesh.FinestLevel + 1];
    private readonly double[] _offsets = new double[Voltages];
    private readonly double[] _right = new double[Voltages * Width];
    private readonly double[] _end = new double[3];
    private readonly double[] _endSlopes = new double[3 * Width];
    private double _radians;
    private double _baseAmps;
    private double _emitterAmps;
    private FollowerPorts _ports;

    public FollowerPass(FollowerUnits units, FollowerElements elements, double beta)
    {
        _units = units;
        _elements = elements;
        Sums = new PassIntegrals(beta, units.GivenCurrent);
    }

    /// <summary>What the pass sums up.</summary>
    public PassIntegrals Sums { get; }

    /// <summary>Charges at the end.</summary>
    public ReadOnlySpan<double> End => _end;

    /// <summary>Largest correction that a step's own Newton method made last; infinite where a step was not solved.</summary>
    public double Left { get; private set; }

    /// <summary>Derivatives of a charge at the end.</summary>
    public ReadOnlySpan<double> EndSlopes(int charge) => _endSlopes.AsSpan(charge * Width, Unknowns);

    /// <summary>Sets the frequency in rad/s and the ports at it.</summary>
    public void SetFrequency(double radians, in FollowerPorts ports)
    {
        _radians = radians;
        _ports = ports;
        Array.Clear(_mapped);
    }

    /// <summary>Makes a pass; false where a step was not solved.</summary>
    /// <param name="orbit">Guesses of the voltages, then the voltages, their currents and derivatives.</param>
    /// <param name="unknowns">The unknowns; the last one is not looked at.</param>
    /// <param name="amps">Peak motional current in units of the emitter current at rest.</param>
    public bool Run(FollowerOrbit orbit, ReadOnlySpan<double> unknowns, double amps)
    {
        unknowns[..3].CopyTo(_end);
        Array.Clear(_endSlopes);
        _endSlopes[0] = _endSlopes[Width + 1] = _endSlopes[2 * Width + 2] = 1;
        _baseAmps = _units.BaseFeed + _units.BasePerSource * unknowns[4];
        _emitterAmps = _units.EmitterPerSource * unknowns[3];
        Complex junction = _ports.Junction * amps / _units.Ohms;
        Complex inner = _ports.Internal * amps / _units.Ohms;
        Left = 0;
        Sums.Clear();
        PeriodMesh mesh = orbit.Mesh;
        Span<double> allVolts = orbit.Volts;
        Span<double> allCurrents = orbit.Currents;
        Span<double> allSlopes = orbit.Slopes;
        for (int step = 0; step < mesh.Count; step++)
        {
            ReadOnlySpan<double> map = MapOf(mesh.Levels[step]);
            ReadOnlySpan<Complex> turns = mesh.Turns(step);
            Span<double> volts = allVolts.Slice(step * Voltages, Voltages);
            Span<double> currents = allCurrents.Slice(step * Voltages, Voltages);
            Span<double> slopes = allSlopes.Slice(step * Voltages * Width, Voltages * Width);
            Prepare(map, turns, junction, inner);
            Left = Math.Max(Left, JunctionStep.Solve(map, _offsets, _right, volts, currents, slopes));
            if (!double.IsFinite(Left))
            {
                return false;
            }

            Advance(map, currents, slopes);
            Sums.Add(1.0 / (1 << mesh.Levels[step]), turns, _ports, amps, volts, currents, slopes);
        }

        Sums.Close(_ports.Own);
        return true;
    }

    private static double Real(Complex left, Complex right) => left.Real * right.Real - left.Imaginary * right.Imaginary;

    private ReadOnlySpan<double> MapOf(int level)
    {
        double[] map = _maps[level] ??= new double[FollowerElements.MapRows * FollowerElements.MapWidth];
        if (!_mapped[level])
        {
            _elements.Step(_radians, 2 * Math.PI / (1 << level), map);
            _mapped[level] = true;
        }

        return map;
    }

    // The voltages of a step with no current in either junction, and their derivatives.
    private void Prepare(ReadOnlySpan<double> map, ReadOnlySpan<Complex> turns, Complex junction, Complex inner)
    {
        var begin = new ChargeRows(_endSlopes);
        Span<Vector256<double>> right = MemoryMarshal.Cast<double, Vector256<double>>(_right.AsSpan());
        for (int k = 0; k < Voltages; k++)
        {
            ReadOnlySpan<double> line = map.Slice(k * FollowerElements.MapWidth, FollowerElements.MapWidth);
            double drive = k < Stages ? Real(junction, turns[k]) : Real(inner, turns[k - Stages]);
            _offsets[k] = drive + Linear(line) + (k < Stages ? _units.JunctionShift : _units.InnerShift);
            right[2 * k] = PerFirstSource(line);
            right[2 * k + 1] = PerSecondSource(line, drive);
            begin.AddTo(line, ref right[2 * k], ref right[2 * k + 1]);
        }
    }

    private void Advance(ReadOnlySpan<double> map, ReadOnlySpan<double> currents, ReadOnlySpan<double> slopes)
    {
        var begin = new ChargeRows(_endSlopes);
        ReadOnlySpan<Vector256<double>> lines = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        Span<Vector256<double>> ends = MemoryMarshal.Cast<double, Vector256<double>>(_endSlopes.AsSpan());
        int carrying = currents[0] + currents[1] + currents[2] == 0 ? 0 : currents[Stages] == 0 ? Stages : Voltages;
        Span<double> charges = stackalloc double[3];
        for (int row = 0; row < 3; row++)
        {
            ReadOnlySpan<double> line = map.Slice((Voltages + row) * FollowerElements.MapWidth, FollowerElements.MapWidth);
            double charge = Linear(line);
            Vector256<double> low = PerFirstSource(line);
            Vector256<double> high = PerSecondSource(line, 0);
            begin.AddTo(line, ref low, ref high);
            ReadOnlySpan<double> gains = line.Slice(FollowerElements.ForwardColumn, carrying);
            for (int k = 0; k < gains.Length; k++)
            {
                double term = gains[k] * currents[k];
                charge += term;
                low += lines[2 * k] * term;
                high += lines[2 * k + 1] * term;
            }

            charges[row] = charge;
            ends[2 * row] = low;
            ends[2 * row + 1] = high;
        }

        charges.CopyTo(_end);
    }

    // What the charges at the beginning and the constant currents make of a row of the map.
    private double Linear(ReadOnlySpan<double> line) =>
        line[0] * _end[0] + line[1] * _end[1] + line[2] * _end[2]
        + line[FollowerElements.BaseColumn] * _baseAmps + line[FollowerElements.EmitterColumn] * _emitterAmps;

    private Vector256<double> PerFirstSource(ReadOnlySpan<double> line) =>
        Vector256.Create(0, 0, 0, line[FollowerElements.EmitterColumn] * _units.EmitterPerSource);

    private Vector256<double> PerSecondSource(ReadOnlySpan<double> line, double drive) =>
        Vector256.Create(line[FollowerElements.BaseColumn] * _units.BasePerSource, drive, 0, 0);
}
