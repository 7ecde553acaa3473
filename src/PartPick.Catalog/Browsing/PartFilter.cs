using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Catalog.Browsing;

/// <summary>
/// What a list is narrowed to: words, all of which have to stand in the part's texts, and conditions on its figures such as
/// <c>load&lt;=18p</c>.
/// </summary>
public sealed class PartFilter
{
    private readonly ImmutableArray<string> _words;
    private readonly ImmutableArray<FigureCondition> _conditions;

    private PartFilter(PartKind kind, ImmutableArray<string> words, ImmutableArray<FigureCondition> conditions) =>
        (Kind, _words, _conditions) = (kind, words, conditions);

    /// <summary>The kind of the parts.</summary>
    public PartKind Kind { get; }

    /// <summary>Whether it lets everything through.</summary>
    public bool IsEmpty => _words.IsEmpty && _conditions.IsEmpty;

    /// <summary>A filter that lets everything through.</summary>
    /// <param name="kind">The kind of the parts.</param>
    public static PartFilter All(PartKind kind) => new(kind, [], []);

    /// <summary>Reads a filter.</summary>
    /// <param name="kind">The kind of the parts.</param>
    /// <param name="text">Words and conditions, with spaces between them.</param>
    /// <param name="where">The field or option, for the problem.</param>
    public static Result<PartFilter> Read(PartKind kind, string text, string where)
    {
        ArgumentNullException.ThrowIfNull(text);
        var words = ImmutableArray.CreateBuilder<string>();
        var conditions = ImmutableArray.CreateBuilder<FigureCondition>();
        foreach (string word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            string? sign = Array.Find(FigureCondition.Signs, each => word.IndexOf(each, StringComparison.Ordinal) > 0);
            if (sign is null)
            {
                words.Add(word);
                continue;
            }

            int at = word.IndexOf(sign, StringComparison.Ordinal);
            Result<FigureCondition> condition = FigureCondition.Read(kind, word[..at], sign, word[(at + sign.Length)..], where);
            if (!condition.IsOk)
            {
                return Result.Fail<PartFilter>(condition.Problem);
            }

            conditions.Add(condition.Value);
        }

        // The longest word is the rarest one: it is looked for first.
        return Result.Ok(new PartFilter(kind, [.. words.OrderByDescending(word => word.Length)], conditions.ToImmutable()));
    }

    /// <summary>Whether it lets through nothing that another filter does not.</summary>
    /// <param name="other">The other filter.</param>
    public bool Narrows(PartFilter other)
    {
        ArgumentNullException.ThrowIfNull(other);
        return Kind == other.Kind
            && other._conditions.All(condition => _conditions.Contains(condition))
            && other._words.All(word => _words.Any(own => own.Contains(word, StringComparison.OrdinalIgnoreCase)));
    }

    /// <summary>Whether it lets a part through.</summary>
    /// <param name="row">The part's row.</param>
    public bool Holds(PartRow row)
    {
        ArgumentNullException.ThrowIfNull(row);
        return Holds(PartBlock.Of(row.Kind, [row]), 0);
    }

    /// <summary>The numbers of the rows that it lets through, ascending.</summary>
    /// <param name="rows">The rows.</param>
    /// <param name="cancellation">Ends it.</param>
    public int[] Find(PartRows rows, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(rows);
        var found = new List<int>();
        for (int i = 0; i < rows.Blocks.Length; i++)
        {
            cancellation.ThrowIfCancellationRequested();
            FindIn(rows.Blocks[i], i * PartBlock.Size, found);
        }

        return [.. found];
    }

    /// <summary>Those of some rows that it lets through.</summary>
    /// <param name="rows">The rows.</param>
    /// <param name="among">The numbers of the rows that are looked at.</param>
    /// <param name="cancellation">Ends it.</param>
    public int[] Find(PartRows rows, int[] among, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(among);
        var found = new List<int>();
        for (int i = 0; i < among.Length; i++)
        {
            if (i % PartBlock.Size == 0)
            {
                cancellation.ThrowIfCancellationRequested();
            }

            if (Holds(rows.BlockOf(among[i]), among[i] % PartBlock.Size))
            {
                found.Add(among[i]);
            }
        }

        return [.. found];
    }

    private void FindIn(PartBlock block, int first, List<int> found)
    {
        if (_words.IsEmpty)
        {
            for (int row = 0; row < block.Count; row++)
            {
                if (Holds(block, row))
                {
                    found.Add(first + row);
                }
            }

            return;
        }

        // One pass over the texts of all rows finds the few that are worth a closer look.
        int at = 0;
        while (block.Text[at..].IndexOf(_words[0], StringComparison.OrdinalIgnoreCase) is >= 0 and int next)
        {
            int row = block.RowAt(at + next);
            if (Holds(block, row))
            {
                found.Add(first + row);
            }

            at = block.StartOf(row + 1);
        }
    }

    private bool Holds(PartBlock block, int row)
    {
        foreach (FigureCondition condition in _conditions)
        {
            if (!condition.Holds(block.NumberOf(row, condition.Number)))
            {
                return false;
            }
        }

        ReadOnlySpan<char> text = block.TextOf(row);
        foreach (string word in _words)
        {
            if (text.IndexOf(word, StringComparison.OrdinalIgnoreCase) < 0)
            {
                return false;
            }
        }

        return true;
    }
}
