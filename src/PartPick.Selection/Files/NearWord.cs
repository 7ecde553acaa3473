namespace PartPick.Selection.Files;

/// <summary>Finds the word that was probably meant.</summary>
internal static class NearWord
{
    /// <summary>The nearest of some words; null where none is near.</summary>
    /// <param name="word">What was written.</param>
    /// <param name="words">What would be right.</param>
    public static string? Of(string word, IEnumerable<string> words)
    {
        int most = Math.Max(1, word.Length / 3);
        (string Word, int Distance)[] near =
        [
            .. words.Select(known => (known, Distance(word.ToUpperInvariant(), known.ToUpperInvariant())))
                .Where(known => known.Item2 <= most),
        ];
        return near.Length == 0 ? null : near.MinBy(known => known.Distance).Word;
    }

    // Damerau's distance with neighbours swapped: "laod" is one step from "load".
    private static int Distance(string a, string b)
    {
        int[,] steps = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            for (int j = 0; j <= b.Length; j++)
            {
                if (i == 0 || j == 0)
                {
                    steps[i, j] = i + j;
                    continue;
                }

                int change = steps[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                steps[i, j] = Math.Min(change, Math.Min(steps[i - 1, j], steps[i, j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    steps[i, j] = Math.Min(steps[i, j], steps[i - 2, j - 2] + 1);
                }
            }
        }

        return steps[a.Length, b.Length];
    }
}
