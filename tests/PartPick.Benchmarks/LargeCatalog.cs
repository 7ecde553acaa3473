using System.Globalization;
using PartPick.Catalog;
using PartPick.Catalog.Import;

namespace PartPick.Benchmarks;

/// <summary>A catalogue with a generated list of crystals beside the built-in parts, in a folder of its own that goes with it.</summary>
internal sealed class LargeCatalog : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("partpick-bench-");

    /// <param name="rows">Number of rows of the list.</param>
    public LargeCatalog(int rows)
    {
        string list = System.IO.Path.Combine(_folder.FullName, "list.csv");
        ImportTable.WriteList(list, rows);
        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = new DateOnly(2026, 3, 1) };
        using FileStream stream = File.OpenRead(list);
        Added = CatalogImport.Run(Path, stream, request, null, CancellationToken.None).Value.Added;
    }

    /// <summary>The catalogue's path.</summary>
    public string Path => System.IO.Path.Combine(_folder.FullName, "catalog.db");

    /// <summary>Number of parts that came of the list.</summary>
    public int Added { get; }

    /// <summary>Number of rows asked for on the command line.</summary>
    public static int RowsOf(string[] arguments, int otherwise) =>
        arguments.Length > 0 ? int.Parse(arguments[0], CultureInfo.InvariantCulture) : otherwise;

    /// <inheritdoc/>
    public void Dispose() => _folder.Delete(recursive: true);
}
