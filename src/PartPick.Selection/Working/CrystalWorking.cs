using PartPick.Physics;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The crystal's equivalent circuit.</summary>
internal static class CrystalWorking
{
    private const string Section = "Crystal (Butterworth-Van Dyke equivalent)";

    public static IEnumerable<WorkingStep> Of(Crystal crystal)
    {
        string nominal = Numbers.Hertz(crystal.NominalHz);
        string motional = Numbers.Farads(crystal.MotionalFarads);
        string shunt = Numbers.Farads(crystal.ShuntFarads);
        string series = Numbers.Hertz(crystal.SeriesHz);
        if (crystal.LoadFarads is { } load)
        {
            yield return new WorkingStep(Section, "series resonance fs", "fN / sqrt(1 + Cm/(C0 + CL))",
                $"{nominal} / sqrt(1 + {motional}/({shunt} + {Numbers.Farads(load)}))",
                series,
                "series and parallel resonance of the equivalent circuit");
        }
        else
        {
            yield return new WorkingStep(Section, "series resonance fs", "fN, stated at series resonance", "", series, "");
        }

        yield return new WorkingStep(Section, "motional inductance Lm", "1 / ((2 pi fs)^2 Cm)", $"1 / ((2 pi {series})^2 {motional})",
            $"{Numbers.Of(crystal.InductanceHenries)} H", "resonance of the motional branch");
        yield return new WorkingStep(Section, "quality factor Q", "1 / (2 pi fs Rm Cm)",
            $"1 / (2 pi {series} {Numbers.Ohms(crystal.ResistanceOhms)} {motional})", Numbers.Of(crystal.QualityFactor), "definition");
        if (crystal.LoadFarads is { } at)
        {
            yield return new WorkingStep(Section, "trim sensitivity at CL", "-Cm / (2 (C0 + CL)^2)",
                $"-{motional} / (2 ({shunt} + {Numbers.Farads(at)})^2)",
                $"{Numbers.Of(crystal.TrimSensitivityPerFarad(at) * 1e-12 * 1e6)} ppm/pF", "derivative of the loaded frequency");
            yield return new WorkingStep(Section, "resistance at load RL", "Rm (1 + C0/CL)^2",
                $"{Numbers.Ohms(crystal.ResistanceOhms)} (1 + {shunt}/{Numbers.Farads(at)})^2",
                Numbers.Of(crystal.ResistanceAtLoadOhms(at), Dimension.Resistance), "equivalent circuit at its loaded frequency");
        }
    }
}
