namespace PartPick.Tests;

public class CommandLineTests
{
    [Theory]
    [InlineData("chek")]
    [InlineData("check")]
    [InlineData("check", "a.json", "b.json")]
    [InlineData("check", "a.json", "--format", "xml")]
    [InlineData("caps", "--laod", "18p")]
    public void Wrong_arguments_are_one_line(params string[] arguments) =>
        Assert.Contains("--help)", Run.Of(arguments).WrongLine(), StringComparison.Ordinal);

    [Theory]
    [InlineData("rank")]
    [InlineData("check")]
    [InlineData("caps")]
    public void Help_of_every_command_has_examples(string command)
    {
        Run run = Run.Of(command, "--help");

        Assert.Equal((0, ""), (run.Status, run.Error));
        Assert.Contains($"Examples:\n  partpick {command}", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Help_of_the_program_has_the_cautions() =>
        Assert.Contains("Local codes come first.", Run.Of("--help").Output, StringComparison.Ordinal);

    [Fact]
    public void Fault_of_the_program_is_one_line_that_asks_to_report_it()
    {
        using var error = new StringWriter { NewLine = "\n" };
        int status = CommandLine.Run(["check", "-"], new Surroundings
        {
            Input = new FailingReader(),
            Output = TextWriter.Null,
            Error = error,
            Environment = _ => null,
        });

        Assert.Equal(ExitStatus.Fault, status);
        Assert.Equal("partpick: a fault of the program, please report it: InvalidTimeZoneException: two lines\n", error.ToString());
    }

    [Fact]
    public void A_search_that_is_stopped_on_its_threads_is_no_fault()
    {
        using var error = new StringWriter { NewLine = "\n" };
        int status = CommandLine.Run(["check", "-"], new Surroundings
        {
            Input = new StoppedReader(),
            Output = TextWriter.Null,
            Error = error,
            Environment = _ => null,
        });

        Assert.Equal((ExitStatus.Stopped, "partpick: stopped\n"), (status, error.ToString()));
    }

    [Fact]
    public void A_ranking_that_is_stopped_says_so()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();

        Run run = Run.Until(stop.Token, "rank", "--output", "4 MHz", "--circuits", "follower", "--supply", "12");

        Assert.Equal((ExitStatus.Stopped, "", "partpick: stopped\n"), (run.Status, run.Output, run.Error));
    }

    private sealed class FailingReader : TextReader
    {
        public override string ReadToEnd() => throw new InvalidTimeZoneException("two\nlines");
    }

    private sealed class StoppedReader : TextReader
    {
        public override string ReadToEnd() =>
            throw new AggregateException(new OperationCanceledException(), new AggregateException(new OperationCanceledException()));
    }
}
