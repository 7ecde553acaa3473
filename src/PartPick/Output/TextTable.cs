namespace PartPick.Output;

/// <summary>A column of a table: its heading with the unit, and on which side its texts stand.</summary>
/// <param name="Heading">Heading, with the unit in brackets.</param>
/// <param name="Right">Whether texts stand at the right, as numbers do.</param>
internal sealed record TextColumn(string Heading, bool Right = false);

/// <summary>Prints aligned columns.</summary>
internal static class TextTable
{
    private const string Gap = "  ";

    /// <summary>Prints headings, a rule and the rows.</summary>
    /// <param name="output">Where to.</param>
    /// <param name="columns">The columns.</param>
    /// <param name="rows">The rows, each with a text for every column.</param>
    /// <param name="paint">How a row is shown; null for plainly.</param>
    public static void Write(
        TextWriter output, IReadOnlyList<TextColumn> columns, IReadOnlyList<string[]> rows, Func<int, string, string>? paint = null)
    {
        int[] widths = [.. columns.Select((column, i) => rows.Select(row => row[i].Length).Append(column.Heading.Length).Max())];
        output.WriteLine(Line(columns, widths, [.. columns.Select(column => column.Heading)]));
        output.WriteLine(string.Join(Gap, widths.Select(width => new string('-', width))));
        for (int i = 0; i < rows.Count; i++)
        {
            string line = Line(columns, widths, rows[i]);
            output.WriteLine(paint is null ? line : paint(i, line));
        }
    }

    private static string Line(IReadOnlyList<TextColumn> columns, int[] widths, string[] texts) => string.Join(
        Gap,
        texts.Select((text, i) => columns[i].Right ? text.PadLeft(widths[i]) : text.PadRight(widths[i]))).TrimEnd();
}
