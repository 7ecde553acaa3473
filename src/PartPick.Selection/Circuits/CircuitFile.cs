using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Catalog;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Circuit files: one circuit, its parts and strays, as JSON.</summary>
public static class CircuitFile
{
    private const string Fits = "a circuit";

    /// <summary>Reads a circuit.</summary>
    /// <param name="json">The text of the file.</param>
    /// <param name="fileName">The name of the file, for problems.</param>
    /// <param name="catalog">Where parts named by id are looked up; null where there is no catalogue.</param>
    /// <returns>The circuit, or the first problem: file, key, what is wrong and what fits.</returns>
    public static Result<CircuitDescription> Read(string json, string fileName, PartsCatalog? catalog = null)
    {
        ArgumentNullException.ThrowIfNull(json);
        ArgumentNullException.ThrowIfNull(fileName);
        return JsonText.Open(json, fileName, Fits).Then(root => CircuitReader.Read(root, fileName, catalog));
    }

    /// <summary>Whether the text names a part of the catalogue, so that reading it needs one.</summary>
    /// <param name="json">The text of the file; wrong text names none.</param>
    public static bool NamesParts(string json) =>
        JsonText.Open(json, "", Fits).Map(root => root.EnumerateObject()
            .Any(field => field.Value.ValueKind == JsonValueKind.Object && field.Value.TryGetProperty(PartReference.Key, out _)))
        .ValueOr(false);

    /// <summary>Writes a complete circuit of plain SI values; reading it gives the same numbers.</summary>
    /// <param name="description">The circuit.</param>
    public static JsonObject Write(CircuitDescription description) => CircuitWriter.Write(description);
}
