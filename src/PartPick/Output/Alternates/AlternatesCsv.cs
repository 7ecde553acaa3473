using System.Globalization;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Replacements as comma-separated values, a row each.</summary>
internal static class AlternatesCsv
{
    /// <summary>Prints them.</summary>
    public static void Write(TextWriter output, IEnumerable<AlternatesView> views) => CsvOutput.Write(
        output,
        [
            "list", "candidate", "designators", "part", "replacement", "description", "supplier", "supplierPart", "package", "samePackage",
            "stock", "errorWorst (ppm)", "startUpMargin", "driveLevel (W)", "startUpTime (s)", "cost", "currency", .. ChangeFigures.Header,
        ],
        from view in views
        from line in view.Lines
        from one in line.Replacements.Take(view.Top)
        select Row(view, line, one));

    private static string[] Row(AlternatesView view, LineAlternates line, Replacement one) =>
    [
        view.List,
        Figures.Whole(view.Review.Entry.Number),
        string.Join(' ', line.Line.Designators),
        line.Line.Part.Id,
        one.Part.Id,
        one.Part.Description,
        one.Part.Supplier ?? "",
        one.Part.SupplierPart ?? "",
        one.Part.Package ?? "",
        one.SamePackage ? "true" : "false",
        one.Part.Stock?.ToString(CultureInfo.InvariantCulture) ?? "",
        Figures.Exact(one.Candidate.Budget?.WorstRatio * 1e6),
        Figures.Exact(one.Candidate.Margin.Value),
        Figures.Exact(one.Candidate.Drive?.Value),
        Figures.Exact(one.Candidate.StartUpTime?.Value),
        one.Candidate.Cost.ToString(CultureInfo.InvariantCulture),
        one.Candidate.Currency,
        .. ChangeFigures.ExactCells(one.Change),
    ];
}
