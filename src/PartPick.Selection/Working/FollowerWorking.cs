using PartPick.Physics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The bias, the network and the device of a follower.</summary>
internal static class FollowerWorking
{
    private const string Network = "Network (nodes B base, I internal base, E emitter)";
    private const string Device = "Transistor and bias";

    public static IEnumerable<WorkingStep> Of(FollowerCircuit follower)
    {
        FollowerBias bias = FollowerBias.Solve(follower);
        double beta = follower.Transistor.Beta;
        double gm = bias.TransconductanceSiemens;
        const string ebers = "Ebers and Moll 1954";
        yield return new WorkingStep(Device, "thermal voltage VT", "k T / q",
            $"k ({Numbers.Of(follower.TemperatureCelsius)} + {Numbers.Of(PhysicalConstants.ZeroCelsiusKelvins)}) K / q",
            Numbers.Of(bias.ThermalVolts, Dimension.Voltage), "SI constants");
        yield return new WorkingStep(Device, "saturation current Is", "1 mA e^(-VBE/VT), VBE less 2 mV/K from 25 °C",
            $"1 mA e^(-({Numbers.Of(follower.Transistor.BaseEmitterVolts)} V "
                + $"- 2 mV/K ({Numbers.Of(follower.TemperatureCelsius)} - 25) K)/VT)",
            $"{Numbers.Of(bias.SaturationAmps)} A", ebers);
        yield return new WorkingStep(Device, "emitter current IE",
            follower.EmitterCurrentAmps is null ? "the bias network solved with the exponential law" : "given", "",
            Numbers.Of(bias.EmitterAmps, Dimension.Current), follower.EmitterCurrentAmps is null ? ebers : "");
        yield return new WorkingStep(Device, "transconductance gm", "IE beta/(beta + 1) / VT",
            $"{Numbers.Of(bias.EmitterAmps, Dimension.Current)} {Numbers.Of(beta)}/({Numbers.Of(beta)} + 1) "
                + $"/ {Numbers.Of(bias.ThermalVolts, Dimension.Voltage)}",
            Numbers.Siemens(gm), ebers);
        yield return new WorkingStep(Device, "input conductance g(pi)", "gm / beta", $"{Numbers.Siemens(gm)} / {Numbers.Of(beta)}",
            Numbers.Siemens(gm / beta), ebers);
        yield return new WorkingStep(Device, "input capacitance C(pi)", "Cje + gm tauF",
            $"{Numbers.Farads(follower.Transistor.JunctionFarads)} + {Numbers.Siemens(gm)} "
                + Numbers.Of(follower.Transistor.TransitSeconds, Dimension.Time),
            Numbers.Farads(follower.Transistor.JunctionFarads + gm * follower.Transistor.TransitSeconds), "charge control");
        yield return Capacitance("B to ground (C3)", "C0 + Cs,across", follower.Crystal.ShuntFarads, follower.Strays.AcrossFarads);
        yield return Capacitance("B to E", "C1", follower.C1Farads);
        yield return Capacitance("E to ground", "C2 + Cs,out", follower.C2Farads, follower.Strays.OutputFarads);
        yield return Capacitance("I to ground", "Cmu", follower.Transistor.CollectorFarads);
        double baseOhms = 1 / (1 / follower.BaseTopOhms + 1 / follower.BaseBottomOhms);
        yield return new WorkingStep(Network, "resistors", "RB at B, rbb from B to I, RE and RL at E", "",
            $"RB {Numbers.Ohms(baseOhms)}, rbb {Numbers.Ohms(follower.Transistor.BaseSpreadingOhms)}, "
            + $"RE {Numbers.Ohms(follower.EmitterOhms)}, RL {Numbers.Ohms(follower.LoadOhms)}", "");
    }

    private static WorkingStep Capacitance(string place, string formula, params double[] parts) => new(
        Network, "capacitance " + place, formula, parts.Length > 1 ? string.Join(" + ", parts.Select(Numbers.Farads)) : "",
        Numbers.Farads(parts.Sum()), "");
}
