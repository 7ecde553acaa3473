using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>What load capacitors and strays at least add to the error budget of a combination of values.</summary>
internal readonly struct LeastTerms
{
    private const double SeriesShare = 0.6;
    private const double FirstOrderShare = 0.93;
    private readonly double _byC1;
    private readonly double _byC2;
    private readonly double _strays;

    private LeastTerms(double byC1, double byC2, double strays)
    {
        _byC1 = byC1;
        _byC2 = byC2;
        _strays = strays;
    }

    /// <summary>
    /// From the values alone: the slopes of the load by C1, C2 and the strays are those of two capacitors in series beside a third,
    /// within a factor that the device does not undercut.
    /// </summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="gate">Whether a stray stands beside C1, as in all circuits but a follower.</param>
    /// <param name="crystal">The crystal.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="loadFarads">Load capacitance seen by the crystal.</param>
    public static LeastTerms OfValues(Board board, bool gate, Crystal crystal, in CircuitValues values, double loadFarads)
    {
        double first = values.C1Farads + (gate ? board.Strays.InputFarads : 0);
        double second = values.C2Farads + board.Strays.OutputFarads;
        double firstShare = second / (first + second) * (second / (first + second));
        double secondShare = first / (first + second) * (first / (first + second));
        double perFarad = SeriesShare * Math.Abs(crystal.TrimSensitivityPerFarad(loadFarads));
        return Of(board, gate, values, perFarad * firstShare, perFarad * secondShare, perFarad);
    }

    /// <summary>From the values alone, for a load between bounds; nothing where it is not bounded.</summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="family">The family.</param>
    /// <param name="crystal">The crystal.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="load">The bounds.</param>
    public static LeastTerms OfLoad(Board board, CircuitFamily family, Crystal crystal, in CircuitValues values, in LoadRange load) =>
        double.IsFinite(load.Highest) ? OfValues(board, family.IsGate, crystal, values, load.Highest) : default;

    /// <summary>From slopes of the frequency that are right to the first order.</summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="gate">Whether a stray stands beside C1, as in all circuits but a follower.</param>
    /// <param name="values">Nominal values.</param>
    /// <param name="slopes">∂f/f by C1, C2 and the stray across, per farad.</param>
    public static LeastTerms OfSlopes(Board board, bool gate, in CircuitValues values, (double C1, double C2, double Across) slopes) => Of(
        board,
        gate,
        values,
        FirstOrderShare * Math.Abs(slopes.C1),
        FirstOrderShare * Math.Abs(slopes.C2),
        FirstOrderShare * Math.Abs(slopes.Across));

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
