namespace PartPick.Catalog.Import;

/// <summary>The words that lists of parts write in the place of a price or of a stock (common practice, from memory).</summary>
internal static class TradeAnswers
{
    private static readonly HashSet<string> OnRequest = Set(
        "call; call for price; call for pricing; poa; p o a; on request; price on request; request; request quote; quote; ask; rfq; "
        + "auf anfrage; a a; anfrage; preis auf anfrage; sur demande; nous consulter; a richiesta; su richiesta; bajo pedido; "
        + "consultar; a consultar; sob consulta; na zapytanie; na dotaz; op aanvraag; pa forfragan; pa foresporgsel; "
        + "询价; 要見積; 問合せ; по запросу");

    private static readonly HashSet<string> NoneLeft = Set(
        "out of stock; no stock; sold out; oos; sem estoque; sem stock; esgotado; agotado; sin stock; sin existencias; epuise; "
        + "en rupture; rupture; rupture de stock; ausverkauft; nicht auf lager; vergriffen; esaurito; non disponibile; "
        + "niet op voorraad; uitverkocht; slut; slutsald; ikke pa lager; udsolgt; utsolgt; brak w magazynie; neni skladem; "
        + "nincs keszleten; stokta yok; 缺货; 无货; 在庫なし; нет; нет в наличии");

    private static readonly HashSet<string> SomeLeft = Set(
        "in stock; on stock; stock; yes; available; auf lager; ab lager; lieferbar; en stock; disponible; disponibile; disponivel; "
        + "em estoque; op voorraad; i lager; pa lager; na stanie; skladem; raktaron; 有货; 有; 在庫あり; есть; в наличии");

    /// <summary>Whether a cell says that the price is told on request, so that it states none.</summary>
    public static bool IsOnRequest(string cell) => OnRequest.Contains(Trade.Words(cell));

    /// <summary>What words say of a stock: none left, or some, of which the number is not stated; null where the cell is no such
    /// word.</summary>
    public static (double? Pieces, bool IsAnswer)? Stock(string cell) =>
        cell.Any(char.IsAsciiDigit) ? null
        : NoneLeft.Contains(Trade.Words(cell)) ? (0, true)
        : SomeLeft.Contains(Trade.Words(cell)) ? (null, true) : null;

    private static HashSet<string> Set(string words) =>
        new(words.Split(';', StringSplitOptions.TrimEntries).Select(Trade.Words), StringComparer.Ordinal);
}
