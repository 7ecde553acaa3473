namespace PartPick.Selection.Tests.Ranking;

/// <summary>A fit choice of parts with the figures that rank it.</summary>
/// <param name="Choice">The parts.</param>
/// <param name="Id">Its identifier.</param>
/// <param name="ErrorRatio">Frequency error, worst case, as a ratio.</param>
/// <param name="Margin">Margin at the worst corner.</param>
/// <param name="Cost">Cost per unit.</param>
internal sealed record TriedChoice(CandidateParts Choice, string Id, double ErrorRatio, double Margin, decimal Cost)
{
    /// <summary>Its circuit–crystal–amplifier group.</summary>
    public (CircuitKind, string, string, int) Group => (Choice.Circuit, Choice.Crystal.Id, Choice.Amplifier.Id, Choice.Tap);
}
