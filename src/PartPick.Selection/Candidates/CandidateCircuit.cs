namespace PartPick.Selection;

/// <summary>A candidate as a circuit that can be checked by itself.</summary>
public static class CandidateCircuit
{
    /// <summary>The nominal circuit with its divider, target, ratings and parts.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="outputHz">Wanted output frequency in hertz.</param>
    public static CircuitDescription Describe(this Candidate candidate, double outputHz)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        CandidateParts choice = candidate.Choice;
        return new CircuitDescription
        {
            Kind = choice.Circuit,
            Circuit = candidate.Nominal,
            Tap = choice.Tap,
            TargetHz = outputHz,
            Ratings = PartPhysics.Ratings(choice.Crystal),
            Crystal = choice.Crystal,
            Amplifier = choice.Amplifier,
            C1 = choice.C1,
            C2 = choice.C2,
        };
    }
}
