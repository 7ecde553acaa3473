using System.Collections.Immutable;
using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist list</c>: shows the lists, or one of them recomputed from today's parts.</summary>
internal static class ShortlistListCommand
{
    private const string Examples =
        """
        partpick shortlist list                 all lists
        partpick shortlist list logger          its candidates with the figures of today, and what changed since they were added
        partpick shortlist list logger --format json
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var name = new Argument<string?>("NAME") { Description = "The list; all of them without", Arity = ArgumentArity.ZeroOrOne };
        var command = new Command("list", "Shows the lists, or one of them with the figures of today.") { name, context.Format };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            string? wanted = parsed.GetValue(name) is { } text ? CommandFailure.Unless(ShortlistName.Read(text)) : null;
            var reviewer = new ShortlistReviewer(context.LoadCatalog(parsed));
            ShortlistView[] views = [.. Load(context, parsed, wanted).Select(list => ShortlistView.Of(list, reviewer))];
            OutputFormat format = context.FormatOf(parsed);
            if (wanted is null)
            {
                ShortlistsOutput.Write(context.Output, format, views);
            }
            else
            {
                ShortlistOutput.Write(context.Output, format, views[0]);
            }

            return ExitStatus.Done;
        });
        return command;
    }

    /// <summary>One list, or all of them.</summary>
    public static ImmutableArray<Shortlist> Load(CommandContext context, ParseResult parsed, string? name)
    {
        string path = context.CatalogPath(parsed);
        if (name is null)
        {
            return CommandFailure.Unless(ShortlistStore.ReadAll(path), ExitStatus.NoCatalog);
        }

        Result<Shortlist> list = ShortlistStore.Read(path, name);
        return [CommandFailure.Unless(list, list.Problem?.Where == "NAME" ? ExitStatus.WrongInput : ExitStatus.NoCatalog)];
    }
}
