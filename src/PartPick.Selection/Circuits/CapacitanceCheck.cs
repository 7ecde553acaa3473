using PartPick.Physics.Circuits;
using PartPick.Selection.Files;

namespace PartPick.Selection;

/// <summary>A three-point oscillator divides by its two capacitances; without either there is no circuit to analyse.</summary>
internal static class CapacitanceCheck
{
    private const string Fits = "a capacitance such as 22 pF";

    /// <summary>Notes a problem where a node has no capacitance at all.</summary>
    public static void Of(FieldReader fields, OscillatorCircuit circuit)
    {
        double first = circuit.C1Farads + circuit switch
        {
            GateCircuit gate => gate.Inverter.InputFarads + circuit.Strays.InputFarads,
            FollowerCircuit follower => follower.Transistor.JunctionFarads + follower.Transistor.TransitSeconds,
            _ => 0,
        };
        if (first == 0)
        {
            fields.Reject("c1", "is missing and nothing stands in for it", Fits);
        }

        if (circuit.C2Farads + circuit.Strays.OutputFarads == 0)
        {
            fields.Reject("c2", "is missing and nothing stands in for it", Fits);
        }
    }
}
