using PartPick.Catalog.Fields;

namespace PartPick.Catalog.Import;

/// <summary>How surely a header names a field.</summary>
/// <param name="Column">The place of the column.</param>
/// <param name="Field">The field.</param>
/// <param name="Score">Greater is surer: 85 and more for the whole name, less for a part of it or for words cut short.</param>
/// <param name="Reading">The way of reading the header in which it names the field.</param>
internal readonly record struct FieldMatch(int Column, string Field, double Score, HeaderCell Reading)
{
    /// <summary>From here on a header is the whole name of a field.</summary>
    public const double Whole = 85;

    private const double Compound = 0.8;

    private static readonly UInt128 Least = Notions.Mark("minimum");
    private static readonly UInt128 Greatest = Notions.Mark("maximum");

    // What a way of reading is less sure than the first.
    private const double OtherReading = 3;

    /// <summary>All fields that a header may name, in any way of reading it.</summary>
    public static IEnumerable<FieldMatch> Of(PartKind kind, int column, HeaderCell header) => header.Readings()
        .SelectMany((reading, place) => OfReading(kind, column, reading)
            .Select(match => match with { Score = match.Score - (place * OtherReading) }));

    private static IEnumerable<FieldMatch> OfReading(PartKind kind, int column, HeaderCell header)
    {
        foreach (PartField field in PartShape.Of(kind).Fields)
        {
            if (Trade.Words(field.Key) == header.Name)
            {
                string named = (kind, field.Key) is (PartKind.Capacitor, "tolerance") ? "toleranceAny" : field.Key;
                yield return new FieldMatch(column, named, 110, header);
            }
        }

        IReadOnlySet<string> known = TradeWords.Known(kind);
        HeaderCell[] alternatives = [.. header.Alternatives()];
        HeaderNotions notions = HeaderNotions.Of(header.Plain);
        foreach (TradeWords words in TradeWords.Of(kind))
        {
            double best = Rate(header, words, known);
            foreach (HeaderCell alternative in alternatives)
            {
                best = Math.Max(best, Rate(alternative, words, known) - 2);
            }

            if (IsOtherEnd(kind, words.Field, notions))
            {
                continue;
            }

            Recipe[] recipes = [.. Recipes.Of(kind, words.Field)];
            if (best < Whole && recipes.Length > 0 && recipes.All(recipe => recipe.IsContradicted(notions)))
            {
                best = 0;
            }

            if (recipes.Length > 0 && !words.IsOther(header))
            {
                best = Math.Max(best, recipes.Max(recipe => recipe.Rate(notions)));
            }

            if (best > 40)
            {
                yield return new FieldMatch(column, words.Field, best, header);
            }
        }
    }

    // The least and the greatest are no typical figure where a part has a field for each.
    private static bool IsOtherEnd(PartKind kind, string field, HeaderNotions header)
    {
        string[] key = field.Split(' ');
        bool Has(string end) => PartShape.Of(kind).Fields.Any(each => each.Key == string.Join(' ', [key[0] + end, .. key[1..]]));
        return (header.Says(Least) && Has("Min")) || (header.Says(Greatest) && Has("Max"));
    }

    private static double Rate(HeaderCell header, TradeWords words, IReadOnlySet<string> known)
    {
        bool other = words.IsOther(header);
        double best = 0;
        foreach ((TradePhrase phrase, int place) in words.Phrases)
        {
            double rate = Rate(header, phrase, other, words.IsText, known);
            best = rate > 0 ? Math.Max(best, rate - Math.Min(place * 0.1, 5)) : best;
        }

        return best;
    }

    private static double Rate(HeaderCell header, TradePhrase phrase, bool other, bool texts, IReadOnlySet<string> known)
    {
        if (header.Plain == phrase.Text)
        {
            return 100;
        }

        if (other)
        {
            return 0;
        }

        if (header.BareName == phrase.Text)
        {
            return 93;
        }

        return phrase.IsWhole ? 0 : Math.Max(
            Partly(header.Telling, phrase.Words, texts, known), Partly(header.All, phrase.Words, texts, known));
    }

    // Every word of the phrase has to be found, uncut where the cells are texts, which prove nothing; words of the header that are left
    // over make it less sure.
    private static double Partly(string[] header, string[] phrase, bool texts, IReadOnlySet<string> known)
    {
        if (header.Length < phrase.Length || phrase.Sum(word => word.Length) < 3)
        {
            return 0;
        }

        double likeness = 1;
        bool sure = false;
        var used = new bool[header.Length];
        foreach (string word in phrase)
        {
            (double best, int at) = (0, -1);
            for (int i = 0; i < header.Length; i++)
            {
                double like = used[i] ? 0 : Likeness(header[i], word, header.Length > 1, known.Contains(header[i]));
                (best, at) = like > best ? (like, i) : (best, at);
            }

            if (at < 0 || (texts && best is < 1 and not Compound && header[at].Length < 5))
            {
                return 0;
            }

            // A few letters beside other words may begin many a long word.
            if (phrase.Length == 1 && header.Length > 1 && best < 1 && header[at].Length * 3 < word.Length)
            {
                return 0;
            }

            sure |= best >= Compound && header[at].Length > 2;

            used[at] = true;
            likeness *= best;
        }

        // One or two letters say something only beside a word that does.
        if (!sure && header.Length > 1)
        {
            return 0;
        }

        int found = header.Where((_, i) => used[i]).Sum(word => word.Length);
        int all = header.Sum(word => word.Length);
        return found == all ? 60 + (25 * likeness) : 42 + (20 * likeness * found / all);
    }

    // The same word, one cut short, or one compound with it: "freq" and "frequency", "nennfrequenz" and "frequenz".
    private static double Likeness(string header, string word, bool several, bool isKnown)
    {
        if (header == word)
        {
            return 1;
        }

        if (header.Length == 1)
        {
            return several && word.Length >= 6 && word[0] == header[0] ? 0.5 : 0;
        }

        // A word that means something by itself is not cut short: a part is no partial.
        if (word.StartsWith(header, StringComparison.Ordinal))
        {
            return isKnown ? 0 : header.Length > 2 ? 0.9 : several && word.Length >= 6 ? 0.4 : 0;
        }

        return word.Length >= 6 && (header.EndsWith(word, StringComparison.Ordinal) || header.StartsWith(word, StringComparison.Ordinal))
            ? Compound
            : 0;
    }
}
