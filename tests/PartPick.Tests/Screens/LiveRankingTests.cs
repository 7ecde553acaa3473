using PartPick.Screens;
using PartPick.Selection;

namespace PartPick.Tests.Screens;

public class LiveRankingTests
{
    [Fact]
    public void A_newer_question_ends_the_older_and_its_late_answer_is_dropped()
    {
        var fake = new FakeRanking { Holds = true };
        using var live = new LiveRanking(fake, action => action(), TimeProvider.System);
        var answers = new List<double>();
        live.Answered += result => answers.Add(result.Requirement.OutputHz);
        live.Ask(SampleRanking.Wanted, TimeSpan.Zero);
        live.Ask(SampleRanking.Wanted with { OutputHz = 2 }, TimeSpan.Zero);
        Assert.True(fake.IsCancelled(0));
        fake.Report(0, SampleRanking.Answer(SampleRanking.Wanted));
        fake.Finish(0);
        Assert.True(live.IsRunning);
        fake.Finish(1);
        Assert.False(live.IsRunning);
        Assert.Equal([2], answers);
    }

    [Fact]
    public async Task While_more_is_typed_nothing_is_ranked()
    {
        var fake = new FakeRanking();
        var answered = new TaskCompletionSource<RankingResult>();
        using var live = new LiveRanking(fake, action => action(), TimeProvider.System);
        live.Answered += result => answered.TrySetResult(result);
        for (int i = 1; i <= 5; i++)
        {
            live.Ask(SampleRanking.Wanted with { OutputHz = i }, TimeSpan.FromMilliseconds(100));
        }

        RankingResult answer = await answered.Task.WaitAsync(TimeSpan.FromSeconds(10), TestContext.Current.CancellationToken);
        Assert.Equal(5, answer.Requirement.OutputHz);
        Assert.Single(fake.Asked);
    }

    [Fact]
    public void A_fault_of_the_ranking_comes_out_where_the_screen_is()
    {
        Action? posted = null;
        var fake = new FakeRanking { Answer = _ => throw new InvalidOperationException("a bug") };
        using var live = new LiveRanking(fake, action => posted = action, TimeProvider.System);
        live.Ask(SampleRanking.Wanted, TimeSpan.Zero);
        Assert.Throws<InvalidOperationException>(() => posted!());
    }
}
