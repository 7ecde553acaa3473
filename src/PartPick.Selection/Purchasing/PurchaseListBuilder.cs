using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection;

/// <summary>Makes a purchase list: one line a part, merged over all circuits.</summary>
/// <param name="catalog">Today's parts: what is not there cannot be bought, and equal parts come from there.</param>
/// <param name="options">How it is made.</param>
public sealed class PurchaseListBuilder(PartsCatalog catalog, PurchaseOptions options)
{
    private const int Most = int.MaxValue / 2;

    /// <summary>Makes the list.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="circuits">The circuits.</param>
    /// <returns>The list, or the problem: more than one currency, or more parts than can be counted.</returns>
    public Result<PurchaseList> Build(string name, ImmutableArray<PurchaseCircuit> circuits)
    {
        ImmutableArray<Need> needs = Merge(circuits);
        Result<string> currency = options.Rates.Settle(
        [
            .. needs.Where(need => IsThere(need.Part))
                .Select(need => ($"{need.Part.Id} ({References(need, circuits.Length == 1)})", need.Part)),
        ]);
        if (!currency.IsOk)
        {
            return Result.Fail<PurchaseList>(currency.Problem);
        }

        if (needs.GroupBy(need => need.Part.Kind)
            .FirstOrDefault(kind => kind.Sum(need => options.Attrition.Required(kind.Key, need.Count)) > Most) is { } much)
        {
            return Result.Fail<PurchaseList>(
                "builds", $"more {much.Key.Word()} are needed than can be ordered", "a number of boards that can be built");
        }

        // Where every part is gone, equal ones may still be bought.
        string ofList = currency.Value.Length > 0 ? currency.Value : new Market(catalog, 1).Currency;
        var orders = new OrderFinder(catalog, options, ofList);
        var lines = ImmutableArray.CreateBuilder<PurchaseLine>();
        foreach (ImmutableArray<Need> group in Group(needs, orders))
        {
            lines.Add(Line(lines.Count + 1, group, orders));
        }

        return Result.Ok(new PurchaseList(name, ofList, circuits, lines.ToImmutable()));
    }

    private static ImmutableArray<Need> Merge(ImmutableArray<PurchaseCircuit> circuits) =>
    [
        .. from circuit in circuits
           from use in circuit.Parts
           group (circuit, use) by use.Part.Id into part
           let first = part.First().use
           let uses = part.GroupBy(pair => pair.circuit).Select(pairs => new PurchaseUse(
               pairs.Key.Label, pairs.Key.Builds, [.. pairs.Select(pair => pair.use.Designator)])).ToImmutableArray()
           orderby Letter(first), SizeOf(first.Part), first.Part.Id
           select new Need(first.Part, uses, uses.Sum(use => (long)use.Builds * use.Designators.Length)),
    ];

    // Where one of several equal parts runs short, they are bought together: any of them does for any of the places. Where they
    // do not suffice together either, each stays by itself.
    private IEnumerable<ImmutableArray<Need>> Group(ImmutableArray<Need> needs, OrderFinder orders)
    {
        if (!options.Splits)
        {
            return needs.Select(need => ImmutableArray.Create(need));
        }

        HashSet<string> pooled =
        [
            .. needs.GroupBy(need => EqualParts.KeyOf(need.Part))
                .Where(group => group.Any(need => !orders.IsCovered(need.Part, RequiredOf([need])))
                    && orders.Split([.. group.Select(need => need.Part)], RequiredOf([.. group])) is not null)
                .Select(group => group.Key),
        ];
        return needs.GroupBy(need => EqualParts.KeyOf(need.Part) is var key && pooled.Contains(key) ? key : need.Part.Id)
            .Select(group => group.ToImmutableArray());
    }

    private PurchaseLine Line(int number, ImmutableArray<Need> group, OrderFinder orders)
    {
        Part part = group[0].Part;
        int required = RequiredOf(group);
        (ImmutableArray<PurchaseOrder> found, decimal? single) = orders.Find([.. group.Select(need => need.Part)], required);
        string[] ordered = [.. found.Select(order => order.Part.Id)];
        IEnumerable<string> alternates = group.SelectMany(need =>
            EqualParts.Of(need.Part, catalog).Select(equal => equal.Id)
                .Concat(options.Alternates.GetValueOrDefault(need.Part.Id, [])));
        return new PurchaseLine
        {
            Number = number,
            Parts = [.. group.Select(need => need.Part)],
            Description = BuyerText.Of(part),
            Uses = [.. group.SelectMany(need => need.Uses)],
            Needed = (int)group.Sum(need => need.Count),
            Attrition = options.Attrition.Of(part.Kind),
            Required = required,
            Orders = found,
            SingleTotal = single,
            Alternates = [.. alternates.Where(id => !ordered.Contains(id)).Distinct()],
            IsGone = group.All(need => !IsThere(need.Part)),
        };
    }

    private static string References(Need need, bool one) => one
        ? string.Join(", ", need.Uses.SelectMany(use => use.Designators))
        : string.Join("; ", need.Uses.Select(use => $"{use.Circuit}: {string.Join(' ', use.Designators)}"));

    private int RequiredOf(ImmutableArray<Need> group) =>
        (int)options.Attrition.Required(group[0].Part.Kind, group.Sum(need => need.Count));

    private bool IsThere(Part part) => catalog.Find(part.Id) is { } found && found.Kind == part.Kind;

    // By the letter of the designator: C, Q, R, U, Y.
    private static char Letter(PartUse use) => use.Designator.Length == 0 ? '~' : use.Designator[0];

    private static double SizeOf(Part part) => part switch
    {
        CapacitorPart capacitor => capacitor.ValueFarads,
        ResistorPart resistor => resistor.ValueOhms,
        CrystalPart crystal => crystal.FrequencyHz,
        _ => 0,
    };

    private sealed record Need(Part Part, ImmutableArray<PurchaseUse> Uses, long Count);
}
