using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;

namespace PartPick.Commands;

/// <summary><c>partpick catalog info</c>: what the catalogue holds.</summary>
internal static class CatalogInfoCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var command = new Command("info", "Says where the catalogue is, what it holds, and what was imported.") { context.Format };
        command.SetAction(parsed =>
        {
            CatalogInfo info = CommandFailure.Unless(CatalogReading.Info(context.CatalogPath(parsed)), ExitStatus.NoCatalog);
            CatalogInfoOutput.Write(context.Output, context.FormatOf(parsed), info);
            return ExitStatus.Done;
        });
        return command;
    }
}
