using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Shortlists;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The lists of a catalogue. Each call reads the parts anew: an import elsewhere may have changed them.</summary>
/// <param name="catalogPath">Path of the catalogue's file.</param>
public sealed class CatalogDesk(string catalogPath) : IShortlistDesk
{
    private static DateOnly Today => DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date);

    /// <inheritdoc/>
    public Result<ImmutableArray<string>> Names() =>
        ShortlistStore.ReadAll(catalogPath).Map<ImmutableArray<string>>(lists => [.. lists.Select(list => list.Name)]);

    /// <inheritdoc/>
    public Result<ListGlance> Glance(string list) => ShortlistStore.ReadAll(catalogPath).Then(lists =>
    {
        if ((lists.FirstOrDefault(each => each.Name == list) ?? lists.FirstOrDefault()) is not { } found)
        {
            return Result.Ok(ListGlance.None);
        }

        IEnumerable<string> ids = found.Entries.SelectMany(entry => entry.Parts).Select(part => part.Id);
        return CatalogReading.FindAll(catalogPath, ids).Map(today => new ListGlance(
            found.Name, lists.Length, [.. found.Entries.Select(entry => ShortlistGlance.Of(entry, today)).OfType<ShortlistGlance>()]));
    });

    /// <inheritdoc/>
    public Result<ImmutableArray<ShortlistReview>> Read(string list, CancellationToken cancellation) =>
        CatalogReading.All(catalogPath, cancellation).Then(catalog => Read(list, catalog));

    /// <inheritdoc/>
    public Result<ListCircuit> Circuit(string list, int number, CancellationToken cancellation) => CatalogReading.All(
        catalogPath, cancellation).Then(catalog =>
        ShortlistStore.Read(catalogPath, list).Then(found => found.Entries.FirstOrDefault(entry => entry.Number == number) is { } entry
            ? new ShortlistReviewer(catalog).Review(list, entry).Then(review =>
                ChosenCircuit.Of(review, catalog).Map(chosen => new ListCircuit(review, chosen, catalog)))
            : Result.Fail<ListCircuit>(
                "list", FormattableString.Invariant($"candidate {number} is not on it any more"), "a candidate that is on the list")));

    /// <inheritdoc/>
    public Result<ShortlistEntry> Put(
        string list, CandidateParts choice, Requirement requirement, string? note, SupportParts? support,
        CancellationToken cancellation) =>
        CatalogReading.All(catalogPath, cancellation).Then(catalog =>
        {
            // The parts that are shown may be older than the catalogue.
            return ChosenParts.Of(choice, support ?? new SupportParts(null, null, null)).In(catalog) is { } now
                ? new ShortlistReviewer(catalog).Make(now.Choice, support is null ? null : now.Support, requirement, note, Today)
                : Result.Fail<ShortlistEntry>("circuit", "one of its parts is not in the catalogue any more", "a circuit of today's parts");
        }).Then(entry =>
        {
            cancellation.ThrowIfCancellationRequested();
            return ShortlistStore.Add(catalogPath, list, entry);
        });

    /// <inheritdoc/>
    public Problem? Remove(string list, int number) => ShortlistStore.Remove(catalogPath, list, number).Problem;

    /// <inheritdoc/>
    public Result<string> Export(string list, string path, bool replace, CancellationToken cancellation)
    {
        var target = new ExportTarget(path, replace, "file", catalogPath);
        return ShortlistExport.Form(target).Then(form => CatalogReading.All(catalogPath, cancellation).Then(catalog =>
            Read(list, catalog).Then(reviews => Export(list, reviews, catalog, target, form, cancellation))));
    }

    /// <inheritdoc/>
    public bool IsThere(string path) => File.Exists(path);

    private static Result<string> Export(
        string list, ImmutableArray<ShortlistReview> reviews, PartsCatalog catalog, ExportTarget target, ExportForm form,
        CancellationToken cancellation)
    {
        var view = new ShortlistView(list, reviews);
        return ShortlistExport.Purchase(view, catalog, new PurchaseOptions()).Then(purchase =>
        {
            string text = ShortlistExport.Text(view, purchase, form, new CsvStyle(), Today);
            string total = $"{new PurchaseCells(purchase).Amount(purchase.Total)} {purchase.Currency}";
            cancellation.ThrowIfCancellationRequested();
            return ShortlistExport.Save(target, text, mark: false) is { } problem
                ? Result.Fail<string>(problem)
                : Result.Ok(FormattableString.Invariant($"{purchase.Lines.Length} lines, {total}, written to {target.Path}"));
        });
    }

    private Result<ImmutableArray<ShortlistReview>> Read(string list, PartsCatalog catalog) =>
        ShortlistStore.Read(catalogPath, list).Then(found => new ShortlistReviewer(catalog).Review(found));
}
