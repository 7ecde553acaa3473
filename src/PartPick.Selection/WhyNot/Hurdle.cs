namespace PartPick.Selection;

/// <summary>What keeps a part out before any circuit with it is looked at.</summary>
/// <param name="Name">What it is, in words.</param>
/// <param name="Wanted">What is wanted, with its unit; empty where nothing of the requirement is meant.</param>
/// <param name="Has">What the part has.</param>
/// <param name="Distance">How far apart they are, in words; empty where that cannot be said.</param>
/// <param name="CanBeLifted">Whether some change of the requirement, or of how the part is kept, lifts it.</param>
public sealed record Hurdle(HurdleName Name, string Wanted, string Has, string Distance, bool CanBeLifted);

/// <summary>The kinds of <see cref="Hurdle"/>.</summary>
public enum HurdleName
{
    /// <summary>Excluded by hand, or by its list.</summary>
    Excluded,

    /// <summary>A crystal on an overtone, which these circuits do not reach.</summary>
    Overtone,

    /// <summary>No price in the currency of the catalogue.</summary>
    Price,

    /// <summary>Too few in stock.</summary>
    Stock,

    /// <summary>The circuit or the waveform is not wanted.</summary>
    Circuit,

    /// <summary>No divider stage gives the output frequency.</summary>
    Frequency,

    /// <summary>The device is not specified over the supply.</summary>
    Supply,

    /// <summary>The part is not specified over the temperatures.</summary>
    Temperature,

    /// <summary>The crystal is beyond the device's guaranteed clock, or outside its range.</summary>
    Clock,
}
