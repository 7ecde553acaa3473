using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Selection.Files;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Crystal files: the same keys as the crystal of a circuit file, or the id of a part.</summary>
public static class CrystalFile
{
    /// <summary>Reads a crystal.</summary>
    /// <param name="json">The text of the file.</param>
    /// <param name="fileName">The name of the file, for problems.</param>
    /// <param name="catalog">Where a part named by its id is looked up; null where there is no catalogue.</param>
    /// <returns>The crystal, or the first problem.</returns>
    public static Result<Crystal> Read(string json, string fileName, PartsCatalog? catalog = null)
    {
        ArgumentNullException.ThrowIfNull(json);
        ArgumentNullException.ThrowIfNull(fileName);
        return JsonText.Open(json, fileName, "a crystal").Then(root =>
        {
            var box = new ProblemBox();
            FieldReader fields = FieldReader.Of(root, fileName + ": ", box);
            if (fields.Has(PartReference.Key))
            {
                CrystalPart? part = PartReference.Find<CrystalPart>(fields, catalog, "a crystal of the catalogue");
                return box.Result(() => PartPhysics.Crystal(part!));
            }

            Crystal crystal = CrystalFields.Read(fields).Crystal;
            return box.Result(() => crystal);
        });
    }

    /// <summary>Whether the text names a part of the catalogue, so that reading it needs one.</summary>
    /// <param name="json">The text of the file; wrong text names none.</param>
    public static bool NamesPart(string json) =>
        JsonText.Open(json, "", "a crystal").Map(root => root.TryGetProperty(PartReference.Key, out _)).ValueOr(false);
}
