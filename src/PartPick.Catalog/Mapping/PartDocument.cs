using LiteDB;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>A part as a document: its id, its kind, where it came from, and its figures by their keys.</summary>
internal static class PartDocument
{
    public const string Collection = "parts";

    /// <summary>The field that says whether the part travels in the program.</summary>
    public const string BuiltIn = "builtIn";

    private const string Kind = "kind";
    private const string Figures = "figures";

    public static BsonDocument Write(Part part, bool builtIn)
    {
        PartShape shape = PartShape.Of(part.Kind);
        PartDraft draft = shape.DraftOf(part);
        var figures = new BsonDocument();
        foreach (PartField column in shape.Fields)
        {
            if (draft.Number(column.Key) is { } number)
            {
                figures[column.Key] = number;
            }
            else if (draft.Text(column.Key) is { } text)
            {
                figures[column.Key] = text;
            }
        }

        return new BsonDocument
        {
            ["_id"] = part.Id,
            [Kind] = part.Kind.Word(),
            [BuiltIn] = builtIn,
            [Figures] = figures,
        };
    }

    /// <summary>Reads a part; null where the document holds none.</summary>
    public static Part? Read(BsonDocument document)
    {
        var kind = PartKinds.Named(document[Kind].IsString ? document[Kind].AsString : null);
        if (!kind.IsOk || !document[Figures].IsDocument)
        {
            return null;
        }

        PartShape shape = PartShape.Of(kind.Value);
        BsonDocument figures = document[Figures].AsDocument;
        var draft = new PartDraft();
        foreach (PartField column in shape.Fields)
        {
            BsonValue value = figures[column.Key];
            if (column.Dimension is null && value.IsString)
            {
                draft.Set(column.Key, value.AsString);
            }
            else if (column.Dimension is not null && value.IsDouble && double.IsFinite(value.AsDouble))
            {
                draft.Set(column.Key, value.AsDouble);
            }
        }

        return shape.Build(new DraftReader(draft, key => key));
    }
}
