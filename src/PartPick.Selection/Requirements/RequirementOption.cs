using System.Globalization;
using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>A requirement's key given on the command line, over or instead of the file.</summary>
/// <param name="Key">The key.</param>
/// <param name="Text">Its value as written; null for a flag without one.</param>
public sealed record RequirementOption(RequirementKey Key, string? Text)
{
    /// <summary>The value as the file would hold it.</summary>
    internal Result<Field> ToField()
    {
        string where = "--" + Key.Name;
        string text = (Text ?? "").Trim();
        if (text.Length > 0 && text[0] is '{' or '[')
        {
            return ReadJson(text, where);
        }

        JsonNode node = Key.Shape switch
        {
            RequirementShape.Flag => Flag(text),
            RequirementShape.List => new JsonArray([.. Words(text).Select(Word)]),
            _ => JsonValue.Create(text),
        };
        return Result.Ok(new Field(JsonSerializer.SerializeToElement(node), where));
    }

    private static JsonValue Flag(string text) => text.ToUpperInvariant() switch
    {
        "" or "TRUE" or "YES" => JsonValue.Create(true),
        "FALSE" or "NO" => JsonValue.Create(false),
        _ => JsonValue.Create(text),
    };

    private static string[] Words(string text) => text.Split(
        text.Contains(' ', StringComparison.Ordinal) ? ' ' : ',',
        StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);

    private static JsonNode Word(string word) =>
        double.TryParse(word.TrimEnd(','), NumberStyles.Float, CultureInfo.InvariantCulture, out double number) && double.IsFinite(number)
            ? JsonValue.Create(number)
            : JsonValue.Create(word.TrimEnd(','));

    private Result<Field> ReadJson(string text, string where)
    {
        try
        {
            using JsonDocument document = JsonDocument.Parse(text);
            return JsonText.IsReadable(document.RootElement)
                ? Result.Ok(new Field(document.RootElement.Clone(), where))
                : Result.Fail<Field>(where, "holds half a character in a text", Key.Fits);
        }
        catch (JsonException)
        {
            return Result.Fail<Field>(where, $"{Problem.Quote(text)} is not valid JSON", Key.Fits);
        }
    }
}
