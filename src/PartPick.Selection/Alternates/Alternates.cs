using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// Looks for replacements of the parts of a circuit: each part of the kind is put into the circuit, and the whole circuit analysed
/// as a candidate. What cannot fit for a certain and cheap reason is left out first, with the reason. Where the stock of another
/// part of the circuit is too small, that part needs its own replacement, and does not count against this one.
/// </summary>
public sealed class Alternates
{
    private readonly BoardParts _board;
    private readonly Requirement _requirement;
    private readonly PartsCatalog _catalog;
    private readonly AlternatesOptions _options;
    private readonly Market _market;
    private readonly CandidateBuilder _builder;
    private readonly PlaceRules _rules;

    /// <param name="chosen">The circuit, as it stands.</param>
    /// <param name="requirement">What is needed of it.</param>
    /// <param name="catalog">The parts.</param>
    /// <param name="options">Which replacements are wanted; null for all.</param>
    public Alternates(ChosenCircuit chosen, Requirement requirement, PartsCatalog catalog, AlternatesOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(chosen);
        ArgumentNullException.ThrowIfNull(requirement);
        ArgumentNullException.ThrowIfNull(catalog);
        Chosen = chosen;
        _board = chosen.Board;
        _requirement = requirement;
        _catalog = catalog;
        _options = options ?? new AlternatesOptions();
        _market = new Market(catalog, requirement.Builds);
        _builder = new CandidateBuilder(requirement, _market);
        _rules = new PlaceRules(requirement, _market, _board);
    }

    /// <summary>The circuit as it stands.</summary>
    public ChosenCircuit Chosen { get; }

    /// <summary>The replacements of one line of the circuit, in order.</summary>
    /// <param name="line">The line, from <see cref="BoardLine.Of"/>.</param>
    /// <param name="cancellation">Ends the search at once with <see cref="OperationCanceledException"/>.</param>
    public LineAlternates Find(BoardLine line, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(line);
        Part[] others = [.. _catalog.OfKind(line.Part.Kind).Where(part => part.Id != line.Part.Id)];
        Tried[] tried =
        [
            .. others.AsParallel().AsOrdered()
                .WithDegreeOfParallelism(Math.Clamp(_options.Threads ?? Environment.ProcessorCount, 1, 64))
                .WithCancellation(cancellation)
                .Select(part => Try(line, part)),
        ];
        return new LineAlternates
        {
            Line = line,
            Replacements =
            [
                .. tried.Where(one => one.Candidate is { } candidate && IsFit(candidate))
                    .Select(one => Replace(line, one.Part, one.Candidate!))
                    .OrderBy(one => one.Change.Size)
                    .ThenBy(one => one.Candidate.Cost)
                    .ThenBy(one => one.Part.Id, StringComparer.Ordinal),
            ],
            Considered = others.Length,
            Analysed = tried.Count(one => one.Candidate is not null),
            LeftOut = tried.Where(one => one.Reason is not null).GroupBy(one => one.Reason!.Value)
                .ToImmutableSortedDictionary(group => group.Key, group => group.Count()),
            Unfit = tried.Where(one => one.Candidate is { } candidate && !IsFit(candidate)).GroupBy(one => FirstMiss(one.Candidate!))
                .ToImmutableSortedDictionary(group => group.Key, group => group.Count()),
        };
    }

    private Tried Try(BoardLine line, Part part)
    {
        LeftOut? reason = line.Places.Select(place => _rules.Reason(place, part)).FirstOrDefault(one => one is not null)
            ?? (_options.SamePackage && part.Package != line.Part.Package ? LeftOut.Package : null);
        if (reason is not null)
        {
            return new Tried(part, reason, null);
        }

        BoardParts changed = line.Replace(_board, part);
        int count = BillOfParts.Counts(changed.Choice, changed.Support).First(entry => ReferenceEquals(entry.Part, part)).Count;
        reason = !_market.Covers(part, count) ? LeftOut.Stock
            : BillOfParts.UnitCost(changed.Choice, changed.Support, _market) > _requirement.CostLimit ? LeftOut.Cost
            : _builder.StartsWithMargin(changed.Choice, changed.Support) switch
            {
                null => LeftOut.Supply,
                false => LeftOut.Margin,
                true => null,
            };
        return new Tried(part, reason, reason is null ? _builder.Build(changed.Choice, changed.Support) : null);
    }

    // The stock of the part itself is settled before; that of the circuit's other parts is no fault of this one.
    private static bool IsFit(Candidate candidate) => candidate.Misses.All(miss => miss.Limit == Limit.Stock);

    private static Limit FirstMiss(Candidate candidate) => candidate.Misses.First(miss => miss.Limit != Limit.Stock).Limit;

    private Replacement Replace(BoardLine line, Part part, Candidate candidate) => new(
        part,
        candidate,
        CandidateChange.Between(Chosen.Candidate, candidate, _requirement),
        part.Package == line.Part.Package);

    private sealed record Tried(Part Part, LeftOut? Reason, Candidate? Candidate);
}
