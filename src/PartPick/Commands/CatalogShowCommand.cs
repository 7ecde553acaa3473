using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog show</c>: one part, each figure with its origin.</summary>
internal static class CatalogShowCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var id = new Argument<string>("ID") { Description = "The id of a part" };
        var command = new Command("show", "Shows one part, each figure with what it rests on and where it came from.")
        {
            id, context.Format,
        };
        command.SetAction(parsed =>
        {
            string wanted = parsed.GetRequiredValue(id);
            CatalogEntry entry = CommandFailure.Unless(
                    CatalogReading.Find(context.CatalogPath(parsed), wanted), ExitStatus.NoCatalog)
                ?? throw new CommandFailure(
                    new Problem(id.Name, $"{Problem.Quote(wanted)} is no part of the catalogue", "an id from partpick catalog list"),
                    ExitStatus.WrongInput);
            switch (context.FormatOf(parsed))
            {
                case OutputFormat.Json:
                    JsonOutput.Write(context.Output, PartJson.Of(entry));
                    break;
                case OutputFormat.Csv:
                    PartCsv.Write(entry.Part.Kind, [entry.Part], context.Output);
                    break;
                default:
                    PartTable.WriteOne(context.Output, entry);
                    break;
            }

            return ExitStatus.Done;
        });
        return command;
    }
}
