using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>What load capacitors and strays at least add to the error budget of a combination of values.</summary>
internal readonly struct LeastTerms
{
    private readonly double _byC1;
    private readonly double _byC2;
    private readonly double _strays;

    private LeastTerms(double byC1, double byC2, double strays)
    {
        _byC1 = byC1;
        _byC2 = byC2;
        _strays = strays;
    }

    /// <summary>From the least slopes of the load, for a load between bounds; nothing where it is not bounded.</summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="gate">Whether a stray stands beside C1, as in all circuits but a follower.</param>
    /// <param name="crystal">The crystal.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="slopes">The slopes.</param>
    /// <param name="highestFarads">Largest load capacitance seen by the crystal.</param>
    public static LeastTerms OfLoad(
        Board board, bool gate, Crystal crystal, in CircuitValues values, LoadSlopes slopes, double highestFarads)
    {
        if (!double.IsFinite(highestFarads))
        {
            return default;
        }

        double perFarad = Math.Abs(crystal.TrimSensitivityPerFarad(highestFarads));
        return Of(board, gate, values, perFarad * slopes.C1, perFarad * slopes.C2, perFarad * slopes.Across);
    }

    /// <summary>From slopes of the frequency that are right to the first order.</summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="gate">Whether a stray stands beside C1, as in all circuits but a follower.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="slopes">∂f/f by C1, C2 and the stray across, per farad.</param>
    /// <param name="share">Least true slopes over these.</param>
    public static LeastTerms OfSlopes(
        Board board, bool gate, in CircuitValues values, (double C1, double C2, double Across) slopes, double share) => Of(
        board,
        gate,
        values,
        share * Math.Abs(slopes.C1),
        share * Math.Abs(slopes.C2),
        share * Math.Abs(slopes.Across));

    /// <summary>The least sum of the terms for capacitors with these spreads, all as ratios.</summary>
    public double Ratio(double c1Spread, double c2Spread) => _byC1 * c1Spread + _byC2 * c2Spread + _strays;

    private static LeastTerms Of(Board board, bool gate, in CircuitValues values, double byC1, double byC2, double byAcross) => new(
        byC1 * values.C1Farads,
        byC2 * values.C2Farads,
        board.UncertaintyRatio * (
            (gate ? byC1 * board.Strays.InputFarads : 0)
            + byC2 * board.Strays.OutputFarads
            + byAcross * board.Strays.AcrossFarads));
}
