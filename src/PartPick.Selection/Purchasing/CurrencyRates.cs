using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The currency of a purchase list, and what other currencies are worth in it.</summary>
/// <param name="Currency">The currency of the list; null for that of its parts.</param>
/// <param name="Rates">What one unit of another currency is worth in that of the list, above zero.</param>
public sealed record CurrencyRates(string? Currency, ImmutableSortedDictionary<string, decimal> Rates)
{
    /// <summary>No rates: all parts have to be priced in one currency.</summary>
    public static CurrencyRates None { get; } = new(null, ImmutableSortedDictionary<string, decimal>.Empty);

    /// <summary>The currency in which a list of parts can be totalled.</summary>
    /// <param name="rows">The parts with the names of their rows.</param>
    /// <returns>The currency; empty where no part has a price; or the problem, which names the rows.</returns>
    public Result<string> Settle(IReadOnlyList<(string Row, Part Part)> rows)
    {
        ArgumentNullException.ThrowIfNull(rows);
        var byCurrency = rows.Where(row => row.Part.Offer.HasPrices)
            .GroupBy(row => row.Part.Offer.Currency, StringComparer.Ordinal)
            .OrderBy(group => group.Key, StringComparer.Ordinal)
            .ToArray();
        string[] free = [.. byCurrency.Select(group => group.Key).Where(key => key != Currency && !Rates.ContainsKey(key))];
        if (Currency is { } wanted)
        {
            return free.Length == 0 ? Result.Ok(wanted) : Mixed([.. byCurrency.Where(group => free.Contains(group.Key))], wanted);
        }

        return free.Length switch
        {
            1 => Result.Ok(free[0]),
            0 when byCurrency.Length == 0 => Result.Ok(""),
            0 => Result.Fail<string>(
                "--currency", "every currency of the list has a rate, so that none is its own", "the currency of the list, such as EUR"),
            _ => Mixed([.. byCurrency.Where(group => free.Contains(group.Key))], free[0]),
        };
    }

    /// <summary>An offer with its prices in the currency of the list; null where there is no rate.</summary>
    /// <param name="offer">The offer.</param>
    /// <param name="currency">The currency of the list.</param>
    public Offer? Convert(Offer offer, string currency)
    {
        ArgumentNullException.ThrowIfNull(offer);
        if (offer.Currency == currency)
        {
            return offer;
        }

        return Rates.TryGetValue(offer.Currency, out decimal rate)
            ? offer with
            {
                Currency = currency,
                Prices = [.. offer.Prices.Select(price => price with { UnitPrice = price.UnitPrice * rate })],
            }
            : null;
    }

    private static Result<string> Mixed(IGrouping<string, (string Row, Part Part)>[] groups, string currency)
    {
        string rows = string.Join("; ", groups.OrderBy(group => group.Count()).Select(group =>
            $"{group.Key}: {string.Join(", ", group.Take(5).Select(row => row.Row))}{(group.Count() > 5 ? " and others" : "")}"));
        string foreign = groups.Select(group => group.Key).FirstOrDefault(key => key != currency, currency);
        return Result.Fail<string>(
            "prices", $"are in more than one currency ({rows})", $"one currency, or rates such as --rate {foreign}=0.9");
    }
}
