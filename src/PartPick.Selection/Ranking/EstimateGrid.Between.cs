namespace PartPick.Selection.Search;

/// <summary>What the nodes say of the combinations between them, beyond the nearest ones.</summary>
internal sealed partial class EstimateGrid
{
    // What may be left of a drive level after interpolation, as logarithms: everywhere, and as a share of the range round it.
    private const double DriveSlack = 0.1;
    private const double DriveRange = 0.3;

    /// <summary>
    /// Narrower bounds, from nodes further round as well: what is known at the nodes bends little between them.
    /// </summary>
    /// <param name="option">Place of the amplifier option.</param>
    /// <param name="c1">Place of C1's value.</param>
    /// <param name="c2">Place of C2's value.</param>
    /// <param name="range">The bounds known so far.</param>
    public LoadRange Sharp(int option, int c1, int c2, in LoadRange range)
    {
        if (Predict(option, c1, c2) is not { } predicted || _critical.Farads(Values(option, c1, c2)) is not { } critical)
        {
            return range;
        }

        double slack = _fineness.SharpSlack + predicted.Bend + _fineness.SharpRange * predicted.Range;
        LoadRange sharp = Load(critical * (predicted.Share - slack), critical * (predicted.Share + slack), range.HarmonicShare);
        return new LoadRange(
            Math.Max(range.Lowest, sharp.Lowest), Math.Max(sharp.Lowest, Math.Min(range.Highest, sharp.Highest)), range.HarmonicShare);
    }

    /// <summary>The share between the nodes, and by how much it bends there; null where too few nodes run.</summary>
    private (double Share, double Bend, double Range)? Predict(int option, int c1, int c2)
    {
        (NodeBracket o, NodeBracket i, NodeBracket j) = (_options[option], _values[c1], _values[c2]);
        double share = 0;
        double bend = 0;
        double byOption = 0;
        double byC1 = 0;
        double byC2 = 0;
        double least = double.PositiveInfinity;
        double most = 0;
        foreach ((int atO, double wO) in Ends(o))
        {
            foreach ((int atI, double wI) in Ends(i))
            {
                double along = ShareAt(atO, atI, j.Low);
                double to = ShareAt(atO, atI, j.High);
                (least, most) = (Math.Min(least, Math.Min(along, to)), Math.Max(most, Math.Max(along, to)));
                share += wO * wI * (along + (to - along) * j.Weight);
                byC2 += wO * wI * Bend(j, place => ShareAt(atO, atI, place));
            }

            foreach ((int atJ, double wJ) in Ends(j))
            {
                byC1 += wO * wJ * Bend(i, place => ShareAt(atO, place, atJ));
            }
        }

        if (double.IsNaN(share))
        {
            return null;
        }

        foreach ((int atI, double wI) in Ends(i))
        {
            foreach ((int atJ, double wJ) in Ends(j))
            {
                byOption += wI * wJ * Bend(o, place => ShareAt(place, atI, atJ));
            }
        }

        bend = Math.Abs(byOption) + Math.Abs(byC1) + Math.Abs(byC2);
        return double.IsNaN(bend) ? null : (share + byOption + byC1 + byC2, bend, most - least);
    }

    private static double Bend(NodeBracket bracket, Func<int, double> share) => bracket.IsNode
        ? 0
        : bracket.Bend(
            bracket.Before < 0 ? double.NaN : share(bracket.Before),
            share(bracket.Low),
            share(bracket.High),
            bracket.After < 0 ? double.NaN : share(bracket.After));

    private double ShareAt(int option, int c1, int c2) => Find(option, c1, c2) is { Share: > 0 and var share } ? share : double.NaN;

    /// <summary>
    /// The least drive level in watts between the nodes round a combination, as nominal or at the higher one of the corners furthest
    /// apart; zero where not known.
    /// </summary>
    /// <param name="option">Place of the amplifier option.</param>
    /// <param name="c1">Place of C1's value.</param>
    /// <param name="c2">Place of C2's value.</param>
    /// <param name="highest">Whether at the corners, of a gate.</param>
    public double LeastDriveWatts(int option, int c1, int c2, bool highest)
    {
        if (PredictDrive(option, c1, c2, highest) is not { } predicted)
        {
            return 0;
        }

        return Math.Exp(predicted.Log - DriveSlack - DriveRange * predicted.Range)
            * (1 - _family.Members[0].Quality.DriveShare) * (highest ? ProspectAnalysis.LeastCornerDrive : 1);
    }

    private (double Log, double Range)? PredictDrive(int option, int c1, int c2, bool highest)
    {
        double sum = 0;
        double least = double.PositiveInfinity;
        double most = double.NegativeInfinity;
        foreach ((Node? node, double weight) in Around(option, c1, c2))
        {
            if (node is null)
            {
                return null;
            }

            double log = Math.Log(highest ? (node.Amplifier ??= FindOverAmplifier(node)).Watts : node.Estimate!.DriveWatts);
            sum += weight * log;
            (least, most) = (Math.Min(least, log), Math.Max(most, log));
        }

        return (sum, most - least);
    }
}
