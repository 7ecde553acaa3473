using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The large-signal steady state.</summary>
internal static class SteadyWorking
{
    private const string Section = "Steady state (all harmonics)";
    private const string Balance = "harmonic balance: the periodic state for a sinusoidal motional current";

    public static IEnumerable<WorkingStep> Of(CircuitDescription description, OscillatorResult result)
    {
        yield return new WorkingStep(Section, "running margin", "largest -Re Zc(I) / Rm over the amplitude", "",
            Numbers.Of(result.RunningMargin), Balance);
        if (result.Steady is not { } steady)
        {
            yield return new WorkingStep(Section, "steady state", "Re Zc(I) = -Rm", "", "none", Balance);
            yield break;
        }

        Crystal crystal = description.Circuit.Crystal;
        yield return new WorkingStep(Section, "Zc(I) = V1 / I at the running amplitude",
            "Re Zc(I) = -Rm, Im Zc(I) = -(w Lm - 1/(w Cm))", "",
            Numbers.Ohms(-crystal.ResistanceOhms, -StartWorking.Reactance(crystal, steady.FrequencyHz)), Balance);
        yield return new WorkingStep(Section, "frequency at the crystal f", "the frequency at which both hold", "",
            Numbers.Hertz(steady.FrequencyHz), Balance);
        yield return new WorkingStep(Section, "motional current (rms)", "the amplitude at which both hold", "",
            Numbers.Of(steady.CurrentRmsAmps, Dimension.Current), Balance);
        yield return new WorkingStep(Section, "load seen by the crystal", "Cm / ((f/fs)^2 - 1) - C0",
            $"{Numbers.Farads(crystal.MotionalFarads)} / (({Numbers.Hertz(steady.FrequencyHz)}/{Numbers.Hertz(crystal.SeriesHz)})^2 - 1) - "
            + Numbers.Farads(crystal.ShuntFarads), Numbers.Farads(steady.LoadFarads), "loaded frequency solved for the load");
        yield return new WorkingStep(Section, "drive level P", "Rm I^2",
            $"{Numbers.Ohms(crystal.ResistanceOhms)} ({Numbers.Of(steady.CurrentRmsAmps, Dimension.Current)})^2",
            Numbers.Of(steady.DriveWatts, Dimension.Power), "definition");
        yield return new WorkingStep(Section, "output swing (peak to peak)", "largest less smallest output voltage of the period", "",
            Numbers.Of(steady.OutputSwingVolts, Dimension.Voltage), Balance);
        if (description.Circuit is GateCircuit)
        {
            yield return new WorkingStep(Section, "bound of the output's first harmonic", "2 VDD / pi (peak)",
                $"2 {Numbers.Of(description.Circuit.SupplyVolts)} V / pi",
                Numbers.Of(2 * description.Circuit.SupplyVolts / Math.PI, Dimension.Voltage), "Fourier series of a square wave, a check");
        }

        yield return new WorkingStep(Section, "output frequency", "f / 2^k", $"{Numbers.Hertz(steady.FrequencyHz)} / 2^{description.Tap}",
            Numbers.Hertz(steady.FrequencyHz / Math.Pow(2, description.Tap)), "binary divider");
        yield return new WorkingStep(Section, "error e0", description.TargetHz is null ? "f / fN - 1" : "f / (2^k target) - 1",
            $"{Numbers.Hertz(steady.FrequencyHz)} / {Numbers.Hertz(description.ReferenceHz)} - 1",
            $"{Numbers.Of(CircuitResults.ErrorRatio(description, steady.FrequencyHz) * 1e6)} ppm", "definition");
    }
}
