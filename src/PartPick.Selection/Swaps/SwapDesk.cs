using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection.Search;

namespace PartPick.Selection;

/// <summary>
/// What may stand in each place of a circuit, in order: the values and parts that a ranking for the requirement tries there.
/// Called from one thread at a time.
/// </summary>
public sealed class SwapDesk
{
    private readonly Requirement _requirement;
    private readonly Market _market;
    private readonly SearchScope _scope;
    private readonly CrystalDesk _crystals;
    private readonly ImmutableArray<CapacitorValue> _capacitors;
    private readonly ImmutableArray<ResistorPart> _damping;
    private readonly ImmutableArray<ResistorPart> _bias;

    /// <param name="requirement">What is needed.</param>
    /// <param name="catalog">The parts that are ranked for it.</param>
    public SwapDesk(Requirement requirement, PartsCatalog catalog)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        _requirement = requirement;
        _market = new Market(catalog, requirement.Builds);
        _scope = new SearchScope(requirement, catalog);
        _crystals = new CrystalDesk(requirement, catalog, _market);
        _capacitors = CapacitorChoice.Of(requirement, _market, every: false);
        _damping = AmplifierOptions.ByValue(_market, requirement.ResistorSeries);
        _bias = AmplifierOptions.ByValue(_market, requirement.BiasSeries);
    }

    /// <summary>What is needed.</summary>
    public Requirement Requirement => _requirement;

    /// <summary>What can be bought.</summary>
    public Market Market => _market;

    /// <summary>The support parts of a circuit, as a ranking takes them.</summary>
    /// <param name="choice">The circuit.</param>
    public SupportParts Support(CandidateParts choice)
    {
        ArgumentNullException.ThrowIfNull(choice);
        return _crystals.Support(choice.Circuit, choice.Crystal);
    }

    /// <summary>What may stand in a place, in order, with what stands there.</summary>
    /// <param name="place">The place.</param>
    /// <param name="board">The circuit.</param>
    public ImmutableArray<SwapOption> Options(SwapPlace place, BoardParts board)
    {
        ArgumentNullException.ThrowIfNull(board);
        return place switch
        {
            SwapPlace.C1 => Capacitors(place, board.Choice.C1),
            SwapPlace.C2 => Capacitors(place, board.Choice.C2),
            SwapPlace.Series => Resistors(place, board.Choice.Series, _damping, none: true),
            SwapPlace.Feedback => Resistors(
                place, board.Support.Feedback, Feedback(board.Choice.Crystal), none: board.Support.Feedback is null),
            SwapPlace.BaseTop => Resistors(place, board.Choice.BaseTop, _bias, none: false),
            SwapPlace.BaseBottom => Resistors(place, board.Choice.BaseBottom, _bias, none: true),
            SwapPlace.Emitter => Resistors(place, board.Choice.Emitter, _bias, none: false),
            SwapPlace.Crystal => [.. Crystals(board.Choice, board.Choice.Tap).Select(crystal => Crystal(place, crystal, board.Choice.Tap))],
            SwapPlace.Amplifier => Amplifiers(board.Choice),
            _ => Stages(board.Choice),
        };
    }

    private ImmutableArray<SwapOption> Capacitors(SwapPlace place, CapacitorPart standing)
    {
        IEnumerable<(double Farads, ImmutableArray<Part?> Parts)> values =
            _capacitors.Select(value => (value.Farads, value.Contenders.Select(one => (Part?)one.Part).ToImmutableArray()));
        if (_capacitors.All(value => value.Farads != standing.ValueFarads))
        {
            values = values.Append((standing.ValueFarads, [standing]));
        }

        return
        [
            .. values.OrderBy(value => value.Farads)
                .Select(value => new SwapOption(place, SwapPlaces.Words(place, value.Parts[0]), value.Parts)),
        ];
    }

    private static ImmutableArray<SwapOption> Resistors(
        SwapPlace place, ResistorPart? standing, ImmutableArray<ResistorPart> values, bool none)
    {
        IEnumerable<ResistorPart> parts = standing is null || values.Any(part => part.ValueOhms == standing.ValueOhms)
            ? values
            : values.Append(standing).OrderBy(part => part.ValueOhms);
        IEnumerable<Part?> all = none ? parts.Prepend<Part?>(null) : parts;
        return [.. all.Select(part => new SwapOption(place, SwapPlaces.Words(place, part), [part]))];
    }

    private ImmutableArray<ResistorPart> Feedback(CrystalPart crystal) =>
        [.. _damping.Where(part => SupportParts.IsFeedback(part, crystal.FrequencyHz))];

    // Like ones stand beside each other: by rated load, then by how far the crystal alone may be off, then by cost.
    private IEnumerable<CrystalPart> Crystals(CandidateParts choice, int tap)
    {
        CrystalPart[] fit =
        [
            .. _crystals.Reaching(_scope.TargetHz(tap))
                .Where(entry => Specification.CoversTemperature(entry.Part, choice.Amplifier, _requirement)
                    && Specification.CoversClock(choice.Amplifier, entry.Part.FrequencyHz, _requirement)
                    && Spread(entry.Part) <= _requirement.BudgetRatio)
                .Select(entry => entry.Part),
        ];
        return (tap != choice.Tap || fit.Any(part => part.Id == choice.Crystal.Id) ? fit : fit.Append(choice.Crystal))
            .OrderBy(part => part.LoadFarads ?? 0).ThenBy(Spread).ThenBy(part => _market.UnitCost(part, 1))
            .ThenBy(part => part.Id, StringComparer.Ordinal);
    }

    private double Spread(CrystalPart crystal) => CrystalSpread.Of(crystal, _requirement).Sum(term => term.Ratio);

    private static SwapOption Crystal(SwapPlace place, CrystalPart crystal, int tap) =>
        new(place, place == SwapPlace.Stage ? SwapPlaces.Words(tap) : crystal.Id, [crystal], tap);

    // From the weakest to the strongest, as far as that is stated.
    private ImmutableArray<SwapOption> Amplifiers(CandidateParts choice)
    {
        CrystalModel model = CrystalModel.From(choice.Crystal);
        return
        [
            .. _scope.Amplifiers(choice.Circuit)
                .Where(part => part.Id != choice.Amplifier.Id && _market.IsListed(part)
                    && (part is not CounterPart counter || counter.Taps.Contains(choice.Tap))
                    && Specification.CoversTemperature(choice.Crystal, part, _requirement)
                    && Specification.CoversClock(part, choice.Crystal.FrequencyHz, _requirement)
                    && CircuitTemplate.Create(_requirement, choice.Circuit, model, part, double.PositiveInfinity) is not null)
                .Append(choice.Amplifier)
                .OrderBy(Strength).ThenBy(part => _market.UnitCost(part, 1)).ThenBy(part => part.Id, StringComparer.Ordinal)
                .Select(part => new SwapOption(SwapPlace.Amplifier, part.Id, [part])),
        ];
    }

    private double Strength(Part amplifier) => amplifier is AmplifierPart part
        && InverterModel.At(part, _requirement.NominalSupplyVolts, DeviceStrength.Typical) is { } device
            ? device.TransconductanceSiemens
            : 0;

    // With each stage the crystal that is most like the one that stands there.
    private ImmutableArray<SwapOption> Stages(CandidateParts choice)
    {
        double load = choice.Crystal.LoadFarads ?? 0;
        return
        [
            .. SearchScope.Taps(choice.Amplifier).Order()
                .Select(tap => (Tap: tap, Crystal: tap == choice.Tap ? choice.Crystal : Crystals(choice, tap)
                    .OrderBy(part => Math.Abs((part.LoadFarads ?? 0) - load))
                    .ThenBy(part => part.Holder == choice.Crystal.Holder ? 0 : 1).FirstOrDefault()))
                .Where(pair => pair.Crystal is not null)
                .Select(pair => Crystal(SwapPlace.Stage, pair.Crystal!, pair.Tap)),
        ];
    }
}
