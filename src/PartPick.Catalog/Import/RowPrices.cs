using System.Globalization;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Gathers the prices of a row from its columns.</summary>
/// <param name="uses">The columns that are used.</param>
internal sealed class RowPrices(ColumnUse[] uses)
{
    private const int MostRemembered = 16384;

    private readonly Dictionary<(int Column, string Cell), (decimal? Price, string? Currency)> _known = [];
    private readonly SortedDictionary<int, decimal> _prices = [];
    private string? _currency;

    /// <summary>Begins a row.</summary>
    public void Begin()
    {
        _prices.Clear();
        _currency = null;
    }

    /// <summary>Takes a price; gives what is wrong, or null.</summary>
    public string? Take(ColumnUse use, string cell, IReadOnlyList<string> row)
    {
        if (!_known.TryGetValue((use.Index, cell), out (decimal? Price, string? Currency) known))
        {
            known = (PriceCells.Price(cell, use.Notation), Currencies.In(cell) ?? use.Currency);
            if (_known.Count < MostRemembered)
            {
                _known[(use.Index, cell)] = known;
            }
        }

        if (known.Price is not { } price)
        {
            return $"{Problem.Quote(cell)} is no price that can be read with certainty; fits a number such as 0.42";
        }

        (int quantity, string? wrong) = Count(use.QuantityColumn, use.Quantity, row);
        (int together, string? none) = Count(use.PerColumn, use.Per, row);
        if ((wrong ?? none) is { } problem)
        {
            return problem;
        }

        if (!_prices.TryAdd(quantity, price / together) && _prices[quantity] != price / together)
        {
            return $"{Problem.Quote(cell)} is a second price from {CellNumber.Text(quantity)} on; fits one price for each quantity";
        }

        return Agree(known.Currency);
    }

    /// <summary>Takes a list of prices; gives what is wrong, or null.</summary>
    public string? TakeList(ColumnUse use, string cell)
    {
        if (PriceCells.List(cell, use.Notation) is not { } list)
        {
            return $"{Problem.Quote(cell)} is no list of prices; fits quantity:price such as 1:0.42;10:0.31";
        }

        foreach (PriceBreak each in list)
        {
            _prices[each.Quantity] = each.UnitPrice;
        }

        return Agree(Currencies.In(cell) ?? use.Currency);
    }

    /// <summary>Puts the prices into a draft; gives the column at fault and what is wrong, or null.</summary>
    public (ColumnUse Use, string Wrong)? Put(PartDraft draft)
    {
        if (_prices.Count == 0)
        {
            return null;
        }

        if (_currency is null && !draft.Has("currency"))
        {
            return (
                Array.Find(uses, use => use.Field is "price" or "prices")!,
                "names no currency; fits a sign beside the price, a column of currencies, or --currency EUR");
        }

        IEnumerable<string> steps = _prices.Select(
            pair => string.Create(CultureInfo.InvariantCulture, $"{pair.Key}:{pair.Value}"));
        draft.Set("prices", string.Join(';', steps));
        if (!draft.Has("currency"))
        {
            draft.Set("currency", _currency);
        }

        return null;
    }

    // An empty cell, or 0, says nothing beyond the one that is known.
    private (int Count, string? Wrong) Count(int? column, int known, IReadOnlyList<string> row)
    {
        string cell = column is { } at && at < row.Count ? CellText.Plain(row[at]) : "";
        if (cell.Length == 0)
        {
            return (known, null);
        }

        NumberNotation notation = Array.Find(uses, use => use.Index == column)?.Notation ?? NumberNotation.Unknown;
        Result<double> read = CellNumber.Read(cell, Dimension.Count, 0, notation, false);
        return read.IsOk && read.Value <= int.MaxValue
            ? (Math.Max(1, (int)read.Value), null)
            : (known, $"{Problem.Quote(cell)} is no quantity of its price; fits a whole number");
    }

    private string? Agree(string? further)
    {
        if (further is not null && _currency is not null && _currency != further)
        {
            return $"is in {further}, other prices of the row in {_currency}; fits one currency";
        }

        _currency = further ?? _currency;
        return null;
    }
}
