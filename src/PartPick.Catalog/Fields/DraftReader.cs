using PartPick.Values;

namespace PartPick.Catalog.Fields;

/// <summary>Takes figures from a draft, and gathers what is wrong with them.</summary>
/// <param name="draft">The figures.</param>
/// <param name="where">Names the place of a key, for a problem.</param>
internal sealed class DraftReader(PartDraft draft, Func<string, string> where)
{
    /// <summary>What was found wrong so far.</summary>
    public List<Problem> Problems { get; } = [];

    public double? Number(string key) => draft.Number(key);

    public string? Text(string key) => draft.Text(key);

    public int? Whole(string key) => draft.Number(key) is { } number ? (int)number : null;

    /// <summary>A figure above zero that the part cannot be without; NaN, and a problem, where it is missing.</summary>
    public double Required(string key)
    {
        if (draft.Number(key) is > 0 and { } number)
        {
            return number;
        }

        Report(key, draft.Number(key) is null ? "is missing" : "is zero", "a value above zero");
        return double.NaN;
    }

    public string RequiredText(string key)
    {
        if (draft.Text(key) is { } text)
        {
            return text;
        }

        Report(key, "is missing", "a text");
        return "";
    }

    /// <summary>A whole number that is one of a few.</summary>
    public int OneOf(string key, params int[] choices)
    {
        if (Whole(key) is { } number && choices.Contains(number))
        {
            return number;
        }

        Report(key, Whole(key) is { } other ? $"{other} is not one of the choices" : "is missing", string.Join(" or ", choices));
        return choices[0];
    }

    /// <summary>Reports figures that have to ascend and do not; absent ones are passed over.</summary>
    public void Ascending(params string[] keys)
    {
        string[] present = [.. keys.Where(key => draft.Number(key) is not null)];
        for (int i = 1; i < present.Length; i++)
        {
            if (draft.Number(present[i - 1]) > draft.Number(present[i]))
            {
                Report(present[i], $"is below {present[i - 1]}", $"a value not below {present[i - 1]}");
            }
        }
    }

    public void Report(string key, string what, string fits) => Problems.Add(new Problem(where(key), what, fits));
}
