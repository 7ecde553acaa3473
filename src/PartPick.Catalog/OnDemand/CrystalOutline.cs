namespace PartPick.Catalog;

/// <summary>What decides which frequencies a crystal can run at. Figures that are not known are null.</summary>
/// <param name="FrequencyHz">The nominal frequency, Hz.</param>
/// <param name="Cut">The cut.</param>
/// <param name="LoadFarads">The load capacitance at which the nominal frequency holds, F; null for series resonance.</param>
/// <param name="ShuntFarads">The shunt capacitance C0, F.</param>
/// <param name="MotionalFarads">The motional capacitance, F.</param>
/// <param name="Package">The package.</param>
public readonly record struct CrystalOutline(
    double FrequencyHz, CrystalCut Cut, double? LoadFarads, double? ShuntFarads, double? MotionalFarads, string? Package)
{
    /// <summary>The outline of a crystal.</summary>
    /// <param name="part">The crystal.</param>
    public static CrystalOutline Of(CrystalPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        return new CrystalOutline(
            part.FrequencyHz, part.Cut, part.LoadFarads, part.ShuntFarads, part.MotionalFarads, part.Package);
    }
}
