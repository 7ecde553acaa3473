using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace PartPick.Physics.Steady;

/// <summary>The derivatives of the three charges at the beginning of a step by the unknowns, two vectors to a charge.</summary>
internal readonly struct ChargeRows
{
    private readonly Vector256<double> _low0, _high0, _low1, _high1, _low2, _high2;

    /// <param name="slopes">Three rows of <see cref="JunctionStep.Width"/>.</param>
    public ChargeRows(ReadOnlySpan<double> slopes)
    {
        ReadOnlySpan<Vector256<double>> rows = MemoryMarshal.Cast<double, Vector256<double>>(slopes);
        (_low2, _high2) = (rows[4], rows[5]);
        (_low1, _high1) = (rows[2], rows[3]);
        (_low0, _high0) = (rows[0], rows[1]);
    }

    /// <summary>What a row of a step's map makes of them, added to the given vectors.</summary>
    public void AddTo(ReadOnlySpan<double> line, ref Vector256<double> low, ref Vector256<double> high)
    {
        low += _low0 * line[0] + _low1 * line[1] + _low2 * line[2];
        high += _high0 * line[0] + _high1 * line[1] + _high2 * line[2];
    }
}
