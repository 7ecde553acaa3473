using System.CommandLine;
using System.Text;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog export</c>: the parts of a kind as a file that comes back in unchanged.</summary>
internal static class CatalogExportCommand
{
    private const string Examples =
        """
        partpick catalog export crystals > crystals.csv
        partpick catalog export crystals --to crystals.csv
        partpick catalog import crystals.csv --kind crystals
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var kind = new Argument<string>("KIND") { Description = string.Join(", ", PartKinds.All.Select(each => each.Word())) };
        var to = new Option<string?>("--to") { Description = "The file to write, else standard output", HelpName = "FILE" };
        var format = new Option<string>("--format") { Description = "csv, json or table", DefaultValueFactory = _ => "csv" };
        format.AcceptOnlyFromAmong("table", "json", "csv");
        var command = new Command("export", "Writes the parts of a kind as CSV, which catalog import takes unchanged.")
        {
            kind, to, format,
        };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            PartKind wanted = CommandFailure.Unless(PartKinds.Named(parsed.GetRequiredValue(kind), kind.Name));
            string catalog = context.CatalogPath(parsed);
            if (parsed.GetValue(to) is { } path)
            {
                int count = 0;
                WriteFile(path, writer => count = Write(writer, CommandContext.FormatOf(parsed, format), wanted, catalog));
                context.Surroundings.Error.WriteLine($"{count} {wanted.Word()} written to {path}");
            }
            else
            {
                Write(context.Output, CommandContext.FormatOf(parsed, format), wanted, catalog);
            }

            return ExitStatus.Done;
        });
        return command;
    }

    private static int Write(TextWriter output, OutputFormat format, PartKind kind, string catalog)
    {
        using var parts = new PartsOutput(output, format, kind);
        int count = CommandFailure.Unless(CatalogReading.Each(catalog, kind, parts.Write), ExitStatus.NoCatalog);
        parts.End();
        return count;
    }

    // Under another name first: a full disk leaves an earlier file of this name as it was.
    private static void WriteFile(string path, Action<TextWriter> write)
    {
        string unfinished = path + ".new";
        try
        {
            using (var writer = new StreamWriter(unfinished, append: false, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false)))
            {
                write(writer);
            }

            File.Move(unfinished, path, overwrite: true);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            throw new CommandFailure(
                new Problem(
                    "--to",
                    $"{Problem.Quote(path)} cannot be written: {error.Message}",
                    "a file in a directory that can be written to"),
                ExitStatus.WrongInput);
        }
        finally
        {
            DeleteQuietly(unfinished);
        }
    }

    private static void DeleteQuietly(string path)
    {
        try
        {
            File.Delete(path);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            // What is wrong with the path was said already.
        }
    }
}
