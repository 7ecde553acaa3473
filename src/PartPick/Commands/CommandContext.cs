using System.CommandLine;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>What every command needs: where it reads and writes, the shared options, the catalogue.</summary>
internal sealed class CommandContext
{
    /// <summary>Makes the context of one run.</summary>
    /// <param name="surroundings">Where it reads and writes.</param>
    public CommandContext(Surroundings surroundings)
    {
        Surroundings = surroundings;
        Format.AcceptOnlyFromAmong("table", "json", "csv");
    }

    /// <summary>Where it reads and writes.</summary>
    public Surroundings Surroundings { get; }

    /// <summary>Where data goes.</summary>
    public TextWriter Output => Surroundings.Output;

    /// <summary>The option of every command that uses the catalogue.</summary>
    public Option<string?> Catalog { get; } = new(CatalogPathOption)
    {
        Description = $"The catalogue file; else {PartPick.Catalog.CatalogPath.Variable}, else the user's own",
        HelpName = "FILE",
        Recursive = true,
    };

    /// <summary>The option of every command that prints data.</summary>
    public Option<string> Format { get; } = new("--format")
    {
        Description = "How to print: table, json or csv",
        DefaultValueFactory = _ => "table",
        HelpName = "FORMAT",
    };

    private static string CatalogPathOption => PartPick.Catalog.CatalogPath.Option;

    /// <summary>The chosen format.</summary>
    public OutputFormat FormatOf(ParseResult parsed) => FormatOf(parsed, Format);

    /// <summary>The format that a command's own option chooses.</summary>
    public static OutputFormat FormatOf(ParseResult parsed, Option<string> format) => parsed.GetValue(format) switch
    {
        "json" => OutputFormat.Json,
        "csv" => OutputFormat.Csv,
        _ => OutputFormat.Table,
    };

    /// <summary>Path of the catalogue.</summary>
    public string CatalogPath(ParseResult parsed) => CommandFailure.Unless(
        PartPick.Catalog.CatalogPath.Resolve(parsed.GetValue(Catalog), Surroundings.Environment), ExitStatus.NoCatalog);

    /// <summary>The parts of the catalogue.</summary>
    public PartsCatalog LoadCatalog(ParseResult parsed) =>
        CommandFailure.Unless(CatalogStore.Load(CatalogPath(parsed)), ExitStatus.NoCatalog);

    /// <summary>The text of a file, or of standard input where the name is a hyphen; with the name for problems.</summary>
    public (string Text, string Name) ReadFile(string path)
    {
        if (path == "-")
        {
            return (Surroundings.Input.ReadToEnd(), "standard input");
        }

        try
        {
            return (File.ReadAllText(path), Path.GetFileName(path));
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            string what = error is FileNotFoundException or DirectoryNotFoundException ? "is not there"
                : Directory.Exists(path) ? "is a directory" : "cannot be read";
            throw new CommandFailure(new Problem(path, what, "the path of a file, or - for standard input"), ExitStatus.WrongInput);
        }
    }
}
