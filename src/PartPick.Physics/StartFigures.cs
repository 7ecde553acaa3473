namespace PartPick.Physics;

/// <summary>The two start-up figures that every corner is asked for.</summary>
/// <param name="Margin">Start-up margin.</param>
/// <param name="GrowthRatePerSecond">Growth rate in 1/s.</param>
public readonly record struct StartFigures(double Margin, double GrowthRatePerSecond);
