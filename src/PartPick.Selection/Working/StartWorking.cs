using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Small signals at the bias point.</summary>
internal static class StartWorking
{
    private const string Section = "Start-up (small signals at the bias point)";
    private const string Nodes = "node equations, solved exactly";
    private const string Vittoz = "Vittoz, Degrauwe, Bitz, IEEE J. Solid-State Circuits 23(3), 1988; lossless network, a check";

    public static IEnumerable<WorkingStep> Of(CircuitDescription description, OscillatorResult result)
    {
        Crystal crystal = description.Circuit.Crystal;
        StartUp start = result.StartUp;
        double omega = 2 * Math.PI * start.NaturalHz;
        double resistance = crystal.ResistanceOhms;
        yield return new WorkingStep(Section, "natural frequency and growth rate sigma",
            "Rm + s Lm + 1/(s Cm) + Zc(s; gm) = 0 near j 2 pi fs",
            "", $"{Numbers.Hertz(start.NaturalHz)}, sigma = {Numbers.Of(start.GrowthRatePerSecond)} /s", Nodes);
        yield return new WorkingStep(Section, "Zc at this frequency", "impedance between the crystal's terminals, C0 inside, at gm",
            $"gm = {Numbers.Siemens(start.TransconductanceSiemens)}",
            Numbers.Ohms(-start.NegativeResistanceOhms, -Reactance(crystal, start.NaturalHz)), Nodes);
        yield return new WorkingStep(
            Section, "negative resistance Rn", "-Re Zc", "", Numbers.Ohms(start.NegativeResistanceOhms), "definition");
        yield return new WorkingStep(Section, "start-up margin", "Rn / Rm",
            $"{Numbers.Ohms(start.NegativeResistanceOhms)} / {Numbers.Ohms(resistance)}", Numbers.Of(start.Margin),
            "oscillation allowance; common practice asks for 5");
        yield return new WorkingStep(Section, "critical transconductance", "the smallest gm with sigma = 0", "",
            start.CriticalSiemens is { } critical ? Numbers.Siemens(critical) : "none", Nodes);
        yield return new WorkingStep(Section, "upper transconductance", "the larger gm with sigma = 0", "",
            start.UpperSiemens is { } upper ? Numbers.Siemens(upper) : "none", Nodes);
        if (start.GainMargin is { } gain)
        {
            yield return new WorkingStep(Section, "gain margin", "gm / gm,crit",
                $"{Numbers.Siemens(start.TransconductanceSiemens)} / {Numbers.Siemens(start.CriticalSiemens!.Value)}",
                Numbers.Of(gain), "definition");
        }

        foreach (WorkingStep step in Checks(description.Circuit, omega))
        {
            yield return step;
        }

        yield return new WorkingStep(Section, "growth rate by the envelope", "(Rn - Rm) / (2 Lm)",
            $"({Numbers.Ohms(start.NegativeResistanceOhms)} - {Numbers.Ohms(resistance)}) / (2 {Numbers.Of(crystal.InductanceHenries)} H)",
            $"{Numbers.Of((start.NegativeResistanceOhms - resistance) / (2 * crystal.InductanceHenries))} /s",
            "series resonant circuit, a check");
        if (result.StartUpTimeSeconds is { } time && result.Steady is { } steady)
        {
            double kelvins = description.Circuit.TemperatureCelsius + PhysicalConstants.ZeroCelsiusKelvins;
            double thermal = Math.Sqrt(PhysicalConstants.BoltzmannJoulesPerKelvin * kelvins / crystal.InductanceHenries);
            yield return new WorkingStep(Section, "thermal current of the motional branch", "sqrt(k T / Lm)",
                $"sqrt(k {Numbers.Of(kelvins)} K / {Numbers.Of(crystal.InductanceHenries)} H)",
                $"{Numbers.Of(thermal)} A", "equipartition");
            yield return new WorkingStep(Section, "start-up time", "ln(I peak / I thermal) / sigma",
                $"ln({Numbers.Of(steady.CurrentRmsAmps * Math.Sqrt(2))} A / {Numbers.Of(thermal)} A) "
                    + $"/ {Numbers.Of(start.GrowthRatePerSecond)} /s",
                Numbers.Of(time, Dimension.Time), "exponential growth from thermal noise");
        }
    }

    /// <summary>Reactance in ohms of the motional branch at a frequency.</summary>
    public static double Reactance(Crystal crystal, double hertz)
    {
        double shift = (hertz - crystal.SeriesHz) / crystal.SeriesHz;
        return shift * (2 + shift) / (1 + shift) / (2 * Math.PI * crystal.SeriesHz * crystal.MotionalFarads);
    }

    private static IEnumerable<WorkingStep> Checks(OscillatorCircuit circuit, double omega)
    {
        (double first, double second) = circuit switch
        {
            GateCircuit gate => (gate.C1Farads + gate.Inverter.InputFarads + gate.Strays.InputFarads,
                gate.C2Farads + gate.Strays.OutputFarads + gate.Inverter.OutputFarads),
            _ => (circuit.C1Farads, circuit.C2Farads + circuit.Strays.OutputFarads),
        };
        double third = circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads;
        double sum = first * second + second * third + third * first;
        string capacitances =
            $"C1 = {Numbers.Farads(first)}, C2 = {Numbers.Farads(second)}, C3 = {Numbers.Farads(third)} with pins and strays";
        yield return new WorkingStep(Section, "critical transconductance, closed form",
            "w^2 Rm (C1 C2 + C2 C3 + C3 C1)^2 / (C1 C2)", capacitances,
            Numbers.Siemens(omega * omega * circuit.Crystal.ResistanceOhms * sum * sum / (first * second)), Vittoz);
        if (third > 0)
        {
            yield return new WorkingStep(Section, "largest negative resistance, closed form",
                "1 / (2 w C3 (1 + C3 (C1 + C2)/(C1 C2)))", capacitances,
                Numbers.Ohms(1 / (2 * omega * third * (1 + third * (first + second) / (first * second)))), Vittoz);
        }
    }
}
