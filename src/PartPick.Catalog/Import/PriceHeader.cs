using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>What the header of a price column says of quantities: "Qty 100 price", "100+", "Preis ab 1.000", "Price/1k".</summary>
/// <param name="Quantity">The number in it.</param>
/// <param name="IsMarked">Whether it says that the price holds from there on, as "100+" does; else it may be only the place in a row of
/// prices.</param>
/// <param name="IsPer">Whether it may be the price of so many together: "Price per 100".</param>
/// <param name="IsBare">Whether it is the number alone, or with words of quantity.</param>
/// <param name="IsPriced">Whether it names a price or a currency, and not only a step of quantities.</param>
internal sealed partial record PriceHeader(int Quantity, bool IsMarked, bool IsPer, bool IsBare, bool IsPriced)
{
    private static readonly Words Prices = new(
        "k kr sales ar t r", "price", "unit", "net", "currency", "break");

    private static readonly Words Costs = new("k kr ar", "price", "net", "unit", "currency");

    private static readonly Words Quantities = new("off q", "quantity", "piece");

    private static readonly Words From = new("a at v tol", "from");

    private static readonly Words Per = new("p", "per");

    /// <summary>Takes a header apart; null where it is none of a price with a quantity.</summary>
    public static PriceHeader? Of(string header)
    {
        MatchCollection numbers = Number().Matches(header);
        if (numbers.Count is 0 or > 2 || Read(numbers[0]) is not (>= 1 and var quantity))
        {
            return null;
        }

        if (numbers.Count == 2 && (Read(numbers[1]) < quantity || !Range().IsMatch(header)))
        {
            return null;
        }

        string rest = Currencies.Without(Brackets().Replace(HeaderCell.Parted(Number().Replace(header, " ")), " "));
        string[] words = TradePhrase.Folded(Trade.Words(rest)).Split(' ', StringSplitOptions.RemoveEmptyEntries);
        words = [.. words.Where(word => !IsTax(word))];
        if (!words.All(word => Prices.Contains(word) || Quantities.Contains(word) || From.Contains(word) || Per.Contains(word)))
        {
            return null;
        }

        bool marked = numbers.Count == 2 || Plus().IsMatch(header) || words.Any(From.Contains) || words.Any(Quantities.Contains);
        bool per = !Plus().IsMatch(header) && numbers.Count == 1
            && (words.Any(Per.Contains) || Slash().IsMatch(header)) && !words.Any(From.Contains) && quantity > 1;
        string? currency = Currencies.In(HeaderCell.Parted(header));
        return new PriceHeader(
            quantity, marked, per, !words.Any(Prices.Contains) && currency is null && !Plus().IsMatch(header),
            words.Any(Costs.Contains) || currency is not null);
    }

    private static int? Read(Match number)
    {
        string digits = new([.. number.Groups[1].Value.Where(char.IsAsciiDigit)]);
        return int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out int count)
            && count <= (number.Groups[2].Length > 0 ? 1_000_000 : int.MaxValue)
                ? count * (number.Groups[2].Length > 0 ? 1000 : 1)
                : null;
    }

    private static bool IsTax(string word) => Notions.Of(word) is [var notion, ..] && notion.Marks == Notions.Mark("vat");

    private static readonly UInt128 Money = Notions.Mark("currency");

    // Words for one thing: some by themselves, and all that stand for certain notions and for nothing else.
    private sealed class Words(string more, params string[] notions)
    {
        private readonly HashSet<string> _more = new(more.Split(' '), StringComparer.Ordinal);
        private readonly UInt128 _marks = notions.Aggregate((UInt128)0, (marks, name) => marks | Notions.Mark(name));

        public bool Contains(string word) => _more.Contains(word)
            || ((_marks & Money) != 0 && Currencies.IsName(word))
            || Notions.Of(word).Any(notion => notion.Doubt <= 0.1 && (notion.Marks & ~_marks) == 0);
    }

    [GeneratedRegex(@"(\d{1,3}(?:[.,' \u00A0]\d{3})+|\d+)([kK](?![a-zA-Z]))?")]
    private static partial Regex Number();

    [GeneratedRegex(@"\d[kK]?\s*(?:\+|＋|以上|~\s*$|-\s*$)|(?:>=?|≥|⩾)\s*\d")]
    private static partial Regex Plus();

    [GeneratedRegex(@"[\(\)\[\]\{\}/]")]
    private static partial Regex Brackets();

    [GeneratedRegex(@"/\s*\d")]
    private static partial Regex Slash();

    [GeneratedRegex(@"\d[kK]?\s*(?:-|–|—|~|\.{2,3}|…|to|bis|à|a|tot|till|til|do)\s*\d", RegexOptions.IgnoreCase)]
    private static partial Regex Range();
}
