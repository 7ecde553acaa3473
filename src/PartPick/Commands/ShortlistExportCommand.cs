using System.Collections.Immutable;
using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Shortlists;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist export</c>: what to order for a list, and its design record.</summary>
internal static class ShortlistExportCommand
{
    private const string Examples =
        """
        partpick shortlist export logger                                      the purchase list as CSV
        partpick shortlist export logger --to order.csv --delimiter ";" --decimal , --bom
        partpick shortlist export logger --to order.md                        Markdown
        partpick shortlist export logger --to record.html                     the design record, to print
        partpick shortlist export logger --format table --attrition 0% --attrition crystals=2%
        One row is one order of one part for all circuits of the list. A part whose stock does not cover is bought from
        several equal parts where they do. The form follows the ending of FILE, unless --format says another.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var name = new Argument<string>("NAME") { Description = "The list" };
        var to = new Option<string?>("--to") { Description = "The file to write, else standard output", HelpName = "FILE" };
        var form = new Option<string?>("--format") { Description = string.Join(", ", ExportForms.Words), HelpName = "FORMAT" };
        form.AcceptOnlyFromAmong(ExportForms.Words);
        var force = new Option<bool>("--force") { Description = "Replace FILE where it is there" };
        var bom = new Option<bool>("--bom") { Description = "Begin the CSV file with a byte order mark" };
        var delimiter = new Option<string>("--delimiter")
        {
            Description = "Between the cells of the CSV file: comma, semicolon, tab, bar, or the sign (comma)",
            HelpName = "SIGN",
            DefaultValueFactory = _ => ",",
        };
        var point = new Option<string>("--decimal")
        {
            Description = "Decimal sign of the CSV file: . or , (.)",
            HelpName = "SIGN",
            DefaultValueFactory = _ => ".",
        };
        var command = new Command("export", "Writes what to order for a list: CSV, Markdown, or an HTML design record.")
        {
            name, to, form, force, bom, delimiter, point,
        };
        var alternates = new Option<string?>("--alternates")
        {
            Description = "Look for replacements of each part, of its package, that keep every circuit fit; name up to N",
            HelpName = "N",
        };
        command.Add(alternates);
        var purchase = new PurchaseArguments();
        purchase.AddTo(command);
        HelpFooter.AddTo(command, "Examples", Examples);
        HelpFooter.AddTo(command, "Cautions", HelpFooter.Cautions);
        command.SetAction(parsed =>
        {
            string list = CommandFailure.Unless(ShortlistName.Read(parsed.GetRequiredValue(name)));
            var style = new CsvStyle(
                Delimiter(parsed.GetValue(delimiter)!, delimiter.Name),
                DecimalSign(parsed.GetValue(point)!, point.Name),
                parsed.GetValue(bom));
            PurchaseOptions options = purchase.Read(parsed);
            string? path = parsed.GetValue(to);
            ExportForm chosen = ExportForms.Named(parsed.GetValue(form))
                ?? CommandFailure.Unless(ShortlistExport.Form(
                    new ExportTarget(path ?? "", false, to.Name, context.CatalogPath(parsed))));
            PartsCatalog catalog = context.LoadCatalog(parsed);
            var view = ShortlistView.Of(ShortlistListCommand.Load(context, parsed, list)[0], new ShortlistReviewer(catalog));
            if (Counts.Read(parsed.GetValue(alternates), alternates.Name) is { } most)
            {
                options = options with { Alternates = Alternates(view, catalog, most, context.Surroundings.Cancellation) };
            }

            PurchaseList made = CommandFailure.Unless(ShortlistExport.Purchase(view, catalog, options));
            string text = ShortlistExport.Text(view, made, chosen, style, ShortlistAddCommand.Today());
            bool mark = style.Mark && chosen == ExportForm.Csv;
            if (path is null)
            {
                context.Output.Write((mark ? "\uFEFF" : "") + text);
            }
            else if (ShortlistExport.Save(
                new ExportTarget(path, parsed.GetValue(force), to.Name, context.CatalogPath(parsed)), text, mark) is { } problem)
            {
                throw new CommandFailure(problem, ExitStatus.WrongInput);
            }

            Tell(context.Surroundings.Error, view, made, path, chosen);
            return ExitStatus.Done;
        });
        return command;
    }

    // A buyer cannot change the board: only parts of the same package.
    private static ImmutableDictionary<string, ImmutableArray<string>> Alternates(
        ShortlistView view, PartsCatalog catalog, int most, CancellationToken stop) => ListAlternates.Of(
        [
            .. view.Candidates.Select(review => (CommandFailure.Unless(ChosenCircuit.Of(review, catalog)), review.Requirement)),
        ],
        catalog,
        most,
        new AlternatesOptions { SamePackage = true },
        stop);

    // What a buyer or an engineer has to look at is said even where only the file is wanted.
    private static void Tell(TextWriter error, ShortlistView view, PurchaseList list, string? path, ExportForm form)
    {
        var cells = new PurchaseCells(list);
        if (path is not null)
        {
            error.WriteLine(FormattableString.Invariant(
                $"{list.Lines.Length} lines, {cells.Amount(list.Total)} {list.Currency} in all, written to {path}"));
        }

        foreach (ShortlistReview review in view.Candidates.Where(each => !each.IsFit))
        {
            error.WriteLine($"candidate {Figures.Whole(review.Entry.Number)}: {ReviewWords.State(review)}");
        }

        if (form != ExportForm.Table)
        {
            foreach (string note in cells.Notes())
            {
                error.WriteLine(note);
            }
        }
    }

    private static char Delimiter(string text, string option) => text switch
    {
        "comma" or "," => ',',
        "semicolon" or ";" => ';',
        "tab" or "\t" or "\\t" => '\t',
        "bar" or "|" => '|',
        _ => throw new CommandFailure(
            new Problem(option, $"{Problem.Quote(text)} is no delimiter", "comma, semicolon, tab or bar"), ExitStatus.WrongInput),
    };

    private static char DecimalSign(string text, string option) => text is "." or ","
        ? text[0]
        : throw new CommandFailure(new Problem(option, $"{Problem.Quote(text)} is no decimal sign", ". or ,"), ExitStatus.WrongInput);
}
