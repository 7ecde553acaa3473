namespace PartPick.Catalog.Import;

/// <summary>Gives each column the field that its header names most surely, each field to one column.</summary>
/// <param name="kind">The kind of the parts.</param>
/// <param name="sample">The first rows.</param>
internal sealed class HeaderMatching(PartKind kind, ColumnSample sample)
{
    // How far behind its surest field a column may still be given another.
    private const double MostBehind = 15;

    // Two fields this near are named alike.
    private const double Alike = 0.3;

    private readonly ColumnFit _fit = new(kind, sample);

    /// <summary>The columns of a header; what the user stated goes first.</summary>
    public ColumnUse[] Assign(HeaderCell[] cells, IReadOnlyList<ColumnWish> wishes)
    {
        var uses = new ColumnUse[cells.Length];
        var taken = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < cells.Length; i++)
        {
            uses[i] = Begin(i, cells[i], wishes.FirstOrDefault(wish => wish.IsOf(cells[i].Text)));
            if (uses[i].Field is { } field && !ImportFields.IsRepeated(field))
            {
                taken.Add(field);
            }
        }

        PriceColumns.Mark(kind, cells, sample, uses);
        FieldMatch[] matches =
        [
            .. cells.SelectMany((cell, i) => uses[i] is { Field: null, IsUnnamed: true } ? FieldMatch.Of(kind, i, cell) : [])
                .OrderByDescending(match => match.Score).ThenBy(match => match.Column),
        ];
        var unclear = new HashSet<int>();
        var surest = matches.GroupBy(match => match.Column).ToDictionary(group => group.Key, group => group.First().Score);
        foreach (FieldMatch match in matches)
        {
            // A column whose own field another one has more surely is not made the next best thing.
            if (surest[match.Column] - match.Score > MostBehind && !uses[match.Column].IsUnnamed)
            {
                continue;
            }

            if (uses[match.Column].Field is null && Rival(match, matches, taken) is { } rival)
            {
                uses[match.Column] = uses[match.Column] with
                {
                    IsUnnamed = false,
                    Why = $"may be {match.Field} or {rival}: state --column \"{cells[match.Column].Text}=FIELD\"",
                };
                unclear.Add(match.Column);
            }

            if (unclear.Contains(match.Column))
            {
                continue;
            }

            // For how many a price is says something only beside a price.
            bool alone = match.Field == "priceFor" && !uses.Any(use => use.Field == "price")
                && !matches.Any(other => other.Field == "price" && other.Column != match.Column);
            if (alone || uses[match.Column].Field is not null || !_fit.Holds(match))
            {
                continue;
            }

            if (match.Field == "price" && uses.Any(use => use.Field == "price" && use.Quantity > 1)
                && uses.Any(use => use.Field == "price" && use.Quantity == 1))
            {
                uses[match.Column] = uses[match.Column] with
                {
                    IsUnnamed = false,
                    Why = "the prices for each quantity are in other columns",
                };
            }
            else if (taken.Add(match.Field))
            {
                uses[match.Column] = uses[match.Column] with { Field = match.Field, HeaderUnit = match.Reading.Unit, Why = "header" };
            }
            else if (uses[match.Column].IsUnnamed)
            {
                uses[match.Column] = uses[match.Column] with
                {
                    IsUnnamed = false,
                    Why = $"{uses.First(use => use.Field == match.Field || match.Field == "price").Header} is {match.Field} more surely",
                };
            }
        }

        return uses;
    }

    // Another field that the header names as surely and the cells hold as well, and that no column has yet.
    private string? Rival(FieldMatch match, FieldMatch[] matches, HashSet<string> taken) =>
        taken.Contains(match.Field) || match.Score >= FieldMatch.Whole || !_fit.Holds(match)
            ? null
            : matches.Where(other => other.Column == match.Column && other.Field != match.Field
                && Math.Abs(other.Score - match.Score) < Alike && !taken.Contains(other.Field)
                && ImportFields.IsNumeric(kind, other.Field) && _fit.Holds(other)).Select(other => other.Field).FirstOrDefault();

    private ColumnUse Begin(int index, HeaderCell cell, ColumnWish? wish)
    {
        var use = new ColumnUse { Index = index, Header = cell.Text, HeaderUnit = cell.Unit, Basis = cell.Basis };
        if (RejectedFile.IsOwnColumn(cell.Text))
        {
            return use with { Why = "added by an earlier import, not read" };
        }

        if (wish is null)
        {
            return use with { IsUnnamed = true, Why = "its header names no figure of " + kind.Word() };
        }

        return wish.Field is not "price"
            ? use with { Field = wish.Field, Why = wish.Field is null ? "left out as stated" : "stated" }
            : PriceColumns.Stated(use, wish);
    }
}
