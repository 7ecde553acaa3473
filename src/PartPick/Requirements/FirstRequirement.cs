using PartPick.Selection;

namespace PartPick.Requirements;

/// <summary>The requirement with which the program shows itself the first time.</summary>
public static class FirstRequirement
{
    /// <summary>The time base of a river-level logger.</summary>
    public static Requirement RiverLogger { get; } = new()
    {
        Name = "river logger time base",
        OutputHz = 1000,
        Waveform = Waveform.Square,
        BudgetRatio = 80e-6,
        SupplyMinVolts = 4.5,
        SupplyMaxVolts = 5.5,
        TemperatureMinCelsius = -10,
        TemperatureMaxCelsius = 50,
        Years = 5,
        Margin = 5,
        StartUpTimeSeconds = 0.05,
        Builds = 200,
        CostLimit = 2.50m,
        Board = Board.TwoLayer,
        CapacitorSeries = "E12",
    };
}
