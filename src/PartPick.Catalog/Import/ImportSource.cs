namespace PartPick.Catalog.Import;

/// <summary>Where a file is read from, as far as possible more than once.</summary>
internal sealed class ImportSource : IDisposable
{
    private readonly Stream? _stream;
    private readonly long _start;

    public ImportSource(Stream stream)
    {
        (_stream, _start) = (stream, stream.CanSeek ? stream.Position : 0);
        Text = SourceText.Of(stream);
    }

    public ImportSource(TextReader reader) => Text = SourceText.Of(reader);

    /// <summary>The text.</summary>
    public SourceText Text { get; private set; }

    /// <summary>The share that was read; null where that is not known.</summary>
    public double? Share => _stream is { CanSeek: true, Length: > 0 } ? (double)_stream.Position / _stream.Length : null;

    /// <summary>Goes back to the start; false where that is not possible.</summary>
    public bool TryRewind()
    {
        if (_stream is not { CanSeek: true })
        {
            return false;
        }

        _stream.Position = _start;
        Text = SourceText.Of(_stream);
        return true;
    }

    public void Dispose() => Text.Dispose();
}
