namespace PartPick.Selection;

/// <summary>A figure of a circuit that a change of parts may move.</summary>
public enum ChangedFigure
{
    /// <summary>The nominal frequency.</summary>
    Frequency,

    /// <summary>The frequency error, worst case.</summary>
    Error,

    /// <summary>The start-up margin at its worst corner.</summary>
    Margin,

    /// <summary>The drive level at its worst corner.</summary>
    Drive,

    /// <summary>The start-up time at its worst corner.</summary>
    StartUpTime,

    /// <summary>The cost per unit.</summary>
    Cost,
}
