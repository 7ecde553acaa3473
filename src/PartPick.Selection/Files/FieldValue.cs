using System.Text.Json;
using PartPick.Values;

namespace PartPick.Selection.Files;

/// <summary>Reads single values: a JSON number, or a text as people write values.</summary>
internal static class FieldValue
{
    // Beyond these no figure of a circuit on a board lies, whatever its unit.
    private const double Largest = 1e15;
    private const double Coldest = -200;
    private const double Hottest = 500;

    /// <summary>Reads a value in the unit of its dimension.</summary>
    public static Result<double> Read(Field field, Dimension dimension) => field.Value.ValueKind switch
    {
        JsonValueKind.String => Within(ValueText.Parse(field.Value.GetString(), dimension, field.Where), field, dimension),
        JsonValueKind.Number => Within(ValueText.Parse(field.Value.GetRawText(), dimension, field.Where), field, dimension),
        _ => Result.Fail<double>(field.Where, $"is {JsonText.Kind(field.Value)}", Fits(dimension)),
    };

    private static Result<double> Within(Result<double> read, Field field, Dimension dimension)
    {
        if (!read.IsOk)
        {
            return read;
        }

        bool within = dimension == Dimension.Temperature
            ? read.Value is >= Coldest and <= Hottest
            : Math.Abs(read.Value) <= Largest;
        if (within)
        {
            return read;
        }

        string text = field.Value.ValueKind == JsonValueKind.String ? field.Value.GetString()! : field.Value.GetRawText();
        return Result.Fail<double>(
            field.Where,
            $"{Problem.Quote(text)} is beyond what a circuit can be at",
            dimension == Dimension.Temperature ? "-200 °C to 500 °C" : Fits(dimension));
    }

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
