using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>The text of a basis column: <c>resistance=maximum;shunt=typical</c>.</summary>
internal static class BasisText
{
    private static readonly Basis[] Marks = [Basis.Minimum, Basis.Typical, Basis.Maximum, Basis.Assumed];

    public static IReadOnlyDictionary<string, Basis>? Read(string? text, IReadOnlyCollection<string> keys, DraftReader reader)
    {
        if (text is null)
        {
            return null;
        }

        var marks = new Dictionary<string, Basis>(StringComparer.Ordinal);
        foreach (string entry in text.Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
        {
            int equals = entry.IndexOf('=', StringComparison.Ordinal);
            string key = equals < 0 ? entry : entry[..equals].TrimEnd();
            string word = equals < 0 ? "" : entry[(equals + 1)..].TrimStart();
            int mark = Array.FindIndex(Marks, candidate => Word(candidate) == word);
            if (mark < 0)
            {
                reader.Report("basis", $"{Problem.Quote(entry)} is no basis", "key=minimum, typical, maximum or assumed");
            }
            else if (!keys.Contains(key))
            {
                reader.Report("basis", $"{Problem.Quote(key)} is no figure of this kind", "one of " + string.Join(", ", keys));
            }
            else if (!marks.TryAdd(key, Marks[mark]))
            {
                reader.Report("basis", $"{Problem.Quote(key)} is there twice", "one basis for each figure");
            }
        }

        return marks.AsReadOnly();
    }

    /// <summary>Writes the marks in the order of the kind's figures.</summary>
    public static string Write(Part part, IEnumerable<string> keys) => string.Join(';', keys
        .Where(key => part.BasisOf(key) != Basis.Stated)
        .Select(key => $"{key}={Word(part.BasisOf(key))}"));

    private static string Word(Basis basis) => basis switch
    {
        Basis.Minimum => "minimum",
        Basis.Typical => "typical",
        Basis.Maximum => "maximum",
        Basis.Assumed => "assumed",
        _ => throw new ArgumentOutOfRangeException(nameof(basis), basis, "A stated figure has no mark."),
    };
}
