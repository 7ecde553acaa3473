using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>How a delimited file is laid out: its delimiter, its header, its first rows.</summary>
internal sealed record FileLayout
{
    private const int HeadCharacters = 1 << 16;
    private const int MostSample = 500;
    private const int MostTitles = 20;

    private static readonly char[] Delimiters = [',', ';', '\t', '|'];

    /// <summary>The delimiter.</summary>
    public required char Delimiter { get; init; }

    /// <summary>The cells of the header.</summary>
    public required string[] Header { get; init; }

    /// <summary>The line of the header.</summary>
    public required long HeaderLine { get; init; }

    /// <summary>The first rows below the header.</summary>
    public required IReadOnlyList<string[]> Sample { get; init; }

    /// <summary>The text that was read to find all this; the reader goes on behind it.</summary>
    public required string Head { get; init; }

    /// <summary>Whether the head is the whole text.</summary>
    public bool IsWhole { get; init; }

    /// <summary>Finds the layout of a text.</summary>
    public static Result<FileLayout> Find(TextReader text, string name, PartKind kind, IReadOnlyList<ColumnWish> wishes)
    {
        char[] buffer = new char[HeadCharacters];
        int count = text.ReadBlock(buffer, 0, HeadCharacters);
        string head = new(buffer, 0, count);
        if (head.Trim('\0', ' ', '\r', '\n', '\uFEFF').Length == 0)
        {
            return Result.Fail<FileLayout>(name, "is empty", "a CSV file with a header and rows");
        }

        if (count == HeadCharacters && !head.AsSpan().ContainsAny('\n', '\r'))
        {
            return Result.Fail<FileLayout>(
                name, $"line 1 is longer than {HeadCharacters} characters", "a CSV file with a header and rows on lines of their own");
        }

        int controls = head.Count(letter => char.IsControl(letter) && letter is not ('\n' or '\r' or '\t'));
        if (controls > head.Length / 20)
        {
            return Result.Fail<FileLayout>(name, "is not a text", "a CSV file");
        }

        char? stated = head.StartsWith("sep=", StringComparison.OrdinalIgnoreCase) && head.Length > 5 ? head[4] : null;
        char delimiter = stated ?? Delimiters.MaxBy(each => Rate(Rows(head, each, 60)));
        List<(string[] Cells, long Line)> rows = Rows(head, delimiter, MostSample + MostTitles);
        (int at, int known) = HeaderOf(rows, kind, wishes);
        if (known == 0)
        {
            return Result.Fail<FileLayout>(
                name,
                "has no header that names a figure of " + kind.Word(),
                "a row of column names such as frequency, load, ESR; or --column");
        }

        return Result.Ok(new FileLayout
        {
            Delimiter = delimiter,
            Header = rows[at].Cells,
            HeaderLine = rows[at].Line,
            Sample = [.. rows.Skip(at + 1).Select(row => row.Cells).Take(MostSample)],
            Head = head,
            IsWhole = count < HeadCharacters,
        });
    }

    private static (int Index, int Known) HeaderOf(List<(string[] Cells, long Line)> rows, PartKind kind, IReadOnlyList<ColumnWish> wishes)
    {
        (int best, int most) = (0, 0);
        for (int i = 0; i < Math.Min(rows.Count, MostTitles); i++)
        {
            int known = ColumnProposal.Known(kind, rows[i].Cells, wishes);
            if (known > most && rows[i].Cells.Length > 1)
            {
                (best, most) = (i, known);
            }
        }

        return (best, most);
    }

    private static List<(string[] Cells, long Line)> Rows(string head, char delimiter, int most)
    {
        var rows = new List<(string[] Cells, long Line)>();
        var reader = new CsvRows(TextReader.Null, delimiter, head);
        while (rows.Count < most && reader.Read())
        {
            if (reader.Fault is null)
            {
                rows.Add(([.. reader.Cells], reader.Line));
            }
        }

        return rows;
    }

    // Many rows with the same number of cells, and more cells rather than fewer.
    private static double Rate(List<(string[] Cells, long Line)> rows)
    {
        if (rows.Count == 0)
        {
            return 0;
        }

        IGrouping<int, (string[] Cells, long Line)> mode = rows
            .GroupBy(row => row.Cells.Length)
            .MaxBy(group => group.Count() * (group.Key > 1 ? 2 : 1))!;
        return mode.Key <= 1 ? 0 : ((double)mode.Count() / rows.Count) + (Math.Min(mode.Key, 40) * 0.002);
    }
}
