namespace PartPick.Screens;

/// <summary>Which columns of the list fit a width. What the circuit's own page says anyway goes first.</summary>
public sealed class ListShape
{
    /// <summary>Width with all columns.</summary>
    public const int Full = 78;

    /// <summary>Width of a bar in cells.</summary>
    public const int BarCells = 4;

    /// <summary>Chooses the columns.</summary>
    /// <param name="width">Width in cells.</param>
    public ListShape(int width)
    {
        int left = Full;
        HasCase = Keeps(5);
        HasDivider = Keeps(6);
        HasCircuit = Keeps(9);
        HasLoad = Keeps(5);
        HasMarginBar = Keeps(BarCells + 1);
        HasErrorBar = Keeps(BarCells + 1);
        HasFrequency = Keeps(10);

        bool Keeps(int cells)
        {
            bool keeps = left <= width;
            left -= keeps ? 0 : cells;
            return keeps;
        }
    }

    /// <summary>Whether there is room for the circuit's word.</summary>
    public bool HasCircuit { get; }

    /// <summary>Whether there is room for the crystal's frequency.</summary>
    public bool HasFrequency { get; }

    /// <summary>Whether there is room for the crystal's load.</summary>
    public bool HasLoad { get; }

    /// <summary>Whether there is room for the crystal's case.</summary>
    public bool HasCase { get; }

    /// <summary>Whether there is room for the divider.</summary>
    public bool HasDivider { get; }

    /// <summary>Whether there is room for the bar of the error.</summary>
    public bool HasErrorBar { get; }

    /// <summary>Whether there is room for the bar of the margin.</summary>
    public bool HasMarginBar { get; }
}
