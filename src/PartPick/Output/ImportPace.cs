using System.Globalization;
using PartPick.Catalog.Import;

namespace PartPick.Output;

/// <summary>How far an import is, in words.</summary>
internal static class ImportPace
{
    /// <summary>Rows, rate, and time left where that is known.</summary>
    public static string Words(ImportProgress progress)
    {
        double rate = progress.Rows / Math.Max(progress.Elapsed.TotalSeconds, 1e-3);
        string left = progress.Share is > 0 and { } share
            ? string.Create(CultureInfo.InvariantCulture, $", {progress.Elapsed.TotalSeconds * (1 - share) / share:F0} s left")
            : "";
        return string.Create(CultureInfo.InvariantCulture, $"{progress.Rows} rows, {rate:F0} rows/s{left}");
    }

    /// <summary>What became of the rows.</summary>
    public static string Sum(ImportReport report) => string.Create(
        CultureInfo.InvariantCulture,
        $"{report.Read} read = {report.Added} added + {report.Updated} updated + {report.Unchanged} unchanged + {report.Rejected} rejected")
        + (report.DryRun ? "; nothing was written" : "");

    /// <summary>The encoding, the delimiter and the line of the header.</summary>
    public static string Layout(string encoding, char delimiter, long headerLine)
    {
        string word = delimiter switch { '\t' => "tab", ';' => "semicolon", ',' => "comma", _ => delimiter.ToString() };
        return string.Create(CultureInfo.InvariantCulture, $"{encoding}, {word} between cells, header on line {headerLine}");
    }
}
