using System.Text.Json;
using System.Text.Json.Nodes;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Requirement files: what a board needs, as JSON; any key may be given as an option over or instead of the file.</summary>
public static class RequirementFile
{
    /// <summary>Reads a requirement.</summary>
    /// <param name="json">The text of the file; null where there is none.</param>
    /// <param name="fileName">The name of the file, for problems.</param>
    /// <param name="options">Keys given as options; null for none.</param>
    /// <returns>The requirement with defaults filled in, or the first problem.</returns>
    public static Result<Requirement> Read(string? json, string fileName, IReadOnlyList<RequirementOption>? options = null)
    {
        ArgumentNullException.ThrowIfNull(fileName);
        var box = new ProblemBox();
        var fields = new Dictionary<string, Field>(StringComparer.Ordinal);
        if (json is not null)
        {
            Result<JsonElement> root = JsonText.Open(json, fileName, "a requirement");
            if (!root.IsOk)
            {
                return Result.Fail<Requirement>(root.Problem);
            }

            FieldReader.Of(root.Value, fileName + ": ", box).CopyTo(fields);
        }

        foreach (RequirementOption option in options ?? [])
        {
            Result<Field> field = option.ToField();
            if (!field.IsOk)
            {
                return Result.Fail<Requirement>(field.Problem);
            }

            fields[option.Key.Name] = field.Value;
        }

        FieldReader reader = FieldReader.Of(fields, json is null ? "--" : fileName + ": ", box);
        reader.Allow("a requirement", RequirementKeys.Names);
        Requirement requirement = RequirementReader.Read(reader);
        return box.Result(() => requirement);
    }

    /// <summary>Writes a complete requirement; reading it gives the same one.</summary>
    /// <param name="requirement">The requirement.</param>
    public static JsonObject Write(Requirement requirement) => RequirementWriter.Write(requirement);
}
