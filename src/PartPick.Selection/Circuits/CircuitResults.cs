using System.Collections.Immutable;
using System.Text.Json.Nodes;
using PartPick.Physics;

namespace PartPick.Selection;

/// <summary>The figures of one circuit under their fixed keys: the same for a single check and for a candidate.</summary>
public static class CircuitResults
{
    /// <summary>Error of a frequency at the crystal, as a ratio: against the target, else the nominal frequency.</summary>
    /// <param name="description">The circuit.</param>
    /// <param name="frequencyHz">Frequency at the crystal in hertz.</param>
    public static double ErrorRatio(CircuitDescription description, double frequencyHz)
    {
        ArgumentNullException.ThrowIfNull(description);
        double reference = description.ReferenceHz;
        return (frequencyHz - reference) / reference;
    }

    /// <summary>The word for the way a circuit starts.</summary>
    /// <param name="start">The way.</param>
    public static string Word(StartKind start) => start switch
    {
        StartKind.BuildsUp => "builds-up",
        StartKind.NeedsDisturbance => "needs-disturbance",
        StartKind.None => "none",
        _ => throw new ArgumentOutOfRangeException(nameof(start), start, "Not a way to start."),
    };

    /// <summary>The figures in SI units, the error in ppm; null where there is none.</summary>
    /// <param name="description">The circuit.</param>
    /// <param name="result">Its analysis.</param>
    /// <param name="warnings">Its warnings.</param>
    public static JsonObject ToJson(CircuitDescription description, OscillatorResult result, ImmutableArray<string> warnings)
    {
        ArgumentNullException.ThrowIfNull(description);
        ArgumentNullException.ThrowIfNull(result);
        StartUp start = result.StartUp;
        SteadyState? steady = result.Steady;
        return new JsonObject
        {
            ["frequency"] = Number(steady?.FrequencyHz),
            ["outputFrequency"] = Number(steady?.FrequencyHz / Math.Pow(2, description.Tap)),
            ["error"] = Number(steady is null ? null : ErrorRatio(description, steady.FrequencyHz) * 1e6),
            ["negativeResistance"] = Number(start.NegativeResistanceOhms),
            ["startUpMargin"] = Number(start.Margin),
            ["gainMargin"] = Number(start.GainMargin),
            ["criticalTransconductance"] = Number(start.CriticalSiemens),
            ["upperTransconductance"] = Number(start.UpperSiemens),
            ["growthRate"] = Number(start.GrowthRatePerSecond),
            ["start"] = Word(result.Start),
            ["runningMargin"] = Number(result.RunningMargin),
            ["startUpTime"] = Number(result.StartUpTimeSeconds),
            ["motionalCurrent"] = Number(steady?.CurrentRmsAmps),
            ["driveLevel"] = Number(steady?.DriveWatts),
            ["outputSwing"] = Number(steady?.OutputSwingVolts),
            ["loadCapacitance"] = Number(steady?.LoadFarads),
            ["limitedBySupply"] = steady is null ? null : steady.LimitedBySupply,
            ["warnings"] = new JsonArray([.. warnings.Select(warning => (JsonNode)warning)]),
        };
    }

    // JSON has no infinity: a load that is no capacitance (series resonance) counts as none.
    private static JsonValue? Number(double? value) =>
        value is { } number && double.IsFinite(number) ? JsonValue.Create(number) : null;
}
