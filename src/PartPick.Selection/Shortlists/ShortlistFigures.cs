using System.Collections.Immutable;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace PartPick.Selection;

/// <summary>The figures of a candidate that are compared over time; null where there is none.</summary>
/// <param name="ErrorWorst">Frequency error, worst case, ppm.</param>
/// <param name="ErrorRss">Frequency error, root of the sum of squares, ppm.</param>
/// <param name="Margin">Start-up margin of the worst corner.</param>
/// <param name="DriveWatts">Drive level of the worst corner, W.</param>
/// <param name="StartUpSeconds">Start-up time of the worst corner, s.</param>
/// <param name="Cost">Cost per unit; null where a part has no price in the currency.</param>
/// <param name="Currency">The currency of the cost.</param>
/// <param name="Misses">The limits it breaks, as sentences.</param>
public sealed record ShortlistFigures(
    double? ErrorWorst,
    double? ErrorRss,
    double? Margin,
    double? DriveWatts,
    double? StartUpSeconds,
    decimal? Cost,
    string Currency,
    ImmutableArray<string> Misses)
{
    /// <summary>Whether it breaks no limit.</summary>
    public bool IsFit => Misses.IsEmpty;

    /// <summary>The figures of a candidate.</summary>
    /// <param name="candidate">The candidate; null where there is none.</param>
    /// <param name="misses">The limits it breaks.</param>
    /// <param name="priced">Whether its cost says something.</param>
    public static ShortlistFigures Of(Candidate? candidate, ImmutableArray<Miss> misses, bool priced) => new(
        Finite(candidate?.Budget?.WorstRatio * 1e6),
        Finite(candidate?.Budget?.RssRatio * 1e6),
        Finite(candidate?.Margin.Value),
        Finite(candidate?.Drive?.Value),
        Finite(candidate?.StartUpTime?.Value),
        priced ? candidate?.Cost : null,
        candidate?.Currency ?? "",
        [.. misses.Select(miss => miss.Sentence)]);

    /// <summary>Reads what <see cref="ToJson"/> has written; null where the text is something else.</summary>
    /// <param name="json">The text.</param>
    public static ShortlistFigures? Read(string json)
    {
        try
        {
            JsonObject root = JsonNode.Parse(json)!.AsObject();
            return new ShortlistFigures(
                root["errorWorst"]?.GetValue<double>(),
                root["errorRss"]?.GetValue<double>(),
                root["startUpMargin"]?.GetValue<double>(),
                root["driveLevel"]?.GetValue<double>(),
                root["startUpTime"]?.GetValue<double>(),
                root["cost"]?.GetValue<decimal>(),
                root["currency"]!.GetValue<string>(),
                [.. root["misses"]!.AsArray().Select(miss => miss!.GetValue<string>())]);
        }
        catch (Exception error) when (error is JsonException or InvalidOperationException or NullReferenceException or FormatException)
        {
            return null;
        }
    }

    /// <summary>The figures as JSON: error in ppm, all else in SI units.</summary>
    public JsonObject ToJson() => new()
    {
        ["errorWorst"] = ErrorWorst,
        ["errorRss"] = ErrorRss,
        ["startUpMargin"] = Margin,
        ["driveLevel"] = DriveWatts,
        ["startUpTime"] = StartUpSeconds,
        ["cost"] = Cost,
        ["currency"] = Currency,
        ["fit"] = IsFit,
        ["misses"] = new JsonArray([.. Misses.Select(miss => (JsonNode)miss)]),
    };

    private static double? Finite(double? value) => value is { } number && double.IsFinite(number) ? number : null;
}
