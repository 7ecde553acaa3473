namespace PartPick.Selection;

/// <summary>Where in its spread a device lies.</summary>
public enum DeviceStrength
{
    /// <summary>The weakest: lowest gain.</summary>
    Weakest,

    /// <summary>The typical one.</summary>
    Typical,

    /// <summary>The strongest: highest gain.</summary>
    Strongest,
}
