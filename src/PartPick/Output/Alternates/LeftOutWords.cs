using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The words for why a part was left out.</summary>
internal static class LeftOutWords
{
    /// <summary>The key in JSON.</summary>
    public static string Key(LeftOut reason) => reason switch
    {
        LeftOut.CrystalError => "crystalError",
        _ => reason.ToString().ToLowerInvariant(),
    };

    /// <summary>How many parts were left out and how many break a limit, as sentences; none where there are none.</summary>
    /// <param name="found">What was found for a part.</param>
    public static IEnumerable<string> Lines(LineAlternates found)
    {
        string[] leftOut = [.. found.LeftOut.Select(pair => $"{Figures.Whole(pair.Value)} {Words(pair.Key)}")];
        string[] unfit = [.. found.Unfit.Select(pair => $"{Figures.Whole(pair.Value)} {LimitWords.Words(pair.Key)}")];
        if (leftOut.Length > 0)
        {
            yield return $"Left out: {string.Join(", ", leftOut)}.";
        }

        if (unfit.Length > 0)
        {
            yield return $"Break a limit: {string.Join(", ", unfit)}.";
        }
    }

    /// <summary>The reason in words.</summary>
    public static string Words(LeftOut reason) => reason switch
    {
        LeftOut.Excluded => "excluded in the catalogue",
        LeftOut.Price => "no price in the currency",
        LeftOut.Package => "another package",
        LeftOut.Overtone => "an overtone crystal",
        LeftOut.Frequency => "another frequency",
        LeftOut.CrystalError => "the crystal's own spreads break the budget",
        LeftOut.Temperature => "not specified over the temperatures",
        LeftOut.Clock => "clock not guaranteed",
        LeftOut.Stage => "without the divider stage",
        LeftOut.Dielectric => "dielectric not fit for it",
        LeftOut.Voltage => "voltage too low",
        LeftOut.Value => "value not fit for it",
        LeftOut.Stock => "stock too small",
        LeftOut.Cost => "over the cost limit",
        LeftOut.Supply => "not specified over the supply",
        LeftOut.Margin => "start-up margin too small",
        _ => reason.ToString(),
    };
}
