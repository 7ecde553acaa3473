using System.CommandLine;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog restore</c>: puts a copy in the place of the catalogue.</summary>
internal static class CatalogRestoreCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string>("FILE") { Description = "A file made by catalog backup" };
        var command = new Command("restore", "Puts a copy in the place of the catalogue, once the copy was found whole.") { file };
        command.SetAction(parsed =>
        {
            string source = CatalogBackupCommand.Filled(parsed.GetRequiredValue(file), file.Name);
            Result<CatalogCheck> restored = CatalogSafety.Restore(context.CatalogPath(parsed), source);
            bool ofSource = !restored.IsOk && restored.Problem.Where == Path.GetFullPath(source);
            CatalogCheck check = CommandFailure.Unless(restored, ofSource ? ExitStatus.WrongInput : ExitStatus.NoCatalog);
            context.Surroundings.Error.WriteLine("the catalogue was restored; " + CatalogVerifyCommand.Sentence(check));
            return ExitStatus.Done;
        });
        return command;
    }
}
