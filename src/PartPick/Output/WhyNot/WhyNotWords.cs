using System.Globalization;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>An answer to "why not this part" in sentences, for the command and the screen alike.</summary>
internal static class WhyNotWords
{
    /// <summary>The verdict in one sentence.</summary>
    public static string Verdict(WhyNotAnswer answer)
    {
        string id = answer.Part.Id;
        if (answer is { Fits: true, Place: { } place })
        {
            return place.Number is { } number
                ? $"{id} is in the list: its best circuit is number {Figures.Whole(number)} of {Figures.Whole(place.Listed)}."
                : $"{id} fits, and is not listed because {Figures.Whole(place.Listed)} others are better.";
        }

        string why = string.Join(", ", Removing(answer));
        string change = answer.Changes is [var first, ..] ? $" What lets it in: {Shown(first)}." : "";
        return $"{id} is not in the list{(why.Length == 0 ? "" : $": {why}")}.{change}";
    }

    /// <summary>A set of changes, as the screen's signs show it.</summary>
    public static string Shown(ChangeSet set) => string.Join(" and ", set.Changes.Select(change => change.ToString()));

    /// <summary>The hurdle in a few words.</summary>
    public static string Of(HurdleName name) => name switch
    {
        HurdleName.Excluded => "excluded by hand",
        HurdleName.Overtone => "overtone",
        HurdleName.Price => "price",
        HurdleName.Stock => "stock",
        HurdleName.Circuit => "circuit",
        HurdleName.Frequency => "output frequency",
        HurdleName.Supply => "supply range",
        HurdleName.Temperature => "temperature range",
        HurdleName.Clock => "clock",
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, "Not a hurdle."),
    };

    /// <summary>What the list's better candidates have before the part's own; empty where there is none.</summary>
    public static IEnumerable<string> Beaten(WhyNotAnswer answer)
    {
        if (answer is not { Candidate: { } own, Place: { } place } || place.Number == 1)
        {
            yield break;
        }

        yield return $"The first is better: {Against(place.First, own)}.";
        if (place.Above is { } above && above.Id != place.First.Id)
        {
            yield return $"{(place.Number is null ? "The last that is listed" : "The one just before it")}: {Against(above, own)}.";
        }
    }

    /// <summary>Where it would stand once the smallest change is made; null where that is not known.</summary>
    public static string? Then(WhyNotAnswer answer) => answer.PlaceThen switch
    {
        null => null,
        { Number: { } number } then =>
            $"With {Shown(answer.Changes[0])} it is number {Figures.Whole(number)} of {Figures.Whole(then.Listed)} listed.",
        { } then => $"With {Shown(answer.Changes[0])} it fits, behind the {Figures.Whole(then.Listed)} that are listed.",
    };

    /// <summary>How many combinations with it each limit removed, most first; empty where none were looked at.</summary>
    public static string Removed(WhyNotAnswer answer) => string.Join(", ", answer.Rejections
        .Where(limit => limit.Value > 0)
        .OrderByDescending(limit => limit.Value).ThenBy(limit => limit.Key)
        .Select(limit => $"{LimitWords.Words(limit.Key)} {Figures.Count(limit.Value)}"));

    private static IEnumerable<string> Removing(WhyNotAnswer answer) =>
    [
        .. answer.Hurdles.Select(hurdle => $"{Of(hurdle.Name)} ({Joined(hurdle)})"),
        .. answer.Limits.Where(limit => limit.IsBroken)
            .Select(limit => $"{LimitWords.Words(limit.Limit)} {limit.Reached}, {Wanted(limit)}, {limit.Distance}"),
    ];

    private static string Joined(Hurdle hurdle) =>
        (hurdle.Wanted.Length == 0 ? "" : $"wanted {hurdle.Wanted}, ") + hurdle.Has
            + (hurdle.Distance.Length == 0 ? "" : $", {hurdle.Distance}");

    private static string Wanted(LimitReading limit) =>
        limit.Limit == Limit.Drive ? $"rated {limit.Wanted}" : $"wanted {limit.Wanted}";

    private static string Against(Candidate better, Candidate own)
    {
        string name = $"{better.Choice.Crystal.Id} with {better.Choice.Amplifier.Id}";
        return $"{name}, error {Ppm(better)} against {Ppm(own)} ppm, margin {Margin(better)} against {Margin(own)}, "
            + $"cost {Money(better)} against {Money(own)} {own.Currency}, score {Score(better)} against {Score(own)}";
    }

    private static string Ppm(Candidate one) => Figures.Short(one.Budget?.WorstRatio, 1e-6);

    private static string Margin(Candidate one) => Figures.Short(one.Margin.Value, 1);

    private static string Money(Candidate one) => one.Cost.ToString("0.00##", CultureInfo.InvariantCulture);

    private static string Score(Candidate one) => Figures.Fixed(one.Score, 1, 3);
}
