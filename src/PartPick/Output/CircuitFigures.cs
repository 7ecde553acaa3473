using PartPick.Physics;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Output;

/// <summary>One figure of a circuit's results.</summary>
/// <param name="Key">Its key in JSON.</param>
/// <param name="Label">Its name in words.</param>
/// <param name="Unit">Its SI unit, or ppm; empty for none.</param>
/// <param name="Text">The value for people, with unit.</param>
internal sealed record CircuitFigure(string Key, string Label, string Unit, string Text);

/// <summary>The figures of a circuit's results in the order of their keys.</summary>
internal static class CircuitFigures
{
    /// <summary>All figures but the warnings.</summary>
    public static IReadOnlyList<CircuitFigure> Of(CircuitDescription description, OscillatorResult result)
    {
        StartUp start = result.StartUp;
        SteadyState? steady = result.Steady;
        string reference = description.TargetHz is null ? "against the nominal frequency" : "against the target";
        return
        [
            new("frequency", "Frequency at the crystal", "Hz", Value(steady?.FrequencyHz, Dimension.Frequency, 10)),
            new("outputFrequency", description.Tap > 0 ? $"Output frequency (divided by 2^{description.Tap})" : "Output frequency", "Hz",
                Value(steady?.FrequencyHz / Math.Pow(2, description.Tap), Dimension.Frequency, 10)),
            new("error", $"Error {reference}", "ppm",
                steady is null
                    ? Figures.None
                    : Figures.Fixed(CircuitResults.ErrorRatio(description, steady.FrequencyHz), 1e-6, 2) + " ppm"),
            new("negativeResistance", "Negative resistance", "ohm", Value(start.NegativeResistanceOhms, Dimension.Resistance, 4)),
            new("startUpMargin", "Start-up margin", "", Figures.Short(start.Margin, 1)),
            new("gainMargin", "Gain margin", "", Figures.Short(start.GainMargin, 1)),
            new("criticalTransconductance", "Critical transconductance", "S", Value(start.CriticalSiemens, Dimension.Transconductance, 4)),
            new("upperTransconductance", "Upper transconductance", "S", Value(start.UpperSiemens, Dimension.Transconductance, 4)),
            new("growthRate", "Growth rate", "1/s", Figures.Short(start.GrowthRatePerSecond, 1) + " /s"),
            new("start", "Start", "", Start(result.Start)),
            new("runningMargin", "Running margin", "", Figures.Short(result.RunningMargin, 1)),
            new("startUpTime", "Start-up time", "s", Value(result.StartUpTimeSeconds, Dimension.Time, 3)),
            new("motionalCurrent", "Motional current (rms)", "A", Value(steady?.CurrentRmsAmps, Dimension.Current, 4)),
            new("driveLevel", "Drive level", "W", Drive(description, steady)),
            new("outputSwing", "Output swing (peak to peak)", "V", Value(steady?.OutputSwingVolts, Dimension.Voltage, 3)),
            new("loadCapacitance", "Load seen by the crystal", "F", Value(steady?.LoadFarads, Dimension.Capacitance, 4)),
            new("limitedBySupply", "Limited by the supply", "", steady is null ? Figures.None : steady.LimitedBySupply ? "yes" : "no"),
        ];
    }

    /// <summary>The way a circuit starts, in words.</summary>
    public static string Start(StartKind start) => start switch
    {
        StartKind.BuildsUp => "builds up from noise",
        StartKind.NeedsDisturbance => "needs a disturbance",
        _ => "does not start",
    };

    private static string Drive(CircuitDescription description, SteadyState? steady)
    {
        string text = Value(steady?.DriveWatts, Dimension.Power, 3);
        return steady is not null && description.Ratings.DriveLevelWatts is { } rated
            ? $"{text} (rated {ValueText.Format(rated, Dimension.Power)})"
            : text;
    }

    private static string Value(double? value, Dimension dimension, int digits) =>
        value is { } number && double.IsFinite(number) ? ValueText.Format(number, dimension, digits) : Figures.None;
}
