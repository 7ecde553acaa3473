using LiteDB;
using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Mapping;

/// <summary>A part as a document: its id, its kind, where it came from, and its figures by their keys.</summary>
internal static class PartDocument
{
    public const string Collection = "parts";

    /// <summary>The field that says whether the part travels in the program.</summary>
    public const string BuiltIn = "builtIn";

    /// <summary>The field with the number of the import that last changed the part.</summary>
    public const string Import = "import";

    /// <summary>The field with the digest of the row.</summary>
    public const string Digest = "digest";

    /// <summary>The field of the kind's word.</summary>
    public const string Kind = "kind";

    /// <summary>The field of the supplied figures.</summary>
    public const string Figures = "figures";

    /// <summary>The field of what was set by hand.</summary>
    public const string ByHand = "byHand";

    private const string Cleared = "cleared";
    private const string HandDate = "handDate";
    private const string Line = "line";
    private const string Elsewhere = "elsewhere";

    public static BsonDocument Write(Part part, bool builtIn) => Write(new StoredPart
    {
        Kind = part.Kind,
        BuiltIn = builtIn,
        Supplied = PartShape.Of(part.Kind).DraftOf(part),
    });

    public static BsonDocument Write(StoredPart part)
    {
        PartShape shape = PartShape.Of(part.Kind);
        var document = new BsonDocument
        {
            ["_id"] = part.Id,
            [Kind] = part.Kind.Word(),
            [BuiltIn] = part.BuiltIn,
            [Figures] = DraftDocument.Write(shape, part.Supplied),
        };
        if (part.Place.Import > 0)
        {
            document[Import] = part.Place.Import;
            document[Line] = part.Place.Line;
        }

        if (part.Digest is not null)
        {
            document[Digest] = part.Digest;
        }

        if (part.Elsewhere.Count > 0)
        {
            document[Elsewhere] = new BsonDocument(part.Elsewhere.ToDictionary(
                pair => pair.Key, pair => (BsonValue)new BsonArray(new BsonValue[] { pair.Value.Import, pair.Value.Line })));
        }

        if (part.HandDate is not null)
        {
            document[ByHand] = DraftDocument.Write(shape, part.ByHand);
            document[Cleared] = new BsonArray(part.Cleared.Select(key => new BsonValue(key)));
            document[HandDate] = part.HandDate;
        }

        return document;
    }

    /// <summary>Reads a part; null where the document holds none.</summary>
    public static Part? Read(BsonDocument document) => ReadStored(document)?.Build();

    /// <summary>Reads a part as it is stored; null where the document holds none.</summary>
    public static StoredPart? ReadStored(BsonDocument document)
    {
        var kind = PartKinds.Named(document[Kind].IsString ? document[Kind].AsString : null);
        if (!kind.IsOk || !document[Figures].IsDocument)
        {
            return null;
        }

        PartShape shape = PartShape.Of(kind.Value);
        bool handwork = document[HandDate].IsString;
        return new StoredPart
        {
            Kind = kind.Value,
            BuiltIn = document[BuiltIn].IsBoolean && document[BuiltIn].AsBoolean,
            Supplied = DraftDocument.Read(shape, document[Figures].AsDocument),
            Place = document[Import].IsInt32 ? new RowPlace(document[Import].AsInt32, document[Line].AsInt64) : default,
            Digest = document[Digest].IsBinary ? document[Digest].AsBinary : null,
            Elsewhere = ReadElsewhere(document[Elsewhere]),
            ByHand = handwork && document[ByHand].IsDocument ? DraftDocument.Read(shape, document[ByHand].AsDocument) : new PartDraft(),
            Cleared = document[Cleared].IsArray
                ? document[Cleared].AsArray.Where(key => key.IsString).Select(key => key.AsString).ToHashSet(StringComparer.Ordinal)
                : [],
            HandDate = handwork ? document[HandDate].AsString : null,
        };
    }

    private static Dictionary<string, RowPlace> ReadElsewhere(BsonValue value)
    {
        var places = new Dictionary<string, RowPlace>(StringComparer.Ordinal);
        if (value.IsDocument)
        {
            foreach ((string key, BsonValue place) in value.AsDocument)
            {
                if (place.IsArray && place.AsArray.Count == 2)
                {
                    places[key] = new RowPlace(place.AsArray[0].AsInt32, place.AsArray[1].AsInt64);
                }
            }
        }

        return places;
    }
}
