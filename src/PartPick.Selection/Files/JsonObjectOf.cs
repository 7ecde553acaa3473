using System.Text.Json.Nodes;

namespace PartPick.Selection.Files;

/// <summary>Puts an object of plain numbers together; what is absent or ideal (infinite) is left out.</summary>
internal sealed class JsonObjectOf
{
    /// <summary>The object.</summary>
    public JsonObject Done { get; } = [];

    /// <summary>Adds a number where it is there and finite.</summary>
    public JsonObjectOf Add(string key, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            Done[key] = number;
        }

        return this;
    }

    /// <summary>Adds a node.</summary>
    public JsonObjectOf Add(string key, JsonNode? node)
    {
        Done[key] = node;
        return this;
    }
}
