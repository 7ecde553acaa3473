namespace PartPick.Selection.Search;

/// <summary>A fit combination as the search keeps it: the three figures that rank it and the choice itself.</summary>
/// <param name="ErrorRatio">Frequency error, worst case, as a ratio.</param>
/// <param name="Margin">Margin at the worst corner.</param>
/// <param name="Cost">Cost per unit.</param>
/// <param name="Choice">The parts.</param>
internal sealed record FitPoint(double ErrorRatio, double Margin, decimal Cost, CandidateParts Choice)
{
    /// <summary>The identifier, which breaks ties.</summary>
    public string Id { get; } = CandidateId.Of(Choice);

    /// <summary>The cost as a binary number, for quick comparisons.</summary>
    public double CostNumber { get; } = (double)Cost;

    /// <summary>Whether this one beats or equals the other's figures with one strictly better.</summary>
    public bool Dominates(double errorRatio, double margin, decimal cost) =>
        ErrorRatio <= errorRatio && Margin >= margin && Cost <= cost
        && (ErrorRatio < errorRatio || Margin > margin || Cost < cost);
}
