using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.WhyNot;

/// <summary>Answers why a part of a catalogue is not in a ranked list. Each call reads the parts anew.</summary>
/// <param name="catalogPath">Path of the catalogue's file.</param>
public sealed class WhyNotDesk(string catalogPath) : IWhyNotDesk
{
    private const int MostNear = 3;

    /// <inheritdoc/>
    public Result<WhyNotAnswer> Ask(Requirement requirement, string id, IProgress<string>? progress, CancellationToken cancellation) =>
        Find(id, "part").Then(part => Ask(requirement, part, progress, cancellation));

    /// <inheritdoc/>
    public Result<ImmutableDictionary<PartKind, PartRows>> Rows(CancellationToken cancellation) =>
        PartListing.Read(catalogPath, _ => { }, cancellation);

    /// <summary>The crystal or amplifier of an id.</summary>
    /// <param name="id">The id.</param>
    /// <param name="where">The option or field, for the problem.</param>
    /// <returns>The part; or the problem, with ids that are like it where there are any.</returns>
    public Result<Part> Find(string id, string where)
    {
        Result<CatalogEntry?> found = CatalogReading.Find(catalogPath, id);
        return found switch
        {
            { IsOk: false } => Result.Fail<Part>(found.Problem),
            { Value: null } => Unknown(id, where),
            { Value.Part: CrystalPart or AmplifierPart or TransistorPart } => Result.Ok(found.Value.Part),
            _ => Result.Fail<Part>(
                where, $"{Problem.Quote(id)} is one of the {found.Value.Part.Kind.Word()}, of which the ranking takes what suits",
                "the id of a crystal, an inverter, a counter, a port or a transistor"),
        };
    }

    private Result<WhyNotAnswer> Ask(Requirement requirement, Part part, IProgress<string>? progress, CancellationToken cancellation)
    {
        var parts = new PartsOnDemand(new StoredParts(catalogPath));
        Result<bool> opened = parts.Open(cancellation);
        if (!opened.IsOk)
        {
            return Result.Fail<WhyNotAnswer>(opened.Problem);
        }

        try
        {
            return Result.Ok(WhyNotSearch.Find(requirement, parts, part, progress, cancellation));
        }
        catch (PartsUnreadableException unreadable)
        {
            return Result.Fail<WhyNotAnswer>(unreadable.Problem);
        }
    }

    // Of a small catalogue those ids are named that begin as this one does, the longest beginning first.
    private Result<Part> Unknown(string id, string where)
    {
        var parts = new StoredParts(catalogPath);
        Result<bool> opened = parts.Open(CancellationToken.None);
        string[] known =
        [
            .. (parts.Whole?.All ?? []).Where(part => part is CrystalPart or AmplifierPart or TransistorPart).Select(part => part.Id),
        ];
        string[] near =
        [
            .. known.Select(one => (Id: one,
                Same: one.Zip(id).TakeWhile(pair => char.ToUpperInvariant(pair.First) == char.ToUpperInvariant(pair.Second)).Count()))
                .Where(one => one.Same > 1)
                .OrderByDescending(one => one.Same).ThenBy(one => Math.Abs(one.Id.Length - id.Length)).ThenBy(one => one.Id,
                    StringComparer.Ordinal)
                .Take(MostNear).Select(one => one.Id),
        ];
        return Result.Fail<Part>(opened.Problem ?? new Problem(
            where, $"{Problem.Quote(id)} is no part of the catalogue",
            "the id of a crystal or an amplifier" + (near.Length == 0 ? "" : ", such as " + string.Join(", ", near))));
    }
}
