using System.Globalization;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Screens;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

public sealed class ImportScreenTests : IDisposable
{
    private const string Small =
        "Part No,Freq,Cap A (pF),ESR max,Remark\nA-1,4.096 MHz,3,100 Ohm,one\nA-2,eight,3,60 Ohm,two\nA-3,8 MHz,4,40 Ohm,three\n";

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-import-").FullName;

    private string CatalogFile => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Fact]
    public void A_list_is_imported_with_a_changed_column_its_rejected_row_is_told_and_it_is_taken_back()
    {
        using Bench bench = Begin(Small);
        Assert.Contains("5 columns, ", bench.Text, StringComparison.Ordinal);
        Assert.Contains("4.096 MHz | eight | 8 MHz", bench.Text, StringComparison.Ordinal);

        GoTo(bench, "Cap A (pF)");
        bench.Press(Key.Enter);
        Clear(bench);
        bench.Type("shu");
        Assert.Contains("shunt; a unit behind a colon", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Equal("shunt", Import(bench).Look!.Columns[2].Field);
        Assert.Contains(": stated", bench.Text, StringComparison.Ordinal);

        bench.Press(new Key('r'));
        Assert.Contains("1 would be rejected", bench.Text, StringComparison.Ordinal);
        Assert.Contains("shunt 3 pF", bench.Text.ReplaceLineEndings(" "), StringComparison.Ordinal);
        bench.Press(Key.CursorDown);
        Assert.Contains("rejected: Freq: 'eight'", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);

        bench.Press(new Key('d'));
        bench.Settle();
        Assert.Contains("3 read = 2 added + 0 updated + 0 unchanged + 1 rejected; nothing was", bench.Text, StringComparison.Ordinal);
        Assert.Null(CatalogReading.Find(CatalogFile, "A-1").Value);

        bench.Press(new Key('i'));
        bench.Settle();
        Assert.Contains("3 read = 2 added + 0 updated + 0 unchanged + 1 rejected", bench.Text, StringComparison.Ordinal);
        Assert.Contains("list.rejected.csv", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Freq: 'eight'", bench.Text, StringComparison.Ordinal);
        Assert.Contains("eight", File.ReadAllText(Path.Combine(_directory, "list.rejected.csv")), StringComparison.Ordinal);
        Assert.Equal(3e-12, ((CrystalPart)CatalogReading.Find(CatalogFile, "A-1").Value!.Part).ShuntFarads!.Value, 1e-18);

        bench.Press(Key.Esc);
        bench.Settle();
        Assert.Contains($"{PartsCatalog.BuiltIn().Crystals.Length + 2} crystals", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("list.csv line 2, 2026-03-01", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc, new Key('u'));
        bench.Settle();
        Assert.Contains("u once more takes back list.csv", bench.Text, StringComparison.Ordinal);
        Assert.NotNull(CatalogReading.Find(CatalogFile, "A-1").Value);
        bench.Press(new Key('u'));
        bench.Settle();
        Assert.Contains("Taken back: list.csv", bench.Text, StringComparison.Ordinal);
        Assert.Null(CatalogReading.Find(CatalogFile, "A-1").Value);
        Assert.Contains($"─ {PartsCatalog.BuiltIn().Crystals.Length} crystals", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Another_key_after_u_takes_nothing_back()
    {
        using Bench bench = Begin(Small);
        bench.Press(new Key('i'));
        bench.Settle();
        bench.Press(new Key('u'));
        bench.Settle();
        bench.Press(Key.CursorDown, new Key('u'));
        bench.Settle();
        Assert.Contains("u once more", bench.Text, StringComparison.Ordinal);
        Assert.NotNull(CatalogReading.Find(CatalogFile, "A-1").Value);
    }

    [Fact]
    public void Columns_kept_under_a_name_read_the_next_list()
    {
        using Bench bench = Begin(Small);
        GoTo(bench, "Cap A (pF)");
        while (Import(bench).Look!.Columns[2].Field != "shunt")
        {
            bench.Press(Key.CursorRight);
            bench.Settle();
        }

        bench.Press(new Key('k'));
        bench.Type("shop");
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("The columns are kept under shop.", bench.Text, StringComparison.Ordinal);
        Assert.Equal(["shop"], ColumnMaps.Names(CatalogFile, PartKind.Crystal).Value);

        using Bench next = Begin(Small.Replace("A-", "B-", StringComparison.Ordinal));
        Assert.NotEqual("shunt", Import(next).Look!.Columns[2].Field);
        next.Press(Key.CursorDown, Key.CursorDown, Key.Enter);
        next.Settle();
        Assert.Contains("columns as kept   shop", next.Text, StringComparison.Ordinal);
        Assert.Equal("shunt", Import(next).Look!.Columns[2].Field);
    }

    [Fact]
    public void A_column_can_be_left_out_and_found_again()
    {
        using Bench bench = Begin(Small);
        GoTo(bench, "ESR max");
        bench.Press(Key.Delete);
        bench.Settle();
        Assert.Null(Import(bench).Look!.Columns[3].Field);
        bench.Press(new Key('b'));
        bench.Settle();
        Assert.Equal("resistance", Import(bench).Look!.Columns[3].Field);
    }

    [Fact]
    public void A_list_without_numbers_is_not_begun_and_a_file_that_is_not_there_is_said()
    {
        using Bench bench = Begin("Freq,CL (pF)\n4 MHz,18\n");
        bench.Press(new Key('i'));
        bench.Settle();
        Assert.Contains("! columns: none of them holds a supplier's number", bench.Text, StringComparison.Ordinal);

        using Bench other = Begin(Small, "nowhere.csv");
        Assert.Contains("is not there", other.Text.ReplaceLineEndings(" "), StringComparison.Ordinal);
        other.Press(new Key('i'));
        Assert.Equal(ImportStep.Columns, Import(other).Step);
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void A_running_import_shows_how_far_it_is_and_a_stop_leaves_the_catalogue_as_it_was(bool ctrlC)
    {
        string rows = string.Concat(Enumerable.Range(0, 150_000).Select(i => string.Create(
            CultureInfo.InvariantCulture, $"L-{i:D6},{4 + (i % 20)} MHz,3,{20 + (i % 50)} Ohm,row {i}\n")));
        using Bench bench = Begin("Part No,Freq,C0 (pF),ESR max,Remark\n" + rows);
        byte[] before = File.ReadAllBytes(CatalogFile);
        bench.Press(new Key('i'));
        bench.SettleUntil(() => Import(bench).Run.Progress.Rows > 0);
        Assert.Contains("rows/s", bench.Text, StringComparison.Ordinal);
        Assert.Contains("s left", bench.Text, StringComparison.Ordinal);
        Assert.Contains(" %", bench.Text, StringComparison.Ordinal);

        bench.Press(ctrlC ? Key.C.WithCtrl : Key.Esc);
        bench.Settle();

        Assert.Contains("Stopped; the catalogue is as it was.", bench.Text, StringComparison.Ordinal);
        Assert.Equal(ImportStep.Columns, Import(bench).Step);
        Assert.Equal(before, File.ReadAllBytes(CatalogFile));
        Assert.DoesNotContain(Directory.GetFiles(_directory), path => path.EndsWith(".copy", StringComparison.Ordinal));
        Assert.False(File.Exists(Path.Combine(_directory, "list.rejected.csv")));
    }

    [Fact]
    public void What_would_steer_a_terminal_is_shown_harmlessly()
    {
        using Bench bench = Begin(
            "Part No,Freq,Description,Maker\u001b[2J\nE-1,4 MHz,red \u001b[31mtext\u0007 \u202Eback,\u009b5m\nE-2,5 MHz,\u200Bplain,x\n");
        AssertHarmless(bench);
        bench.Press(new Key('r'));
        AssertHarmless(bench);
        bench.Press(new Key('i'));
        bench.Settle();
        AssertHarmless(bench);
        bench.Press(Key.Esc);
        bench.Settle();
        AssertHarmless(bench);
        Assert.Contains("E-1", bench.Rows[4], StringComparison.Ordinal);
        bench.Press(Key.Enter);
        bench.Settle();
        Assert.Contains("red ", bench.Text, StringComparison.Ordinal);
        AssertHarmless(bench);
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(120, 40)]
    public void Every_step_fits_the_screen(int width, int height)
    {
        using Bench bench = Begin(Small, width: width, height: height);
        AssertFits();
        bench.Press(new Key('r'));
        AssertFits();
        bench.Press(new Key('d'));
        bench.Settle();
        AssertFits();
        Assert.Contains("2 added", bench.Text.ReplaceLineEndings(" "), StringComparison.Ordinal);

        void AssertFits()
        {
            Assert.Equal(height, bench.Rows.Length);
            Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
            Assert.Contains("? keys", bench.Rows[^1], StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Tab_completes_a_path()
    {
        File.WriteAllText(Path.Combine(_directory, "stock of march.csv"), Small);
        string typed = Path.Combine(_directory, "sto");
        Assert.Equal(Path.Combine(_directory, "stock of march.csv"), PathCompletion.Of(typed));
        Assert.Equal("/nowhere/x", PathCompletion.Of("/nowhere/x"));
    }

    private static ImportPage Import(Bench bench) => bench.Model.Parts!.Import;

    private static void AssertHarmless(Bench bench) =>
        Assert.DoesNotContain(bench.Text, sign => (char.IsControl(sign) && sign is not ('\n' or '\r'))
            || sign is '\u202E' or '\u200B' or '\u009b');

    private static void Clear(Bench bench)
    {
        while (Import(bench).Typed is { Text.Length: > 0 })
        {
            bench.Press(Key.Backspace);
        }
    }

    private static void GoTo(Bench bench, string header)
    {
        for (int i = 0; Import(bench).Choices.ColumnOf(Import(bench))?.Header != header; i++)
        {
            Assert.True(i < 100, header + " is not on the page.");
            bench.Press(Key.CursorDown);
        }
    }

    private Bench Begin(string text, string name = "list.csv", int width = 80, int height = 24)
    {
        File.WriteAllText(Path.Combine(_directory, "list.csv"), text);
        var bench = new Bench(width, height, catalogue: CatalogFile);
        bench.Press(new Key('c'));
        bench.Settle();
        bench.Press(new Key('i'));
        bench.Settle();
        bench.Type(Path.Combine(_directory, name));
        bench.Press(Key.Enter);
        bench.Settle();
        return bench;
    }
}
