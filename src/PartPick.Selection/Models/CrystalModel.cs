using PartPick.Catalog;
using PartPick.Physics;

namespace PartPick.Selection;

/// <summary>
/// A crystal part as the physics sees it. A figure that the part does not state is taken as the default of its class
/// (cut, frequency, holder; common practice, from memory) and counts as assumed.
/// </summary>
/// <param name="Crystal">The equivalent circuit, with the stated maximum of the resistance.</param>
/// <param name="MotionalAssumed">Whether the motional capacitance is a class default.</param>
/// <param name="ShuntUncertain">Whether the shunt capacitance is a class default, or stated as a maximum only.</param>
public sealed record CrystalModel(Crystal Crystal, bool MotionalAssumed, bool ShuntUncertain)
{
    /// <summary>Uncertainty of an assumed motional capacitance.</summary>
    public const double MotionalUncertainty = 0.30;

    /// <summary>Uncertainty of an assumed shunt capacitance.</summary>
    public const double ShuntUncertainty = 0.20;

    /// <summary>Makes the model of a part.</summary>
    public static CrystalModel From(CrystalPart part)
    {
        ArgumentNullException.ThrowIfNull(part);
        (double motional, double shunt) = Capacitances(CrystalOutline.Of(part));
        var crystal = new Crystal
        {
            NominalHz = part.FrequencyHz,
            LoadFarads = part.LoadFarads,
            MotionalFarads = motional,
            ShuntFarads = shunt,
            ResistanceOhms = part.ResistanceOhms ?? DefaultResistanceOhms(part),
        };
        bool motionalAssumed = part.MotionalFarads is null || part.BasisOf("motional") == Basis.Assumed;
        bool shuntUncertain = part.ShuntFarads is null || part.BasisOf("shunt") is Basis.Assumed or Basis.Maximum;
        return new CrystalModel(crystal, motionalAssumed, shuntUncertain);
    }

    /// <summary>Between which frequencies a crystal can run, in hertz: the series and the antiresonant one of its equivalent circuit.</summary>
    /// <param name="outline">What is known of the crystal.</param>
    public static (double SeriesHz, double AntiresonantHz) SpanHz(in CrystalOutline outline)
    {
        (double motional, double shunt) = Capacitances(outline);
        double series = outline.LoadFarads is { } load
            ? outline.FrequencyHz / Math.Sqrt(1 + motional / (shunt + load))
            : outline.FrequencyHz;
        return (series, series * Math.Sqrt(1 + motional / shunt));
    }

    private static (double MotionalFarads, double ShuntFarads) Capacitances(in CrystalOutline part)
    {
        double motional = part.MotionalFarads ?? DefaultMotionalFarads(part);
        return (motional, part.ShuntFarads ?? DefaultShuntFarads(part, motional));
    }

    private static bool IsSmall(in CrystalOutline part) => part.Package?.StartsWith("SMD", StringComparison.OrdinalIgnoreCase) == true;

    private static double DefaultMotionalFarads(in CrystalOutline part) => part.Cut switch
    {
        CrystalCut.Fork => 3e-15,
        _ when IsSmall(part) => 4e-15,
        _ when part.FrequencyHz < 3e6 => 8e-15,
        _ => 15e-15,
    };

    private static double DefaultShuntFarads(in CrystalOutline part, double motional) =>
        part.Cut == CrystalCut.Fork ? 1.2e-12 : Math.Clamp(250 * motional, 1e-12, 7e-12);

    private static double DefaultResistanceOhms(CrystalPart part) => part switch
    {
        { Cut: CrystalCut.Fork } => 90e3,
        { FrequencyHz: < 2e6 } => 600,
        { FrequencyHz: < 5e6 } => 150,
        { FrequencyHz: < 10e6 } => 80,
        { FrequencyHz: < 16e6 } => 60,
        _ => 50,
    };
}
