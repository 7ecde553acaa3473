using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Commands;

namespace PartPick.Output;

/// <summary>Prints what a catalogue holds.</summary>
internal static class CatalogInfoOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, CatalogInfo info)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, ToJson(info));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(output, ["kind", "parts"], info.Counts.Select(pair => new[] { pair.Kind.Word(), Text(pair.Count) }));
                break;
            default:
                WriteTable(output, info);
                break;
        }
    }

    private static JsonObject ToJson(CatalogInfo info) => new()
    {
        ["path"] = info.Path,
        ["bytes"] = info.Bytes,
        ["parts"] = info.Counts.Sum(pair => pair.Count),
        ["kinds"] = new JsonObject(info.Counts.Select(pair => KeyValuePair.Create(pair.Kind.Word(), (JsonNode?)pair.Count))),
        ["own"] = info.Own,
        ["setByHand"] = info.SetByHand,
        ["maps"] = new JsonArray([.. info.Maps.Select(name => (JsonNode)name)]),
        ["imports"] = new JsonArray([.. info.Imports.Select(note => (JsonNode)new JsonObject
        {
            ["number"] = note.Number,
            ["file"] = note.File,
            ["date"] = note.Date,
            ["kind"] = note.Kind.Word(),
            ["added"] = note.Added,
            ["updated"] = note.Updated,
        })]),
    };

    private static void WriteTable(TextWriter output, CatalogInfo info)
    {
        output.WriteLine($"{info.Path}, {Figures.Count(info.Bytes)} bytes");
        output.WriteLine($"own parts: {Text(info.Own)}; parts with figures set by hand: {Text(info.SetByHand)}");
        output.WriteLine($"column maps: {(info.Maps.IsEmpty ? "none" : string.Join(", ", info.Maps))}");
        output.WriteLine();
        TextTable.Write(
            output, [new("kind"), new("parts", true)], [.. info.Counts.Select(pair => new[] { pair.Kind.Word(), Text(pair.Count) })]);
        if (info.Imports.IsEmpty)
        {
            return;
        }

        output.WriteLine();
        TextTable.Write(
            output,
            [new("import", true), new("file"), new("date"), new("kind"), new("added", true), new("updated", true)],
            [.. info.Imports.Select(note => new[]
            {
                Text(note.Number), note.File, note.Date, note.Kind.Word(), Text(note.Added), Text(note.Updated),
            })]);
    }

    private static string Text(int number) => number.ToString(CultureInfo.InvariantCulture);
}
