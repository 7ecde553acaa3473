using System.Collections.Immutable;
using System.Globalization;
using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>Finds with what a part could stand in a circuit that gives the wanted output, and what has to be lifted for it.</summary>
/// <param name="search">The search, for the parts.</param>
internal sealed class Pairings(PartSearch search)
{
    private static readonly ImmutableArray<CircuitKind> Every = [.. Enum.GetValues<CircuitKind>().Order()];

    /// <summary>What stands in the way of the part, with what can be lifted lifted.</summary>
    /// <param name="lift">What was lifted before.</param>
    public Lift Over(Lift lift)
    {
        Requirement wanted = lift.Requirement;
        Requirement wide = wanted with { BudgetRatio = LetOut.WideBudget(wanted) };
        Requirement free = wide with { Circuits = Every, Waveform = Waveform.Any };
        PartsCatalog parts = search.PartsFor(free);
        Pairing[] all = [.. Of(lift.Part, parts, wanted.Builds)];
        Pairing[] reaching = [.. all.Where(pair => pair.Reaches(wanted.OutputHz, wide.BudgetRatio))];
        var scope = new SearchScope(wanted, parts);
        Pairing[] allowed = [.. reaching.Where(pair => scope.Kinds.Contains(pair.Kind))];
        if (allowed.Length > 0)
        {
            return Least(lift, allowed);
        }

        return reaching.Length > 0 ? OverCircuit(lift, reaching) : OverFrequency(lift, all, scope);
    }

    // The pairing with the fewest and smallest hurdles.
    private static Lift Least(Lift lift, IEnumerable<Pairing> pairs) => pairs
        .Select(pair => PairHurdles.Of(lift, pair))
        .OrderBy(one => one.Hurdles.Count(hurdle => !hurdle.CanBeLifted))
        .ThenBy(one => one.Hurdles.Length)
        .ThenBy(one => RequirementChanges.Between(lift.Requirement, one.Requirement).Sum(change => Math.Log(change.Size)))
        .First();

    private static Lift OverCircuit(Lift lift, Pairing[] reaching)
    {
        Requirement wanted = lift.Requirement;
        return reaching.GroupBy(pair => pair.Kind)
            .Select(group => Least(OverCircuit(lift, group.First()), group))
            .OrderBy(one => one.Hurdles.Count(hurdle => !hurdle.CanBeLifted))
            .ThenBy(one => RequirementChanges.Between(wanted, one.Requirement).Sum(change => Math.Log(change.Size)))
            .First();
    }

    private static Lift OverCircuit(Lift lift, Pairing pair)
    {
        Requirement wanted = lift.Requirement;
        bool fitsWave = wanted.Waveform switch
        {
            Waveform.Sine => pair.Kind == CircuitKind.Follower,
            Waveform.Square => pair.Kind != CircuitKind.Follower,
            _ => true,
        };
        Requirement wider = wanted with
        {
            Circuits = wanted.Circuits.Contains(pair.Kind) ? wanted.Circuits : wanted.Circuits.Add(pair.Kind),
            Waveform = fitsWave ? wanted.Waveform : Waveform.Any,
        };
        string want = string.Join(" or ", wanted.Circuits.Select(circuit => circuit.Word()))
            + (wanted.Waveform == Waveform.Any ? "" : $", {RequirementWords.Of(wanted.Waveform)}");
        string stage = pair.Tap > 0 ? string.Create(CultureInfo.InvariantCulture, $", stage {pair.Tap}") : "";
        return lift.Over(HurdleName.Circuit, want, pair.Kind.Word() + stage, "", wider);
    }

    // Another output is what is left: the nearest that a stage gives.
    private static Lift OverFrequency(Lift lift, Pairing[] all, SearchScope scope)
    {
        Requirement wanted = lift.Requirement;
        Pairing[] allowed = [.. all.Where(pair => scope.Kinds.Contains(pair.Kind))];
        if (allowed.Length == 0 && all.Length > 0)
        {
            Pairing other = Nearest(all, wanted);
            return OverFrequency(OverCircuit(lift, other), [.. all.Where(pair => pair.Kind == other.Kind)]);
        }

        return OverFrequency(lift, allowed);
    }

    private static Lift OverFrequency(Lift lift, Pairing[] allowed)
    {
        Requirement wanted = lift.Requirement;
        if (allowed.Length == 0)
        {
            string none = lift.Part is CrystalPart ? "no amplifier of a wanted circuit" : "no crystal that it could use";
            return lift.Over(HurdleName.Frequency, Say.Hertz(wanted.OutputHz), $"the catalogue has {none}", "", null);
        }

        Pairing nearest = Nearest(allowed, wanted);
        double ratio = nearest.OutputHz / wanted.OutputHz;
        string stage = nearest.Tap == 0
            ? "without a divider"
            : string.Create(CultureInfo.InvariantCulture, $"at stage {nearest.Tap} of {nearest.Amplifier.Id}");
        string off = ratio is > 0.5 and < 2
            ? $"{Say.Number(Math.Abs(ratio - 1) * 100)} % {(ratio > 1 ? "above" : "below")}"
            : $"{Say.Number(ratio > 1 ? ratio : 1 / ratio)} times {(ratio > 1 ? "as high" : "too low")}";
        Lift over = lift.Over(
            HurdleName.Frequency, Say.Hertz(wanted.OutputHz), $"nearest {Say.Hertz(nearest.OutputHz)}, {stage}", off,
            wanted with { OutputHz = nearest.OutputHz });
        return Least(over, allowed.Where(pair => pair.OutputHz == nearest.OutputHz));
    }

    private static Pairing Nearest(IEnumerable<Pairing> pairs, Requirement wanted) =>
        pairs.MinBy(pair => (Math.Abs(Math.Log(pair.OutputHz / wanted.OutputHz)), pair.Tap, pair.Amplifier.Id))!;

    private static IEnumerable<Pairing> Of(Part part, PartsCatalog parts, int builds)
    {
        var market = new Market(parts, builds);
        IEnumerable<CrystalPart> crystals = part is CrystalPart own ? [own]
            : parts.Crystals.Where(one => one.Overtone == 1 && market.IsListed(one));
        (CrystalPart Part, CrystalModel Model)[] modelled = [.. crystals.Select(one => (one, CrystalModel.From(one)))];
        var scope = new SearchScope(new Requirement { OutputHz = 1 }, parts);
        foreach (CircuitKind kind in Every)
        {
            IEnumerable<Part> amplifiers = scope.Amplifiers(kind)
                .Where(one => part is CrystalPart ? market.IsListed(one) : one.Id == part.Id);
            foreach (Part amplifier in amplifiers)
            {
                foreach (int tap in SearchScope.Taps(amplifier))
                {
                    foreach ((CrystalPart crystal, CrystalModel model) in modelled)
                    {
                        yield return new Pairing(kind, crystal, model, amplifier, tap);
                    }
                }
            }
        }
    }
}
