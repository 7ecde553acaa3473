using PartPick.Catalog.Fields;

namespace PartPick.Catalog;

/// <summary>Texts in files that a spreadsheet opens.</summary>
public static class SpreadsheetText
{
    /// <summary>The text, with an apostrophe in front where a spreadsheet would run it as a formula.</summary>
    /// <param name="text">The text of a cell.</param>
    public static string Harmless(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        return FormulaGuard.Guard(text);
    }
}
