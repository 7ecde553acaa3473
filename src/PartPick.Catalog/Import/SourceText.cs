using System.Text;

namespace PartPick.Catalog.Import;

/// <summary>The text of a file in whatever of the usual encodings it is: UTF-8, UTF-16 with or without a mark, or Latin-1.</summary>
internal sealed class SourceText : IDisposable
{
    private const int HeadBytes = 4096;

    private readonly WesternFallback _western = new();
    private readonly string? _wide;

    private SourceText(TextReader reader) => Reader = reader;

    private SourceText(Stream stream)
    {
        byte[] head = new byte[HeadBytes];
        int count = stream.ReadAtLeast(head, HeadBytes, throwOnEndOfStream: false);
        ReadOnlySpan<byte> start = head.AsSpan(0, count);
        (Encoding encoding, int mark, _wide) = start switch
        {
            [0xEF, 0xBB, 0xBF, ..] => (Utf8(), 3, null),
            [0xFF, 0xFE, ..] => (Encoding.Unicode, 2, "UTF-16"),
            [0xFE, 0xFF, ..] => (Encoding.BigEndianUnicode, 2, "UTF-16"),
            _ when ZerosAt(start, 1) => (Encoding.Unicode, 0, "UTF-16"),
            _ when ZerosAt(start, 0) => (Encoding.BigEndianUnicode, 0, "UTF-16"),
            _ => (Utf8(), 0, (string?)null),
        };
        Reader = new StreamReader(
            new HeadedStream(head[mark..count], stream), encoding, detectEncodingFromByteOrderMarks: false, bufferSize: 65536);
    }

    public TextReader Reader { get; }

    /// <summary>The encoding, as far as what was read so far tells.</summary>
    public string EncodingName => _wide ?? (_western.WasUsed ? "Latin-1" : "UTF-8");

    public static SourceText Of(Stream stream) => new(stream);

    public static SourceText Of(TextReader reader) => new(reader);

    public void Dispose() => Reader.Dispose();

    private static bool ZerosAt(ReadOnlySpan<byte> start, int side)
    {
        (int zeros, int pairs) = (0, start.Length / 2);
        for (int i = side; i < pairs * 2; i += 2)
        {
            zeros += start[i] == 0 ? 1 : 0;
        }

        int others = 0;
        for (int i = 1 - side; i < pairs * 2; i += 2)
        {
            others += start[i] == 0 ? 1 : 0;
        }

        return pairs > 2 && zeros > pairs * 0.7 && others < pairs * 0.1;
    }

    private Encoding Utf8() => Encoding.GetEncoding("utf-8", EncoderFallback.ReplacementFallback, _western);
}
