using System.CommandLine;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Output;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog import</c>: takes the parts of a CSV file, whatever its columns are called.</summary>
internal static class CatalogImportCommand
{
    private const string Examples =
        """
        partpick catalog import stock.csv --kind crystals --dry-run
        partpick catalog import stock.csv --kind crystals --map shop --currency EUR
        partpick catalog import list.csv --kind capacitors --column "Cap=value:pF" --column "Internal=" --decimal comma
        Columns are found by their headers and cells; --dry-run shows how each is read and what would become of the rows.
        --map NAME uses the columns kept under a name, or keeps them where there are none. A row that cannot be read with
        certainty goes to FILE.rejected.csv with line, column and reason; mended, that file can be imported itself.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string>("FILE.csv") { Description = "The file; - for standard input" };
        var kind = new Option<string>("--kind")
        {
            Description = string.Join(", ", PartKinds.All.Select(each => each.Word())),
            HelpName = "KIND",
            Required = true,
        };
        var map = new Option<string?>("--map")
        {
            Description = "The name of a column map: used, or kept where there is none",
            HelpName = "NAME",
        };
        var dryRun = new Option<bool>("--dry-run") { Description = "Only say what would happen" };
        var column = new Option<string[]>("--column")
        {
            Description = "HEADER=FIELD, HEADER=FIELD:UNIT, or HEADER= to leave a column out; may be repeated",
            HelpName = "TEXT",
            DefaultValueFactory = _ => [],
        };
        var sign = new Option<string?>("--decimal") { Description = "The decimal sign: point or comma; else found", HelpName = "SIGN" };
        sign.AcceptOnlyFromAmong("point", "comma");
        var currency = new Option<string?>("--currency") { Description = "The currency of prices that name none", HelpName = "CODE" };
        var supplier = new Option<string?>("--supplier") { Description = "The supplier of rows that name none", HelpName = "NAME" };
        var rejected = new Option<string?>("--rejected")
        {
            Description = "Where rejected rows go; else FILE.rejected.csv",
            HelpName = "FILE",
        };
        var quiet = new Option<bool>("--no-progress") { Description = "Show no progress" };
        var command = new Command("import", "Imports parts from a CSV file: all of it, or none.")
        {
            file, kind, map, dryRun, column, sign, currency, supplier, rejected, quiet, context.Format,
        };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            string path = parsed.GetRequiredValue(file);
            var request = new ImportRequest
            {
                Kind = CommandFailure.Unless(PartKinds.Named(parsed.GetRequiredValue(kind), kind.Name)),
                Name = path == "-" ? "standard input" : Path.GetFileName(path),
                RejectedPath = parsed.GetValue(rejected)
                    ?? (path == "-" ? "standard-input.rejected.csv" : ListFile.RejectedPathOf(path)),
                DryRun = parsed.GetValue(dryRun),
                Map = parsed.GetValue(map) is { Length: > 0 } name ? name : null,
                Columns = [.. parsed.GetValue(column) ?? []],
                DecimalSign = parsed.GetValue(sign),
                Currency = parsed.GetValue(currency),
                Supplier = parsed.GetValue(supplier),
                Date = DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date),
            };
            return Run(context, parsed, path, request, parsed.GetValue(quiet));
        });
        return command;
    }

    private static int Run(CommandContext context, ParseResult parsed, string path, ImportRequest request, bool quiet)
    {
        ImportProgressLine? progress =
            quiet || !context.Surroundings.ErrorIsTerminal ? null : new ImportProgressLine(context.Surroundings.Error);
        Result<ImportReport> result;
        string catalog = context.CatalogPath(parsed);
        try
        {
            result = path == "-" && context.Surroundings.Input is not StreamReader
                ? CatalogImport.Run(catalog, context.Surroundings.Input, request, context.Surroundings.Cancellation)
                : CatalogImport.Run(catalog, Open(context, path), request, progress, context.Surroundings.Cancellation);
        }
        finally
        {
            progress?.Clear();
        }

        bool ofCatalog = !result.IsOk && result.Problem.Where == Path.GetFullPath(catalog);
        ImportReport report = CommandFailure.Unless(result, ofCatalog ? ExitStatus.NoCatalog : ExitStatus.WrongInput);
        ImportOutput.Write(context.Output, context.FormatOf(parsed), report);
        return ExitStatus.Done;
    }

    private static Stream Open(CommandContext context, string path)
    {
        if (path == "-")
        {
            return ((StreamReader)context.Surroundings.Input).BaseStream;
        }

        Result<Stream> file = ListFile.Open(path);
        return file.IsOk ? file.Value : throw new CommandFailure(
            file.Problem with { Fits = file.Problem.Fits + ", or - for standard input" }, ExitStatus.WrongInput);
    }
}
