using System.CommandLine;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog undo</c>: takes the last import back.</summary>
internal static class CatalogUndoCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var command = new Command("undo", "Takes the last import back; what was set by hand stays.");
        command.SetAction(parsed =>
        {
            ImportNote note = CommandFailure.Unless(CatalogImport.Undo(context.CatalogPath(parsed)), ExitStatus.NoCatalog)
                ?? throw new CommandFailure(
                    new Problem("undo", "there is no import to take back", "an undo after an import, once for each"),
                    ExitStatus.WrongInput);
            context.Surroundings.Error.WriteLine(
                $"taken back: import {note.Number} of {note.File}, {note.Date}: {note.Added} added and {note.Updated} updated parts");
            return ExitStatus.Done;
        });
        return command;
    }
}
