using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>One figure or text of a kind of part: its key, and how its cells are written.</summary>
/// <param name="Key">The key, as in JSON; a point's key is followed by a space and the number of the point.</param>
/// <param name="Dimension">What the figure measures; null for a text.</param>
/// <param name="Unit">The unit of the column, empty for none.</param>
/// <param name="Power">The power of ten of the column's unit.</param>
/// <param name="AllowNegative">Whether a negative figure makes sense.</param>
internal sealed record PartField(string Key, Dimension? Dimension, string Unit = "", int Power = 0, bool AllowNegative = false)
{
    /// <summary>The cell of the header row.</summary>
    public string Header => Unit.Length == 0 ? Key : $"{Key} ({Unit})";

    /// <summary>The key without the number of the point: what a basis is given for.</summary>
    public string BasisKey => Key.Split(' ')[0];

    /// <summary>Reads a cell into a draft; an empty cell leaves the figure absent.</summary>
    /// <returns>What is wrong, or null.</returns>
    public Problem? Read(string cell, PartDraft draft, Func<string> where)
    {
        string text = cell.Trim();
        if (text.Length == 0)
        {
            return null;
        }

        if (Dimension is not { } dimension)
        {
            if (text.Any(char.IsControl))
            {
                return new Problem(where(), $"{Problem.Quote(text)} has a control character", "one line of text");
            }

            draft.Set(Key, FormulaGuard.Unguard(text));
            return null;
        }

        Result<double> value = ValueText.ParseIn(text, dimension, Power, "", AllowNegative);
        if (value.IsOk)
        {
            draft.Set(Key, value.Value);
        }

        return value.Problem is { } problem ? problem with { Where = where() } : null;
    }

    /// <summary>Writes the cell of a draft.</summary>
    public string Write(PartDraft draft) => Dimension is null
        ? FormulaGuard.Guard(draft.Text(Key) ?? "")
        : draft.Number(Key) is { } number ? ValueText.FormatIn(number, Power) : "";
}
