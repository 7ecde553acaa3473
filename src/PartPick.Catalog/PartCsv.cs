using System.Globalization;
using CsvHelper;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>
/// The CSV files of parts, one for each kind: comma, LF, quotes only where needed. A plain number in a cell is in the unit of
/// its header; any other form of a value is read as it stands. An empty cell is an absent figure.
/// </summary>
public static class PartCsv
{
    /// <summary>Reads a file. Rows that are wrong are left out and reported; the others are kept.</summary>
    /// <param name="kind">The kind of its parts.</param>
    /// <param name="text">The text of the file.</param>
    /// <param name="fileName">The name of the file, for the problems.</param>
    /// <returns>The parts in the order of the file, and what is wrong, each with file, line and column.</returns>
    public static (IReadOnlyList<Part> Parts, IReadOnlyList<Problem> Problems) Read(PartKind kind, TextReader text, string fileName)
    {
        ArgumentNullException.ThrowIfNull(text);
        PartShape shape = PartShape.Of(kind);
        var parts = new List<Part>();
        var problems = new List<Problem>();
        var malformed = new HashSet<long>();
        CsvReaderOptions options = CsvReaderOptions.Default with
        {
            Separator = ',',
            TrackLineNumbers = true,
            SkipEmptyLines = true,
            OnMalformedRecord = record => malformed.Add(record.LineNumber),
        };
        using CsvReader reader = CsvReader.FromText(text.ReadToEnd(), options);
        string[] header = [.. reader.Headers.Select(cell => cell.Trim())];
        CheckHeader(shape, header, fileName, problems);
        if (problems.Count > 0)
        {
            return ([], problems);
        }

        PartField[] fields = [.. header.Select(cell => shape.Fields.First(field => field.Header == cell))];
        var firstLine = new Dictionary<string, long>(StringComparer.Ordinal);
        while (reader.Read())
        {
            long line = reader.LineNumber;
            if (malformed.Contains(line))
            {
                problems.Add(new Problem(
                    Place(fileName, line), "has a quote that is not closed, or text after one", "quotes as in RFC 4180"));
            }
            else if (reader.FieldCount != fields.Length)
            {
                problems.Add(new Problem(Place(fileName, line), Counted("has", reader.FieldCount), Counted("a row of", fields.Length)));
            }
            else if (ReadRow(reader, shape, fields, key => Place(fileName, line, HeaderOf(shape, key)), problems) is { } part)
            {
                if (firstLine.TryAdd(part.Id, line))
                {
                    parts.Add(part);
                }
                else
                {
                    problems.Add(new Problem(
                        Place(fileName, line, "id"), $"{Problem.Quote(part.Id)} is already in line {firstLine[part.Id]}",
                        "an id of its own"));
                }
            }
        }

        return (parts, problems);
    }

    /// <summary>Writes a file that <see cref="Read"/> reads again, and that is written the same way from what was read.</summary>
    /// <param name="kind">The kind of the parts.</param>
    /// <param name="parts">The parts, in the order to write.</param>
    /// <param name="text">Where to write.</param>
    /// <exception cref="ArgumentException">A part is of another kind.</exception>
    public static void Write(PartKind kind, IEnumerable<Part> parts, TextWriter text)
    {
        ArgumentNullException.ThrowIfNull(parts);
        ArgumentNullException.ThrowIfNull(text);
        using var writer = new PartCsvWriter(kind, text);
        foreach (Part part in parts)
        {
            writer.Write(part);
        }
    }

    private static Part? ReadRow(
        CsvReader reader, PartShape shape, PartField[] fields, Func<string, string> where, List<Problem> problems)
    {
        var draft = new PartDraft();
        int before = problems.Count;
        for (int i = 0; i < fields.Length; i++)
        {
            PartField column = fields[i];
            if (column.Read(reader.GetString(i), draft, () => where(column.Key)) is { } problem)
            {
                problems.Add(problem);
            }
        }

        // A figure that could not be read would be reported again as missing.
        if (problems.Count > before)
        {
            return null;
        }

        var figures = new DraftReader(draft, where);
        Part? part = shape.Build(figures);
        problems.AddRange(figures.Problems);
        return part;
    }

    private static void CheckHeader(PartShape shape, string[] header, string fileName, List<Problem> problems)
    {
        string[] known = [.. shape.Fields.Select(field => field.Header)];
        string place = Place(fileName, 1);
        foreach (string missing in known.Except(header))
        {
            problems.Add(new Problem(
                place, $"the column {Problem.Quote(missing)} is missing", "every column of the kind, empty where nothing is known"));
        }

        foreach (string unknown in header.Except(known))
        {
            problems.Add(new Problem(place, $"the column {Problem.Quote(unknown)} is not known", "the columns of " + shape.Kind.Word()));
        }

        foreach (string twice in header.GroupBy(cell => cell).Where(group => group.Count() > 1).Select(group => group.Key))
        {
            problems.Add(new Problem(place, $"the column {Problem.Quote(twice)} is there twice", "every column once"));
        }
    }

    private static string HeaderOf(PartShape shape, string key) => shape.Fields.First(field => field.Key == key).Header;

    private static string Counted(string front, int cells) =>
        string.Create(CultureInfo.InvariantCulture, $"{front} {cells} {(cells == 1 ? "cell" : "cells")}");

    private static string Place(string fileName, long line, string? column = null) => string.Create(
        CultureInfo.InvariantCulture, $"{fileName} line {line}{(column is null ? "" : $", column {column}")}");
}
