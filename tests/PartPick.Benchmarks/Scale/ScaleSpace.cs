using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Selection.Search;

namespace PartPick.Benchmarks;

/// <summary>How large a space is.</summary>
/// <param name="Crystals">Crystals that reach a wanted frequency with some amplifier.</param>
/// <param name="Combinations">Combinations of parts.</param>
internal sealed record ScaleSpace(int Crystals, double Combinations)
{
    /// <summary>Counts.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts.</param>
    public static ScaleSpace Of(Requirement requirement, PartsCatalog catalog)
    {
        var space = new SearchSpace(requirement, catalog, every: false);
        var crystals = new CrystalDesk(requirement, catalog, space.Market);
        var targets = new SearchScope(requirement, catalog).TargetsHz;
        int reaching = targets.SelectMany(target => crystals.Reaching(target)).Select(entry => entry.Part.Id).Distinct().Count();
        return new ScaleSpace(reaching, space.Combinations);
    }
}
