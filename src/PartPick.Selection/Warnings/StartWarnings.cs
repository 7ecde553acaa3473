using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Selection;

/// <summary>Warnings about the start: too little gain or too much, a thin margin.</summary>
internal static class StartWarnings
{
    /// <summary>Start-up margin that common practice asks for.</summary>
    public const double UsualMargin = 5;

    /// <summary>Start-up margin below which common practice calls a circuit unreliable.</summary>
    public const double UnreliableMargin = 3;

    public static IEnumerable<string> Of(CircuitDescription description, OscillatorResult result)
    {
        StartUp start = result.StartUp;
        bool tooMuch = start.UpperSiemens is { } upper && start.TransconductanceSiemens > upper;
        if (tooMuch)
        {
            yield return TooMuchGain(description.Circuit, start, start.UpperSiemens!.Value);
        }

        if (result.Start == StartKind.NeedsDisturbance)
        {
            yield return $"It does not build up from noise and needs a disturbance, such as the step of the supply, to start: "
                + $"its running margin is {Say.Number(result.RunningMargin)}, but nothing guarantees the start.";
        }
        else if (result.Start == StartKind.None)
        {
            yield return NoStart(start) + Cure(description.Circuit);
        }
        else if (Thin(start.Margin) is { } thin)
        {
            yield return thin;
        }

        if (description.Circuit is GateCircuit { Inverter: BufferedInverter buffered })
        {
            yield return $"The inverter is buffered, with a voltage gain of {Say.Number(buffered.Gain)}: such a gain makes the start "
                + "uncertain and the frequency depend on its delay; an unbuffered inverter is made for this.";
        }

        if (description.Circuit is GateCircuit { Inverter: OneStageInverter one } && NoOverdrive(one, description.Circuit.SupplyVolts))
        {
            yield return $"At {Say.Volts(one.SwingVolts ?? description.Circuit.SupplyVolts)} the inverter has no gain: half of that "
                + $"is not above its threshold of {Say.Volts(one.ThresholdVolts)}.";
        }
    }

    private static bool NoOverdrive(OneStageInverter inverter, double supplyVolts) =>
        (inverter.SwingVolts ?? supplyVolts) / 2 <= inverter.ThresholdVolts;

    private static string TooMuchGain(OscillatorCircuit circuit, StartUp start, double upper)
    {
        string cures = circuit is GateCircuit { Inverter: BufferedInverter }
            ? "an unbuffered inverter, larger C1 and C2, or a larger Rs"
            : circuit is GateCircuit ? "a weaker inverter, larger C1 and C2, or a larger Rs" : "larger C1 and C2, or a larger RE";
        return $"There is too much gain: the transconductance of {Say.Siemens(start.TransconductanceSiemens)} is above the "
            + $"{Say.Siemens(upper)} at which growth ends, because the capacitance across the crystal then shorts the amplifier; "
            + $"cures are {cures}.";
    }

    private static string NoStart(StartUp start) => start.CriticalSiemens is { } critical
        ? $"It does not start: the start-up margin is {Say.Number(start.Margin)} and at least 1 is needed; "
            + $"the transconductance is {Say.Siemens(start.TransconductanceSiemens)} and the critical one {Say.Siemens(critical)}"
        : $"It does not start: the start-up margin is {Say.Number(start.Margin)}, and no transconductance would start this circuit";

    private static string Cure(OscillatorCircuit circuit) =>
        circuit is GateCircuit gate && DampingCure.FindStart(gate, UsualMargin) is { } cure
            ? $"; Rs = {Say.Ohms(cure.Ohms)} would give it a start-up margin of {Say.Number(cure.Margin)}."
            : ".";

    private static string? Thin(double margin) => margin switch
    {
        < UnreliableMargin => $"The start-up margin of {Say.Number(margin)} is below {Say.Number(UnreliableMargin)}, which common "
            + $"practice calls unreliable; it asks for {Say.Number(UsualMargin)}.",
        < UsualMargin =>
            $"The start-up margin of {Say.Number(margin)} is below the {Say.Number(UsualMargin)} that common practice asks for.",
        _ => null,
    };
}
