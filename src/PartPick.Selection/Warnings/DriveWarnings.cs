using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>Warnings about the drive level, with the damping resistor that would cure it.</summary>
internal static class DriveWarnings
{
    /// <summary>Drive level in watts that a tuning fork bears where none is stated (makers' tables: 0.5 to 1 µW).</summary>
    private const double TuningForkWatts = 1e-6;

    private const double HighestTuningForkHz = 200e3;

    public static IEnumerable<string> Of(CircuitDescription description, OscillatorResult result)
    {
        if (result.Steady is not { } steady)
        {
            yield break;
        }

        bool fork = description.Crystal is { } part
            ? part.Cut == CrystalCut.Fork
            : description.Circuit.Crystal.NominalHz < HighestTuningForkHz;
        if (description.Ratings.DriveLevelWatts is { } rated)
        {
            if (steady.DriveWatts > rated)
            {
                yield return TooHigh(description.Circuit, steady.DriveWatts, rated, "rated for", fork);
            }
        }
        else if (fork && steady.DriveWatts > TuningForkWatts)
        {
            yield return TooHigh(description.Circuit, steady.DriveWatts, TuningForkWatts, "as a tuning fork usually rated for", fork);
        }
    }

    private static string TooHigh(OscillatorCircuit circuit, double watts, double rated, string basis, bool fork)
    {
        string harm = fork ? "; a tuning fork shifts and can break" : "";
        return $"The drive level of {Say.Watts(watts)} is {Say.Number(watts / rated)} times the {Say.Watts(rated)} that the crystal is "
            + $"{basis}{harm}; {Cure(circuit, rated)}.";
    }

    private static string Cure(OscillatorCircuit circuit, double rated)
    {
        if (circuit is not GateCircuit gate)
        {
            return "a larger RE, and so less emitter current, lowers it";
        }

        return DampingCure.Find(gate, rated, StartWarnings.UsualMargin) is { } cure
            ? $"Rs = {Say.Ohms(cure.Ohms)} would bring it to {Say.Watts(cure.DriveWatts)} "
                + $"with a start-up margin of {Say.Number(cure.Margin)}"
            : $"no damping resistor Rs of the E12 series brings it there with a start-up margin of {Say.Number(StartWarnings.UsualMargin)} "
                + "left: take smaller capacitors, a lower supply or a crystal for more drive";
    }
}
