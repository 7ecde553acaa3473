using System.Collections.Immutable;
using System.CommandLine;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>The options that say how a purchase list is made.</summary>
internal sealed class PurchaseArguments
{
    private const decimal LeastRate = 0.000001m;
    private const decimal MostRate = 1_000_000m;

    private readonly Option<string[]> _attrition = new("--attrition")
    {
        Description = "Spare parts, as 2% for all kinds or crystals=2% for one; may be repeated "
            + "(capacitors, resistors 3 %; crystals, transistors 2 %; inverters, counters 1 %)",
        HelpName = "KIND=RATIO",
        DefaultValueFactory = _ => [],
    };

    private readonly Option<string[]> _rates = new("--rate")
    {
        Description = "What one unit of another currency is worth in the list's, as USD=0.92; may be repeated",
        HelpName = "CURRENCY=VALUE",
        DefaultValueFactory = _ => [],
    };

    private readonly Option<string?> _currency = new("--currency") { Description = "The currency of the list", HelpName = "CURRENCY" };

    private readonly Option<bool> _whole = new("--no-split") { Description = "Do not buy a part that runs short from several suppliers" };

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_attrition);
        command.Add(_rates);
        command.Add(_currency);
        command.Add(_whole);
    }

    /// <summary>What the options say; a wrong one ends the command.</summary>
    public PurchaseOptions Read(ParseResult parsed)
    {
        string? currency = parsed.GetValue(_currency)?.Trim();
        if (currency?.Length == 0)
        {
            throw Wrong(_currency.Name, "is empty", "a currency such as EUR");
        }

        return new PurchaseOptions
        {
            Attrition = new AttritionRates((parsed.GetValue(_attrition) ?? []).Aggregate(AttritionRates.Usual.Ratios, WithAttrition)),
            Rates = new CurrencyRates(
                currency,
                (parsed.GetValue(_rates) ?? []).Aggregate(CurrencyRates.None.Rates, (rates, text) => WithRate(rates, text, currency))),
            Splits = !parsed.GetValue(_whole),
        };
    }

    private ImmutableDictionary<PartKind, decimal> WithAttrition(ImmutableDictionary<PartKind, decimal> ratios, string text)
    {
        foreach (string piece in text.Split(',', StringSplitOptions.TrimEntries))
        {
            int equals = piece.IndexOf('=', StringComparison.Ordinal);
            double value = CommandFailure.Unless(ValueText.Parse(piece[(equals + 1)..], Dimension.Relative, _attrition.Name));
            if (value > 1)
            {
                throw Wrong(_attrition.Name, $"{Problem.Quote(piece)} is more than all of them", "a ratio from 0 to 100 %, such as 2%");
            }

            IEnumerable<PartKind> kinds = equals < 0
                ? PartKinds.All
                : [CommandFailure.Unless(PartKinds.Named(piece[..equals].Trim(), _attrition.Name))];
            ratios = ratios.SetItems(kinds.Select(kind => KeyValuePair.Create(kind, (decimal)value)));
        }

        return ratios;
    }

    private ImmutableSortedDictionary<string, decimal> WithRate(
        ImmutableSortedDictionary<string, decimal> rates, string text, string? currency)
    {
        const string fits = "a currency and what it is worth, such as USD=0.92";
        string[] halves = text.Split('=', StringSplitOptions.TrimEntries);
        if (halves.Length != 2 || halves[0].Length == 0
            || !decimal.TryParse(halves[1], NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out decimal rate)
            || rate is < LeastRate or > MostRate)
        {
            throw Wrong(_rates.Name, $"{Problem.Quote(text)} is no rate", fits);
        }

        if (halves[0] == currency || rates.ContainsKey(halves[0]))
        {
            string what = halves[0] == currency ? "is the currency of the list" : "is given twice";
            throw Wrong(_rates.Name, $"{Problem.Quote(halves[0])} {what}", fits);
        }

        return rates.Add(halves[0], rate);
    }

    private static CommandFailure Wrong(string where, string what, string fits) =>
        new(new Problem(where, what, fits), ExitStatus.WrongInput);
}
