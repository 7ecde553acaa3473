using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace PartPick.Catalog.Import;

/// <summary>A column map as JSON: a list of headers with field and unit.</summary>
internal static class ColumnMapText
{
    private static readonly JsonSerializerOptions Plain = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static string Write(PartKind kind, IEnumerable<ColumnUse> uses) => new JsonObject
    {
        ["kind"] = kind.Word(),
        ["columns"] = new JsonArray([.. uses.Select(use => (JsonNode)new JsonObject
        {
            ["header"] = use.Header, ["field"] = use.Field,
            ["unit"] = use.Field is "price" ? PriceColumns.Written(use)
                : use.Power == ColumnUse.NoPlainNumbers ? "" : use.Unit,
        })]),
    }.ToJsonString(Plain);

    /// <summary>The wishes of a map; null where it is of another kind or no map.</summary>
    public static List<ColumnWish>? Read(string text, PartKind kind)
    {
        try
        {
            JsonNode? map = JsonNode.Parse(text);
            return (string?)map?["kind"] != kind.Word()
                ? null
                : [.. map!["columns"]!.AsArray().Select(column => new ColumnWish(
                    (string)column!["header"]!, (string?)column["field"], (string?)column["unit"] ?? ""))];
        }
        catch (Exception error) when (error is JsonException or InvalidOperationException or NullReferenceException or FormatException)
        {
            return null;
        }
    }
}
