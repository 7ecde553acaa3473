using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What can be said of a list: the file as a whole in the first rows, and below them a row for each of its columns.</summary>
public sealed class ImportChoices
{
    /// <summary>The row of the file's path.</summary>
    public const int File = 0;

    /// <summary>The first row of a column.</summary>
    public const int FirstColumn = 6;

    private const int Kind = 1;
    private const int Map = 2;
    private const int DecimalSign = 3;
    private const int Currency = 4;

    private static readonly string[] Signs = ["found", "point", "comma"];

    /// <summary>The names of the rows above those of the columns.</summary>
    public static ImmutableArray<string> Names { get; } = ["file", "kind", "columns as kept", "decimal sign", "currency", "supplier"];

    /// <summary>The chosen row, from zero.</summary>
    public int At { get; private set; }

    /// <summary>Whether the chosen row is turned from one choice to the next, rather than typed.</summary>
    public bool IsChoice => At is Kind or Map or DecimalSign;

    /// <summary>Back to the first row.</summary>
    public void Reset() => At = 0;

    /// <summary>Stays among the rows that are there.</summary>
    /// <param name="columns">How many columns there are.</param>
    public void Fit(int columns) => At = Math.Min(At, FirstColumn + columns - 1);

    /// <summary>Moves the choice with the keys that everywhere do so.</summary>
    /// <param name="key">The key.</param>
    /// <param name="columns">How many columns there are.</param>
    /// <returns>Whether it was one of them.</returns>
    public bool Move(KeyPress key, int columns)
    {
        int? to = Step(key, At, FirstColumn + columns);
        At = to ?? At;
        return to is not null;
    }

    /// <summary>Where a key leads among some rows; null where it leads nowhere.</summary>
    /// <param name="key">The key.</param>
    /// <param name="at">The row before.</param>
    /// <param name="count">How many rows there are.</param>
    public static int? Step(KeyPress key, int at, int count)
    {
        const int page = 10;
        int? to = key.Name switch
        {
            KeyName.Up => at - 1,
            KeyName.Down => at + 1,
            KeyName.PageUp => at - page,
            KeyName.PageDown => at + page,
            KeyName.Home => 0,
            KeyName.End => count - 1,
            _ => null,
        };
        return to is { } row ? Math.Clamp(row, 0, Math.Max(0, count - 1)) : null;
    }

    /// <summary>The chosen column; null where the chosen row is none.</summary>
    /// <param name="page">The page.</param>
    public ImportColumn? ColumnOf(ImportPage page)
    {
        ArgumentNullException.ThrowIfNull(page);
        return page.Look is { } look && At >= FirstColumn && At - FirstColumn < look.Columns.Length
            ? look.Columns[At - FirstColumn]
            : null;
    }

    /// <summary>What stands in one of the rows above those of the columns.</summary>
    /// <param name="wishes">What the user says.</param>
    /// <param name="row">The row.</param>
    public static string Show(ImportWishes wishes, int row)
    {
        ArgumentNullException.ThrowIfNull(wishes);
        return row switch
        {
            File => wishes.File,
            Kind => wishes.Kind.Word(),
            Map => wishes.Map ?? "not used",
            DecimalSign => wishes.DecimalSign ?? "found from the cells",
            Currency => wishes.Currency.Length > 0 ? wishes.Currency : "as the list says",
            _ => wishes.Supplier.Length > 0 ? wishes.Supplier : "as the list says",
        };
    }

    /// <summary>The text of the chosen row when it is to be changed.</summary>
    /// <param name="page">The page.</param>
    public string TextOf(ImportPage page)
    {
        ArgumentNullException.ThrowIfNull(page);
        return At switch
        {
            File => page.Wishes.File,
            Currency => page.Wishes.Currency,
            < FirstColumn => page.Wishes.Supplier,
            _ => ColumnOf(page) is { Field: { } field } column ? column.Unit.Length > 0 ? $"{field}:{column.Unit}" : field : "",
        };
    }

    /// <summary>Reads what was typed in the chosen row.</summary>
    /// <param name="page">The page.</param>
    /// <param name="text">What was typed.</param>
    public Result<ImportWishes> Read(ImportPage page, string text)
    {
        ArgumentNullException.ThrowIfNull(page);
        ImportWishes wishes = page.Wishes;
        return At switch
        {
            File => Result.Ok(wishes with { File = text, Columns = text == wishes.File ? wishes.Columns : wishes.Columns.Clear() }),
            Currency => Result.Ok(wishes with { Currency = text }),
            < FirstColumn => Result.Ok(wishes with { Supplier = text }),
            _ => wishes.ReadUse(text).Map(use => ColumnOf(page) is { } column ? wishes.With(column.Header, use) : wishes),
        };
    }

    /// <summary>The chosen row turned to its next choice, or the one before.</summary>
    /// <param name="page">The page.</param>
    /// <param name="step">1 or -1.</param>
    public ImportWishes Next(ImportPage page, int step)
    {
        ArgumentNullException.ThrowIfNull(page);
        ImportWishes wishes = page.Wishes;
        switch (At)
        {
            case Kind:
                return wishes with { Kind = Turned(PartKinds.All, wishes.Kind, step) };
            case Map:
                return wishes with { Map = Turned([null, .. page.Maps], wishes.Map, step) };
            case DecimalSign:
                string sign = Turned(Signs, wishes.DecimalSign ?? Signs[0], step);
                return wishes with { DecimalSign = sign == Signs[0] ? null : sign };
            default:
                return ColumnOf(page) is { } column
                    ? wishes.With(column.Header, Turned(["", .. ImportPreview.FieldNames(wishes.Kind)], column.Field ?? "", step))
                    : wishes;
        }
    }

    private static T Turned<T>(IReadOnlyList<T> choices, T now, int step)
    {
        int at = 0;
        for (int i = 0; i < choices.Count; i++)
        {
            at = EqualityComparer<T>.Default.Equals(choices[i], now) ? i : at;
        }

        return choices[(at + step + choices.Count) % choices.Count];
    }
}
