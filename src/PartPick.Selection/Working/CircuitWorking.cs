using System.Collections.Immutable;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>The working behind a circuit's figures: every formula of the model with this circuit's numbers and its source.</summary>
public static class CircuitWorking
{
    /// <summary>All steps, in the order in which they are taken.</summary>
    /// <param name="description">The circuit.</param>
    /// <param name="result">Its analysis.</param>
    public static ImmutableArray<WorkingStep> Of(CircuitDescription description, OscillatorResult result)
    {
        ArgumentNullException.ThrowIfNull(description);
        ArgumentNullException.ThrowIfNull(result);
        return
        [
            .. CrystalWorking.Of(description.Circuit.Crystal),
            .. description.Circuit switch
            {
                GateCircuit gate => GateWorking.Of(gate),
                FollowerCircuit follower => FollowerWorking.Of(follower),
                _ => [],
            },
            .. StartWorking.Of(description, result),
            .. SteadyWorking.Of(description, result),
        ];
    }
}
