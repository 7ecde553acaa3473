using System.CommandLine;

namespace PartPick.Commands;

/// <summary><c>partpick catalog</c>: the parts, and where their figures came from.</summary>
internal static class CatalogCommand
{
    /// <summary>Builds the command with all that it can do.</summary>
    public static Command Build(CommandContext context) => new("catalog", "Shows and changes the parts of the catalogue.")
    {
        CatalogListCommand.Build(context),
        CatalogShowCommand.Build(context),
        CatalogExportCommand.Build(context),
        CatalogInfoCommand.Build(context),
        CatalogImportCommand.Build(context),
        CatalogSetCommand.Build(context),
        CatalogUndoCommand.Build(context),
        CatalogVerifyCommand.Build(context),
        CatalogBackupCommand.Build(context),
        CatalogRestoreCommand.Build(context),
    };
}
