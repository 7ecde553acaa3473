using System.Collections.Immutable;
using LiteDB;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>One import into an open catalogue: takes every row, and counts what became of it.</summary>
internal sealed class ImportRun : IDisposable
{
    private const int BatchRows = 5000;

    private readonly CatalogFile _file;
    private readonly ImportRequest _request;
    private readonly ColumnUse[] _uses;
    private readonly RowReader _reader;
    private readonly RowDigest _digest;
    private readonly PartShape _shape;
    private readonly KnownParts _known;
    private readonly RejectedFile? _rejectedFile;
    private readonly int _number;
    private readonly ImmutableArray<RowRejection>.Builder _listed = ImmutableArray.CreateBuilder<RowRejection>();
    private readonly int _idColumn;
    private readonly int _numberColumn;
    private readonly int _supplierColumn;
    private List<BsonDocument> _batch = [];
    private Task _writing = Task.CompletedTask;

    public ImportRun(CatalogFile file, ImportRequest request, FileLayout layout, ColumnUse[] uses)
    {
        (_file, _request, _uses) = (file, request, uses);
        _shape = PartShape.Of(request.Kind);
        _reader = new RowReader(request.Kind, uses);
        string columns = string.Join('\n', uses.Select(use =>
            $"{use.Index}\t{use.Field}\t{use.Power}\t{use.Notation}\t"
            + $"{use.Quantity}\t{use.QuantityColumn}\t{use.Per}\t{use.PerColumn}\t{use.Currency}\t{use.Basis}\t{use.Exact}"));
        _digest = new RowDigest($"{request.Kind.Word()}\n{request.Supplier}\n{columns}");
        _known = KnownParts.Of(file);
        _number = file.NextImport();
        _rejectedFile = request.RejectedPath is { } path && !request.DryRun
            ? new RejectedFile(path, layout.Header, layout.Delimiter)
            : null;
        (_idColumn, _numberColumn, _supplierColumn) = (IndexOf("id"), IndexOf("supplierPart"), IndexOf("supplier"));
    }

    public long Read { get; private set; }

    public int Added { get; private set; }

    public int Updated { get; private set; }

    public int Unchanged { get; private set; }

    public long Rejected { get; private set; }

    public ImmutableArray<RowRejection> Listed => _listed.ToImmutable();

    /// <summary>Takes all rows below the header.</summary>
    public void Take(CsvRows rows, long headerLine, int headerCells, Action<long>? progress, CancellationToken stop)
    {
        while (rows.Read())
        {
            if (rows.Line <= headerLine || (rows.Fault is null && rows.Cells.All(string.IsNullOrWhiteSpace)))
            {
                continue;
            }

            Read++;
            if (Read % 1000 == 0)
            {
                stop.ThrowIfCancellationRequested();
                progress?.Invoke(Read);
            }

            if ((rows.Fault is { } fault ? new RowRejection(rows.Line, null, null, fault) : Reject(rows, headerCells)) is { } rejection)
            {
                Rejected++;
                _rejectedFile?.Add(
                    rejection,
                    rows.Fault is null ? [.. rows.Cells] : [new string(rows.Raw[..Math.Min(1000, rows.Raw.Length)])]);
                if (_listed.Count < ImportReport.MostListed)
                {
                    _listed.Add(rejection);
                }
            }
        }

        stop.ThrowIfCancellationRequested();
        Flush();
        _writing.GetAwaiter().GetResult();
    }

    /// <summary>Keeps what undoing needs, and the note of this import.</summary>
    public void Close()
    {
        if (Added + Updated > 0)
        {
            _file.WriteImport(new ImportNote(
                _number,
                CellText.Harmless(_request.Name),
                _request.Date.ToString("yyyy-MM-dd", System.Globalization.CultureInfo.InvariantCulture),
                _request.Kind,
                Added,
                Updated));
        }
    }

    /// <summary>Puts the file of rejected rows under its name.</summary>
    public string? PublishRejected() => _rejectedFile?.Publish();

    public void Dispose()
    {
        _rejectedFile?.Dispose();
        _digest.Dispose();
    }

    // Takes one row, or gives why not.
    private RowRejection? Reject(CsvRows rows, int headerCells)
    {
        long line = rows.Line;
        IReadOnlyList<string> cells = rows.Cells;
        bool tooMany = cells.Count > headerCells && cells.Skip(headerCells).Any(cell => !string.IsNullOrWhiteSpace(cell));
        if (tooMany || (_uses[0].Exact && cells.Count != headerCells))
        {
            return new RowRejection(
                line,
                null,
                null,
                $"has {CellNumber.Text(cells.Count)} cells, the header {CellNumber.Text(headerCells)}; fits one cell for each column");
        }

        string? id = Cell(cells, _idColumn);
        string? number = Cell(cells, _numberColumn);
        string? supplier = Cell(cells, _supplierColumn) ?? _request.Supplier;
        if (id is null && number is null)
        {
            return new RowRejection(line, null, null, "has neither a supplier's number nor an id; fits a row with one of them");
        }

        KnownPart? known = id is not null ? _known.WithId(id) : _known.WithNumber(_request.Kind, number!, supplier);
        UInt128 digest = _digest.Of(rows.Raw);
        if (known is { MetOn: > 0 })
        {
            if (known.Digest != digest)
            {
                string what = string.Create(
                    System.Globalization.CultureInfo.InvariantCulture,
                    $"is the part of line {known.MetOn} with other figures; fits one row for each part");
                return new RowRejection(line, Header(id is not null ? "id" : "supplierPart"), id ?? number, what);
            }

            Unchanged++;
            return null;
        }

        if (known is not null && known.Digest == digest)
        {
            known.MetOn = line;
            Unchanged++;
            return null;
        }

        if (known is not null && known.Kind != _request.Kind)
        {
            return new RowRejection(line, Header("id"), id, $"is the id of one of the {known.Kind.Word()}; fits an id of its own");
        }

        (PartDraft? draft, RowRejection? wrong) = _reader.Read(cells, line);
        if (draft is null)
        {
            return wrong;
        }

        if (supplier is not null && !draft.Has("supplier"))
        {
            draft.Set("supplier", CellText.Harmless(supplier));
        }

        return known is null ? Add(draft, id, number, supplier, line, digest) : Update(known, draft, line, digest);
    }

    private RowRejection? Add(PartDraft draft, string? id, string? number, string? supplier, long line, UInt128 digest)
    {
        if (id is null)
        {
            draft.Set("id", _known.FreeId(RowCompletion.IdOf(CellText.Harmless(number!)), supplier));
        }

        RowCompletion.Complete(_request.Kind, draft);
        (Part? part, RowRejection? wrong) = Build(draft, line);
        if (part is null)
        {
            return wrong;
        }

        string? kept = number is null ? null : CellText.Harmless(number);
        _known.Add(new KnownPart(part.Id, _request.Kind, part.Supplier, kept, digest) { MetOn = line });
        Added++;
        _batch.Add(PartDocument.Write(new StoredPart
        {
            Kind = _request.Kind,
            Supplied = _shape.DraftOf(part),
            Place = new RowPlace(_number, line),
            Digest = RowDigest.Bytes(digest),
        }));
        if (_batch.Count >= BatchRows)
        {
            Flush();
        }

        return null;
    }

    private RowRejection? Update(KnownPart known, PartDraft draft, long line, UInt128 digest)
    {
        _writing.GetAwaiter().GetResult();
        StoredPart old = _file.FindStored(known.Id) ?? throw new InvalidDataException("A part in it cannot be read.");
        PartDraft merged = old.Supplied.Copy();
        foreach (string key in _reader.Keys)
        {
            if (key is not ("id" or "basis") && (key != "description" || draft.Has(key)))
            {
                merged.Take(key, draft);
            }
        }

        if (draft.Has("supplier"))
        {
            merged.Take("supplier", draft);
        }

        merged.Remove("basis");
        merged.Set("basis", BasisMarks.Join(old.Supplied.Text("basis"), draft.Text("basis"), _reader.Keys));
        merged.IsSeries = draft.IsSeries
            || (!_reader.Keys.Contains("load") && old.Supplied.Text("basis")?.Contains("load=assumed", StringComparison.Ordinal) != true);
        RowCompletion.Complete(_request.Kind, merged);
        (Part? part, RowRejection? wrong) = Build(merged, line);
        if (part is null)
        {
            return wrong;
        }

        known.MetOn = line;
        known.Digest = digest;
        PartDraft supplied = _shape.DraftOf(part);
        if (_shape.Fields.All(field => supplied.Agrees(field.Key, old.Supplied)))
        {
            Unchanged++;
            return null;
        }

        Updated++;
        var changed = new StoredPart
        {
            Kind = old.Kind,
            Supplied = supplied,
            ByHand = old.ByHand,
            Cleared = old.Cleared,
            HandDate = old.HandDate,
            Place = new RowPlace(_number, line),
            Digest = RowDigest.Bytes(digest),
        };
        foreach (string key in supplied.Keys.Where(key => !_reader.Keys.Contains(key) && key != "basis"))
        {
            changed.Elsewhere[key] = old.Elsewhere.TryGetValue(key, out RowPlace place) ? place : old.Place;
        }

        _file.KeepEarlier(old.Id, _number);
        _file.Put(changed);
        return null;
    }

    private (Part? Part, RowRejection? Wrong) Build(PartDraft draft, long line)
    {
        var figures = new DraftReader(draft, key => key);
        if (_shape.Build(figures) is { } part)
        {
            return (part, null);
        }

        Problem problem = figures.Problems.Find(each => Header(each.Where) is not null)
            ?? figures.Problems.Find(each => each.Where is "frequency" or "value" or "beta") ?? figures.Problems[0];
        string what = $"{problem.Where} {problem.What}; fits {problem.Fits}";
        return (null, new RowRejection(line, Header(problem.Where), draft.Text(problem.Where), what));
    }

    private void Flush()
    {
        _writing.GetAwaiter().GetResult();
        if (_batch.Count > 0)
        {
            List<BsonDocument> full = _batch;
            _batch = [];
            _writing = Task.Run(() => _file.InsertNew(full));
        }
    }

    private int IndexOf(string field) => Array.Find(_uses, use => use.Field == field)?.Index ?? -1;

    private string? Header(string key) => Array.Find(_uses, use => use.Field == key)?.Header;

    private static string? Cell(IReadOnlyList<string> cells, int column)
    {
        string text = column >= 0 && column < cells.Count ? CellText.Harmless(CellText.Plain(cells[column])) : "";
        return text.Length > 0 ? text : null;
    }
}
