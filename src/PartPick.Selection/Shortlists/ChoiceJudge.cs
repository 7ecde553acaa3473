using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;

namespace PartPick.Selection;

/// <summary>
/// Holds a given choice against every limit of its requirement: those that the figures show, and those that the search settles
/// before it looks at a circuit (supply, temperature, clock, whether the parts can be bought).
/// </summary>
/// <param name="requirement">What is needed.</param>
/// <param name="market">What can be bought.</param>
public sealed class ChoiceJudge(Requirement requirement, Market market)
{
    /// <summary>The candidate, and every limit that it breaks; no candidate where its amplifier is not specified over the supply.</summary>
    /// <param name="choice">The parts.</param>
    /// <param name="support">The support parts.</param>
    public (Candidate? Candidate, ImmutableArray<Miss> Misses) Judge(CandidateParts choice, SupportParts support)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(support);
        var misses = ImmutableArray.CreateBuilder<Miss>();
        Candidate? candidate = new CandidateBuilder(requirement, market).Build(choice, support);
        if (candidate is null)
        {
            misses.Add(Broken(Limit.Supply, $"{choice.Amplifier.Id} is not specified from {Supply}"));
        }

        if (!Specification.CoversTemperature(choice.Crystal, choice.Amplifier, requirement))
        {
            misses.Add(Broken(
                Limit.Temperature,
                $"{choice.Crystal.Id} or {choice.Amplifier.Id} is not specified from {Number(requirement.TemperatureMinCelsius)} "
                    + $"to {Number(requirement.TemperatureMaxCelsius)} °C"));
        }

        if (!Specification.CoversClock(choice.Amplifier, choice.Crystal.FrequencyHz, requirement))
        {
            misses.Add(Broken(
                Limit.Clock, $"{choice.Amplifier.Id} does not guarantee {Say.Hertz(choice.Crystal.FrequencyHz)} at {Supply}"));
        }

        (bool priced, ImmutableArray<Miss> offers) = Offers(choice, support);
        misses.AddRange(offers);
        if (candidate is not null)
        {
            // A cost that leaves a part out is none, and breaks no limit.
            misses.AddRange(candidate.Misses.Where(miss => priced || miss.Limit != Limit.Cost));
        }

        return (candidate is null ? null : candidate with { Misses = misses.ToImmutable() }, misses.ToImmutable());
    }

    /// <summary>Whether every part of a circuit has a price in the currency of the market, so that its cost says something.</summary>
    /// <param name="candidate">The candidate.</param>
    public bool IsPriced(Candidate candidate)
    {
        ArgumentNullException.ThrowIfNull(candidate);
        return candidate.Parts.All(use => use.Part.Offer.HasPrices && use.Part.Offer.Currency == market.Currency);
    }

    private (bool Priced, ImmutableArray<Miss> Misses) Offers(CandidateParts choice, SupportParts support)
    {
        var misses = ImmutableArray.CreateBuilder<Miss>();
        bool priced = true;
        foreach (Part part in BillOfParts.List(choice, support).Select(use => use.Part).DistinctBy(part => part.Id))
        {
            if (part.Excluded)
            {
                misses.Add(Broken(Limit.Stock, $"{part.Id} is excluded in the catalogue"));
            }

            if (!part.Offer.HasPrices)
            {
                misses.Add(Broken(Limit.Cost, $"{part.Id} has no price"));
                priced = false;
            }
            else if (part.Offer.Currency != market.Currency)
            {
                misses.Add(Broken(Limit.Cost, $"{part.Id} is priced in {part.Offer.Currency}, most parts in {market.Currency}"));
                priced = false;
            }
        }

        return (priced, misses.ToImmutable());
    }

    private string Supply => requirement.SupplyMinVolts == requirement.SupplyMaxVolts
        ? Say.Volts(requirement.SupplyMinVolts)
        : $"{Number(requirement.SupplyMinVolts)} to {Say.Volts(requirement.SupplyMaxVolts)}";

    private static Miss Broken(Limit limit, string sentence) => new(limit, sentence, 100);

    private static string Number(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
