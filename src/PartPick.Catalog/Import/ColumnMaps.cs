using System.Collections.Immutable;
using PartPick.Values;

namespace PartPick.Catalog.Import;

/// <summary>The column maps that a catalogue keeps.</summary>
public static class ColumnMaps
{
    /// <summary>The names of the maps of a kind, in order.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="kind">The kind.</param>
    public static Result<ImmutableArray<string>> Names(string path, PartKind kind) => CatalogStore.UseCurrent(
        path, file => (ImmutableArray<string>)
        [
            .. file.MapNames().Where(name => ColumnMapText.Read(file.ReadMap(name) ?? "", kind) is not null)
                .Order(StringComparer.Ordinal),
        ]);

    /// <summary>Keeps the columns of a file under a name; a map of that name is replaced.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="name">The name.</param>
    /// <param name="source">The bytes of the file; read no further than its first rows, and closed.</param>
    /// <param name="request">What is to be imported, and how.</param>
    /// <returns>The name, or the problem.</returns>
    public static Result<string> Keep(string path, string name, Stream source, ImportRequest request)
    {
        ArgumentException.ThrowIfNullOrEmpty(name);
        using var text = SourceText.Of(source);
        return ImportPlan.Make(path, text, request).Then(plan => CatalogChange.Hold(
            path,
            () => CatalogStore.UseCurrent(path, file =>
            {
                file.WriteMap(name, ColumnMapText.Write(request.Kind, plan.Uses));
                return name;
            })));
    }
}
