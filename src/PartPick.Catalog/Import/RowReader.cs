using System.Globalization;
using PartPick.Catalog.Fields;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>Reads rows into drafts by the use of their columns.</summary>
internal sealed class RowReader
{
    private const int MostRemembered = 4096;

    private readonly PartKind _kind;
    private readonly ColumnUse[] _uses;
    private readonly Dictionary<string, PartField> _fields;
    private readonly Dictionary<string, Result<double>>[] _remembered;
    private readonly Dictionary<(int Use, string Cell), (decimal? Price, string? Currency)> _prices = [];
    private readonly Dictionary<string, (double Lowest, double Highest)?> _ranges = new(StringComparer.Ordinal);

    public RowReader(PartKind kind, ColumnUse[] columns)
    {
        _kind = kind;
        _uses = [.. columns.Where(use => use.Field is not null)];
        _fields = PartShape.Of(kind).Fields.ToDictionary(field => field.Key, StringComparer.Ordinal);
        _remembered = [.. _uses.Select(_ => new Dictionary<string, Result<double>>(StringComparer.Ordinal))];
        Keys = [.. _uses.SelectMany(KeysOf).Distinct()];
    }

    /// <summary>The keys of the figures that these columns state.</summary>
    public IReadOnlyList<string> Keys { get; }

    /// <summary>Reads a row; gives its draft, or what is wrong with it first.</summary>
    public (PartDraft? Draft, RowRejection? Rejection) Read(IReadOnlyList<string> cells, long line)
    {
        var draft = new PartDraft();
        var prices = new SortedDictionary<int, decimal>();
        var marks = new SortedDictionary<string, string>(StringComparer.Ordinal);
        string? currency = null;
        for (int i = 0; i < _uses.Length; i++)
        {
            ColumnUse use = _uses[i];
            if (use.Index >= cells.Count)
            {
                continue;
            }

            string raw = cells[use.Index];
            string? wrong = use.Exact ? ReadExact(use, raw, draft) : ReadCell(i, raw, draft, prices, marks, ref currency);
            if (wrong is not null)
            {
                return (null, new RowRejection(line, use.Header, CellText.Harmless(raw.Length > 100 ? raw[..100] : raw), wrong));
            }
        }

        if (prices.Count > 0)
        {
            if (currency is null && !draft.Has("currency"))
            {
                ColumnUse first = Array.Find(_uses, use => use.Field is "price" or "prices")!;
                return (null, new RowRejection(
                    line, first.Header, CellText.Harmless(cells[first.Index]),
                    "names no currency; fits a sign beside the price, a column of currencies, or --currency EUR"));
            }

            IEnumerable<string> steps = prices.Select(
                pair => string.Create(CultureInfo.InvariantCulture, $"{pair.Key}:{pair.Value}"));
            draft.Set("prices", string.Join(';', steps));
            if (!draft.Has("currency"))
            {
                draft.Set("currency", currency);
            }
        }

        if (marks.Count > 0 && !draft.Has("basis"))
        {
            draft.Set("basis", string.Join(';', marks.Select(mark => $"{mark.Key}={mark.Value}")));
        }

        return (draft, null);
    }

    private static IEnumerable<string> KeysOf(ColumnUse use) => use.Field switch
    {
        "price" or "prices" => ["prices", "currency"],
        "temperature" => ["temperatureMin", "temperatureMax"],
        "toleranceAny" => ["tolerance", "toleranceAbsolute"],
        { } field => use.Basis != Basis.Stated ? [field, "basis"] : [field],
        null => [],
    };

    private string? ReadExact(ColumnUse use, string raw, PartDraft draft)
    {
        PartField field = _fields[use.Field!];
        return field.Read(field.Dimension is null ? CellText.Harmless(raw) : raw, draft, () => "") is { } problem ? Say(problem) : null;
    }

    private string? ReadCell(
        int i,
        string raw,
        PartDraft draft,
        SortedDictionary<int, decimal> prices,
        SortedDictionary<string, string> marks,
        ref string? currency)
    {
        ColumnUse use = _uses[i];
        string cell = CellText.Plain(raw);
        if (cell.Length == 0)
        {
            return null;
        }

        switch (use.Field)
        {
            case "price":
                if (!_prices.TryGetValue((i, cell), out (decimal? Price, string? Currency) known))
                {
                    known = (PriceCells.Price(cell, use.Notation), PriceCells.CurrencyIn(cell) ?? use.Currency);
                    if (_prices.Count < MostRemembered * 4)
                    {
                        _prices[(i, cell)] = known;
                    }
                }

                if (known.Price is not { } price)
                {
                    return $"{Problem.Quote(cell)} is no price that can be read with certainty; fits a number such as 0.42";
                }

                prices[use.Quantity] = price;
                return Agree(ref currency, known.Currency);
            case "prices":
                if (PriceCells.List(cell, use.Notation) is not { } list)
                {
                    return $"{Problem.Quote(cell)} is no list of prices; fits quantity:price such as 1:0.42;10:0.31";
                }

                foreach (PriceBreak each in list)
                {
                    prices[each.Quantity] = each.UnitPrice;
                }

                return Agree(ref currency, PriceCells.CurrencyIn(cell) ?? use.Currency);
            case "temperature":
                if (!_ranges.TryGetValue(cell, out (double Lowest, double Highest)? extent))
                {
                    extent = TemperatureRange.Read(cell);
                    if (_ranges.Count < MostRemembered)
                    {
                        _ranges[cell] = extent;
                    }
                }

                if (extent is not { } range)
                {
                    return $"{Problem.Quote(cell)} is no temperature range; fits two temperatures such as -20 to 70 °C";
                }

                draft.Set("temperatureMin", range.Lowest);
                draft.Set("temperatureMax", range.Highest);
                return null;
            case "toleranceAny":
                return ReadTolerance(use, cell, draft);
            case "cut" or "overtone":
                return CrystalWords.Read(use.Field, cell, draft);
            case "excluded":
                draft.Set("excluded", cell.ToUpperInvariant() is "YES" or "TRUE" or "1" or "X" ? "yes" : null);
                return null;
        }

        PartField field = _fields[use.Field!];
        if (field.Dimension is not { } dimension)
        {
            draft.Set(field.Key, CellText.Harmless(cell));
            return null;
        }

        Result<double> value = Number(i, cell, field, dimension);
        if (!value.IsOk)
        {
            return Say(value.Problem);
        }

        draft.Set(field.Key, value.Value);
        if (use.Basis != Basis.Stated
            && field.BasisKey is not ("stock" or "temperatureMin" or "temperatureMax" or "minimumOrder" or "multiple"))
        {
            marks[field.BasisKey] = use.Basis switch { Basis.Minimum => "minimum", Basis.Typical => "typical", _ => "maximum" };
        }

        return null;
    }

    private Result<double> Number(int i, string cell, PartField field, Dimension dimension)
    {
        Dictionary<string, Result<double>> remembered = _remembered[i];
        if (remembered.TryGetValue(cell, out Result<double>? known))
        {
            return known;
        }

        Result<double> value = CellNumber.Read(cell, dimension, _uses[i].Power, _uses[i].Notation, field.AllowNegative);
        if (value.IsOk
            && Plausible.Of(_kind, field.Key) is { } range
            && (value.Value < range.Least - (Math.Abs(range.Least) * 0.5) || value.Value > range.Greatest * 2)
            && value.Value != 0)
        {
            value = Result.Fail<double>(
                "", $"{Problem.Quote(cell)} is no {field.Key} that {_kind.Word()} have",
                $"between {ValueText.Format(range.Least, dimension)} and {ValueText.Format(range.Greatest, dimension)}");
        }

        if (remembered.Count < MostRemembered)
        {
            remembered[cell] = value;
        }

        return value;
    }

    private static string? ReadTolerance(ColumnUse use, string cell, PartDraft draft)
    {
        if (CapacitorTolerance.Read(cell, use.Unit, use.Notation) is not { } tolerance)
        {
            return $"{Problem.Quote(cell)} is no tolerance that can be read with certainty; fits 5 % or 0.25 pF";
        }

        draft.Set(tolerance.Absolute ? "toleranceAbsolute" : "tolerance", tolerance.Value);
        return null;
    }

    private static string? Agree(ref string? currency, string? further)
    {
        if (further is null)
        {
            return null;
        }

        if (currency is not null && currency != further)
        {
            return $"is in {further}, other prices of the row in {currency}; fits one currency";
        }

        currency = further;
        return null;
    }

    private static string Say(Problem problem) => $"{problem.What}; fits {problem.Fits}";
}
