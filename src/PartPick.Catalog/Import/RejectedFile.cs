using System.Globalization;
using System.Text;
using CsvHelper;

namespace PartPick.Catalog.Import;

/// <summary>
/// The rows that were not taken, as they stood, each with its line, the column at fault and the reason in front; mended, the file
/// can be imported itself. It appears under its name only when the import is done.
/// </summary>
internal sealed class RejectedFile : IDisposable
{
    private static readonly string[] OwnColumns = ["rejected line", "rejected column", "rejected reason"];

    private readonly string _path;
    private readonly IReadOnlyList<string> _header;
    private readonly char _delimiter;
    private CsvWriter? _writer;

    public RejectedFile(string path, IReadOnlyList<string> header, char delimiter) =>
        (_path, _header, _delimiter) = (path, header, delimiter);

    /// <summary>Whether a header is one of those that this file adds.</summary>
    public static bool IsOwnColumn(string header) => OwnColumns.Contains(header.Trim(), StringComparer.OrdinalIgnoreCase);

    /// <summary>Adds a row.</summary>
    public void Add(RowRejection rejection, IReadOnlyList<string> cells)
    {
        _writer ??= Begin();
        string[] own = [rejection.Line.ToString(CultureInfo.InvariantCulture), rejection.Column ?? "", rejection.Reason];
        IEnumerable<string> padded = cells.Concat(Enumerable.Repeat("", Math.Max(0, _header.Count - cells.Count)));
        _writer.WriteRecord([.. own, .. Kept([.. padded]).Select(FormulaGuard.Guard)]);
    }

    /// <summary>Puts the file under its name; gives its path, or null where no row was rejected.</summary>
    public string? Publish()
    {
        if (_writer is null)
        {
            return null;
        }

        _writer.Flush();
        _writer.Dispose();
        _writer = null;
        File.Move(_path + ".new", _path, overwrite: true);
        return _path;
    }

    public void Dispose()
    {
        if (_writer is not null)
        {
            _writer.Dispose();
            File.Delete(_path + ".new");
        }
    }

    private CsvWriter Begin()
    {
        var text = new StreamWriter(_path + ".new", append: false, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false));
        CsvWriterOptions options = CsvWriterOptions.Default with
        {
            NewLine = "\n",
            Separator = _delimiter,
            WriteByteOrderMark = false,
            ValidateFieldCount = false,
        };
        CsvWriter writer = CsvWriter.Create(text, options, false);
        writer.WriteRecord([.. OwnColumns, .. Kept(_header)]);
        return writer;
    }

    // The columns of an earlier rejected file are replaced by those of this one.
    private IEnumerable<string> Kept(IReadOnlyList<string> cells) =>
        cells.Where((_, i) => i >= _header.Count || !IsOwnColumn(_header[i]));
}
