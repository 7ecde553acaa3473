using PartPick.Catalog.Import;

namespace PartPick.Catalog.Tests.Import;

public sealed class CatalogImportTests : IDisposable
{
    private const string List = "Part Number,Frequency,Load Cap.,ESR max,Freq Tol,Stock,Price (EUR)\n"
        + "A1,4.000MHz,18pF,100 Ohm,±30ppm,\"1,200\",0.42\n"
        + "A2,8 MHz,N/A,60 Ohms,±20ppm,-,€0.55\n";

    private readonly ImportBench _bench = new();

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void A_new_row_becomes_a_part_with_the_origin_of_each_figure()
    {
        ImportReport report = _bench.Run(List);
        Assert.Equal((2, 2), (report.Read, report.Added));
        CrystalPart part = _bench.Crystal("A1");
        Assert.Equal(
            (4e6, 18e-12, 100, 30e-6, 1200),
            (part.FrequencyHz, part.LoadFarads, part.ResistanceOhms, part.ToleranceRatio, part.Stock));
        Assert.Equal(Basis.Maximum, part.BasisOf("resistance"));
        Assert.Equal("list.csv line 2, 2026-03-01", _bench.Entry("A1").Origin["load"]);
        Assert.Equal((Basis.Assumed, Basis.Assumed), (part.BasisOf("cut"), part.BasisOf("overtone")));
        Assert.StartsWith("assumed", _bench.Entry("A1").Origin["cut"], StringComparison.Ordinal);
        Assert.Null(_bench.Crystal("A2").LoadFarads);
    }

    [Fact]
    public void The_same_file_again_changes_nothing()
    {
        _bench.Run(List);
        byte[] before = File.ReadAllBytes(_bench.Db);
        ImportReport again = _bench.Run(List);
        Assert.Equal((2, 0, 0, 2), (again.Read, again.Added, again.Updated, again.Unchanged));
        Assert.Equal(before, File.ReadAllBytes(_bench.Db));
    }

    [Fact]
    public void The_same_number_with_another_price_updates_the_part_and_keeps_what_the_file_does_not_state()
    {
        _bench.Run(List);
        ImportReport report = _bench.Run(
            _bench.Request(name: "prices.csv"), "SKU,Unit Price,Currency,Qty Available\nA1,0.39,EUR,7\nA2,0.55,EUR,\n");
        Assert.Equal((2, 1, 1), (report.Read, report.Updated, report.Unchanged));
        CrystalPart part = _bench.Crystal("A1");
        Assert.Equal((0.39m, 7, 18e-12), (part.Offer.Prices[0].UnitPrice, part.Stock, part.LoadFarads));
        Assert.Equal("prices.csv line 2, 2026-03-01", _bench.Entry("A1").Origin["prices"]);
        Assert.Equal("list.csv line 2, 2026-03-01", _bench.Entry("A1").Origin["load"]);
        Assert.Equal(Basis.Assumed, part.BasisOf("cut"));
    }

    [Fact]
    public void An_undo_brings_back_every_part_as_it_was()
    {
        _bench.Run(List);
        string before = _bench.Export(PartKind.Crystal);
        _bench.Run("Part Number,Frequency,Load Cap.,Stock\nA1,4 MHz,20 pF,1\nA3,16 MHz,9 pF,5\n");
        Assert.NotEqual(before, _bench.Export(PartKind.Crystal));
        Assert.Equal((1, 1), CatalogImport.Undo(_bench.Db).Value is { } note ? (note.Added, note.Updated) : default);
        Assert.Equal(before, _bench.Export(PartKind.Crystal));
        Assert.Equal("list.csv line 2, 2026-03-01", _bench.Entry("A1").Origin["load"]);
        Assert.Null(CatalogImport.Undo(_bench.Db).Value);
    }

    [Fact]
    public void A_dry_run_writes_nothing()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        byte[] before = File.ReadAllBytes(_bench.Db);
        ImportReport report = _bench.Run(_bench.Request() with { DryRun = true, Map = "shop" }, List + "A3,nine,,,,,\n");
        Assert.Equal((3, 2, 1, true), (report.Read, report.Added, report.Rejected, report.DryRun));
        Assert.Equal(before, File.ReadAllBytes(_bench.Db));
        Assert.False(File.Exists(_bench.RejectedPath));
    }

    [Fact]
    public void A_stopped_import_leaves_the_catalogue_as_it_was()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        byte[] before = File.ReadAllBytes(_bench.Db);
        using var stop = new CancellationTokenSource();
        var rows = string.Concat(Enumerable.Range(0, 20000).Select(i => $"P{i},4 MHz,18 pF\n"));
        var stopping = new StopAt(6000, stop);
        Assert.Throws<OperationCanceledException>(() => CatalogImport.Run(
            _bench.Db,
            new MemoryStream(System.Text.Encoding.UTF8.GetBytes("Part Number,Frequency,Load\n" + rows)),
            _bench.Request(),
            stopping,
            stop.Token));
        Assert.Equal(before, File.ReadAllBytes(_bench.Db));
        Assert.Empty(Directory.GetFiles(_bench.Folder, "*.copy*"));
        Assert.Null(CatalogReading.Find(_bench.Db, "P1").Value);
    }

    [Fact]
    public void Rejected_rows_can_be_mended_and_imported()
    {
        ImportReport report = _bench.Run(List + "A3,nine MHz,18pF,50,20,1,0.3\nA4,9 MHz,18uF,50,20 ppm,1,0.3\n");
        Assert.Equal(2, report.Rejected);
        Assert.Equal([4L, 5L], report.Rejections.Select(row => row.Line));
        Assert.Equal(["Frequency", "Load Cap."], report.Rejections.Select(row => row.Column));
        string rejected = File.ReadAllText(_bench.RejectedPath);
        string mended = rejected.Replace("nine MHz", "9 MHz", StringComparison.Ordinal).Replace("18uF", "18pF", StringComparison.Ordinal)
            .Replace(",50,20,1", ",50,20 ppm,1", StringComparison.Ordinal);
        ImportReport second = _bench.Run(mended);
        Assert.Equal((2, 2, 0), (second.Read, second.Added, second.Rejected));
        Assert.Equal(9e6, _bench.Crystal("A3").FrequencyHz);
    }

    [Fact]
    public void A_map_is_kept_under_its_name_and_used_again()
    {
        ImportRequest request = _bench.Request() with
        {
            Map = "shop",
            Columns = ["Zahl=supplierPart", "Eins=frequency:MHz", "Zwei=load:pF"],
        };
        Assert.Equal(1, _bench.Run(request, "Zahl,Eins,Zwei\nM1,4,18\n").Added);
        ImportReport second = _bench.Run(_bench.Request() with { Map = "shop" }, "Zahl,Eins,Zwei\nM2,8,20\n");
        Assert.Equal((1, 20e-12), (second.Added, _bench.Crystal("M2").LoadFarads));
        Assert.Equal(["shop"], CatalogReading.Info(_bench.Db).Value.Maps);
    }

    [Fact]
    public void A_second_change_at_the_same_time_is_refused_in_one_line()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        using IDisposable held = CatalogLock.Take(_bench.Db + ".change", TimeSpan.Zero).Value;
        string problem = _bench.Try(_bench.Request(), System.Text.Encoding.UTF8.GetBytes(List)).Problem!.ToString();
        Assert.Contains("in use", problem, StringComparison.Ordinal);
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
    }

    [Fact]
    public void Settings_kept_during_an_import_are_there_after_it()
    {
        Assert.True(CatalogStore.Load(_bench.Db).IsOk);
        var keeping = new KeepSetting(_bench.Db);
        string rows = string.Concat(Enumerable.Range(0, 3000).Select(i => $"P{i},4 MHz,18 pF\n"));
        Assert.True(CatalogImport.Run(
            _bench.Db,
            new MemoryStream(System.Text.Encoding.UTF8.GetBytes("Part Number,Frequency,Load\n" + rows)),
            _bench.Request(),
            keeping,
            TestContext.Current.CancellationToken).IsOk);
        Assert.Equal("kept", CatalogStore.ReadSetting(_bench.Db, "during").Value);
        Assert.Equal(4e6, _bench.Crystal("P2999").FrequencyHz);
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Every_kind_goes_out_and_comes_back_byte_for_byte(PartKind kind)
    {
        Part[] own =
        [
            .. Samples.All
                .Where(part => part.Kind == kind)
                .Select(part => part with { Note = "'=1+1", Supplier = "-2+3|x", Package = "@sum" }),
        ];
        string csv = Samples.Csv(kind, own);
        ImportReport report = _bench.Run(_bench.Request(kind), csv);
        Assert.Equal((own.Length, 0), (report.Added, report.Rejected));
        string exported = _bench.Export(kind);
        using var other = new ImportBench();
        Assert.Equal(0, other.Run(other.Request(kind), exported).Rejected);
        Assert.Equal(exported, other.Export(kind));
        Assert.Equal("'=1+1", _bench.Entry(own[0].Id).Part.Note);
        Assert.DoesNotContain(",-2+3", exported, StringComparison.Ordinal);
    }

    public static TheoryData<PartKind> Kinds => [.. PartKinds.All];

    private sealed class StopAt(long rows, CancellationTokenSource stop) : IProgress<ImportProgress>
    {
        public void Report(ImportProgress value)
        {
            if (value.Rows >= rows)
            {
                stop.Cancel();
            }
        }
    }

    private sealed class KeepSetting(string db) : IProgress<ImportProgress>
    {
        public void Report(ImportProgress value) => Assert.Null(CatalogStore.WriteSetting(db, "during", "kept"));
    }
}
