using System.Text;

namespace PartPick;

/// <summary>What the program reads from and writes to: the process's own, or a test's.</summary>
internal sealed record Surroundings
{
    /// <summary>Standard input.</summary>
    public required TextReader Input { get; init; }

    /// <summary>Standard output: data alone.</summary>
    public required TextWriter Output { get; init; }

    /// <summary>Standard error: everything else.</summary>
    public required TextWriter Error { get; init; }

    /// <summary>Looks up an environment variable.</summary>
    public required Func<string, string?> Environment { get; init; }

    /// <summary>Whether standard output is a terminal.</summary>
    public bool OutputIsTerminal { get; init; }

    /// <summary>Whether standard error is a terminal.</summary>
    public bool ErrorIsTerminal { get; init; }

    /// <summary>Ends a long computation.</summary>
    public CancellationToken Cancellation { get; init; }

    /// <summary>Whether colour may be used: a terminal, and NO_COLOR not set.</summary>
    public bool UsesColour =>
        OutputIsTerminal && string.IsNullOrEmpty(Environment("NO_COLOR")) && Environment("TERM") != "dumb";

    /// <summary>Those of this process, in UTF-8 without a mark.</summary>
    /// <param name="cancellation">Ends a long computation.</param>
    public static Surroundings OfProcess(CancellationToken cancellation)
    {
        var plain = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false);
        return new Surroundings
        {
            Input = new StreamReader(Console.OpenStandardInput(), plain),
            Output = new StreamWriter(Console.OpenStandardOutput(), plain) { AutoFlush = false },
            Error = new StreamWriter(Console.OpenStandardError(), plain) { AutoFlush = true },
            Environment = System.Environment.GetEnvironmentVariable,
            OutputIsTerminal = !Console.IsOutputRedirected,
            ErrorIsTerminal = !Console.IsErrorRedirected,
            Cancellation = cancellation,
        };
    }
}
