using System.Text.Json;
using PartPick.Catalog;

namespace PartPick.Tests;

/// <summary>One run of the program inside the test's process.</summary>
internal sealed record Run(int Status, string Output, string Error)
{
    private static readonly string Directory = Path.Combine(Path.GetTempPath(), "partpick-tests-" + Guid.NewGuid().ToString("N"));

    static Run() => AppDomain.CurrentDomain.ProcessExit += (_, _) =>
    {
        if (System.IO.Directory.Exists(Directory))
        {
            System.IO.Directory.Delete(Directory, recursive: true);
        }
    };

    /// <summary>A file of the tests' own directory, written anew.</summary>
    public static string File(string text, string name = "input.json")
    {
        string folder = Path.Combine(Directory, Guid.NewGuid().ToString("N"));
        System.IO.Directory.CreateDirectory(folder);
        string path = Path.Combine(folder, name);
        System.IO.File.WriteAllText(path, text);
        return path;
    }

    /// <summary>Runs the program with arguments, with a catalogue of the tests' own.</summary>
    public static Run Of(params string[] arguments) => WithInput("", arguments);

    /// <summary>Runs the program with something on standard input.</summary>
    public static Run WithInput(string input, params string[] arguments) =>
        In(name => name == CatalogPath.Variable ? Path.Combine(Directory, "catalog.db") : null, input, arguments);

    /// <summary>Runs the program in an environment.</summary>
    public static Run In(Func<string, string?> environment, string input, params string[] arguments) =>
        Of(environment, input, arguments, CancellationToken.None);

    /// <summary>Runs the program until it is stopped.</summary>
    public static Run Until(CancellationToken stop, params string[] arguments) =>
        Of(name => name == CatalogPath.Variable ? Path.Combine(Directory, "catalog.db") : null, "", arguments, stop);

    private static Run Of(Func<string, string?> environment, string input, string[] arguments, CancellationToken stop)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        int status = CommandLine.Run(arguments, new Surroundings
        {
            Input = new StringReader(input),
            Output = output,
            Error = error,
            Environment = environment,
            Cancellation = stop,
        });
        return new Run(status, output.ToString(), error.ToString());
    }

    /// <summary>Standard output as JSON.</summary>
    public JsonElement Json => JsonSerializer.Deserialize<JsonElement>(Output);

    /// <summary>Asserts wrong input: status 2, nothing on standard output, one line on standard error.</summary>
    public string WrongLine(int status = 2)
    {
        Assert.Equal(status, Status);
        Assert.Equal("", Output);
        Assert.StartsWith("partpick: ", Error, StringComparison.Ordinal);
        Assert.Equal(1, Error.Count(letter => letter == '\n'));
        Assert.DoesNotContain("   at ", Error, StringComparison.Ordinal);
        return Error["partpick: ".Length..].TrimEnd('\n');
    }
}
