using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace PartPick.Output;

/// <summary>Prints one JSON document.</summary>
internal static class JsonOutput
{
    private static readonly JsonSerializerOptions Readable = new()
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Prints a node and ends the line.</summary>
    public static void Write(TextWriter output, JsonNode node) => output.WriteLine(node.ToJsonString(Readable));

    /// <summary>A node as it stands within a list.</summary>
    public static string Indented(JsonNode node) =>
        "  " + node.ToJsonString(Readable).Replace("\n", "\n  ", StringComparison.Ordinal);
}
