using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The words for a candidate of a list, the same in print and on the screen.</summary>
public static class ReviewWords
{
    /// <summary>The circuit in a few words: "counter, X-1, CNT-1, stage 12".</summary>
    /// <param name="review">The candidate.</param>
    public static string Name(ShortlistReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        string stage = review.Chosen.Tap > 0 ? string.Create(CultureInfo.InvariantCulture, $", stage {review.Chosen.Tap}") : "";
        return $"{review.Chosen.Circuit.Word()}, {review.Chosen.Ids["crystal"]}, {review.Chosen.Ids["amplifier"]}{stage}";
    }

    /// <summary>How it stands, in a word or two.</summary>
    /// <param name="review">The candidate.</param>
    public static string State(ShortlistReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        string fits = review.HasGoneParts ? "part gone"
            : review.IsFit ? "fits"
            : review.Then.IsFit ? "no longer fits"
            : "does not fit";
        return review is { IsChanged: true, HasGoneParts: false } ? fits + ", changed" : fits;
    }

    /// <summary>How it stands, for a narrow column.</summary>
    /// <param name="review">The candidate.</param>
    public static string ShortState(ShortlistReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        string fits = review.HasGoneParts ? "part gone" : review.IsFit ? "fits" : "unfit";
        return review is { IsChanged: true, HasGoneParts: false } ? fits + ", changed" : fits;
    }

    /// <summary>What there is to say: limits broken, what changed about the parts, and what became of the figures.</summary>
    /// <param name="review">The candidate.</param>
    public static IEnumerable<string> Lines(ShortlistReview review)
    {
        ArgumentNullException.ThrowIfNull(review);
        foreach (Miss miss in review.Misses)
        {
            yield return $"{(review.Then.IsFit ? "no longer fits" : "does not fit")} ({LimitWords.Words(miss.Limit)}): {miss.Sentence}";
        }

        foreach (PartChange change in review.Changes)
        {
            yield return Words(change);
        }

        foreach (string figure in FigureLines(review))
        {
            yield return figure;
        }
    }

    /// <summary>A change in words; of prices and stock without their digits' tails.</summary>
    /// <param name="change">The change.</param>
    public static string Words(PartChange change)
    {
        ArgumentNullException.ThrowIfNull(change);
        return change.Key == "prices"
            ? (change with { Old = Prices(change.Old), New = Prices(change.New) }).ToString()
            : change.ToString();
    }

    private static IEnumerable<string> FigureLines(ShortlistReview review)
    {
        (ShortlistFigures then, ShortlistFigures now) = (review.Then, review.Now);
        if (review.Candidate is null)
        {
            yield break;
        }

        if (then.Cost != now.Cost || then.Currency != now.Currency)
        {
            yield return $"cost per board {Money(then.Cost)} → {Money(now.Cost)}{(now.Cost is null ? "" : " " + now.Currency)}";
        }

        (string Name, string Old, string New)[] figures =
        [
            ("error (ppm)", Figures.Fixed(then.ErrorWorst, 1, 1), Figures.Fixed(now.ErrorWorst, 1, 1)),
            ("margin", Figures.Fixed(then.Margin, 1, 2), Figures.Fixed(now.Margin, 1, 2)),
            ("drive level (uW)", Figures.Short(then.DriveWatts, 1e-6), Figures.Short(now.DriveWatts, 1e-6)),
            ("start-up (ms)", Figures.Short(then.StartUpSeconds, 1e-3), Figures.Short(now.StartUpSeconds, 1e-3)),
        ];
        foreach ((string name, string old, string @new) in figures)
        {
            if (old != @new)
            {
                yield return $"{name} {old} → {@new}";
            }
        }
    }

    /// <summary>A cost per board.</summary>
    /// <param name="cost">The cost; null for none.</param>
    public static string Money(decimal? cost) => cost?.ToString("0.000", CultureInfo.InvariantCulture) ?? "none";

    // 1:0.12;10:0.084 as it is read aloud: 0.12 from 1, 0.084 from 10.
    private static string Prices(string text) => text.Length == 0 ? "" : string.Join(
        ", ", text.Split(';').Select(each => each.Split(':')).Select(pair => pair.Length == 2 ? $"{pair[1]} from {pair[0]}" : pair[0]));
}
