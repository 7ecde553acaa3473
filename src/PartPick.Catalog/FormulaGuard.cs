using System.Globalization;

namespace PartPick.Catalog;

/// <summary>
/// Keeps a spreadsheet from running a text of ours as a formula: an apostrophe goes in front on the way out, and comes off on
/// the way in. A text that already looks guarded gets one more, so that every text comes back as it was.
/// </summary>
public static class FormulaGuard
{
    /// <summary>A text as it goes into a cell.</summary>
    /// <param name="text">Any text.</param>
    /// <returns>The same, or with an apostrophe in front.</returns>
    public static string Guard(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        return Runs(text.TrimStart('\'')) ? "'" + text : text;
    }

    /// <summary>The text of a cell that <see cref="Guard"/> has written.</summary>
    /// <param name="cell">The cell.</param>
    /// <returns>The text as it was.</returns>
    public static string Unguard(string cell)
    {
        ArgumentNullException.ThrowIfNull(cell);
        return cell.Length > 1 && cell[0] == '\'' && Runs(cell.TrimStart('\'')) ? cell[1..] : cell;
    }

    // Spreadsheets skip blanks in front, and some take the wide forms of the signs for the plain ones. A number with its sign is no
    // formula, but -2+3 is one.
    private static bool Runs(string text)
    {
        string told = text.TrimStart(' ', '\u00A0', '\u3000', '\u200B', '\uFEFF');
        return told.Length > 0 && (told[0] is '=' or '@' or '\t' or '\r' or '\n' or '＝' or '＠' or '＋' or '－'
            || (told[0] is '+' or '-' && !IsNumber(told)));
    }

    private static bool IsNumber(string text) => text.Length > 1 && (char.IsAsciiDigit(text[1]) || text[1] == '.')
        && double.TryParse(text, NumberStyles.AllowLeadingSign | NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent,
            CultureInfo.InvariantCulture, out _);
}
