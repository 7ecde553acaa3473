using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Start-up margin, drive level and start-up time at their worst corners.</summary>
internal static class CornerFigures
{
    private const string Section = "Worst corners";

    public static IEnumerable<FigureWorking> Of(Candidate candidate, Requirement requirement, CandidateStudy study)
    {
        CornerAnalysis corners = study.Corners;
        if (corners.Margin.Point is { } weakest)
        {
            yield return Margin(candidate.Margin, corners.CircuitAt(weakest), requirement);
        }

        if (candidate.Drive is { } drive && corners.Drive(study.Analysis)?.Point is { } driven
            && corners.RunningAt(study.Analysis, driven) is { } running)
        {
            yield return new FigureWorking(
                "drive level, highest", Say.Watts(drive.Value),
                "The power that the crystal dissipates while it runs, at the corner where it is highest. Beyond the crystal's rating it "
                    + "ages fast, jumps in frequency, or breaks.",
                [
                    new WorkingStep(
                        Section, $"drive level at {drive.Corner}", "Rm I^2 (I rms, Rm the stated maximum)",
                        $"{Numbers.Ohms(study.Model.Crystal.ResistanceOhms)} ({Numbers.Of(running.CurrentRmsAmps, Dimension.Current)})^2",
                        Numbers.Of(drive.Value, Dimension.Power), "definition; I from the steady state at that corner"),
                ]);
        }

        if (candidate.Drive is null)
        {
            yield return new FigureWorking(
                "drive level, highest", "none", "There is none, as a corner does not run: it has no steady state.",
                [new WorkingStep(Section, "steady state", "Re Zc(I) = -Rm", "", "none at a corner", "periodic states at all corners")]);
        }

        if (candidate.StartUpTime is { } time && corners.StartUpTime(study.Analysis)?.Point is { } slow
            && corners.RunningAt(study.Analysis, slow) is { } grown)
        {
            yield return Time(time, corners.CircuitAt(slow), grown);
        }
    }

    private static FigureWorking Margin(AtCorner margin, OscillatorCircuit circuit, Requirement requirement)
    {
        const string name = "start-up margin, least";
        string value = Numbers.Two(margin.Value);
        StartUp start = OscillatorAnalysis.AnalyseStartUp(circuit);
        double resistance = circuit.Crystal.ResistanceOhms;
        if (requirement.AllowDisturbance && start.GrowthRatePerSecond <= 0)
        {
            return new FigureWorking(
                name, value, "At this corner the circuit needs a disturbance to start; what counts there is the running margin.",
                [
                    new WorkingStep(
                        Section, $"running margin at {margin.Corner}", "largest -Re Zc(I) / Rm over the amplitude",
                        $"{Numbers.Ohms(margin.Value * resistance)} / {Numbers.Ohms(resistance)}", Numbers.Of(margin.Value),
                        "periodic states for sinusoidal motional currents"),
                ]);
        }

        return new FigureWorking(
            name, value,
            "How many times the crystal's resistance the amplifier makes up for when it is switched on, at the corner where that is "
                + "least. Below 1 it never builds up; common practice asks for 5.",
            [
                new WorkingStep(
                    Section, $"negative resistance Rn at {margin.Corner}", "-Re Zc(j w) at the natural frequency",
                    "", Numbers.Ohms(start.NegativeResistanceOhms), "node equations, solved exactly"),
                new WorkingStep(
                    Section, "start-up margin", "Rn / Rm (Rm the stated maximum)",
                    $"{Numbers.Ohms(start.NegativeResistanceOhms)} / {Numbers.Ohms(resistance)}", Numbers.Of(margin.Value),
                    "oscillation allowance; common practice asks for 5"),
            ]);
    }

    private static FigureWorking Time(AtCorner time, OscillatorCircuit circuit, RunningFigures running)
    {
        double growth = OscillatorAnalysis.FindStartFigures(circuit).GrowthRatePerSecond;
        double kelvins = circuit.TemperatureCelsius + PhysicalConstants.ZeroCelsiusKelvins;
        double inductance = circuit.Crystal.InductanceHenries;
        double thermal = Math.Sqrt(PhysicalConstants.BoltzmannJoulesPerKelvin * kelvins / inductance);
        return new FigureWorking(
            "start-up time, longest", Say.Seconds(time.Value),
            "How long the amplitude takes from thermal noise to its steady value, at the slowest corner; it counts from a settled supply.",
            [
                new WorkingStep(
                    Section, "thermal current of the motional branch", "sqrt(k T / Lm)",
                    $"sqrt(k {Numbers.Of(kelvins)} K / {Numbers.Of(inductance)} H)", $"{Numbers.Of(thermal)} A", "equipartition"),
                new WorkingStep(
                    Section, $"start-up time at {time.Corner}", "ln(I peak / I thermal) / sigma",
                    $"ln({Numbers.Of(running.CurrentRmsAmps * Math.Sqrt(2))} A / {Numbers.Of(thermal)} A) / {Numbers.Of(growth)} /s",
                    Numbers.Of(time.Value, Dimension.Time), "exponential growth from thermal noise"),
            ]);
    }
}
