using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>Warnings about the bias: the feedback resistor of an inverter, the current and swing of a follower.</summary>
internal static class BiasWarnings
{
    public static IEnumerable<string> Of(CircuitDescription description, OscillatorResult result)
    {
        if (description is { Kind: CircuitKind.Gate or CircuitKind.Counter, Circuit: GateCircuit gate }
            && Feedback(gate) is { } feedback)
        {
            yield return feedback;
        }

        if (result.Steady is { LimitedBySupply: true } steady)
        {
            yield return $"The supply of {Say.Volts(description.Circuit.SupplyVolts)} limits the amplitude: the collector junction "
                + $"conducts within the cycle, at a swing of {Say.Volts(steady.OutputSwingVolts)} at the emitter.";
        }

        if (description.Amplifier is TransistorPart { CurrentMaxAmperes: { } most } && result.EmitterCurrentAmps > most)
        {
            yield return $"The emitter current of {Say.Amps(result.EmitterCurrentAmps.Value)} is above the {Say.Amps(most)} "
                + $"that {description.Amplifier.Id} bears.";
        }
    }

    private static string? Feedback(GateCircuit gate)
    {
        FeedbackRange usual = FeedbackRange.At(gate.Crystal.NominalHz);
        string range = $"{Say.Ohms(usual.LeastOhms)} to {Say.Ohms(usual.MostOhms)}, usual at {Say.Hertz(gate.Crystal.NominalHz)}";
        return double.IsPositiveInfinity(gate.FeedbackOhms)
            ? $"There is no feedback resistor: one of {range}, has to hold the inverter at half its supply."
            : gate.FeedbackOhms < usual.LeastOhms || gate.FeedbackOhms > usual.MostOhms
                ? $"The feedback resistor of {Say.Ohms(gate.FeedbackOhms)} is outside the {range}."
                : null;
    }
}
