using System.Text;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>A directory of its own with a catalogue, and imports into it.</summary>
internal sealed class ImportBench : IDisposable
{
    public string Folder { get; } = Directory.CreateTempSubdirectory("partpick-import-").FullName;

    public string Db => Path.Combine(Folder, "catalog.db");

    public string RejectedPath => Path.Combine(Folder, "rejected.csv");

    public void Dispose() => Directory.Delete(Folder, recursive: true);

    public ImportRequest Request(PartKind kind = PartKind.Crystal, string name = "list.csv") =>
        new() { Kind = kind, Name = name, RejectedPath = RejectedPath, Date = new DateOnly(2026, 3, 1) };

    public Result<ImportReport> Try(ImportRequest request, byte[] bytes) =>
        CatalogImport.Run(Db, new MemoryStream(bytes), request, null, TestContext.Current.CancellationToken);

    public ImportReport Run(ImportRequest request, string text)
    {
        Result<ImportReport> result = Try(request, Encoding.UTF8.GetBytes(text));
        Assert.True(result.IsOk, result.Problem?.ToString());
        ImportReport report = result.Value;
        Assert.Equal(report.Read, report.Added + report.Updated + report.Unchanged + report.Rejected);
        return report;
    }

    public ImportReport Run(string text, PartKind kind = PartKind.Crystal) => Run(Request(kind), text);

    public CatalogEntry Entry(string id)
    {
        Result<CatalogEntry?> found = CatalogReading.Find(Db, id);
        Assert.True(found.IsOk, found.Problem?.ToString());
        Assert.NotNull(found.Value);
        return found.Value;
    }

    public CrystalPart Crystal(string id) => (CrystalPart)Entry(id).Part;

    public string Export(PartKind kind)
    {
        var parts = new List<Part>();
        Assert.True(CatalogReading.Each(Db, kind, entry => parts.Add(entry.Part)).IsOk);
        return Samples.Csv(kind, parts);
    }
}
