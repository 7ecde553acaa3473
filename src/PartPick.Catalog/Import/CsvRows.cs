using System.Buffers;

namespace PartPick.Catalog.Import;

/// <summary>
/// Rows of a delimited text, one by one, in bounded memory whatever the text holds. Quotes are those of RFC 4180; a quote that
/// is never closed costs its own line only.
/// </summary>
internal sealed class CsvRows
{
    /// <summary>The most characters of a row.</summary>
    public const int LongestRow = 1 << 18;

    /// <summary>The most cells of a row.</summary>
    public const int MostCells = 4096;

    // A quoted cell that goes on for longer is taken for a quote that was not closed.
    private const int LongestQuoted = 8192;

    private readonly TextReader _reader;
    private readonly char _delimiter;
    private readonly SearchValues<char> _ends;
    private readonly List<string> _cells = [];
    private char[] _buffer = new char[1 << 16];
    private int _start;
    private int _filled;
    private bool _ended;
    private long _nextLine = 1;
    private int _rawStart;
    private int _rawLength;

    public CsvRows(TextReader reader, char delimiter, string head = "")
    {
        _reader = reader;
        _delimiter = delimiter;
        _ends = SearchValues.Create([delimiter, '\n', '\r']);
        if (head.Length > _buffer.Length)
        {
            _buffer = new char[head.Length];
        }

        head.CopyTo(_buffer);
        _filled = head.Length;
    }

    /// <summary>The cells of the row; what was read of them where something is wrong with it.</summary>
    public IReadOnlyList<string> Cells => _cells;

    /// <summary>The line on which the row begins, counted from 1.</summary>
    public long Line { get; private set; }

    /// <summary>What is wrong with the row as a whole; null for nothing.</summary>
    public string? Fault { get; private set; }

    /// <summary>The row as it stands in the text, without the line's end; valid until the next row is read.</summary>
    public ReadOnlySpan<char> Raw => _buffer.AsSpan(_rawStart, _rawLength);

    /// <summary>Reads the next row, empty lines left out; false at the end.</summary>
    public bool Read()
    {
        while (true)
        {
            if (_start == _filled && !Fill())
            {
                return false;
            }

            if (_buffer[_start] is not ('\n' or '\r'))
            {
                ReadRow();
                return true;
            }

            SkipLineEnd(ref _start);
            _nextLine++;
        }
    }

    private void ReadRow()
    {
        _cells.Clear();
        (Line, Fault) = (_nextLine, null);
        int at = _start;
        while (true)
        {
            bool quoted = Has(ref at) && _buffer[at] == '"';
            int end = Fault is not null ? -1 : quoted ? TakeQuoted(ref at) : TakePlain(ref at);
            if (end < 0)
            {
                return;
            }

            bool more = Has(ref end);
            if (Fault is not null)
            {
                return;
            }

            if (!more || _buffer[end] is '\n' or '\r')
            {
                Finish(end);
                return;
            }

            at = end + 1;
            if (_cells.Count == MostCells)
            {
                Fault = "has more cells than any list of parts";
                SkipLine(end);
                return;
            }
        }
    }

    // Both give the place of what ends the cell; -1 where the row was given up. Filling may move the row, so places are relative.
    private int TakePlain(ref int at)
    {
        int from = at;
        while (true)
        {
            int found = _buffer.AsSpan(from, _filled - from).IndexOfAny(_ends);
            if (found >= 0)
            {
                _cells.Add(Text(at, from + found));
                return from + found;
            }

            from = _filled;
            if (!MakeRoom(ref at, ref from))
            {
                if (Fault is null)
                {
                    _cells.Add(Text(at, _filled));
                    return _filled;
                }

                return -1;
            }
        }
    }

    private int TakeQuoted(ref int at)
    {
        int from = at + 1;
        bool doubled = false;
        int lines = 0;
        while (true)
        {
            int found = _buffer.AsSpan(from, _filled - from).IndexOfAny('"', '\n');
            if (found < 0 || from + found - at > LongestQuoted)
            {
                from = _filled;
                if (from - at > LongestQuoted || !MakeRoom(ref at, ref from))
                {
                    return GiveUpQuote();
                }

                continue;
            }

            from += found;
            if (_buffer[from] == '\n')
            {
                (lines, from) = (lines + 1, from + 1);
                continue;
            }

            from++;
            if (!Has(ref at, ref from))
            {
                if (Fault is not null)
                {
                    return -1;
                }

                break;
            }

            if (_buffer[from] == '"')
            {
                (doubled, from) = (true, from + 1);
                continue;
            }

            break;
        }

        int close = from - 1;
        int stop = from;
        while (Has(ref at, ref stop, ref close) && _buffer[stop] == ' ' && _delimiter != ' ')
        {
            stop++;
        }

        if (Fault is not null)
        {
            return -1;
        }

        if (Has(ref at, ref stop, ref close) && _buffer[stop] != _delimiter && _buffer[stop] is not ('\n' or '\r'))
        {
            return GiveUpQuote();
        }

        string text = new(_buffer, at + 1, close - at - 1);
        _cells.Add(doubled ? text.Replace("\"\"", "\"", StringComparison.Ordinal) : text);
        return stop;
    }

    // The line on which the row began is given up; the next row begins on the line after it.
    private int GiveUpQuote()
    {
        Fault = "has a quote that is not closed, or text after one";
        SkipLine(_start);
        return -1;
    }

    private void Finish(int end)
    {
        (_rawStart, _rawLength) = (_start, end - _start);
        _nextLine += 1 + Breaks(Raw);
        _start = end;
        if (_start < _filled)
        {
            SkipLineEnd(ref _start);
        }
    }

    // Passes over the rest of a line without keeping it.
    private void SkipLine(int from)
    {
        int first = _buffer.AsSpan(from, _filled - from).IndexOfAny('\n', '\r');
        (_rawStart, _rawLength) = (_start, (first < 0 ? _filled : from + first) - _start);
        if (first < 0)
        {
            // What the buffer holds of the line is kept as its text; the rest is read into a piece of its own.
            char[] kept = _buffer[_rawStart..(_rawStart + Math.Min(_rawLength, 1000))];
            do
            {
                _filled = _reader.Read(_buffer, 2000, _buffer.Length - 2000);
                _filled = _filled <= 0 ? 0 : _filled + 2000;
                first = _filled == 0 ? -1 : _buffer.AsSpan(2000, _filled - 2000).IndexOfAny('\n', '\r');
            }
            while (first < 0 && _filled > 0);
            kept.CopyTo(_buffer, 0);
            (_rawStart, _rawLength) = (0, kept.Length);
            _ended = _filled == 0;
            if (_ended)
            {
                (_start, _filled) = (0, 0);
                _nextLine++;
                return;
            }

            from = 2000;
        }

        _start = from + first;
        SkipLineEnd(ref _start);
        _nextLine++;
    }

    private void SkipLineEnd(ref int at)
    {
        bool carriage = _buffer[at++] == '\r';
        if (!carriage)
        {
            return;
        }

        if (at < _filled)
        {
            at += _buffer[at] == '\n' ? 1 : 0;
        }
        else if (_reader.Peek() == '\n')
        {
            _reader.Read();
        }
    }

    private string Text(int from, int to)
    {
        ReadOnlySpan<char> cell = _buffer.AsSpan(from, to - from);
        return cell.Length == 0 ? "" : new string(cell);
    }

    private bool Has(ref int at)
    {
        int same = at;
        return Has(ref at, ref same);
    }

    private bool Has(ref int at, ref int from)
    {
        int unused = from;
        return Has(ref at, ref from, ref unused);
    }

    private bool Has(ref int at, ref int from, ref int other)
    {
        if (from < _filled)
        {
            return true;
        }

        int before = _start;
        int place = from;
        int cell = at;
        bool more = MakeRoom(ref cell, ref place);
        if (Fault is null)
        {
            int moved = before - _start;
            (at, from, other) = (at - moved, from - moved, other - moved);
        }

        return more && from < _filled;
    }

    // Fills without moving anything; used only where there is room.
    private bool FillInPlace()
    {
        if (_filled == _buffer.Length)
        {
            Array.Resize(ref _buffer, _buffer.Length * 2);
        }

        int count = _reader.Read(_buffer, _filled, _buffer.Length - _filled);
        _ended |= count <= 0;
        _filled += Math.Max(count, 0);
        return count > 0;
    }

    // Reads more of the row; false at the end of the text, or, with a fault, where the row is too long.
    private bool MakeRoom(ref int at, ref int from)
    {
        if (_ended)
        {
            return false;
        }

        if (_filled - _start >= LongestRow)
        {
            Fault = $"is longer than {LongestRow} characters";
            SkipLine(_start);
            return false;
        }

        if (_start > 0 && _filled == _buffer.Length)
        {
            _buffer.AsSpan(_start, _filled - _start).CopyTo(_buffer);
            (at, from, _filled, _start) = (at - _start, from - _start, _filled - _start, 0);
        }

        return FillInPlace();
    }

    private bool Fill()
    {
        if (_ended)
        {
            return false;
        }

        (_start, _filled) = (0, 0);
        return FillInPlace();
    }

    private static int Breaks(ReadOnlySpan<char> text)
    {
        int breaks = text.Count('\n');
        return breaks > 0 || !text.Contains('\r') ? breaks : text.Count('\r');
    }
}
