using System.Numerics;

namespace PartPick.Physics.Network;

/// <summary>
/// A passive network of three nodes and ground: an admittance from each node to ground and one between each two nodes.
/// Impedances come from the matrix-tree theorem (sums of products of branch admittances), so that nothing cancels;
/// the branch between nodes 2 and 3 may be a short.
/// </summary>
internal readonly struct ThreeNodeNetwork
{
    private readonly Complex _y1;
    private readonly Complex _y2;
    private readonly Complex _y3;
    private readonly Complex _y12;
    private readonly Complex _y13;
    private readonly Complex _y23;
    private readonly bool _shorted;

    /// <param name="y1">Admittance from node 1 to ground, in siemens.</param>
    /// <param name="y2">Admittance from node 2 to ground, in siemens.</param>
    /// <param name="y3">Admittance from node 3 to ground, in siemens.</param>
    /// <param name="y12">Admittance between nodes 1 and 2, in siemens.</param>
    /// <param name="y13">Admittance between nodes 1 and 3, in siemens.</param>
    /// <param name="ohms23">Resistance between nodes 2 and 3, in ohms; zero joins them.</param>
    public ThreeNodeNetwork(Complex y1, Complex y2, Complex y3, Complex y12, Complex y13, double ohms23)
    {
        _y1 = y1;
        _y2 = y2;
        _y3 = y3;
        _y12 = y12;
        _y13 = y13;
        _shorted = ohms23 == 0;
        _y23 = _shorted ? 0 : 1 / ohms23;
    }

    /// <summary>Impedances for currents injected between nodes 1 and 2 (out of 2) and into node 3.</summary>
    /// <param name="z1">Voltage of node 1 per current from 2 to 1.</param>
    /// <param name="zAcross">Voltage from 1 to 2 per current from 2 to 1.</param>
    /// <param name="z3">Voltage of node 3 per current from 2 to 1; also the voltage from 1 to 2 per current into 3.</param>
    /// <param name="z13">Voltage of node 1 per current into node 3.</param>
    /// <param name="z33">Voltage of node 3 per current into node 3.</param>
    public void Floating(out Complex z1, out Complex zAcross, out Complex z3, out Complex z13, out Complex z33)
    {
        if (_shorted)
        {
            Complex rest = _y2 + _y3;
            Complex link = _y12 + _y13;
            Complex inverse = 1 / (_y1 * rest + (_y1 + rest) * link);
            z1 = rest * inverse;
            zAcross = (_y1 + rest) * inverse;
            z3 = -_y1 * inverse;
            z13 = link * inverse;
            z33 = (_y1 + link) * inverse;
        }
        else
        {
            Complex sum = _y13 + _y23;
            Complex trees = _y12 * sum + _y13 * _y23;
            Complex inverse = 1 / Determinant(trees);
            z1 = (_y2 * (_y3 + sum) + _y3 * _y23) * inverse;
            zAcross = ((_y1 + _y2) * (_y3 + sum) + _y3 * sum) * inverse;
            z3 = (_y13 * _y2 - _y23 * _y1) * inverse;
            z13 = (trees + _y13 * _y2) * inverse;
            z33 = (_y1 * _y2 + _y1 * (_y12 + _y23) + _y2 * (_y12 + _y13) + trees) * inverse;
        }
    }

    /// <summary>The impedance matrix: voltage of the first node per current into the second (symmetric).</summary>
    public void Matrix(out Complex z11, out Complex z12, out Complex z13, out Complex z22, out Complex z23, out Complex z33)
    {
        if (_shorted)
        {
            Complex rest = _y2 + _y3;
            Complex link = _y12 + _y13;
            Complex inverse = 1 / (_y1 * rest + (_y1 + rest) * link);
            z11 = (rest + link) * inverse;
            z12 = z13 = link * inverse;
            z22 = z23 = z33 = (_y1 + link) * inverse;
        }
        else
        {
            Complex trees = _y12 * (_y13 + _y23) + _y13 * _y23;
            Complex inverse = 1 / Determinant(trees);
            z11 = (_y2 * _y3 + _y2 * (_y13 + _y23) + _y3 * (_y12 + _y23) + trees) * inverse;
            z22 = (_y1 * _y3 + _y1 * (_y13 + _y23) + _y3 * (_y12 + _y13) + trees) * inverse;
            z33 = (_y1 * _y2 + _y1 * (_y12 + _y23) + _y2 * (_y12 + _y13) + trees) * inverse;
            z12 = (trees + _y12 * _y3) * inverse;
            z13 = (trees + _y13 * _y2) * inverse;
            z23 = (trees + _y23 * _y1) * inverse;
        }
    }

    private Complex Determinant(Complex trees) =>
        _y1 * _y2 * (_y3 + _y13 + _y23)
        + _y3 * (_y1 * (_y12 + _y23) + _y2 * (_y12 + _y13))
        + (_y1 + _y2 + _y3) * trees;
}
