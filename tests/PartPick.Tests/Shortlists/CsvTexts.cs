using CsvHelper;
using Microsoft.VisualBasic.FileIO;

namespace PartPick.Tests.Shortlists;

/// <summary>Reads CSV by two readers that share no code.</summary>
internal static class CsvTexts
{
    public static string[][] ByBoth(string text, char delimiter)
    {
        string[][] one = ByCsvHelper(text, delimiter), other = ByFieldParser(text, delimiter);
        Assert.Equal(one, other);
        return one;
    }

    public static string[][] ByCsvHelper(string text, char delimiter)
    {
        CsvReaderOptions options = CsvReaderOptions.Default with { Separator = delimiter, HasHeader = false };
        using CsvReader reader = CsvReader.FromText(text, options);
        var rows = new List<string[]>();
        while (reader.Read())
        {
            rows.Add([.. Enumerable.Range(0, reader.FieldCount).Select(i => reader.GetString(i))]);
        }

        return [.. rows];
    }

    private static string[][] ByFieldParser(string text, char delimiter)
    {
        using var parser = new TextFieldParser(new StringReader(text))
        {
            TextFieldType = FieldType.Delimited,
            Delimiters = [delimiter.ToString()],
            HasFieldsEnclosedInQuotes = true,
            TrimWhiteSpace = false,
        };
        var rows = new List<string[]>();
        while (!parser.EndOfData)
        {
            rows.Add(parser.ReadFields()!);
        }

        return [.. rows];
    }
}
