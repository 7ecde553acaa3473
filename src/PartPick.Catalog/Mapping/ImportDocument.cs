using LiteDB;

namespace PartPick.Catalog.Mapping;

/// <summary>What is kept about an import, as a document.</summary>
internal static class ImportDocument
{
    public const string Collection = "imports";

    public static BsonDocument Write(ImportNote note) => new()
    {
        ["_id"] = note.Number,
        ["file"] = note.File,
        ["date"] = note.Date,
        ["kind"] = note.Kind.Word(),
        ["added"] = note.Added,
        ["updated"] = note.Updated,
    };

    public static ImportNote? Read(BsonDocument document)
    {
        var kind = PartKinds.Named(document["kind"].IsString ? document["kind"].AsString : null);
        return kind.IsOk && document["_id"].IsInt32 && document["file"].IsString && document["date"].IsString
            ? new ImportNote(
                document["_id"].AsInt32, document["file"].AsString, document["date"].AsString, kind.Value,
                document["added"].AsInt32, document["updated"].AsInt32)
            : null;
    }
}
