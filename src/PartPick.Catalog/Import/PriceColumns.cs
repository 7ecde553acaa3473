using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>Columns of prices: from which quantity on each holds, for how many pieces it is, and in which currency.</summary>
internal static partial class PriceColumns
{
    /// <summary>A column that is stated to be a price, "price:100" from 100 on, "price:1/1000" for a thousand together.</summary>
    public static ColumnUse Stated(ColumnUse use, ColumnWish wish)
    {
        string[] numbers = wish.Unit.Split('/');
        int? Number(int at) => numbers.Length > at
            && int.TryParse(numbers[at], NumberStyles.None, CultureInfo.InvariantCulture, out int count) && count > 0 ? count : null;
        return use with
        {
            Field = "price",
            Quantity = Number(0) ?? PriceHeader.Of(use.Header)?.Quantity ?? 1,
            Per = Number(1) ?? 1,
            IsQuantityStated = Number(0) is not null || PriceHeader.Of(use.Header) is not null,
            Why = "stated",
        };
    }

    /// <summary>What stands behind "price:" for a column; empty where nothing has to.</summary>
    public static string Written(ColumnUse use) => use.QuantityColumn is not null ? ""
        : use.Per > 1 ? $"{CellNumber.Text(use.Quantity)}/{CellNumber.Text(use.Per)}"
        : use.Quantity > 1 ? CellNumber.Text(use.Quantity) : "";

    /// <summary>Marks the columns whose headers are quantities of prices.</summary>
    public static void Mark(PartKind kind, HeaderCell[] cells, ColumnSample sample, ColumnUse[] uses)
    {
        var found = new List<(int Column, PriceHeader Header)>();
        for (int i = 0; i < cells.Length; i++)
        {
            if (uses[i] is { Field: null, IsUnnamed: true }
                && PriceHeader.Of(cells[i].Text) is { } header
                && IsPrices(sample.Cells(i))
                && !FieldMatch.Of(kind, i, cells[i]).Any(match => match.Score >= FieldMatch.Whole && match.Field != "price"))
            {
                found.Add((i, header));
            }
        }

        // Of two with the same quantity the one that names no price is the quantity itself: "Step 1", "Price 1".
        found.RemoveAll(each => !each.Header.IsPriced
            && found.Any(other => other.Header.IsPriced && other.Header.Quantity == each.Header.Quantity));

        // Numbers alone are quantities only side by side, and 1, 2, 3 may count the prices instead of the pieces.
        found.RemoveAll(each => each.Header is { IsBare: true, IsMarked: false } && found.Count < 2);
        bool counted = found.Count > 1 && found.Select(each => each.Header.Quantity).SequenceEqual(Enumerable.Range(1, found.Count))
            && !found.Any(each => each.Header.IsMarked);
        foreach ((int column, _) in found)
        {
            uses[column] = uses[column] with { IsUnnamed = false };
        }

        int[]? partners = counted ? Partners(cells, sample, uses, found.Count) : null;
        foreach ((int column, PriceHeader header) in found)
        {
            int partner = partners is null ? -1 : partners[header.Quantity - 1];
            if (!counted || partner >= 0)
            {
                uses[column] = uses[column] with
                {
                    Field = "price",
                    Quantity = partner >= 0 ? 1 : header.Quantity,
                    QuantityColumn = partner >= 0 ? partner : null,
                    IsQuantityStated = true,
                    IsPerOpen = header.IsPer,
                    Why = partner >= 0 ? $"header: price from the quantity in {cells[partner].Text}"
                        : $"header: price from {CellNumber.Text(header.Quantity)}",
                };
                if (partner >= 0)
                {
                    uses[partner] = uses[partner] with
                    {
                        Field = "priceQuantity",
                        IsUnnamed = false,
                        Why = $"the quantities of {cells[column].Text}",
                    };
                }
            }
            else
            {
                uses[column] = uses[column] with
                {
                    Why = $"{CellNumber.Text(header.Quantity)} may be a quantity or a place: "
                        + $"state --column \"{cells[column].Text}=price:QUANTITY\"",
                };
            }
        }
    }

    /// <summary>Joins prices with the columns of their quantities, and leaves out what is not sure.</summary>
    public static ColumnUse[] Settle(ColumnUse[] uses, ColumnSample sample)
    {
        uses = [.. uses];
        ColumnUse? quantity = Array.Find(
            uses, use => use.Field == "priceQuantity" && !uses.Any(other => other.QuantityColumn == use.Index));
        ColumnUse? together = Array.Find(uses, use => use.Field == "priceFor");
        for (int i = 0; i < uses.Length; i++)
        {
            if (uses[i].Field == "price")
            {
                uses[i] = uses[i] with
                {
                    QuantityColumn = uses[i].QuantityColumn ?? (uses[i].IsQuantityStated ? null : quantity?.Index),
                    PerColumn = together?.Index,
                };
                uses[i] = uses[i].IsPerOpen ? Weigh(uses[i], uses, sample) : uses[i];
            }
        }

        uses = together is null ? LeaveOutForMany(uses, sample) : uses;

        // What one column says of the currency holds for those that say nothing, where no other says otherwise.
        string[] currencies = [.. uses.Select(use => use.Field is "price" or "prices" ? use.Currency : null).OfType<string>().Distinct()];
        if (currencies.Length == 1)
        {
            uses =
            [
                .. uses.Select(use => use is { Field: "price" or "prices", Currency: null }
                    && sample.Cells(use.Index).All(cell => Currencies.In(cell) is null)
                    ? use with { Currency = currencies[0], Why = $"{use.Why}; {currencies[0]}, as the other prices" }
                    : use),
            ];
        }

        // Prices of which nothing says the currency are left out rather than taken in a wrong one.
        return uses.Any(use => use.Field == "currency")
            ? uses
            : [.. uses.Select(use => use is { Field: "price" or "prices", Currency: null }
                && !sample.Cells(use.Index).Any(cell => Currencies.In(cell) is not null)
                ? use with { Field = null, Why = "prices without a currency are left out: state --currency" }
                : use)];
    }

    // A column that is not known, beside the only price, with 1, 10, 100 and the like may say for how many pieces that price is: then it
    // may be a hundred times too high.
    private static ColumnUse[] LeaveOutForMany(ColumnUse[] uses, ColumnSample sample)
    {
        ColumnUse[] prices = [.. uses.Where(use => use.Field == "price")];
        if (prices is not [{ IsQuantityStated: false, QuantityColumn: null } price])
        {
            return uses;
        }

        ColumnUse? open = uses.FirstOrDefault(use => use is { Field: null, IsUnnamed: true } && Math.Abs(use.Index - price.Index) <= 2
            && sample.Cells(use.Index) is { Length: > 0 } cells
            && cells.All(cell => cell is "1" or "10" or "100" or "1000" or "10000") && cells.Any(cell => cell is not "1"));
        return open is null ? uses :
        [
            .. uses.Select(use => use != price ? use : use with
            {
                Field = null,
                Why = $"{open.Header} may say for how many pieces it is: state --column \"{open.Header}=priceFor\" or \"{open.Header}=\"",
            }),
        ];
    }

    // "Price per 100" is the price of one from 100 on, or of 100 together: what the price of fewer pieces tells.
    private static ColumnUse Weigh(ColumnUse use, ColumnUse[] uses, ColumnSample sample)
    {
        ColumnUse? single = uses.Where(other => other.Field == "price" && other.Quantity < use.Quantity && !other.IsPerOpen)
            .MaxBy(other => other.Quantity);
        double? price = Middle(use, sample);
        double? one = single is null ? null : Middle(single, sample);
        double ratio = price is { } many && one is > 0 and { } few ? many / few : double.NaN;
        return ratio switch
        {
            <= 1.05 => use with { Why = $"{use.Why}, each piece, as {single!.Header} shows" },
            _ when ratio > use.Quantity * 0.2 && ratio <= use.Quantity * 1.05 => use with
            {
                Per = use.Quantity,
                Why = $"{use.Why}, for {CellNumber.Text(use.Quantity)} together, as {single!.Header} shows",
            },
            _ => use with
            {
                Field = null,
                Why = $"may be the price of one or of {CellNumber.Text(use.Quantity)} together: state --column "
                    + $"\"{use.Header}=price:{CellNumber.Text(use.Quantity)}\" or "
                    + $"\"…=price:{CellNumber.Text(use.Quantity)}/{CellNumber.Text(use.Quantity)}\"",
            },
        };
    }

    private static double? Middle(ColumnUse use, ColumnSample sample)
    {
        double[] prices =
        [
            .. sample.Cells(use.Index).Select(cell => PriceCells.Price(cell, use.Notation)).OfType<decimal>()
                .Select(price => (double)price).Order(),
        ];
        return prices.Length > 0 ? prices[prices.Length / 2] : null;
    }

    private static bool IsPrices(string[] cells) => cells.Length == 0
        || ColumnSample.Share(cells, cell => PriceCells.Price(cell, NumberNotation.Point) is not null
            || PriceCells.Price(cell, NumberNotation.Comma) is not null) >= 0.5;

    // The columns of quantities beside prices that are only numbered, "Qty 2" beside "Price 2": whole numbers that ascend in each row.
    private static int[]? Partners(HeaderCell[] cells, ColumnSample sample, ColumnUse[] uses, int count)
    {
        IEnumerable<int[]> groups = Enumerable.Range(0, cells.Length)
            .Where(i => uses[i] is { Field: null, IsUnnamed: true })
            .Select(i => (Column: i, Match: Place().Match(cells[i].Text)))
            .Where(each => each.Match.Success)
            .GroupBy(each => each.Match.Groups[1].Value + "#" + each.Match.Groups[3].Value)
            .Where(group => group.Select(each => each.Match.Groups[2].Value)
                .SequenceEqual(Enumerable.Range(1, count).Select(CellNumber.Text)))
            .Select(group => group.Select(each => each.Column).ToArray())
            .Where(columns => sample.Ascend(columns));
        int[][] fitting = [.. groups];
        return fitting.Length == 1 ? fitting[0] : null;
    }

    [GeneratedRegex(@"^(\D*)(\d{1,2})(\D*)$")]
    private static partial Regex Place();
}
