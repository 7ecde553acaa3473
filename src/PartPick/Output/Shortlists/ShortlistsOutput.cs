using System.Text.Json.Nodes;
using PartPick.Commands;

namespace PartPick.Output;

/// <summary>Prints what lists there are.</summary>
internal static class ShortlistsOutput
{
    /// <summary>Prints them in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, ShortlistView[] lists)
    {
        string[][] rows =
        [
            .. lists.Select(list => new[]
            {
                list.Name, Figures.Whole(list.Candidates.Length), Figures.Whole(list.Candidates.Sum(each => (long)each.Entry.Builds)),
                Figures.Whole(list.Changed), Figures.Whole(list.Unfit), list.Candidates[^1].Entry.Added,
            }),
        ];
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, new JsonArray([.. lists.Select(list => (JsonNode)new JsonObject
                {
                    ["name"] = list.Name,
                    ["candidates"] = list.Candidates.Length,
                    ["builds"] = list.Candidates.Sum(each => (long)each.Entry.Builds),
                    ["changed"] = list.Changed,
                    ["unfit"] = list.Unfit,
                    ["lastAdded"] = list.Candidates[^1].Entry.Added,
                })]));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(
                    output, ["name", "candidates", "builds", "changed", "unfit", "lastAdded"],
                    rows.Select(row => row.Select(Catalog.SpreadsheetText.Harmless)));
                break;
            case OutputFormat.Table when lists.Length == 0:
                output.WriteLine("There is no list yet: partpick shortlist add makes one.");
                break;
            default:
                TextTable.Write(
                    output,
                    [
                        new("list"), new("candidates", true), new("boards", true), new("changed", true), new("unfit", true),
                        new("last added"),
                    ],
                    rows);
                break;
        }
    }
}
