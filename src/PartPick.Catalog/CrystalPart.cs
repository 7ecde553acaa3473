namespace PartPick.Catalog;

/// <summary>A quartz crystal.</summary>
public sealed record CrystalPart : Part
{
    /// <inheritdoc/>
    public override PartKind Kind => PartKind.Crystal;

    /// <summary>The cut.</summary>
    public required CrystalCut Cut { get; init; }

    /// <summary>The overtone it is used on: 1, 3 or 5.</summary>
    public required int Overtone { get; init; }

    /// <summary>The nominal frequency, Hz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>The holder, in the trade's words.</summary>
    public string? Holder { get; init; }

    /// <summary>The load capacitance at which the nominal frequency holds, F; null for series resonance.</summary>
    public double? LoadFarads { get; init; }

    /// <summary>The shunt capacitance C0, F.</summary>
    public double? ShuntFarads { get; init; }

    /// <summary>The motional capacitance, F.</summary>
    public double? MotionalFarads { get; init; }

    /// <summary>The motional resistance, Ω.</summary>
    public double? ResistanceOhms { get; init; }

    /// <summary>The drive level it bears, W.</summary>
    public double? DriveLevelWatts { get; init; }

    /// <summary>The tolerance of the frequency at 25 °C, a ratio to both sides.</summary>
    public double? ToleranceRatio { get; init; }

    /// <summary>The change of frequency over the temperature range, a ratio to both sides; null where a parabola says it.</summary>
    public double? StabilityRatio { get; init; }

    /// <summary>The ageing of the first year, a ratio to both sides.</summary>
    public double? AgeingRatio { get; init; }

    /// <summary>The ageing of each later year, a ratio to both sides.</summary>
    public double? AgeingYearlyRatio { get; init; }

    /// <summary>The lowest temperature, °C.</summary>
    public double? TemperatureMinCelsius { get; init; }

    /// <summary>The highest temperature, °C.</summary>
    public double? TemperatureMaxCelsius { get; init; }

    /// <summary>The parabola of frequency over temperature, 1/K², negative for a tuning fork.</summary>
    public double? ParabolaPerSquareKelvin { get; init; }

    /// <summary>The temperature at the top of the parabola, °C.</summary>
    public double? TurnoverCelsius { get; init; }
}
