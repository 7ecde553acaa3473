using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The weights of the score: an object, or three numbers for error, margin and cost.</summary>
internal static class WeightFields
{
    private const string Fits = "an object with error, margin and cost, or three numbers in this order";

    private static readonly string[] Keys = ["error", "margin", "cost"];

    /// <summary>Reads the weights; null where they are absent or wrong.</summary>
    public static Weights? Read(FieldReader fields)
    {
        if (fields.Raw("weights") is { Value.ValueKind: JsonValueKind.Array })
        {
            return ReadList(fields);
        }

        if (fields.Object("weights", Fits) is not { } own)
        {
            return null;
        }

        own.Allow("the weights", Keys);
        var usual = new Weights();
        return Checked(fields, new Weights(
            own.Optional("error", Dimension.Number) ?? usual.Error,
            own.Optional("margin", Dimension.Number) ?? usual.Margin,
            own.Optional("cost", Dimension.Number) ?? usual.Cost));
    }

    /// <summary>Writes all three.</summary>
    public static JsonObject Write(Weights weights) =>
        new JsonObjectOf().Add("error", weights.Error).Add("margin", weights.Margin).Add("cost", weights.Cost).Done;

    private static Weights? ReadList(FieldReader fields)
    {
        IReadOnlyList<Field> items = fields.Items("weights", Fits)!;
        if (items.Count != Keys.Length)
        {
            fields.Reject("weights", $"has {items.Count} values", Fits);
            return null;
        }

        double[] values = [.. items.Select(item => fields.ValueOf(item, Dimension.Number))];
        return Checked(fields, new Weights(values[0], values[1], values[2]));
    }

    private static Weights Checked(FieldReader fields, Weights weights)
    {
        if (weights.Error + weights.Margin + weights.Cost == 0)
        {
            fields.Reject("weights", "are all zero", "at least one weight above zero");
        }

        return weights;
    }
}
