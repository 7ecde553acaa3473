using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The network and the device of a gate, counter or port circuit.</summary>
internal static class GateWorking
{
    private const string Network = "Network (nodes A input, B crystal's far side, D output)";
    private const string Device = "Inverter";

    public static IEnumerable<WorkingStep> Of(GateCircuit gate)
    {
        Inverter inverter = gate.Inverter;
        yield return Capacitance("A to ground", "C1 + Cin + Cs,in", gate.C1Farads, inverter.InputFarads, gate.Strays.InputFarads);
        yield return Capacitance("B to ground", "C2 + Cs,out", gate.C2Farads, gate.Strays.OutputFarads);
        yield return Capacitance("A to B (C3)", "C0 + Cs,across", gate.Crystal.ShuntFarads, gate.Strays.AcrossFarads);
        yield return Capacitance("A to D", "Cf", inverter.FeedbackFarads);
        yield return Capacitance("D to ground", "Cout", inverter.OutputFarads);
        yield return new WorkingStep(Network, "resistors", "Rf from A to D, Rs from D to B, Ro from D to ground", "",
            $"Rf {Numbers.Ohms(gate.FeedbackOhms)}, Rs {Numbers.Ohms(gate.SeriesOhms)}, Ro {Numbers.Ohms(inverter.OutputOhms)}", "");
        IEnumerable<WorkingStep> device =
            inverter is OneStageInverter one ? OneStage(one, gate.SupplyVolts) : Buffered(inverter, gate.SupplyVolts);
        foreach (WorkingStep step in device)
        {
            yield return step;
        }

        if (inverter.DelaySeconds > 0)
        {
            yield return new WorkingStep(Device, "excess delay", "phase factor e^(-s tau)", "",
                Numbers.Of(inverter.DelaySeconds, Dimension.Time), "");
        }
    }

    private static WorkingStep Capacitance(string place, string formula, params double[] parts) => new(
        Network, "capacitance " + place, formula, parts.Length > 1 ? string.Join(" + ", parts.Select(Numbers.Farads)) : "",
        Numbers.Farads(parts.Sum()), "");

    private static IEnumerable<WorkingStep> OneStage(OneStageInverter one, double supply)
    {
        const string source = "Shichman and Hodges 1968, square-law transistors, fitted to gm and Ro at mid-supply";
        double swing = one.SwingVolts ?? supply;
        double v = swing / 2 - one.ThresholdVolts;
        yield return new WorkingStep(Device, "overdrive v", one.SwingVolts is null ? "VDD/2 - Vt" : "swing/2 - Vt",
            $"{Numbers.Of(swing)} V/2 - {Numbers.Of(one.ThresholdVolts)} V", $"{Numbers.Of(v)} V", source);
        if (v <= 0)
        {
            yield break;
        }

        double q = 2 / (one.Gm * one.Ro * v);
        double free = q / (1 - q * swing / 2);
        double lambda = free >= 0 && free <= 0.2 ? free : 0.2;
        double k = one.Gm / (2 * v * (1 + lambda * swing / 2));
        double rest = 1 / one.Ro - k * v * v * lambda;
        rest = rest > 1e-12 / one.Ro ? rest : 0;
        yield return new WorkingStep(Device, "q", "2 / (gm Ro v)",
            $"2 / ({Numbers.Siemens(one.Gm)} {Numbers.Ohms(one.Ro)} {Numbers.Of(v)} V)",
            $"{Numbers.Of(q)} /V", source);
        yield return new WorkingStep(Device, "channel-length modulation lambda", "q / (1 - q VDD/2), at most 0.2 /V",
            $"{Numbers.Of(q)} / (1 - {Numbers.Of(q)} {Numbers.Of(swing / 2)})", $"{Numbers.Of(lambda)} /V", source);
        yield return new WorkingStep(Device, "transconductance factor k", "gm / (2 v (1 + lambda VDD/2))",
            $"{Numbers.Siemens(one.Gm)} / (2 {Numbers.Of(v)} V (1 + {Numbers.Of(lambda)} {Numbers.Of(swing / 2)}))",
            $"{Numbers.Of(k)} A/V^2", source);
        yield return new WorkingStep(Device, "linear conductance left at the output", "1/Ro - k v^2 lambda, where positive",
            $"1/{Numbers.Ohms(one.Ro)} - {Numbers.Of(k)} {Numbers.Of(v)}^2 {Numbers.Of(lambda)}", Numbers.Siemens(rest), source);
    }

    private static IEnumerable<WorkingStep> Buffered(Inverter inverter, double supply)
    {
        var buffered = (BufferedInverter)inverter;
        yield return new WorkingStep(Device, "characteristic", "-(VDD/2) tanh(2 a v/VDD) behind Ron", "",
            $"a = {Numbers.Of(buffered.Gain)}, VDD = {Numbers.Of(supply)} V, Ron = {Numbers.Ohms(buffered.Ron)}",
            "saturating chain of stages");
        yield return new WorkingStep(Device, "transconductance gm", "a / Ron",
            $"{Numbers.Of(buffered.Gain)} / {Numbers.Ohms(buffered.Ron)}",
            Numbers.Siemens(buffered.TransconductanceSiemens), "slope at mid-supply");
    }
}
