using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Gives all parts, whatever is needed.</summary>
/// <param name="catalog">The parts.</param>
public sealed class WholeCatalog(PartsCatalog catalog) : IPartsSource
{
    /// <inheritdoc/>
    public PartsCatalog PartsFor(Requirement requirement, CancellationToken cancellation) => catalog;
}
