using System.Globalization;
using LiteDB;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>A candidate of a list as a document.</summary>
internal static class ShortlistDocument
{
    public const string Collection = "shortlists";

    private static readonly string[] Texts = ["list", "added", "choice", "circuit", "requirement", "figures"];

    public static string KeyOf(string list, int number) => string.Create(CultureInfo.InvariantCulture, $"{list}/{number}");

    public static BsonDocument Write(string list, ShortlistEntry entry) => new()
    {
        ["_id"] = KeyOf(list, entry.Number),
        ["list"] = list,
        ["number"] = entry.Number,
        ["added"] = entry.Added,
        ["builds"] = entry.Builds,
        ["note"] = entry.Note,
        ["choice"] = entry.Choice,
        ["circuit"] = entry.Circuit,
        ["requirement"] = entry.Requirement,
        ["figures"] = entry.Figures,
        ["parts"] = new BsonArray(entry.Parts.Select(part => new BsonDocument
        {
            [PartDocument.Kind] = part.Kind.Word(),
            [PartDocument.Figures] = DraftDocument.Write(PartShape.Of(part.Kind), PartShape.Of(part.Kind).DraftOf(part)),
        })),
    };

    /// <summary>Reads a candidate and the name of its list; null where the document holds none.</summary>
    public static (string List, ShortlistEntry Entry)? Read(BsonDocument document)
    {
        if (!Texts.All(key => document[key].IsString) || !document["number"].IsInt32 || !document["builds"].IsInt32
            || !document["parts"].IsArray)
        {
            return null;
        }

        Part?[] parts = [.. document["parts"].AsArray.Select(part => part.IsDocument ? PartDocument.Read(part.AsDocument) : null)];
        return parts.Contains(null) ? null : (document["list"].AsString, new ShortlistEntry
        {
            Number = document["number"].AsInt32,
            Added = document["added"].AsString,
            Builds = document["builds"].AsInt32,
            Note = document["note"].IsString ? document["note"].AsString : null,
            Choice = document["choice"].AsString,
            Circuit = document["circuit"].AsString,
            Requirement = document["requirement"].AsString,
            Figures = document["figures"].AsString,
            Parts = [.. parts.OfType<Part>()],
        });
    }
}
