namespace PartPick.Catalog;

/// <summary>What a figure of a part rests on.</summary>
public enum Basis
{
    /// <summary>A nominal or rated figure, simply stated.</summary>
    Stated,

    /// <summary>A guaranteed minimum.</summary>
    Minimum,

    /// <summary>A typical figure.</summary>
    Typical,

    /// <summary>A guaranteed maximum.</summary>
    Maximum,

    /// <summary>Not stated for the part: a usual figure of its class.</summary>
    Assumed,
}
