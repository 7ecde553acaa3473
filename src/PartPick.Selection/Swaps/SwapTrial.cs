using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>A changed circuit, analysed in full as a ranking analyses what it lists.</summary>
/// <param name="Board">Its parts.</param>
/// <param name="Candidate">The circuit; null where its amplifier is not specified over the supply.</param>
/// <param name="Misses">The limits it breaks.</param>
public sealed record SwapTrial(BoardParts Board, Candidate? Candidate, ImmutableArray<Miss> Misses)
{
    /// <summary>
    /// Analyses a changed circuit. Where the changes leave a choice between parts of one value, it is the one that a ranking
    /// would put first; where none is fit, the one that is nearest to it.
    /// </summary>
    /// <param name="boards">The circuits to choose from, one or more.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="market">What can be bought.</param>
    /// <param name="ranking">The ranking that the circuit before is from, for the score.</param>
    /// <param name="cancellation">Ends it with <see cref="OperationCanceledException"/>.</param>
    public static SwapTrial Of(
        ImmutableArray<BoardParts> boards,
        Requirement requirement,
        Market market,
        RankingResult ranking,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(ranking);
        var judge = new ChoiceJudge(requirement, market);
        var trials = new List<SwapTrial>(boards.Length);
        foreach (BoardParts board in boards)
        {
            cancellation.ThrowIfCancellationRequested();
            (Candidate? candidate, ImmutableArray<Miss> misses) = judge.Judge(board.Choice, board.Support);
            trials.Add(new SwapTrial(board, candidate is null ? null : Scored(candidate, requirement, ranking), misses));
        }

        return trials
            .OrderBy(trial => trial.Candidate is null ? 1 : 0)
            .ThenBy(trial => Miss.Distance(trial.Misses))
            .ThenBy(trial => trial.Candidate?.Score)
            .ThenBy(trial => trial.Candidate?.Budget?.WorstRatio)
            .ThenBy(trial => trial.Candidate?.Cost)
            .ThenBy(trial => trial.Candidate?.Id, StringComparer.Ordinal)
            .First();
    }

    private static Candidate Scored(Candidate candidate, Requirement requirement, RankingResult ranking) => candidate.IsFit
        ? candidate with
        {
            Score = Score.Of(
                requirement, candidate.Budget!.WorstRatio, candidate.Margin.Value, candidate.Cost, ranking.CheapestCost ?? candidate.Cost),
        }
        : candidate;
}
