using PartPick.Catalog.Import;
using PartPick.Catalog.Tests.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests;

/// <summary>Copies of a catalogue, also while an import is under way.</summary>
public sealed class BackupTests : IDisposable
{
    private readonly ImportBench _bench = new();

    private string Copy => Path.Combine(_bench.Folder, "copy.db");

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void A_copy_brings_the_catalogue_back_as_it_was()
    {
        _bench.Run("Part No,Frequency,Load\nA1,8 MHz,18 pF\n");
        string before = _bench.Export(PartKind.Crystal);
        Assert.True(CatalogSafety.Backup(_bench.Db, Copy).IsOk);
        _bench.Run("Part No,Frequency,Load\nA1,8 MHz,20 pF\nA2,9 MHz,20 pF\n");
        Assert.NotEqual(before, _bench.Export(PartKind.Crystal));
        Assert.True(CatalogSafety.Restore(_bench.Db, Copy).IsOk);
        Assert.Equal(before, _bench.Export(PartKind.Crystal));
    }

    [Fact]
    public void During_an_import_a_copy_is_made_a_restore_and_a_second_import_are_refused_and_the_import_is_whole()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        var during = new During(_bench.Db, Copy);
        string list = "Part No,Frequency\n" + string.Concat(Enumerable.Range(0, 1500).Select(i => $"A{i},8 MHz\n"));
        Result<ImportReport> report = CatalogImport.Run(
            _bench.Db, new MemoryStream(System.Text.Encoding.UTF8.GetBytes(list)), _bench.Request(), during,
            TestContext.Current.CancellationToken);
        Assert.Equal(1500, report.Value.Added);
        Assert.True(during.Copied?.IsOk, during.Copied?.Problem?.ToString());
        foreach (Problem problem in new[] { during.Restored!.Problem!, during.Imported!.Problem! })
        {
            Assert.Contains("in use by another process", problem.ToString(), StringComparison.Ordinal);
            Assert.DoesNotContain('\n', problem.ToString());
        }

        Assert.Empty(CatalogSafety.Verify(_bench.Db).Value.Faults);
        Assert.NotNull(_bench.Entry("A1499"));
        Assert.Null(CatalogReading.Find(Copy, "A0").Value);
    }

    [Fact]
    public void A_copy_that_cannot_be_made_leaves_nothing_behind_and_says_so_in_one_line()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        Directory.CreateDirectory(Copy);
        Result<string> result = CatalogSafety.Backup(_bench.Db, Copy);
        Assert.False(result.IsOk);
        Assert.DoesNotContain('\n', result.Problem.ToString());
        Assert.Empty(Directory.GetFiles(_bench.Folder, "*.new"));
    }

    [Fact]
    public void What_is_no_catalogue_is_not_restored()
    {
        _bench.Run("Part No,Frequency\nA1,8 MHz\n");
        File.WriteAllText(Copy, "no catalogue");
        Result<CatalogCheck> result = CatalogSafety.Restore(_bench.Db, Copy);
        Assert.Contains(Copy, result.Problem!.ToString(), StringComparison.Ordinal);
        Assert.NotNull(_bench.Entry("A1"));
    }

    // Acts from within an import, once.
    private sealed class During(string db, string copy) : IProgress<ImportProgress>
    {
        public Result<string>? Copied { get; private set; }

        public Result<CatalogCheck>? Restored { get; private set; }

        public Result<ImportReport>? Imported { get; private set; }

        public void Report(ImportProgress value)
        {
            if (Copied is null)
            {
                Copied = CatalogSafety.Backup(db, copy);
                Restored = CatalogSafety.Restore(db, copy);
                Imported = CatalogImport.Run(
                    db, new StringReader("Part No,Frequency\nB1,8 MHz\n"),
                    new ImportRequest { Kind = PartKind.Crystal, Name = "b.csv", Date = new DateOnly(2026, 3, 1) },
                    TestContext.Current.CancellationToken);
            }
        }
    }
}
