using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>Gives the parts of a catalogue that a ranking can use.</summary>
public interface IPartsSource
{
    /// <summary>
    /// Gives at least all parts that are no crystals, and all crystals that reach a wanted frequency within the budget; with the main
    /// currency of the whole catalogue.
    /// </summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="cancellation">Ends it.</param>
    /// <exception cref="PartsUnreadableException">The parts cannot be read.</exception>
    PartsCatalog PartsFor(Requirement requirement, CancellationToken cancellation);
}
