namespace PartPick.Catalog.Import;

/// <summary>A list that grows in pieces, so that growing copies nothing and leaves no large arrays behind.</summary>
/// <typeparam name="T">What it holds.</typeparam>
internal sealed class PieceList<T>
    where T : struct
{
    private const int Shift = 14;
    private const int Mask = (1 << Shift) - 1;

    private readonly List<T[]> _pieces = [];

    public int Count { get; private set; }

    /// <summary>One of them, to be read and changed in its place.</summary>
    public ref T this[int index] => ref _pieces[index >> Shift][index & Mask];

    /// <summary>Adds one and gives its place.</summary>
    public int Add(T item)
    {
        if (Count >> Shift == _pieces.Count)
        {
            _pieces.Add(new T[1 << Shift]);
        }

        this[Count] = item;
        return Count++;
    }
}
