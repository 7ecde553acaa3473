using System.Text.RegularExpressions;

namespace PartPick.Catalog.Import;

/// <summary>The cell of a header taken apart: what it names, the unit it states, and minimum, typical or maximum.</summary>
/// <param name="Text">The cell as it stands.</param>
/// <param name="Name">Its words without the unit and without a condition such as "at 25 °C".</param>
/// <param name="Unit">The unit in brackets or at the end; empty for none.</param>
/// <param name="Basis">What its figures rest on; stated where it says nothing.</param>
internal sealed partial record HeaderCell(string Text, string Name, string Unit, Basis Basis)
{
    private static readonly HashSet<string> Highest = new(StringComparer.Ordinal)
    {
        "max", "maximum", "maxi", "maks", "maximal", "maximale", "maximo", "maxima", "massimo", "massima", "maksimi", "最大", "макс",
    };

    private static readonly HashSet<string> Lowest = new(StringComparer.Ordinal)
    {
        "min", "minimum", "mini", "minimal", "minimale", "minimo", "minima", "minimi", "最小", "мин",
    };

    private static readonly HashSet<string> Middle = new(StringComparer.Ordinal)
    {
        "typ", "typical", "typisch", "typique", "tip", "tipico", "tipica", "typisk", "typowe", "typowa", "典型", "тип",
    };

    private static readonly HashSet<string> Noise =
    [
        .. Highest, .. Lowest, .. Middle, "nominal", "nom", "rated", "value", "valu", "all", "25c", "25", "25degc",
    ];

    /// <summary>The words of the name, vowels with dots as they are without.</summary>
    public string Plain { get; } = TradePhrase.Folded(Name);

    /// <summary>The words of the name without those that only qualify it.</summary>
    public string BareName { get; } =
        string.Join(' ', TradePhrase.Folded(Name).Split(' ').Where(word => !Noise.Contains(word)));

    /// <summary>The words that tell what the column is.</summary>
    public string[] Telling { get; } =
        TradePhrase.Telling(string.Join(' ', TradePhrase.Folded(Name).Split(' ').Where(word => !Noise.Contains(word))));

    /// <summary>The same with those that only qualify it.</summary>
    public string[] All { get; } = TradePhrase.Telling(TradePhrase.Folded(Name));

    /// <summary>The names that a header gives side by side, "Fréquence / Frequency", and its own with the words in full.</summary>
    public IEnumerable<HeaderCell> Alternatives()
    {
        string[] pieces = Text.Split(['/', '|', '\n', '='], StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);
        IEnumerable<HeaderCell> beside = pieces.Length < 2
            ? []
            : pieces.Select(Of).Where(cell => cell.Name.Length > 2).Select(cell => cell.Unit.Length > 0 ? cell : cell with { Unit = Unit });
        string full = Abbreviations.InFull(Name);
        return full == Name ? beside : beside.Append(new HeaderCell(Text, full, Unit, Basis));
    }

    /// <summary>The ways of reading the cell: with a last word that may be a unit, and with the same word as a part of the name.</summary>
    public IEnumerable<HeaderCell> Readings()
    {
        yield return this;
        HeaderCell plain = Of(Text, unitAtEnd: false);
        if (plain.Name != Name)
        {
            yield return plain;
        }
    }

    /// <summary>Takes a cell apart.</summary>
    public static HeaderCell Of(string text) => Of(text, unitAtEnd: true);

    /// <summary>A text with its joined words parted: "unitPriceUsd" is "unit Price Usd".</summary>
    public static string Parted(string text) =>
        Joint().Replace(Initials().Replace(text, match => match.Value.Replace(".", "", StringComparison.Ordinal)), " ");

    private static HeaderCell Of(string text, bool unitAtEnd)
    {
        string trimmed = text.Trim().Trim('\uFEFF');
        string unit = "";
        string rest = Condition().Replace(trimmed.StartsWith('@') ? "at " + trimmed[1..] : trimmed, " ");
        rest = Untaxed().Replace(Parted(rest), " ");
        rest = Brackets().Replace(rest, match =>
        {
            string inner = match.Groups[1].Value.Trim();
            string bare = Sign().Replace(inner, "").Trim();
            if (unit.Length == 0 && HeaderUnit.IsUnit(bare))
            {
                unit = bare;
                return " ";
            }

            return " " + inner + " ";
        });
        if (unitAtEnd && unit.Length == 0)
        {
            (rest, unit) = UnitAtEnd(rest);
        }

        string name = Trade.Words(Apostrophe().Replace(Elision().Replace(rest, " "), ""));
        string[] all = name.Split(' ');
        Basis basis = all.Any(Highest.Contains) ? Basis.Maximum
            : all.Any(Middle.Contains) ? Basis.Typical
            : all.Any(Lowest.Contains) ? Basis.Minimum : Basis.Stated;
        return new HeaderCell(trimmed, name, unit, basis);
    }

    private static (string Name, string Unit) UnitAtEnd(string text)
    {
        // "gm_ma_v": a quotient of units in names that have no other sign.
        if (Quotient().Match(text) is { Success: true } two && $"{two.Groups[1].Value}/{two.Groups[2].Value}" is var quotient
            && HeaderUnit.IsUnit(quotient))
        {
            return (text[..two.Index], quotient);
        }

        // A single letter is a unit behind "/" or "in", and in names such as "vdd_v".
        bool isJoined = text.Contains('_', StringComparison.Ordinal) && !text.Contains(' ', StringComparison.Ordinal);
        for (Match tail = Tail().Match(text); tail.Success; tail = Tail().Match(text, tail.Index + 1))
        {
            string unit = tail.Groups[2].Value;
            unit = isJoined && unit is ("f" or "a" or "w") ? unit.ToUpperInvariant() : unit;
            bool isApart = unit.Length > 1 || tail.Groups[1].Value.Trim() is not "" || unit is "Ω" or "%" || isJoined;
            if (isApart && HeaderUnit.IsUnit(unit))
            {
                return (text[..tail.Index], unit);
            }
        }

        return (text, "");
    }

    [GeneratedRegex(@"[\(\[\{（]([^\)\]\}）]*)[\)\]\}）]")]
    private static partial Regex Brackets();

    // Without a tax, or with one of nought: what says only that the price is the net one.
    [GeneratedRegex(
        @"\b(?:(?:excl?|exkl|excluding|without|ohne|hors|sin|sem|senza|zonder|uden|utan|bez)\b\.?\s*(?:of\s+)?"
            + @"(?:vat|tax|mwst|ust|tva|taxes?|iva|btw|moms|mva|dph|kdv)\b|(?:alv|vat|mwst|ust|tva|iva|btw|moms|mva|dph|kdv)\b\.?\s*0\s*%)",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Untaxed();

    // "d'alimentation", "all'ingresso".
    [GeneratedRegex(@"\b(?:d|l|all|dell|nell|dall|sull)['’´`](?=\w)", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Elision();

    // A unit behind a condition stays: "hFE @ IC (mA)" are currents.
    // "at 25 °C", "à 25°C", "@ IC", "bei +25 °C", "(25 °C)", "(IC=2mA)": under which condition the figures hold.
    [GeneratedRegex(
        @"(?<=.)@[^\(\[]*|\([^)]*=[^)]*\)|(?:\b(?:at|à|a|bei|b\.|bij|ved|v\.|vid|w|przy|pri|при|la)|\s)"
            + @"\s*\+?\s*25\s*(?:[°º]\s*C?|deg\.?\s*C|C\b|℃)|\(\s*\+?25\s*(?:[°º]\s*C|C|℃)\s*\)",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Condition();

    [GeneratedRegex(@"^(?:±|\+/?-)|\bin\b|\ben\b|^\s*je\b", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Sign();

    // The last word, where it stands alone: behind "/" or "in" also a unit of one letter.
    [GeneratedRegex(
        @"(?:[\s_,\-:;\.]|(?<=\w))(\s*(?:/|\bin\b|\ben\b|,)\s*)?(?<=[\s_,/\-:;\.±])±?([^\s_,\-:;±]+)\s*$",
        RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Tail();

    [GeneratedRegex(@"(?<=[a-z])[\s_]+([mµu]?a|ppm)[\s_]+(v|k|c|yr|y|year)\s*$", RegexOptions.IgnoreCase | RegexOptions.CultureInvariant)]
    private static partial Regex Quotient();

    // "P.U.", "C.L.": letters with full stops.
    [GeneratedRegex(@"(?<!\w)(?:\p{L}\.){2,}(?=\W|$)")]
    private static partial Regex Initials();

    // "ratedVoltageVdc", "priceEUR": a capital letter behind small ones begins a word; "kHz" and "fTmin" are none.
    [GeneratedRegex(@"(?<=[a-z]{3})(?=[A-Z])")]
    private static partial Regex Joint();

    [GeneratedRegex(@"(?<=\w)['’´`](?=\w)")]
    private static partial Regex Apostrophe();
}
