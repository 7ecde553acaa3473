namespace PartPick.Catalog.Import;

/// <summary>Joins the marks of a basis column with those that were there before.</summary>
internal static class BasisMarks
{
    /// <summary>The newer marks, and the older ones of figures that the newer file does not state.</summary>
    public static string Join(string? older, string? newer, IEnumerable<string> stated)
    {
        HashSet<string> now = [.. stated.Select(key => key.Split(' ')[0])];
        var marks = new SortedDictionary<string, string>(StringComparer.Ordinal);
        foreach (string mark in Entries(older).Where(mark => !now.Contains(KeyOf(mark))).Concat(Entries(newer)))
        {
            marks[KeyOf(mark)] = mark;
        }

        return string.Join(';', marks.Values);
    }

    private static string[] Entries(string? marks) =>
        (marks ?? "").Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries);

    private static string KeyOf(string mark) => mark.Split('=')[0];
}
