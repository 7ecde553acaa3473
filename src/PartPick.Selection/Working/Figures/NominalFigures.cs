using System.Collections.Immutable;
using PartPick.Physics;
using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>The figures of the nominal circuit, with the steps of its working.</summary>
internal static class NominalFigures
{
    public static IEnumerable<FigureWorking> Of(Candidate candidate, ImmutableArray<WorkingStep> working)
    {
        StartUp start = candidate.Result.StartUp;
        double resistance = candidate.Nominal.Crystal.ResistanceOhms;
        yield return new FigureWorking(
            "start-up margin, nominal", Numbers.Two(start.Margin),
            "The start-up margin of the typical device at the middle of the supply and 25 °C, with nominal values.",
            Named("negative resistance Rn", "start-up margin"));
        if (start.CriticalSiemens is { } critical)
        {
            yield return new FigureWorking(
                "critical transconductance", Say.Siemens(critical),
                "The smallest transconductance with which the circuit builds up: there the negative resistance just makes up for the "
                    + "crystal's resistance.",
                [.. Named("critical transconductance"), Check(candidate.Nominal, critical)]);
        }

        if (start.UpperSiemens is { } upper)
        {
            yield return new FigureWorking(
                "upper transconductance", Say.Siemens(upper),
                "The transconductance beyond which the circuit no longer builds up, as C0 shorts so strong a device.",
                [.. Named("upper transconductance"), Check(candidate.Nominal, upper)]);
        }

        if (start.GainMargin is { } gain)
        {
            yield return new FigureWorking(
                "gain margin", Numbers.Two(gain),
                "How many times the critical transconductance the device has. It says less than the start-up margin: too much gain "
                    + "takes negative resistance away.",
                Named("gain margin"));
        }

        yield return new FigureWorking(
            "running margin", Numbers.Two(candidate.Result.RunningMargin),
            "The largest ratio of negative resistance to the crystal's resistance on the way from noise to the steady amplitude.",
            [
                new WorkingStep(
                    "Steady state (all harmonics)", "running margin", "largest -Re Zc(I) / Rm over the amplitude",
                    $"{Numbers.Ohms(candidate.Result.RunningMargin * resistance)} / {Numbers.Ohms(resistance)}",
                    Numbers.Of(candidate.Result.RunningMargin),
                    candidate.Result.RunningMargin == start.Margin
                        ? "it is largest at the very beginning: the start-up margin"
                        : "harmonic balance: the periodic state for a sinusoidal motional current"),
            ]);
        if (candidate.Result.Steady is { } steady)
        {
            foreach (FigureWorking figure in OfSteady(steady))
            {
                yield return figure;
            }
        }

        ImmutableArray<WorkingStep> Named(params string[] quantities) =>
            [.. quantities.Select(quantity => working.First(step => step.Quantity == quantity))];

        IEnumerable<FigureWorking> OfSteady(SteadyState state)
        {
            yield return new FigureWorking(
                "load capacitance", Say.Farads(state.LoadFarads),
                "The capacitance that the crystal sees outside its own C0 while it runs: the load at which this crystal would run at "
                    + "this frequency.",
                Named("load seen by the crystal"));
            yield return new FigureWorking(
                "frequency at the crystal", Say.Hertz(state.FrequencyHz),
                "The frequency at which the circuit runs with nominal values, before any divider.",
                [
                    .. Named("series resonance fs"),
                    new WorkingStep(
                        "Steady state (all harmonics)", "frequency f", "fs sqrt(1 + Cm/(C0 + C)), C the load capacitance",
                        $"{Numbers.Finely(candidate.Nominal.Crystal.SeriesHz)} sqrt(1 + "
                            + $"{Numbers.Farads(candidate.Nominal.Crystal.MotionalFarads)}"
                            + $"/({Numbers.Farads(candidate.Nominal.Crystal.ShuntFarads)} + {Numbers.Farads(state.LoadFarads)}))",
                        Numbers.Finely(state.FrequencyHz), "loaded frequency; f itself comes from the steady state"),
                ]);
            yield return new FigureWorking(
                "output frequency", Say.Hertz(candidate.OutputHz!.Value), "What comes out, after the divider stage that is used.",
                Named("output frequency"));
            yield return new FigureWorking(
                "drive level, nominal", Say.Watts(state.DriveWatts), "The power that the crystal dissipates, with nominal values.",
                Named("drive level P"));
            yield return new FigureWorking(
                "output swing", Say.Volts(state.OutputSwingVolts),
                "The output voltage from its lowest to its highest point of the period, with nominal values"
                    + (candidate.Nominal is GateCircuit ? "." : ", at the emitter."),
                [
                    new WorkingStep(
                        "Steady state (all harmonics)", "output swing (peak to peak)",
                        "highest less lowest output voltage"
                            + (candidate.Nominal is GateCircuit ? ", against half the supply" : ", against ground"),
                        $"{Numbers.Of(state.OutputHighVolts, Dimension.Voltage)} - ({Numbers.Of(state.OutputLowVolts, Dimension.Voltage)})",
                        Numbers.Of(state.OutputSwingVolts, Dimension.Voltage), "the periodic state at the running amplitude"),
                ]);
        }
    }

    // With just that transconductance the negative resistance is the crystal's.
    private static WorkingStep Check(OscillatorCircuit circuit, double siemens)
    {
        StartUp there = OscillatorAnalysis.AnalyseStartUp(With(circuit, siemens));
        return new WorkingStep(
            "Start-up (small signals at the bias point)", "margin with just that much", "Rn / Rm, 1 where growth turns to decay",
            $"{Numbers.Ohms(there.NegativeResistanceOhms)} / {Numbers.Ohms(circuit.Crystal.ResistanceOhms)}",
            Numbers.Of(there.Margin), "node equations, solved exactly; a check");
    }

    private static OscillatorCircuit With(OscillatorCircuit circuit, double siemens) => circuit switch
    {
        GateCircuit { Inverter: OneStageInverter one } gate => gate with { Inverter = one with { Gm = siemens } },
        GateCircuit { Inverter: BufferedInverter chain } gate => gate with { Inverter = chain with { Gain = siemens * chain.Ron } },
        FollowerCircuit follower => follower with
        {
            EmitterCurrentAmps = siemens * FollowerBias.Solve(follower).ThermalVolts
                * (follower.Transistor.Beta + 1) / follower.Transistor.Beta,
        },
        _ => circuit,
    };
}
