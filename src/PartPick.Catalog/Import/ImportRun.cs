using System.Globalization;
using PartPick.Catalog.Fields;
using PartPick.Catalog.Mapping;

namespace PartPick.Catalog.Import;

/// <summary>Takes the rows of a file into an open catalogue.</summary>
internal sealed class ImportRun : IDisposable
{
    private readonly CatalogFile _file;
    private readonly ImportRequest _request;
    private readonly RowBuilder _builder;
    private readonly RowDigest _digest;
    private readonly PartMerge _merge;
    private readonly KnownParts _known;
    private readonly PartBatches _batches;
    private readonly int _number;

    public ImportRun(CatalogFile file, ImportRequest request, ColumnUse[] uses)
    {
        (_file, _request) = (file, request);
        _builder = new RowBuilder(request.Kind, uses, request.Supplier);
        _merge = new PartMerge(_builder.Shape, _builder.Keys);
        _batches = new PartBatches(file);
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
        (RowPart named, RowRejection? unnamed) = _builder.Begin(rows.Cells, line, headerCells);
        if (unnamed is not null)
        {
            return unnamed;
        }

        (string? id, string? number, string? supplier) = named;
        int known = id is not null ? _known.WithId(id) : _known.WithNumber(_request.Kind, number!, supplier);
        UInt128 digest = _digest.Of(rows.Raw);
        if (known >= 0)
        {
            ref KnownPart part = ref _known[known];
            if (part.MetOn > 0 && part.Row != digest)
            {
                return new RowRejection(
                    line, _builder.Header(id is not null ? "id" : "supplierPart"), id ?? number,
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
                return new RowRejection(
                    line, _builder.Header("id"), id, $"is the id of one of the {part.Kind.Word()}; fits an id of its own");
            }
        }

        (PartDraft? draft, RowRejection? wrong) = _builder.Read(rows.Cells, line, named);
        if (draft is null)
        {
            return wrong;
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

        (Part? part, RowRejection? wrong) = _builder.Build(draft, line);
        if (part is null)
        {
            return wrong;
        }

        Meet(_known.Add(part.Id, _request.Kind, part.Supplier, number, digest), line, digest);
        Added++;
        _batches.Add(PartDocument.Write(new StoredPart
        {
            Kind = _request.Kind,
            Supplied = _builder.Shape.DraftOf(part),
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
        (Part? part, RowRejection? wrong) = _builder.Build(merged, line);
        if (part is null)
        {
            return wrong;
        }

        Meet(known, line, digest);
        PartDraft supplied = _builder.Shape.DraftOf(part);
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
}
