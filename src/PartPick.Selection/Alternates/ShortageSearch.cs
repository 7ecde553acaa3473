using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// Ranks again without a part of a chosen circuit: a crystal that cannot be had is looked for round the amplifier that stays, an
/// amplifier round the crystal, and any other part round both. Everything else is free, and the ranking exact.
/// </summary>
public static class ShortageSearch
{
    /// <summary>What else meets the requirement.</summary>
    /// <param name="chosen">The circuit that was chosen.</param>
    /// <param name="line">The part that cannot be had.</param>
    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="equalToo">Whether the parts that are equal to it cannot be had either.</param>
    /// <param name="options">How much of the ranking is wanted; null for the defaults.</param>
    /// <param name="progress">Takes a best-so-far now and then; may be null.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    public static Shortage Find(
        ChosenCircuit chosen,
        BoardLine line,
        Requirement requirement,
        PartsCatalog catalog,
        bool equalToo = false,
        RankingOptions? options = null,
        IProgress<RankingResult>? progress = null,
        CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(chosen);
        ArgumentNullException.ThrowIfNull(line);
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(catalog);
        CandidateParts choice = chosen.Board.Choice;
        ImmutableArray<Part> kept = [.. new[] { choice.Crystal, choice.Amplifier }.Where(part => part.Id != line.Part.Id)];
        string equal = EqualParts.KeyOf(line.Part);
        ImmutableArray<Part> gone =
        [
            .. catalog.OfKind(line.Part.Kind)
                .Where(part => part.Id == line.Part.Id || (equalToo && EqualParts.KeyOf(part) == equal)),
        ];
        bool keepsAmplifier = kept.Contains(choice.Amplifier);
        Requirement wanted = keepsAmplifier ? requirement with { Circuits = [choice.Circuit] } : requirement;
        RankingResult ranking = Ranker.Rank(wanted, Left(catalog, requirement, gone, kept), options, progress, cancellation);
        return new Shortage
        {
            Gone = gone,
            Kept = kept,
            Ranking = ranking,
            Candidates =
            [
                .. ranking.Candidates.Select(candidate => new ChangedCandidate(
                    candidate, CandidateChange.Between(chosen.Candidate, candidate, requirement))),
            ],
        };
    }

    // Parts in another currency are left out here, so that the parts that are taken away cannot change which currency counts.
    private static PartsCatalog Left(
        PartsCatalog catalog, Requirement requirement, ImmutableArray<Part> gone, ImmutableArray<Part> kept)
    {
        string currency = new Market(catalog, requirement.Builds).Currency;
        var without = gone.Select(part => part.Id).ToHashSet(StringComparer.Ordinal);
        bool keepsCrystal = kept.Any(part => part is CrystalPart);
        bool keepsAmplifier = kept.Any(IsAmplifier);
        var stays = kept.Select(part => part.Id).ToHashSet(StringComparer.Ordinal);
        return new PartsCatalog(catalog.All.Where(part =>
            part.Offer.Currency == currency
            && !without.Contains(part.Id)
            && (stays.Contains(part.Id) || !((keepsCrystal && part is CrystalPart) || (keepsAmplifier && IsAmplifier(part))))));
    }

    private static bool IsAmplifier(Part part) => part is AmplifierPart or TransistorPart;
}
