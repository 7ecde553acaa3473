namespace PartPick.Selection.Search;

/// <summary>The figures that rank a candidate and do not depend on the number of boards.</summary>
/// <param name="ErrorRatio">Frequency error, worst case, as a ratio.</param>
/// <param name="Margin">Margin at the worst corner.</param>
internal sealed record PoolFigures(double ErrorRatio, double Margin);

/// <summary>A candidate as it is bought for a number of boards.</summary>
/// <param name="Id">Its identifier with the parts that are bought.</param>
/// <param name="Choice">The parts.</param>
/// <param name="Cost">Cost per unit.</param>
/// <param name="Figures">Its figures.</param>
internal sealed record PoolPoint(string Id, CandidateParts Choice, decimal Cost, PoolFigures Figures);
