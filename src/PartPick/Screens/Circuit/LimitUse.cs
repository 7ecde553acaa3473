namespace PartPick.Screens;

/// <summary>The limits that have a picture.</summary>
public enum LimitName
{
    /// <summary>Frequency error.</summary>
    Error,

    /// <summary>Start-up margin.</summary>
    Margin,

    /// <summary>Drive level.</summary>
    Drive,

    /// <summary>Start-up time.</summary>
    StartUp,

    /// <summary>Cost.</summary>
    Cost,
}

/// <summary>A limit and the part of it that is used up.</summary>
public sealed record LimitUse
{
    /// <summary>Which limit.</summary>
    public required LimitName Name { get; init; }

    /// <summary>Its word on the screen.</summary>
    public required string Word { get; init; }

    /// <summary>The figure, without its unit where the limit has it.</summary>
    public required string Figure { get; init; }

    /// <summary>The limit in words: "of 80 ppm", "wanted 5"; the unit alone where there is none.</summary>
    public required string Against { get; init; }

    /// <summary>What stands in the place of the bar where there is no limit: "no limit", "not rated".</summary>
    public string Unlimited { get; init; } = "";

    /// <summary>How the figure has changed against another circuit: "+3.2 worse"; empty where there is none to compare with.</summary>
    public string Change { get; init; } = "";

    /// <summary>What makes the figure what it is: "most: crystal over temperature".</summary>
    public required string Because { get; init; }

    /// <summary>The used part: 1 at the limit, more beyond it; null where there is no limit or no figure.</summary>
    public required double? Used { get; init; }

    /// <summary>Whether the limit is broken.</summary>
    public bool IsBroken => Used > 1;
}
