using System.CommandLine;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Output;

namespace PartPick.Commands;

/// <summary><c>partpick catalog list</c>: the parts of a kind.</summary>
internal static class CatalogListCommand
{
    private const string Examples =
        """
        partpick catalog list crystals
        partpick catalog list crystals --filter "4 MHz" --top 20 --format json
        partpick catalog list crystals --filter "H49 frequency=4.096M load<=18p"
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var kind = new Argument<string>("KIND") { Description = string.Join(", ", PartKinds.All.Select(each => each.Word())) };
        var filter = new Option<string?>("--filter")
        {
            Description = "Words that stand in the texts of a part, and conditions on its figures such as load<=18p",
            HelpName = "TEXT",
        };
        var top = new Option<string?>("--top") { Description = "Most parts to list (all)", HelpName = "N" };
        var command = new Command("list", "Lists the parts of a kind.") { kind, filter, top, context.Format };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            PartKind wanted = CommandFailure.Unless(PartKinds.Named(parsed.GetRequiredValue(kind), kind.Name));
            int most = Counts.Read(parsed.GetValue(top), top.Name) ?? int.MaxValue;
            PartFilter narrow = CommandFailure.Unless(PartFilter.Read(wanted, parsed.GetValue(filter) ?? "", filter.Name));
            int count = 0;
            using var parts = new PartsOutput(context.Output, context.FormatOf(parsed), wanted);
            CommandFailure.Unless(
                CatalogReading.Each(context.CatalogPath(parsed), wanted, entry =>
                {
                    context.Surroundings.Cancellation.ThrowIfCancellationRequested();
                    if (count < most && narrow.Holds(PartRow.Of(entry.Part)))
                    {
                        count++;
                        parts.Write(entry);
                    }
                }),
                ExitStatus.NoCatalog);
            parts.End();
            return ExitStatus.Done;
        });
        return command;
    }
}
