namespace PartPick.Values.Tests;

public sealed class ResultTests
{
    private static readonly Problem Wrong = new("here", "it is wrong", "something else");

    [Fact]
    public void A_value_goes_through_the_steps()
    {
        Result<string> result = Result.Ok(2).Map(number => number + 1).Then(number => Result.Ok($"{number}"));
        Assert.True(result.IsOk);
        Assert.Null(result.Problem);
        Assert.Equal("3", result.Value);
        Assert.Equal(2, Result.Ok(2).ValueOr(5));
    }

    [Fact]
    public void A_problem_skips_the_steps_and_stays_the_same()
    {
        Result<int> result = Result.Fail<int>(Wrong).Map(number => number + 1).Then(_ => Result.Ok(1));
        Assert.Same(Wrong, result.Problem);
        Assert.Equal(5, result.ValueOr(5));
        Assert.Equal("here: it is wrong; fits something else", result.ToString());
        Assert.Throws<InvalidOperationException>(() => result.Value);
    }
}
