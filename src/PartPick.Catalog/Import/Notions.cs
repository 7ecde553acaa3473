using System.Collections.Concurrent;

namespace PartPick.Catalog.Import;

/// <summary>What single words of headers stand for, in any of the languages of the lists, also cut short or joined.</summary>
internal static class Notions
{
    private const int MostUnderstood = 4096;

    private static readonly ConcurrentDictionary<string, IReadOnlyList<Notion>> Understood = new(StringComparer.Ordinal);
    private static readonly List<string> Names = [];
    private static readonly Dictionary<string, List<Notion>> Exact = new(StringComparer.Ordinal);
    private static readonly List<(string Word, Notion Notion)> Whole = [];
    private static readonly string[] Sorted = Load();

    private static readonly UInt128 Qualifying = Mark("minimum") | Mark("maximum") | Mark("typical") | Mark("nominal");

    /// <summary>The mark of a notion.</summary>
    /// <exception cref="InvalidOperationException">There is no such notion.</exception>
    public static UInt128 Mark(string name) => Names.IndexOf(name) is >= 0 and var at
        ? UInt128.One << at
        : throw new InvalidOperationException($"The lists of words know no notion \"{name}\".");

    /// <summary>The ways in which a word of a header can be understood; none where it is not known.</summary>
    /// <param name="word">A word in the form of <see cref="TradePhrase.Folded"/>.</param>
    public static IReadOnlyList<Notion> Of(string word)
    {
        if (!Understood.TryGetValue(word, out IReadOnlyList<Notion>? known))
        {
            known = Find(word);
            if (Understood.Count < MostUnderstood)
            {
                Understood[word] = known;
            }
        }

        return known;
    }

    private static List<Notion> Find(string word)
    {
        if (Exact.TryGetValue(word, out List<Notion>? exact))
        {
            return word.Length is 3 or 4
                ? [.. exact, .. CutShort(word).Where(notion => !exact.Exists(known => known.Marks == notion.Marks)).Select(Doubtful)]
                : exact;
        }

        if (word.Length is < 2 or > 40 || word.Any(char.IsAsciiDigit))
        {
            return [];
        }

        List<Notion> found = [.. Joined(word), .. Longer(word)];
        return found.Count > 0 ? found : [.. CutShort(word), .. WithoutVowels(word)];
    }

    // A short word may also be one cut short: "bez".
    private static Notion Doubtful(Notion notion) => notion with { Doubt = 0.25 };

    // "belastningskap", "nennfreq", "fmax": two words, with or without a letter between.
    private static IEnumerable<Notion> Joined(string text)
    {
        for (int at = 1; at < text.Length - 1; at++)
        {
            string right = text[at..];
            IEnumerable<Notion> ends = Exact.TryGetValue(right, out List<Notion>? known) ? known
                : at >= 4 && right.Length >= 4 ? CutShort(right) : [];
            foreach (Notion end in ends)
            {
                bool qualifies = (end.Marks & Qualifying) != 0 && right.Length >= 3;
                if (at < 3 && !qualifies && !(at == 2 && right.Length >= 4 && end.Doubt == 0))
                {
                    continue;
                }

                foreach (string left in Stems(text[..at]))
                {
                    foreach (Notion start in Exact.GetValueOrDefault(left, []))
                    {
                        yield return new Notion(start.Marks | end.Marks, 0.05 + end.Doubt);
                    }
                }
            }
        }
    }

    private static IEnumerable<string> Stems(string left)
    {
        yield return left;
        if (left.Length > 4 && left[^1] is 's' or 'n' or 'e' or 'o')
        {
            yield return left[..^1];
        }
    }

    // With an ending: "temperaturen", "frequencias".
    private static IEnumerable<Notion> Longer(string text)
    {
        for (int cut = 1; cut <= 3 && text.Length - cut >= 5; cut++)
        {
            if (Exact.TryGetValue(text[..^cut], out List<Notion>? known))
            {
                return known.Select(notion => notion with { Doubt = 0.1 });
            }
        }

        return [];
    }

    private static IEnumerable<Notion> CutShort(string text)
    {
        if (text.Length < 3)
        {
            yield break;
        }

        int at = Array.BinarySearch(Sorted, text, StringComparer.Ordinal);
        for (int i = at < 0 ? ~at : at; i < Sorted.Length && Sorted[i].StartsWith(text, StringComparison.Ordinal); i++)
        {
            foreach (Notion notion in Exact[Sorted[i]])
            {
                yield return notion with { Doubt = text.Length > 4 ? 0.05 : 0.1 };
            }
        }
    }

    // "vltg", "rtg", "prz": the consonants of a word, in its order; usual in English lists, less so in others.
    private static IEnumerable<Notion> WithoutVowels(string text) => text.Length is < 3 or > 6 || text[1..].Any("aeiou".Contains)
        ? []
        : Whole.Where(each => each.Word.Length > text.Length && IsWithin(text, each.Word)).Select(each => each.Notion);

    private static bool IsWithin(string text, string word)
    {
        int at = 0;
        foreach (char letter in word)
        {
            at += at < text.Length && text[at] == letter ? 1 : 0;
        }

        return at == text.Length && text[0] == word[0];
    }

    private static string[] Load()
    {
        foreach ((_, string name, string[] languages) in TradeWords.Lines().Where(line => line.Section == "notions"))
        {
            Names.Add(name);
            var notion = new Notion(UInt128.One << (Names.Count - 1), 0);
            bool english = true;
            foreach (string written in languages.SelectMany(part => part.Split(' ', StringSplitOptions.RemoveEmptyEntries)))
            {
                if (written == "|")
                {
                    english = false;
                    continue;
                }

                string word = TradePhrase.Folded(Trade.Words(written));
                if (!Exact.TryGetValue(word, out List<Notion>? known))
                {
                    Exact[word] = known = [];
                }

                if (!known.Contains(notion))
                {
                    known.Add(notion);
                }

                Whole.Add((word, notion with { Doubt = english ? 0.2 : 0.22 }));
            }
        }

        return [.. Exact.Keys.Order(StringComparer.Ordinal)];
    }
}
