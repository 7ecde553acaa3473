using System.Globalization;
using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>What the header of a price column says of quantities: "Qty 100 price", "100+", "Preis ab 1.000", "Price/1k".</summary>
/// <param name="Quantity">The number in it.</param>
/// <param name="IsMarked">Whether it says that the price holds from there on, as "100+" does; else it may be only the place in a row of
/// prices.</param>
/// <param name="IsPer">Whether it may be the price of so many together: "Price per 100".</param>
/// <param name="IsBare">Whether it is the number alone, or with words of quantity.</param>
internal sealed partial record PriceHeader(int Quantity, bool IsMarked, bool IsPer, bool IsBare)
{
    private static readonly HashSet<string> Prices = Set(
        "price prices preis preise prix precio precios prezzo prezzi preco precos prijs pris hinta cena ceny ar pret fiyat cost "
        + "costo coste custo cout unit each rate ek vk pu ea net netto net ht stuckpreis einzelpreis stuksprijs styckpris stykpris "
        + "stykkpris pc unitario unitaire unitprice 单价 价格 単価 価格 цена kosten usd eur gbp chf sek nok dkk pln czk huf inr cny jpy kr k sales excl ex vat sin iva "
        + "bez dph hors taxe list tier break staffel scaglione palier tarif t egysegar egyseg birim jednostkowa unit unite unidad");

    private static readonly HashSet<string> Quantities = Set(
        "qty quantity quantities menge antal antall aantal cantidad quantita qta quantite qte quantidade qtd ilosc mennyiseg adet "
        + "miktar kpl pcs pieces piece pzs pz stk st stuck stueck stuks szt ks db шт 个 個 pieza piezas uds ud un units unites off q");

    private static readonly HashSet<string> From = Set(
        "ab from od desde des dessa dès da vanaf fran fra partir from at alkaen tol a");

    private static readonly HashSet<string> Per = Set("per pro je par por cada za p");

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

        string rest = Currencies.Without(Brackets().Replace(Number().Replace(header, " "), " "));
        string[] words = TradePhrase.Folded(Trade.Words(rest)).Split(' ', StringSplitOptions.RemoveEmptyEntries);
        if (!words.All(word => Prices.Contains(word) || Quantities.Contains(word) || From.Contains(word) || Per.Contains(word)))
        {
            return null;
        }

        bool marked = numbers.Count == 2 || Plus().IsMatch(header) || words.Any(From.Contains) || words.Any(Quantities.Contains);
        bool per = !Plus().IsMatch(header) && numbers.Count == 1
            && (words.Any(Per.Contains) || Slash().IsMatch(header)) && !words.Any(From.Contains) && quantity > 1;
        return new PriceHeader(
            quantity, marked, per, !words.Any(Prices.Contains) && Currencies.In(header) is null && !Plus().IsMatch(header));
    }

    private static int? Read(Match number)
    {
        string digits = new([.. number.Groups[1].Value.Where(char.IsAsciiDigit)]);
        return int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out int count)
            && count <= (number.Groups[2].Length > 0 ? 1_000_000 : int.MaxValue)
                ? count * (number.Groups[2].Length > 0 ? 1000 : 1)
                : null;
    }

    private static HashSet<string> Set(string words) => new(words.Split(' '), StringComparer.Ordinal);

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
