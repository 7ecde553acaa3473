using System.Collections.Immutable;

namespace PartPick.Catalog.Browsing;

/// <summary>All parts of a kind as lines of a list, in the order of their ids; packed, and never changed once they are made.</summary>
public sealed class PartRows
{
    private readonly ImmutableArray<PartBlock> _blocks;

    internal PartRows(PartKind kind, ImmutableArray<PartBlock> blocks)
    {
        Kind = kind;
        _blocks = blocks;
        Count = blocks.Sum(block => block.Count);
    }

    /// <summary>The kind.</summary>
    public PartKind Kind { get; }

    /// <summary>How many rows there are.</summary>
    public int Count { get; }

    /// <summary>A row.</summary>
    /// <param name="row">Its number, from zero.</param>
    public PartRow this[int row] => BlockOf(row).Row(row % PartBlock.Size);

    internal ImmutableArray<PartBlock> Blocks => _blocks;

    /// <summary>No rows.</summary>
    /// <param name="kind">The kind.</param>
    public static PartRows None(PartKind kind) => new(kind, []);

    /// <summary>Finds the row of a part.</summary>
    /// <param name="id">The id of the part.</param>
    /// <returns>The number of the row; -1 where there is none.</returns>
    public int Find(string id)
    {
        ArgumentNullException.ThrowIfNull(id);
        (int low, int high) = (0, Count - 1);
        while (low <= high)
        {
            int middle = (low + high) / 2;
            int order = BlockOf(middle).CellOf(middle % PartBlock.Size, 0).SequenceCompareTo(id);
            if (order == 0)
            {
                return middle;
            }

            (low, high) = order < 0 ? (middle + 1, high) : (low, middle - 1);
        }

        return -1;
    }

    /// <summary>The rows with one of them changed.</summary>
    /// <param name="row">The row as it now is.</param>
    /// <returns>The rows; the same ones where the part is not among them.</returns>
    public PartRows With(PartRow row)
    {
        ArgumentNullException.ThrowIfNull(row);
        int at = Find(row.Id);
        return at < 0 ? this : new PartRows(
            Kind, _blocks.SetItem(at / PartBlock.Size, BlockOf(at).With(at % PartBlock.Size, row)));
    }

    internal PartBlock BlockOf(int row) => _blocks[row / PartBlock.Size];
}
