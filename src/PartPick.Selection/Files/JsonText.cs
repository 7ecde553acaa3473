using System.Text.Json;
using PartPick.Values;

namespace PartPick.Selection.Files;

/// <summary>Opens the text of a JSON file whose outermost value is an object.</summary>
internal static class JsonText
{
    private static readonly JsonDocumentOptions Lenient = new()
    {
        CommentHandling = JsonCommentHandling.Skip,
        AllowTrailingCommas = true,
    };

    /// <summary>Reads the text.</summary>
    /// <param name="json">The text.</param>
    /// <param name="fileName">The name of the file, for problems.</param>
    /// <param name="fits">What the file should hold, for problems: "a circuit".</param>
    /// <returns>The outermost object, or the problem with its line.</returns>
    public static Result<JsonElement> Open(string json, string fileName, string fits)
    {
        try
        {
            using JsonDocument document = JsonDocument.Parse(json.TrimStart('\uFEFF'), Lenient);
            if (!IsReadable(document.RootElement))
            {
                return Result.Fail<JsonElement>(fileName, "holds half a character in a text", $"{fits} as JSON");
            }

            return document.RootElement.ValueKind == JsonValueKind.Object
                ? Result.Ok(document.RootElement.Clone())
                : Result.Fail<JsonElement>(fileName, $"holds {Kind(document.RootElement)}", $"{fits}: an object in braces");
        }
        catch (JsonException error)
        {
            long line = (error.LineNumber ?? 0) + 1;
            long column = (error.BytePositionInLine ?? 0) + 1;
            return Result.Fail<JsonElement>(
                FormattableString.Invariant($"{fileName}, line {line}, column {column}"), "is not valid JSON", $"{fits} as JSON");
        }
    }

    /// <summary>Whether every text in a value is one: an escape may name half of a UTF-16 pair, which is no character.</summary>
    public static bool IsReadable(JsonElement element)
    {
        try
        {
            return element.ValueKind switch
            {
                JsonValueKind.Object => element.EnumerateObject().All(property => property.Name.Length >= 0 && IsReadable(property.Value)),
                JsonValueKind.Array => element.EnumerateArray().All(IsReadable),
                JsonValueKind.String => element.GetString() is not null,
                _ => true,
            };
        }
        catch (InvalidOperationException)
        {
            return false;
        }
    }

    /// <summary>A JSON value's kind in words.</summary>
    public static string Kind(JsonElement element) => element.ValueKind switch
    {
        JsonValueKind.Object => "an object",
        JsonValueKind.Array => "a list",
        JsonValueKind.String => $"the text {Problem.Quote(element.GetString())}",
        JsonValueKind.Number => $"the number {Problem.Quote(element.GetRawText())}",
        JsonValueKind.True => "true",
        JsonValueKind.False => "false",
        _ => "nothing",
    };
}
