using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Catalog.Import;
using PartPick.Commands;

namespace PartPick.Output;

/// <summary>Prints what became of an imported file.</summary>
internal static class ImportOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, ImportReport report)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, ToJson(report));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(
                    output, ["read", "added", "updated", "unchanged", "rejected"],
                    [[Text(report.Read), Text(report.Added), Text(report.Updated), Text(report.Unchanged), Text(report.Rejected)]]);
                break;
            default:
                WriteTable(output, report);
                break;
        }
    }

    private static JsonObject ToJson(ImportReport report) => new()
    {
        ["read"] = report.Read,
        ["added"] = report.Added,
        ["updated"] = report.Updated,
        ["unchanged"] = report.Unchanged,
        ["rejected"] = report.Rejected,
        ["columns"] = new JsonArray([.. report.Columns.Select(column => (JsonNode)new JsonObject
        {
            ["header"] = column.Header, ["field"] = column.Field, ["unit"] = column.Unit, ["why"] = column.Why,
        })]),
        ["rejectedFile"] = report.RejectedFile,
        ["rejections"] = new JsonArray([.. report.Rejections.Select(row => (JsonNode)new JsonObject
        {
            ["line"] = row.Line, ["column"] = row.Column, ["value"] = row.Value, ["reason"] = row.Reason,
        })]),
        ["dryRun"] = report.DryRun,
        ["elapsed"] = report.Elapsed.TotalSeconds,
        ["encoding"] = report.Encoding,
        ["delimiter"] = report.Delimiter.ToString(),
        ["headerLine"] = report.HeaderLine,
    };

    private static void WriteTable(TextWriter output, ImportReport report)
    {
        output.WriteLine(ImportPace.Layout(report.Encoding, report.Delimiter, report.HeaderLine));
        output.WriteLine();
        TextTable.Write(
            output, [new("column"), new("figure"), new("unit"), new("why")],
            [.. report.Columns.Select(column => new[] { column.Header, column.Field ?? Figures.None, column.Unit, column.Why })]);
        output.WriteLine();
        if (!report.Rejections.IsEmpty)
        {
            TextTable.Write(
                output, [new("line", true), new("column"), new("reason")],
                [.. report.Rejections.Take(20).Select(row => new[] { Text(row.Line), row.Column ?? Figures.None, row.Reason })]);
            output.WriteLine();
        }

        output.WriteLine(ImportPace.Sum(report));
        if (report.RejectedFile is { } path)
        {
            output.WriteLine($"rejected rows, to be mended and imported again: {path}");
        }
    }

    private static string Text(long number) => number.ToString(CultureInfo.InvariantCulture);
}
