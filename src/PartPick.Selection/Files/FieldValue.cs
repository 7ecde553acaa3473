using System.Text.Json;
using PartPick.Values;

namespace PartPick.Selection.Files;

/// <summary>Reads single values: a JSON number, or a text as people write values.</summary>
internal static class FieldValue
{
    /// <summary>Reads a value in the unit of its dimension.</summary>
    public static Result<double> Read(Field field, Dimension dimension) => field.Value.ValueKind switch
    {
        JsonValueKind.String => ValueText.Parse(field.Value.GetString(), dimension, field.Where),
        JsonValueKind.Number => ValueText.Parse(field.Value.GetRawText(), dimension, field.Where),
        _ => Result.Fail<double>(field.Where, $"is {JsonText.Kind(field.Value)}", Fits(dimension)),
    };

    /// <summary>What fits a dimension, in the words of its own messages.</summary>
    public static string Fits(Dimension dimension) => ValueText.Parse("", dimension, "value").Problem!.Fits;

    /// <summary>Looks up a word; null and a problem where it is none of those known.</summary>
    public static T? Word<T>(string text, string where, IReadOnlyDictionary<string, T> words, string fits, ProblemBox box)
        where T : struct
    {
        if (words.TryGetValue(text, out T value))
        {
            return value;
        }

        string near = NearWord.Of(text, words.Keys) is { } word ? $"'{word}'; {fits}" : fits;
        box.Add(where, $"{Problem.Quote(text)} is unknown", near);
        return null;
    }
}
