using PartPick.Catalog;
using PartPick.Selection.Search;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>
/// Gives the parts of a catalogue on disk: all of a small one, and of a large one only the crystals that can run at a wanted
/// frequency. What another process changes meanwhile is taken in by the next ranking.
/// </summary>
/// <param name="stored">The catalogue.</param>
public sealed class PartsOnDemand(StoredParts stored) : IPartsSource
{
    private readonly Lock _gate = new();
    private (PartsDirectory Directory, CrystalReach Reach)? _reach;

    /// <summary>Reads the catalogue as it now is, so that the next ranking need not wait for it.</summary>
    /// <param name="cancellation">Ends it.</param>
    /// <returns>True, or the problem.</returns>
    public Result<bool> Open(CancellationToken cancellation)
    {
        Result<bool> opened = stored.Open(cancellation);
        if (opened.IsOk && stored.Directory is { } directory)
        {
            ReachOf(directory);
        }

        return opened;
    }

    /// <summary>The main currency; empty before <see cref="Open"/>.</summary>
    public string Currency => stored.Currency;

    /// <inheritdoc/>
    public PartsCatalog PartsFor(Requirement requirement, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        while (true)
        {
            if (stored.Whole is { } whole)
            {
                return whole;
            }

            if (stored.Directory is { } directory && Read(requirement, directory, cancellation) is { } parts)
            {
                return parts;
            }

            Checked(Open(cancellation));
        }
    }

    private PartsCatalog? Read(Requirement requirement, PartsDirectory directory, CancellationToken cancellation)
    {
        if (Checked(stored.Read(directory, [], cancellation)) is not { } others)
        {
            return null;
        }

        CrystalReach reach = ReachOf(directory);
        int[] places =
        [
            .. new SearchScope(requirement, others).TargetsHz
                .SelectMany(target => reach.Within(target, requirement.BudgetRatio)).Distinct(),
        ];
        return Checked(stored.Read(directory, places, cancellation));
    }

    private CrystalReach ReachOf(PartsDirectory directory)
    {
        lock (_gate)
        {
            if (_reach is not { } known || known.Directory != directory)
            {
                known = (directory, new CrystalReach(directory.Crystals, place => directory[place]));
                _reach = known;
            }

            return known.Reach;
        }
    }

    private static T Checked<T>(Result<T> result) => result.IsOk ? result.Value : throw new PartsUnreadableException(result.Problem);
}
