using System.CommandLine;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Output;

namespace PartPick.Commands;

/// <summary><c>partpick catalog verify</c>: reads everything in the catalogue and says what was checked.</summary>
internal static class CatalogVerifyCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var command = new Command("verify", "Reads everything in the catalogue, and says what was checked.") { context.Format };
        command.SetAction(parsed =>
        {
            CatalogCheck check = CommandFailure.Unless(CatalogSafety.Verify(context.CatalogPath(parsed)), ExitStatus.NoCatalog);
            switch (context.FormatOf(parsed))
            {
                case OutputFormat.Json:
                    JsonOutput.Write(context.Output, ToJson(check));
                    break;
                case OutputFormat.Csv:
                    CsvOutput.Write(context.Output, ["fault"], check.Faults.Select(fault => new[] { fault }));
                    break;
                default:
                    context.Output.WriteLine(Sentence(check));
                    break;
            }

            return check.Faults.Count == 0 ? ExitStatus.Done : ExitStatus.NoCatalog;
        });
        return command;
    }

    /// <summary>What was checked, in words.</summary>
    public static string Sentence(CatalogCheck check) =>
        $"checked: {check.Parts} parts read and built from their figures, {check.Origins} origins found, {check.Imports} imports, "
        + $"{check.Earlier} parts kept for undo, {check.Maps} column maps: "
        + (check.Faults.Count == 0 ? "all well" : string.Join("; ", check.Faults));

    private static JsonObject ToJson(CatalogCheck check) => new()
    {
        ["parts"] = check.Parts,
        ["origins"] = check.Origins,
        ["imports"] = check.Imports,
        ["earlier"] = check.Earlier,
        ["maps"] = check.Maps,
        ["faults"] = new JsonArray([.. check.Faults.Select(fault => (JsonNode)fault)]),
    };
}
