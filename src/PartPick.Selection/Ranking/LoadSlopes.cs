namespace PartPick.Selection.Search;

/// <summary>How much the load seen by the crystal at least grows per farad of a capacitance.</summary>
/// <param name="C1">Per farad of C1, and of the stray beside it.</param>
/// <param name="C2">Per farad of C2, and of the stray beside it.</param>
/// <param name="Across">Per farad across the crystal.</param>
internal readonly record struct LoadSlopes(double C1, double C2, double Across)
{
    private const double SeriesShare = 0.6;

    /// <summary>
    /// From the values alone: the slopes of two capacitors in series beside a third, within a factor that the device does not
    /// undercut.
    /// </summary>
    /// <param name="board">The board's strays.</param>
    /// <param name="gate">Whether a stray stands beside C1, as in all circuits but a follower.</param>
    /// <param name="values">Nominal values.</param>
    public static LoadSlopes OfCapacitors(Board board, bool gate, in CircuitValues values)
    {
        double first = values.C1Farads + (gate ? board.Strays.InputFarads : 0);
        double second = values.C2Farads + board.Strays.OutputFarads;
        double firstShare = second / (first + second) * (second / (first + second));
        double secondShare = first / (first + second) * (first / (first + second));
        return new LoadSlopes(SeriesShare * firstShare, SeriesShare * secondShare, SeriesShare);
    }
}
