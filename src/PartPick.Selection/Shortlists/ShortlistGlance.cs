using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// A candidate of a list at a glance: the figures of the day it was put there, and whether its parts are still the same. It takes no
/// more of the catalogue than the parts themselves, and no analysis.
/// </summary>
/// <param name="Entry">What the list keeps.</param>
/// <param name="Amplifier">The id of the amplifier.</param>
/// <param name="CrystalHertz">The frequency of the crystal, Hz.</param>
/// <param name="Then">The figures of the day it was put there.</param>
/// <param name="Changes">What changed about the parts since.</param>
public sealed record ShortlistGlance(
    ShortlistEntry Entry, string Amplifier, double CrystalHertz, ShortlistFigures Then, ImmutableArray<PartChange> Changes)
{
    /// <summary>Whether a part is not in the catalogue any more.</summary>
    public bool HasGoneParts => Changes.Any(change => change.Kind == ChangeKind.Gone);

    /// <summary>Looks at a candidate.</summary>
    /// <param name="entry">What the list keeps.</param>
    /// <param name="today">Today's parts, as far as they are named by it.</param>
    /// <returns>The glance; null where the entry cannot be read.</returns>
    public static ShortlistGlance? Of(ShortlistEntry entry, PartsCatalog today)
    {
        ArgumentNullException.ThrowIfNull(entry);
        ArgumentNullException.ThrowIfNull(today);
        if (ChosenParts.Read(entry.Choice) is not { } chosen || ShortlistFigures.Read(entry.Figures) is not { } then
            || chosen.In(new PartsCatalog(entry.Parts)) is not { } old)
        {
            return null;
        }

        ImmutableArray<PartChange> changes = PartChanges.Of(BillOfParts.List(old.Choice, old.Support), today);
        return new ShortlistGlance(entry, old.Choice.Amplifier.Id, old.Choice.Crystal.FrequencyHz, then, changes);
    }
}
