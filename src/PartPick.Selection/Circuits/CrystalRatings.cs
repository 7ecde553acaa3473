namespace PartPick.Selection;

/// <summary>What a crystal is rated for, beside its equivalent circuit. What is not stated is null.</summary>
public sealed record CrystalRatings
{
    /// <summary>Nothing stated.</summary>
    public static CrystalRatings None { get; } = new();

    /// <summary>Highest drive level in watts, above zero.</summary>
    public double? DriveLevelWatts { get; init; }

    /// <summary>Tolerance of the frequency at 25 °C, as a ratio to both sides.</summary>
    public double? ToleranceRatio { get; init; }

    /// <summary>Change of frequency over its temperature range, as a ratio to both sides.</summary>
    public double? StabilityRatio { get; init; }

    /// <summary>Ageing of the first year, as a ratio to both sides.</summary>
    public double? AgeingRatio { get; init; }
}
