using PartPick.Physics;
using PartPick.Physics.Circuits;

namespace PartPick.Selection;

/// <summary>
/// How the frequency of a circuit changes with its capacitances, from one Newton step each off a known running state: many times
/// cheaper than solved differences, and within a few per cent.
/// </summary>
internal static class FirstOrderSlopes
{
    private const double Share = 0.002;

    /// <summary>∂f/f by C1, C2 and what stands across the crystal, per farad; not a number where not found.</summary>
    /// <param name="circuit">The circuit.</param>
    /// <param name="state">Its running state.</param>
    /// <param name="hertz">Its frequency in hertz, as the state gives it.</param>
    public static (double C1, double C2, double Across) PerFarad(OscillatorCircuit circuit, RunningState state, double hertz)
    {
        double across = circuit.Crystal.ShuntFarads + circuit.Strays.AcrossFarads + 1e-12;
        return (
            Slope(Share * circuit.C1Farads, step => circuit with { C1Farads = circuit.C1Farads + step }),
            Slope(Share * circuit.C2Farads, step => circuit with { C2Farads = circuit.C2Farads + step }),
            Slope(Share * across, step => circuit with
            {
                Strays = circuit.Strays with { AcrossFarads = circuit.Strays.AcrossFarads + step },
            }));

        double Slope(double step, Func<double, OscillatorCircuit> shifted) =>
            OscillatorAnalysis.FindFirstOrderFrequencyHz(shifted(step), state) is { } there ? (there - hertz) / (step * hertz) : double.NaN;
    }
}
