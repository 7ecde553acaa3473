using LiteDB;
using PartPick.Catalog.Mapping;

namespace PartPick.Catalog;

/// <content>What an import writes, and taking the last one back.</content>
internal sealed partial class CatalogFile
{
    /// <summary>What is kept about the imports, by their numbers.</summary>
    public Dictionary<int, ImportNote> ReadImports() =>
        ImportNotes.FindAll().Select(ImportDocument.Read).OfType<ImportNote>().ToDictionary(note => note.Number);

    /// <summary>The number of the next import.</summary>
    public int NextImport() => 1 + int.Parse(
        TextDocument.Read(About.FindById(ImportCountKey)) ?? "0", System.Globalization.CultureInfo.InvariantCulture);

    /// <summary>Puts in parts whose ids are new.</summary>
    public void InsertNew(List<BsonDocument> parts)
    {
        Unmark();
        Parts.InsertBulk(parts, parts.Count);
    }

    /// <summary>Keeps a part as it was before an import changes it.</summary>
    public void KeepEarlier(string id, int import)
    {
        if (_earlierOf != import)
        {
            _database.DropCollection(EarlierCollection);
            _earlierOf = import;
        }

        Earlier.Insert(new BsonDocument { ["_id"] = id, ["part"] = Parts.FindById(id) });
    }

    /// <summary>Keeps the note of an import; what an earlier one kept for undoing goes.</summary>
    public void WriteImport(ImportNote note)
    {
        if (_earlierOf != note.Number)
        {
            _database.DropCollection(EarlierCollection);
        }

        ImportNotes.Insert(ImportDocument.Write(note));
        string count = note.Number.ToString(System.Globalization.CultureInfo.InvariantCulture);
        About.Upsert(TextDocument.Write(ImportCountKey, count));
        About.Upsert(TextDocument.Write(UndoableKey, count));
    }

    /// <summary>The import that can be taken back; null where there is none.</summary>
    public ImportNote? Undoable() =>
        int.TryParse(TextDocument.Read(About.FindById(UndoableKey)), out int number) && ImportNotes.FindById(number) is { } document
            ? ImportDocument.Read(document)
            : null;

    /// <summary>Takes back the last import, as far as it was not taken back before; null where there is none.</summary>
    public ImportNote? UndoLastImport()
    {
        if (Undoable() is not { } note)
        {
            return null;
        }

        Unmark();
        int number = note.Number;
        foreach (BsonDocument earlier in Earlier.FindAll().ToList())
        {
            StoredPart? now = FindStored(earlier["_id"].AsString);
            StoredPart before = PartDocument.ReadStored(earlier["part"].AsDocument)
                ?? throw new InvalidDataException("A part in it cannot be read.");
            Put(now is null ? before : new StoredPart
            {
                Kind = before.Kind,
                BuiltIn = before.BuiltIn,
                Supplied = before.Supplied,
                Place = before.Place,
                Elsewhere = before.Elsewhere,
                Digest = before.Digest,
                ByHand = now.ByHand,
                Cleared = now.Cleared,
                HandDate = now.HandDate,
            });
        }

        // In pieces: what one transaction changes is held in memory.
        string[] added =
        [
            .. PartPages.All(Parts).Where(part => part[PartDocument.Import] == number).Select(part => part["_id"].AsString),
        ];
        foreach (string[] ids in added.Chunk(2000))
        {
            _database.BeginTrans();
            foreach (string id in ids)
            {
                Parts.Delete(id);
            }

            _database.Commit();
        }

        ImportNotes.Delete(number);
        About.Delete(UndoableKey);
        _database.DropCollection(EarlierCollection);
        return note;
    }
}
