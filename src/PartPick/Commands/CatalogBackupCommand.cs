using System.CommandLine;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog backup</c>: copies the catalogue to a file.</summary>
internal static class CatalogBackupCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string>("FILE") { Description = "The file to make" };
        var command = new Command("backup", "Copies the catalogue to a file, also while the program is open elsewhere.") { file };
        command.SetAction(parsed =>
        {
            string catalog = context.CatalogPath(parsed);
            string target = Filled(parsed.GetRequiredValue(file), file.Name);
            Result<string> made = CatalogSafety.Backup(catalog, target);
            bool ofTarget = !made.IsOk && made.Problem.Where == Path.GetFullPath(target);
            string path = CommandFailure.Unless(made, ofTarget ? ExitStatus.WrongInput : ExitStatus.NoCatalog);
            context.Surroundings.Error.WriteLine($"the catalogue was copied to {path}");
            return ExitStatus.Done;
        });
        return command;
    }

    /// <summary>A path that says something.</summary>
    public static string Filled(string path, string where) =>
        !string.IsNullOrWhiteSpace(path) && !path.Contains('\0', StringComparison.Ordinal)
            ? path
            : throw new CommandFailure(
                new Problem(where, $"{Problem.Quote(path)} is no path", "the path of a file"), ExitStatus.WrongInput);
}
