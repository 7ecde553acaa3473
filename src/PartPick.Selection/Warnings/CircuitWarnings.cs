using System.Collections.Immutable;
using PartPick.Physics;

namespace PartPick.Selection;

/// <summary>What a circuit's figures and parts give cause to say, as sentences with the numbers in them.</summary>
public static class CircuitWarnings
{
    /// <summary>All warnings, the gravest kind first; none where nothing is to be said.</summary>
    /// <param name="description">The circuit.</param>
    /// <param name="result">Its analysis.</param>
    public static ImmutableArray<string> Of(CircuitDescription description, OscillatorResult result)
    {
        ArgumentNullException.ThrowIfNull(description);
        ArgumentNullException.ThrowIfNull(result);
        return
        [
            .. StartWarnings.Of(description, result),
            .. DriveWarnings.Of(description, result),
            .. DeviceWarnings.Of(description),
            .. CrystalWarnings.Of(description, result),
            .. BiasWarnings.Of(description, result),
            .. CapacitorWarnings.Of(description),
            .. AssumedWarnings.Of(description),
        ];
    }
}
