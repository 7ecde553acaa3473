using System.Collections.Immutable;

namespace PartPick.Catalog.Import;

/// <summary>Goes through the rows of a file, counts them, and keeps those that are not taken.</summary>
internal sealed class ImportCount : IDisposable
{
    private readonly ImmutableArray<RowRejection>.Builder _listed = ImmutableArray.CreateBuilder<RowRejection>();
    private readonly RejectedFile? _rejectedFile;
    private readonly FileLayout _layout;

    public ImportCount(ImportRequest request, FileLayout layout)
    {
        _layout = layout;
        _rejectedFile = request.RejectedPath is { } path && !request.DryRun
            ? new RejectedFile(path, layout.Header, layout.Delimiter)
            : null;
    }

    public long Read { get; private set; }

    public long Rejected { get; private set; }

    public ImmutableArray<RowRejection> Listed => _listed.ToImmutable();

    /// <summary>The line and the column because of which the file has to be read otherwise from its start; null for none.</summary>
    public (long Line, string Column)? Contradicted { get; private set; }

    /// <summary>Takes all rows below the header, or those before one that contradicts how they were read.</summary>
    public void Take(CsvRows rows, ImportRun run, NotationWatch? watch, Action<long> progress, CancellationToken stop)
    {
        while (rows.Read())
        {
            if (rows.Line <= _layout.HeaderLine || (rows.Fault is null && rows.Cells.All(string.IsNullOrWhiteSpace)))
            {
                continue;
            }

            Read++;
            if (Read % 1000 == 0)
            {
                stop.ThrowIfCancellationRequested();
                progress(Read);
            }

            if (rows.Fault is null && watch?.Contradicted(rows.Cells) is { } column)
            {
                Contradicted = (rows.Line, column);
                return;
            }

            if ((rows.Fault is { } fault ? new RowRejection(rows.Line, null, null, fault) : run.Take(rows, _layout.Header.Length))
                is { } rejection)
            {
                Reject(rejection, rows);
            }
        }

        stop.ThrowIfCancellationRequested();
    }

    /// <summary>Puts the file of rejected rows under its name.</summary>
    public string? PublishRejected() => _rejectedFile?.Publish();

    public void Dispose() => _rejectedFile?.Dispose();

    private void Reject(RowRejection rejection, CsvRows rows)
    {
        Rejected++;
        _rejectedFile?.Add(
            rejection, rows.Fault is null ? [.. rows.Cells] : [new string(rows.Raw[..Math.Min(1000, rows.Raw.Length)])]);
        if (_listed.Count < ImportReport.MostListed)
        {
            _listed.Add(rejection);
        }
    }
}
