using System.Collections.Concurrent;
using LiteDB;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Import;
using PartPick.Catalog.Mapping;

namespace PartPick.Catalog;

/// <summary>An open catalogue file; the lock has to be held while it is.</summary>
internal sealed partial class CatalogFile : IDisposable
{
    /// <summary>The number of the form in which the documents are stored.</summary>
    public const int Schema = 1;

    private const string FingerprintKey = "builtInFingerprint";
    private const string ImportCountKey = "importCount";
    private const string PartsMarkKey = "partsMark";
    private const string UndoableKey = "undoable";
    private const string EarlierCollection = "earlier";
    private const int PageBytes = 8192;
    private const int MarkOffset = 32;

    // A transaction that could not be ended throws again when it is finalized, which would end the process: keep it reachable.
    private static readonly ConcurrentBag<LiteDatabase> Abandoned = [];

    private readonly LiteDatabase _database;
    private int _earlierOf;
    private bool _isUnmarked;

    private CatalogFile(string path)
    {
        // The collation is stored in the file: ordinal and without a culture, the same on every machine.
        var connection = new ConnectionString
        {
            Filename = path,
            Connection = ConnectionType.Direct,
            Collation = new Collation("/Ordinal"),
        };
        _database = new LiteDatabase(connection, new BsonMapper());
    }

    public int StoredSchema => _database.UserVersion;

    public string? BuiltInFingerprint
    {
        get => TextDocument.Read(About.FindAll().FirstOrDefault(document => document["_id"] == FingerprintKey));
        private set => About.Upsert(TextDocument.Write(FingerprintKey, value!));
    }

    /// <summary>
    /// What marks the parts as they are: it goes before any of them changes, and no later one is the same. Null where none is set.
    /// </summary>
    public string? PartsMark => TextDocument.Read(About.FindById(PartsMarkKey));

    /// <summary>The candidates of all shortlists.</summary>
    public ILiteCollection<BsonDocument> Shortlists => _database.GetCollection(ShortlistDocument.Collection);

    private ILiteCollection<BsonDocument> Parts => _database.GetCollection(PartDocument.Collection);

    private ILiteCollection<BsonDocument> About => _database.GetCollection(TextDocument.AboutCollection);

    private ILiteCollection<BsonDocument> ImportNotes => _database.GetCollection(ImportDocument.Collection);

    private ILiteCollection<BsonDocument> Earlier => _database.GetCollection(EarlierCollection);

    private ILiteCollection<BsonDocument> Maps => _database.GetCollection(TextDocument.MapsCollection);

    private ILiteCollection<BsonDocument> Settings => _database.GetCollection(TextDocument.SettingsCollection);

    /// <summary>Opens a file that is there.</summary>
    /// <exception cref="InvalidDataException">It is no catalogue.</exception>
    public static CatalogFile Open(string path)
    {
        if (!LooksWhole(path))
        {
            throw new InvalidDataException("The file is not a catalogue, or only a piece of one.");
        }

        return new CatalogFile(path);
    }

    /// <summary>
    /// Makes a new file with the built-in parts. It is filled under another name and renamed when it is complete and on the disk.
    /// </summary>
    public static void Create(string path, BuiltInFiles builtIn)
    {
        string unfinished = path + ".new";
        Delete(unfinished);
        try
        {
            var file = new CatalogFile(unfinished);
            try
            {
                file._database.UserVersion = Schema;
                file.ReplaceBuiltIn(builtIn);
                file.Dispose();
            }
            catch
            {
                file.Abandon();
                throw;
            }

            Publish(unfinished, path);
        }
        finally
        {
            Delete(unfinished);
        }
    }

    /// <summary>All stored parts, each with the id under which it is found.</summary>
    public IEnumerable<(string Id, StoredPart? Part)> ReadNamed() =>
        PartPages.All(Parts).Select(document => (document["_id"].AsString, PartDocument.ReadStored(document)));

    /// <summary>The parts as they were before the last import; null where one cannot be read.</summary>
    public IEnumerable<StoredPart?> ReadEarlier() =>
        Earlier.FindAll().Select(document => document["part"].IsDocument ? PartDocument.ReadStored(document["part"].AsDocument) : null);

    /// <summary>How many parts the index counts.</summary>
    public int CountParts() => Parts.Count();

    /// <summary>All parts; null where a document holds none.</summary>
    public List<Part?> ReadParts() => [.. PartPages.All(Parts).Select(PartDocument.Read)];

    /// <summary>All stored parts one by one, in the order of their ids; null where a document holds none.</summary>
    public IEnumerable<StoredPart?> ReadStored() => PartPages.All(Parts).Select(PartDocument.ReadStored);

    /// <summary>The stored parts whose ids come after one, in the order of their ids; null where a document holds none.</summary>
    public IEnumerable<StoredPart?> ReadStoredAfter(string id, int most) =>
        Parts.Find(BsonExpression.Create("$._id > @0", id), 0, most).Select(PartDocument.ReadStored);

    /// <summary>A stored part; null where there is none, or none can be read.</summary>
    public StoredPart? FindStored(string id) => Parts.FindById(id) is { } document ? PartDocument.ReadStored(document) : null;

    /// <summary>Gives the mark of the parts as they are, and sets one where there is none.</summary>
    public string MarkParts()
    {
        if (PartsMark is { } set)
        {
            return set;
        }

        string mark = Guid.NewGuid().ToString("N");
        About.Upsert(TextDocument.Write(PartsMarkKey, mark));
        _isUnmarked = false;
        return mark;
    }

    /// <summary>Puts a stored part in the place of the one with its id.</summary>
    public void Put(StoredPart part)
    {
        Unmark();
        Parts.Upsert(PartDocument.Write(part));
    }

    /// <summary>The names of the column maps.</summary>
    public List<string> MapNames() => [.. Maps.FindAll().Select(document => document["_id"].AsString)];

    public string? ReadMap(string name) => TextDocument.Read(Maps.FindById(name));

    public void WriteMap(string name, string text) => Maps.Upsert(TextDocument.Write(name, text));

    /// <summary>Puts the built-in parts in the place of the earlier ones, in one transaction; a part of the user's own stays.</summary>
    public void ReplaceBuiltIn(BuiltInFiles builtIn)
    {
        Unmark();
        _database.BeginTrans();
        Dictionary<string, StoredPart> handwork = Parts.Find(BsonExpression.Create($"$.{PartDocument.BuiltIn} = @0", true))
            .Where(document => document[PartDocument.ByHand].IsDocument)
            .Select(PartDocument.ReadStored).OfType<StoredPart>().ToDictionary(part => part.Id, StringComparer.Ordinal);
        Parts.DeleteMany(BsonExpression.Create($"$.{PartDocument.BuiltIn} = @0", true));
        Parts.Insert(builtIn.ReadCatalog().All.Where(part => Parts.FindById(part.Id) is null)
            .Select(part => PartDocument.Write(WithHandwork(part, handwork.GetValueOrDefault(part.Id)))).ToList());
        BuiltInFingerprint = builtIn.Fingerprint();
        _database.Commit();
    }

    /// <summary>Puts in parts of the user's own; a part of the same id is replaced.</summary>
    public void PutOwn(IEnumerable<Part> parts)
    {
        Unmark();
        _database.BeginTrans();
        foreach (Part part in parts)
        {
            Parts.Upsert(PartDocument.Write(part, false));
        }

        _database.Commit();
    }

    /// <summary>
    /// The parts as an import needs to know them. The numbers of the parts that travel in the program are made up, and no supplier's.
    /// </summary>
    public IEnumerable<(string Id, PartKind Kind, string? Supplier, string? Number, UInt128 Row)> ReadKnown() =>
        PartPages.All(Parts).Select(document =>
    {
        BsonDocument figures = document[PartDocument.Figures].AsDocument;
        var kind = PartKinds.Named(document[PartDocument.Kind].AsString);
        return (
            document["_id"].AsString, kind.IsOk ? kind.Value : throw new InvalidDataException("A part in it cannot be read."),
            figures["supplier"].IsString ? figures["supplier"].AsString : null,
            figures["supplierPart"].IsString && document[PartDocument.BuiltIn] != true ? figures["supplierPart"].AsString : null,
            document[PartDocument.Digest].IsBinary ? RowDigest.Of(document[PartDocument.Digest].AsBinary) : 0);
    });

    public string? ReadSetting(string key) => TextDocument.Read(Settings.FindById(key));

    public void WriteSetting(string key, string text) => Settings.Upsert(TextDocument.Write(key, text));

    /// <summary>Closes the file as far as that goes, after something in it went wrong.</summary>
    public void Abandon()
    {
        Abandoned.Add(_database);
        try
        {
            _database.Dispose();
        }
        catch (Exception)
        {
            // The first error says what is wrong; closing a damaged file only repeats it.
        }
    }

    public void Dispose() => _database.Dispose();

    private void Unmark()
    {
        if (!_isUnmarked)
        {
            About.Delete(PartsMarkKey);
            _isUnmarked = true;
        }
    }

    private static StoredPart WithHandwork(Part part, StoredPart? earlier) => new()
    {
        Kind = part.Kind,
        BuiltIn = true,
        Supplied = PartShape.Of(part.Kind).DraftOf(part),
        ByHand = earlier?.ByHand ?? new PartDraft(),
        Cleared = earlier?.Cleared ?? [],
        HandDate = earlier?.HandDate,
    };
}
