using System.Globalization;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Takes the rows of a file into an open catalogue.</summary>
internal sealed class ImportRun : IDisposable
{
    private readonly CatalogFile _file;
    private readonly ImportRequest _request;
    private readonly ColumnUse[] _uses;
    private readonly RowReader _reader;
    private readonly RowDigest _digest;
    private readonly PartShape _shape;
    private readonly PartMerge _merge;
    private readonly KnownParts _known;
    private readonly PartBatches _batches;
    private readonly RowName _name;
    private readonly int _number;

    public ImportRun(CatalogFile file, ImportRequest request, ColumnUse[] uses)
    {
        (_file, _request, _uses) = (file, request, uses);
        _shape = PartShape.Of(request.Kind);
        _reader = new RowReader(request.Kind, uses);
        _merge = new PartMerge(_shape, _reader.Keys);
        _batches = new PartBatches(file);
        _name = new RowName(uses, request.Supplier);
        _digest = RowDigest.For(request, uses);
        _known = KnownParts.Of(file);
        _number = file.NextImport();
    }

    public int Added { get; private set; }

    public int Updated { get; private set; }

    public int Unchanged { get; private set; }

    /// <summary>Takes one row; gives why not, or null.</summary>
    public RowRejection? Take(CsvRows rows, int headerCells)
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

        (string? id, string? number, string? supplier) = _name.Of(cells);
        if (id is null && number is null)
        {
            return new RowRejection(line, null, null, "has neither a supplier's number nor an id; fits a row with one of them");
        }

        int known = id is not null ? _known.WithId(id) : _known.WithNumber(_request.Kind, number!, supplier);
        UInt128 digest = _digest.Of(rows.Raw);
        if (known >= 0)
        {
            ref KnownPart part = ref _known[known];
            if (part.MetOn > 0 && part.Row != digest)
            {
                return new RowRejection(
                    line, Header(id is not null ? "id" : "supplierPart"), id ?? number,
                    string.Create(
                        CultureInfo.InvariantCulture, $"is the part of line {part.MetOn} with other figures; fits one row for each part"));
            }

            if (part.Row == digest)
            {
                part.MetOn = part.MetOn > 0 ? part.MetOn : ShortLine(line);
                Unchanged++;
                return null;
            }

            if (part.Kind != _request.Kind)
            {
                return new RowRejection(line, Header("id"), id, $"is the id of one of the {part.Kind.Word()}; fits an id of its own");
            }
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

        return known < 0
            ? Add(draft, id, number, supplier, line, digest)
            : Update(known, id ?? _known.IdOf(known, number), draft, line, digest);
    }

    /// <summary>Writes what is left, and keeps what undoing needs, and the note of this import.</summary>
    public void Close()
    {
        _batches.Finish();
        if (Added + Updated > 0)
        {
            _file.WriteImport(new ImportNote(
                _number,
                CellText.Harmless(_request.Name),
                _request.Date.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture),
                _request.Kind,
                Added,
                Updated));
        }
    }

    /// <summary>Waits for what is being written.</summary>
    public void Dispose()
    {
        _batches.Abandon();
        _digest.Dispose();
    }

    private RowRejection? Add(PartDraft draft, string? id, string? number, string? supplier, long line, UInt128 digest)
    {
        if (id is null)
        {
            draft.Set("id", _known.FreeId(RowCompletion.IdOf(number!), supplier));
        }

        RowCompletion.Complete(_request.Kind, draft);
        (Part? part, RowRejection? wrong) = Build(draft, line);
        if (part is null)
        {
            return wrong;
        }

        Meet(_known.Add(part.Id, _request.Kind, part.Supplier, number, digest), line, digest);
        Added++;
        _batches.Add(PartDocument.Write(new StoredPart
        {
            Kind = _request.Kind,
            Supplied = _shape.DraftOf(part),
            Place = new RowPlace(_number, line),
            Digest = RowDigest.Bytes(digest),
        }));
        return null;
    }

    private RowRejection? Update(int known, string id, PartDraft draft, long line, UInt128 digest)
    {
        _batches.Wait();
        StoredPart old = _file.FindStored(id) ?? throw new InvalidDataException("A part in it cannot be read.");
        PartDraft merged = _merge.Join(old, draft);
        RowCompletion.Complete(_request.Kind, merged);
        (Part? part, RowRejection? wrong) = Build(merged, line);
        if (part is null)
        {
            return wrong;
        }

        Meet(known, line, digest);
        PartDraft supplied = _shape.DraftOf(part);
        if (_merge.IsSame(old, supplied))
        {
            Unchanged++;
            return null;
        }

        Updated++;
        _file.KeepEarlier(old.Id, _number);
        _file.Put(_merge.Changed(old, supplied, new RowPlace(_number, line), RowDigest.Bytes(digest)));
        return null;
    }

    private void Meet(int known, long line, UInt128 digest)
    {
        ref KnownPart part = ref _known[known];
        (part.MetOn, part.Row) = (ShortLine(line), digest);
    }

    private static uint ShortLine(long line) => (uint)Math.Min(line, uint.MaxValue);

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

    private string? Header(string key) => Array.Find(_uses, use => use.Field == key)?.Header;
}
