using System.Collections.Immutable;
using PartPick.Catalog.Mapping;
using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>The lists of candidates that a catalogue keeps. An import, or newer built-in parts, leave them as they are.</summary>
public static class ShortlistStore
{
    /// <summary>Reads all lists.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <returns>The lists by name, or the problem.</returns>
    public static Result<ImmutableArray<Shortlist>> ReadAll(string path) => CatalogStore.UseCurrent(path, AllOf);

    /// <summary>Reads one list.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="name">Its name.</param>
    /// <returns>The list, or the problem: none of this name, or the catalogue cannot be used.</returns>
    public static Result<Shortlist> Read(string path, string name) =>
        ReadAll(path).Then(lists => lists.FirstOrDefault(list => list.Name == name) is { } found
            ? Result.Ok(found)
            : Result.Fail<Shortlist>(Missing(name, lists)));

    /// <summary>Puts a candidate at the end of a list, which is made where it is not there.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="name">The name of the list.</param>
    /// <param name="entry">The candidate; its number is given here.</param>
    /// <returns>The candidate with its number, or the problem.</returns>
    public static Result<ShortlistEntry> Add(string path, string name, ShortlistEntry entry)
    {
        ArgumentException.ThrowIfNullOrEmpty(name);
        ArgumentNullException.ThrowIfNull(entry);
        return CatalogChange.Hold(path, () => CatalogStore.UseCurrent(path, file =>
        {
            int last = AllOf(file).Where(list => list.Name == name).Select(list => list.Entries[^1].Number).FirstOrDefault();
            ShortlistEntry numbered = entry with { Number = last + 1 };
            file.Shortlists.Insert(ShortlistDocument.Write(name, numbered));
            return numbered;
        }));
    }

    /// <summary>Takes a candidate off a list, or the whole list away.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="name">The name of the list.</param>
    /// <param name="number">The number of the candidate; null for all.</param>
    /// <returns>How many were taken away, or the problem.</returns>
    public static Result<int> Remove(string path, string name, int? number)
    {
        ArgumentNullException.ThrowIfNull(name);
        return CatalogChange.Hold(path, () => CatalogStore.UseCurrent(path, file =>
        {
            ImmutableArray<Shortlist> lists = AllOf(file);
            if (lists.FirstOrDefault(list => list.Name == name) is not { } found)
            {
                return Result.Fail<int>(Missing(name, lists));
            }

            ShortlistEntry[] gone = [.. found.Entries.Where(entry => number is null || entry.Number == number)];
            if (gone.Length == 0)
            {
                return Result.Fail<int>(
                    "NUMBER", FormattableString.Invariant($"{number} is no candidate of {Problem.Quote(name)}"),
                    "one of " + string.Join(", ", found.Entries.Select(entry => FormattableString.Invariant($"{entry.Number}"))));
            }

            foreach (ShortlistEntry entry in gone)
            {
                file.Shortlists.Delete(ShortlistDocument.KeyOf(name, entry.Number));
            }

            return Result.Ok(gone.Length);
        }).Then(result => result));
    }

    private static ImmutableArray<Shortlist> AllOf(CatalogFile file) =>
    [
        .. file.Shortlists.FindAll()
            .Select(document => ShortlistDocument.Read(document)
                ?? throw new InvalidDataException("A candidate of a shortlist in it cannot be read."))
            .GroupBy(pair => pair.List, pair => pair.Entry, StringComparer.Ordinal)
            .OrderBy(group => group.Key, StringComparer.Ordinal)
            .Select(group => new Shortlist(group.Key, [.. group.OrderBy(entry => entry.Number)])),
    ];

    private static Problem Missing(string name, ImmutableArray<Shortlist> lists) => new(
        "NAME",
        $"there is no list {Problem.Quote(name)}",
        lists.IsEmpty
            ? "a list made with partpick shortlist add"
            : "one of " + string.Join(", ", lists.Take(10).Select(list => Problem.Quote(list.Name))));
}
