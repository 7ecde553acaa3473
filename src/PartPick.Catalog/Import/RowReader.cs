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
    private readonly RowPrices _prices;
    private readonly Dictionary<string, (double Lowest, double Highest)?> _ranges = new(StringComparer.Ordinal);
    private readonly SortedDictionary<string, string> _marks = new(StringComparer.Ordinal);

    public RowReader(PartKind kind, ColumnUse[] columns)
    {
        _kind = kind;
        _uses = [.. columns.Where(use => use.Field is not null)];
        _fields = PartShape.Of(kind).Fields.ToDictionary(field => field.Key, StringComparer.Ordinal);
        _remembered = [.. _uses.Select(_ => new Dictionary<string, Result<double>>(StringComparer.Ordinal))];
        _prices = new RowPrices(_uses);
        Keys = [.. _uses.SelectMany(KeysOf).Distinct()];
    }

    /// <summary>The keys of the figures that these columns state.</summary>
    public IReadOnlyList<string> Keys { get; }

    /// <summary>Reads a row; gives its draft, or what is wrong with it first.</summary>
    public (PartDraft? Draft, RowRejection? Rejection) Read(IReadOnlyList<string> cells, long line)
    {
        var draft = new PartDraft();
        _prices.Begin();
        _marks.Clear();
        for (int i = 0; i < _uses.Length; i++)
        {
            ColumnUse use = _uses[i];
            if (use.Index < cells.Count
                && (use.Exact ? ReadExact(use, cells[use.Index], draft) : ReadCell(i, cells, draft)) is { } wrong)
            {
                return (null, Reject(line, use, cells, wrong));
            }
        }

        if (_prices.Put(draft) is { } fault)
        {
            return (null, Reject(line, fault.Use, cells, fault.Wrong));
        }

        if (_marks.Count > 0 && !draft.Has("basis"))
        {
            draft.Set("basis", string.Join(';', _marks.Select(mark => $"{mark.Key}={mark.Value}")));
        }

        return (draft, null);
    }

    private static RowRejection Reject(long line, ColumnUse use, IReadOnlyList<string> cells, string wrong)
    {
        string raw = use.Index < cells.Count ? cells[use.Index] : "";
        return new RowRejection(line, use.Header, CellText.Harmless(raw.Length > 100 ? raw[..100] : raw), wrong);
    }

    private static IEnumerable<string> KeysOf(ColumnUse use) => use.Field switch
    {
        "price" or "prices" => ["prices", "currency"],
        "priceQuantity" or "priceFor" => [],
        "temperature" => ["temperatureMin", "temperatureMax"],
        "toleranceAny" => ["tolerance", "toleranceAbsolute"],
        { } field => use.Basis != Basis.Stated ? [field, "basis"] : [field],
        null => [],
    };

    private string? ReadExact(ColumnUse use, string raw, PartDraft draft)
    {
        PartField field = _fields[use.Field!];
        draft.IsSeries |= use.Field == "load";
        return field.Read(field.Dimension is null ? CellText.Harmless(raw) : raw, draft, () => "") is { } problem ? Say(problem) : null;
    }

    private string? ReadCell(int i, IReadOnlyList<string> row, PartDraft draft)
    {
        ColumnUse use = _uses[i];
        string cell = CellText.Plain(row[use.Index]);
        if (cell.Length == 0)
        {
            return null;
        }

        switch (use.Field)
        {
            case "price" or "prices" when TradeAnswers.IsOnRequest(cell):
                return null;
            case "price":
                return _prices.Take(use, cell, row);
            case "prices":
                return _prices.TakeList(use, cell);
            case "priceQuantity" or "priceFor":
                return null;
            case "stock" when TradeAnswers.Stock(cell) is { } answer:
                draft.Set("stock", answer.Pieces);
                return null;
            case "taps":
                draft.Set("taps", TapList.Written(cell));
                return null;
            case "temperature":
                return ReadRange(cell, draft);
            case "toleranceAny":
                return ReadTolerance(use, cell, draft);
            case "cut" or "overtone":
                return CrystalWords.Read(use.Field, cell, draft);
            case "load" when CrystalWords.IsSeries(cell):
                draft.IsSeries = true;
                return null;
            case "stages":
                draft.Set("stages", (double?)ImportFields.Stages(cell));
                return draft.Has("stages") ? null : $"{Problem.Quote(cell)} is no number of stages; fits 1 or 3, unbuffered or buffered";
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

        // Stock systems write 0 where no least order or multiple is kept.
        if (value.Value == 0 && use.Field is ("minimumOrder" or "multiple"))
        {
            return null;
        }

        draft.Set(field.Key, value.Value);
        if (use.Basis != Basis.Stated
            && field.BasisKey is not ("stock" or "temperatureMin" or "temperatureMax" or "minimumOrder" or "multiple"))
        {
            _marks[field.BasisKey] = use.Basis switch { Basis.Minimum => "minimum", Basis.Typical => "typical", _ => "maximum" };
        }

        return null;
    }

    private string? ReadRange(string cell, PartDraft draft)
    {
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

    private static string Say(Problem problem) => $"{problem.What}; fits {problem.Fits}";
}
