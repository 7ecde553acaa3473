using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>A crystal and an amplifier in a circuit, with the divider stage that is used.</summary>
/// <param name="Kind">The circuit.</param>
/// <param name="Crystal">The crystal.</param>
/// <param name="Model">Its model.</param>
/// <param name="Amplifier">The amplifier.</param>
/// <param name="Tap">The divider stage.</param>
internal sealed record Pairing(CircuitKind Kind, CrystalPart Crystal, CrystalModel Model, Part Amplifier, int Tap)
{
    /// <summary>What comes out where the crystal runs at its nominal frequency, in hertz.</summary>
    public double OutputHz => Crystal.FrequencyHz / Math.Pow(2, Tap);

    /// <summary>Whether the crystal can be pulled to a wanted output, within a budget.</summary>
    public bool Reaches(double outputHz, double budgetRatio) =>
        Specification.ReachesFrequency(Model, outputHz * Math.Pow(2, Tap), budgetRatio);
}
