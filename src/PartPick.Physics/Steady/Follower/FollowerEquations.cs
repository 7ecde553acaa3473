using PartPick.Physics.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// What makes a pass through the period a periodic state: it ends with the charges it began with, its mean currents are those
/// of the bias, and its amplitude is the given one or the one at which −Re Zc is the crystal's resistance.
/// </summary>
internal sealed class FollowerEquations
{
    private const int Unknowns = FollowerPass.Unknowns;
    private const int LogAmps = FollowerPass.LogAmps;
    private const int Tangent = Unknowns + 1;
    private const int Inverse = Unknowns + 2;
    private const int Width = 16;
    private const double LogarithmFrom = 0.2;
    private readonly FollowerUnits _units;
    private readonly double[] _matrix = new double[Unknowns * Width];
    private readonly double[] _mismatch = new double[Unknowns];

    public FollowerEquations(FollowerUnits units) => _units = units;

    /// <summary>The change of an unknown that Newton's method asks for.</summary>
    public double Step(int unknown) => _matrix[unknown * Width + Unknowns];

    /// <summary>How an unknown changes along ln I, for a given amplitude.</summary>
    public double AlongAmps(int unknown) => _matrix[unknown * Width + Tangent];

    /// <summary>The inverse of the derivatives, row by row.</summary>
    public void CopyInverse(Span<double> inverse)
    {
        for (int row = 0; row < Unknowns; row++)
        {
            _matrix.AsSpan(row * Width + Inverse, Unknowns).CopyTo(inverse[(row * Unknowns)..]);
        }
    }

    /// <summary>The largest change that an earlier inverse asks for at this pass, each unknown weighed.</summary>
    public double Size(ReadOnlySpan<double> inverse, ReadOnlySpan<double> weights)
    {
        double largest = 0;
        for (int row = 0; row < Unknowns; row++)
        {
            double change = 0;
            for (int k = 0; k < Unknowns; k++)
            {
                change += inverse[row * Unknowns + k] * _mismatch[k];
            }

            largest = Math.Max(largest, Math.Abs(change) * weights[row]);
        }

        return double.IsNaN(largest) ? double.PositiveInfinity : largest;
    }

    /// <summary>Solves the equations linearised at a pass; false where they are singular.</summary>
    /// <param name="pass">The pass.</param>
    /// <param name="unknowns">The unknowns it was made with.</param>
    /// <param name="resistanceOhms">Rm in ohms; null where the amplitude is given.</param>
    public bool Solve(FollowerPass pass, ReadOnlySpan<double> unknowns, double? resistanceOhms)
    {
        Array.Clear(_matrix);
        for (int k = 0; k < 3; k++)
        {
            Span<double> row = Row(k);
            pass.EndSlopes(k).CopyTo(row);
            row[k] -= 1;
            row[Unknowns] = unknowns[k] - pass.End[k];
        }

        FillMeans(pass.Sums, unknowns);
        FillAmplitude(pass.Sums, resistanceOhms);
        for (int k = 0; k < Unknowns; k++)
        {
            _mismatch[k] = _matrix[k * Width + Unknowns];
            _matrix[k * Width + Inverse + k] = 1;
        }

        return GaussJordan.Reduce(_matrix, Unknowns, Width / 4);
    }

    // The emitter resistor leads the mean emitter current off; or that current is one, and half the supply stands at the base.
    private void FillMeans(PassIntegrals sums, ReadOnlySpan<double> unknowns)
    {
        Span<double> first = Row(3);
        Span<double> second = Row(4);
        sums.MeanEmitterSlopes.CopyTo(first);
        if (_units.GivenCurrent)
        {
            first[Unknowns] = 1 - sums.MeanEmitter;
            sums.MeanReverseSlopes.CopyTo(second);
            second[Unknowns] = _units.InnerShift + _units.Supply / 2 - sums.MeanReverse;
        }
        else
        {
            first[3] -= _units.EmitterSiemens;
            first[Unknowns] = _units.EmitterSiemens * unknowns[3] - sums.MeanEmitter;
            second[4] = 1;
        }
    }

    // Re Zc falls about as 1/I: its logarithm is nearly straight.
    private void FillAmplitude(PassIntegrals sums, double? resistanceOhms)
    {
        Span<double> row = Row(LogAmps);
        if (resistanceOhms is not { } resistance)
        {
            row[LogAmps] = 1;
            row[Tangent] = 1;
            return;
        }

        double ratio = -sums.Impedance.Real / resistance;
        bool logarithm = ratio > LogarithmFrom;
        double scale = logarithm ? 1 / sums.Impedance.Real : -1 / resistance;
        for (int k = 0; k < Unknowns; k++)
        {
            row[k] = sums.ResistanceSlopes[k] * scale;
        }

        row[Unknowns] = logarithm ? -Math.Log(ratio) : 1 - ratio;
    }

    private Span<double> Row(int row) => _matrix.AsSpan(row * Width, Width);
}
