using System.Globalization;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Shows on one line of a terminal how far a ranking is.</summary>
internal sealed class RankingProgress(TextWriter error) : IProgress<RankingResult>
{
    private readonly Lock _lock = new();
    private int _width;

    /// <inheritdoc/>
    public void Report(RankingResult value)
    {
        double share = value.Combinations > 0 ? value.Covered / value.Combinations : 1;
        string best = value.Candidates.IsDefaultOrEmpty ? "" : $", best so far {value.Candidates[0].Id}";
        string line = string.Create(CultureInfo.InvariantCulture, $"{share:P0} of {Figures.Count(value.Combinations)} combinations{best}");
        line = line.Length > 79 ? line[..79] : line;
        lock (_lock)
        {
            error.Write("\r" + line.PadRight(_width));
            _width = line.Length;
        }
    }

    /// <summary>Takes the line away.</summary>
    public void Clear()
    {
        lock (_lock)
        {
            error.Write("\r" + new string(' ', _width) + "\r");
            _width = 0;
        }
    }

    /// <summary>Does work that ranks, with its progress on a terminal and nowhere else.</summary>
    /// <param name="surroundings">Where it shows.</param>
    /// <param name="quiet">Whether no progress is wanted.</param>
    /// <param name="work">The work.</param>
    public static T Over<T>(Surroundings surroundings, bool quiet, Func<IProgress<RankingResult>?, T> work)
    {
        RankingProgress? progress = quiet || !surroundings.ErrorIsTerminal ? null : new RankingProgress(surroundings.Error);
        try
        {
            return work(progress);
        }
        finally
        {
            progress?.Clear();
        }
    }
}
