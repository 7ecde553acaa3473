using System.Globalization;

namespace PartPick.Catalog.Fields;

/// <summary>
/// Keeps a spreadsheet from running a text of ours as a formula: an apostrophe goes in front on the way out, and comes off on
/// the way in. A text that already looks guarded gets one more, so that every text comes back as it was.
/// </summary>
internal static class FormulaGuard
{
    public static string Guard(string text) => Runs(text.TrimStart('\'')) ? "'" + text : text;

    public static string Unguard(string cell) => cell.Length > 1 && cell[0] == '\'' && Runs(cell.TrimStart('\'')) ? cell[1..] : cell;

    // A number with its sign is no formula, but -2+3 is one.
    private static bool Runs(string text) => text.Length > 0 && (text[0] is '=' or '@' or '\t' or '\r'
        || (text[0] is '+' or '-' && !double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out _)));
}
