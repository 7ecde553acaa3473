using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

/// <summary>Answers at once with what a test has laid ready, or when the test says so.</summary>
internal sealed class FakeRanking : IRankingService
{
    private readonly List<Question> _asked = [];

    public Func<Requirement, RankingResult> Answer { get; set; } =
        requirement => SampleRanking.Answer(requirement, [.. SampleRanking.All]);

    /// <summary>Whether answers wait for <see cref="Finish"/>.</summary>
    public bool Holds { get; set; }

    public IReadOnlyList<Requirement> Asked => [.. _asked.Select(one => one.Requirement)];

    public bool IsCancelled(int number) => _asked[number].Cancellation.IsCancellationRequested;

    public Task<RankingResult> RankAsync(
        Requirement requirement, IProgress<RankingResult> progress, CancellationToken cancellation)
    {
        var answer = new TaskCompletionSource<RankingResult>();
        _asked.Add(new Question(requirement, progress, answer, cancellation));
        return Holds ? answer.Task : Task.FromResult(Answer(requirement));
    }

    /// <summary>Gives an answer that was held; when this returns, it has arrived.</summary>
    public void Finish(int number)
    {
        SynchronizationContext? before = SynchronizationContext.Current;
        SynchronizationContext.SetSynchronizationContext(null);
        _asked[number].Answer.SetResult(Answer(_asked[number].Requirement));
        SynchronizationContext.SetSynchronizationContext(before);
    }

    public void Report(int number, RankingResult result) => _asked[number].Progress.Report(result);

    private sealed record Question(
        Requirement Requirement,
        IProgress<RankingResult> Progress,
        TaskCompletionSource<RankingResult> Answer,
        CancellationToken Cancellation);
}
