using System.Collections.Immutable;
using System.Text;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Shortlists;

/// <summary>Makes what leaves the program of a list: for the command and for the screen.</summary>
internal static class ShortlistExport
{
    /// <summary>The purchase list of a list's candidates.</summary>
    /// <param name="view">The list.</param>
    /// <param name="catalog">Today's parts.</param>
    /// <param name="options">How it is made.</param>
    public static Result<PurchaseList> Purchase(ShortlistView view, PartsCatalog catalog, PurchaseOptions options)
    {
        ImmutableArray<PurchaseCircuit> circuits =
        [
            .. view.Candidates.Select(each => new PurchaseCircuit(
                Figures.Whole(each.Entry.Number), ReviewWords.Name(each), each.Entry.Builds, each.Parts)),
        ];
        return new PurchaseListBuilder(catalog, options).Build(view.Name, circuits);
    }

    /// <summary>The text in a form.</summary>
    public static string Text(ShortlistView view, PurchaseList list, ExportForm form, CsvStyle style, DateOnly date)
    {
        using var output = new StringWriter { NewLine = "\n" };
        switch (form)
        {
            case ExportForm.Csv:
                PurchaseCsv.Write(output, list, style);
                break;
            case ExportForm.Markdown:
                output.Write(PurchaseMarkdown.Of(view, list, date));
                break;
            case ExportForm.Html:
                output.Write(DesignRecord.Of(view, list, date));
                break;
            case ExportForm.Json:
                JsonOutput.Write(output, PurchaseJson.Of(list));
                break;
            default:
                PurchaseTable.Write(output, list);
                break;
        }

        return output.ToString();
    }

    /// <summary>Writes a text to a file, whole or not at all, and never over the catalogue.</summary>
    /// <param name="target">The file.</param>
    /// <param name="text">The text.</param>
    /// <param name="mark">Whether it begins with a byte order mark.</param>
    public static Problem? Save(ExportTarget target, string text, bool mark)
    {
        byte[] bytes = [.. mark ? Encoding.UTF8.Preamble : [], .. new UTF8Encoding(false).GetBytes(text)];
        return Catalogue(target) ?? WholeFile.Write(target.Path, bytes, target.Replaces, target.Where);
    }

    /// <summary>The form that the name of a file asks for.</summary>
    /// <param name="target">The file.</param>
    public static Result<ExportForm> Form(ExportTarget target) =>
        Catalogue(target) is { } problem ? Result.Fail<ExportForm>(problem) : ExportForms.Asked(target.Path, target.Where);

    private static Problem? Catalogue(ExportTarget target) =>
        IsPath(target.Path) && Path.GetFullPath(target.Path) == Path.GetFullPath(target.Catalog)
            ? new Problem(target.Where, "is the catalogue itself", "another file")
            : null;

    private static bool IsPath(string path) => !string.IsNullOrWhiteSpace(path) && !path.Contains('\0', StringComparison.Ordinal);
}
