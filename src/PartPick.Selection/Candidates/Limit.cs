using System.Collections.Immutable;

namespace PartPick.Selection;

/// <summary>The hard limits of a requirement, in the order in which a candidate is judged.</summary>
public enum Limit
{
    /// <summary>The device is not specified over the supply range.</summary>
    Supply,

    /// <summary>Crystal or device is not specified over the temperatures.</summary>
    Temperature,

    /// <summary>The crystal is beyond the device's guaranteed clock or its stated range.</summary>
    Clock,

    /// <summary>The stock does not cover the build.</summary>
    Stock,

    /// <summary>The cost limit.</summary>
    Cost,

    /// <summary>It does not build up from noise, and a disturbance is not allowed or would not help.</summary>
    Start,

    /// <summary>The start-up margin.</summary>
    Margin,

    /// <summary>The frequency error.</summary>
    Error,

    /// <summary>The crystal's drive level.</summary>
    Drive,

    /// <summary>The start-up time.</summary>
    StartUpTime,
}

/// <summary>A limit that a candidate breaks.</summary>
/// <param name="Limit">Which one.</param>
/// <param name="Sentence">How far it is off, as a sentence with the numbers in it.</param>
/// <param name="Ratio">By how much: the used share of the limit, above one.</param>
public sealed record Miss(Limit Limit, string Sentence, double Ratio)
{
    /// <summary>How far a candidate is from being fit: the sum of the logarithms of what it uses of the limits that it breaks.</summary>
    /// <param name="misses">The limits that it breaks.</param>
    internal static double Distance(ImmutableArray<Miss> misses) => misses.Sum(miss => Math.Log(Math.Max(miss.Ratio, 1)));
}
