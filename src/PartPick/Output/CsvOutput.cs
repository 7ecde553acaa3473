using CsvHelper;
using PartPick.Catalog;

namespace PartPick.Output;

/// <summary>Prints comma-separated values: a header with units, then the rows, so that a spreadsheet runs none of them.</summary>
internal static class CsvOutput
{
    private static readonly CsvWriterOptions Plain =
        CsvWriterOptions.Default with { NewLine = "\n", Separator = ',', WriteByteOrderMark = false };

    /// <summary>Prints a header and rows.</summary>
    public static void Write(TextWriter output, IEnumerable<string> header, IEnumerable<IEnumerable<string>> rows)
    {
        using CsvWriter writer = CsvWriter.Create(output, Plain, true);
        writer.WriteRecord([.. header]);
        foreach (IEnumerable<string> row in rows)
        {
            writer.WriteRecord([.. row.Select(FormulaGuard.Guard)]);
        }

        writer.Flush();
    }
}
