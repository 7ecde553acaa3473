using PartPick.Catalog;
using PartPick.Requirements;
using PartPick.Screens;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>What stands side by side at which width.</summary>
public sealed class ColumnsTests
{
    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "columns.db");

    [Theory]
    [InlineData(120, 40)]
    [InlineData(160, 50)]
    public void Enter_opens_the_circuit_beside_the_list_and_both_stay_in_sight(int width, int height)
    {
        using Bench bench = Open(width, height);
        bench.Do(Key.CursorDown, Key.Enter);
        Assert.Equal(Place.Circuit, bench.Model.Place);
        Assert.Contains("Wanted: 1 kHz square", bench.Rows[0], StringComparison.Ordinal);
        string[] left = [.. bench.Rows.Select(row => row[..Math.Min(43, row.Length)])];
        Assert.Contains(left, row => row.Contains("5 circuits fit", StringComparison.Ordinal));
        Assert.Equal(2, left.Count(row => row.Contains("CNT-14-HC", StringComparison.Ordinal)));
        Assert.Contains(left, row => row.Contains("MCU-KHZ-C", StringComparison.Ordinal));
        Assert.Contains(bench.Rows, row => row.Contains("2 of 5, more below", StringComparison.Ordinal));
        string before = string.Join('\n', left);
        bench.Do(Key.End);
        Assert.Contains("Score 1.900", bench.Text, StringComparison.Ordinal);
        Assert.Equal(before, string.Join('\n', bench.Rows.Select(row => row[..Math.Min(43, row.Length)])));
        bench.Do(Key.Esc);
        Assert.Contains("÷16384", bench.Text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
    }

    [Fact]
    public void At_80_columns_the_circuit_takes_the_place_of_the_list()
    {
        using Bench bench = Open(80, 24);
        bench.Do(Key.Enter);
        Assert.DoesNotContain("5 circuits fit", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Esc);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void At_120_columns_the_circuit_stays_in_sight_while_the_sentence_is_edited()
    {
        using Bench bench = Open(120, 40);
        bench.Do(Key.Enter, new Key('e'));
        bench.Type("1k");
        Assert.Equal(Place.Sentence, bench.Model.Place);
        Assert.Contains("decoupling", bench.Text, StringComparison.Ordinal);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Enter, Key.Esc);
        Assert.Equal(Place.Circuit, bench.Model.Place);
    }

    [Fact]
    public void At_160_columns_the_list_of_kept_circuits_is_the_third_column_and_s_adds_to_it()
    {
        using Bench bench = Open(160, 50);
        Assert.Contains(Right(bench), row => row.Contains("Lists ", StringComparison.Ordinal) && Ends(row, "none yet ──"));
        Assert.Contains("s puts the chosen circuit on a list", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.CursorDown, new Key('s'), Key.Enter);
        string[] right = Right(bench);
        Assert.Contains(right, row => row.Contains("List default", StringComparison.Ordinal));
        Assert.Contains(right, row => row.Contains("1 CNT-14-HC", StringComparison.Ordinal));
        bench.Do(Key.Enter);
        Assert.Contains(Right(bench), row => row.Contains("1 CNT-14-HC", StringComparison.Ordinal));
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
        bench.Do(new Key('n'), new Key('s'), Key.Enter, Key.Esc);
        Assert.Contains(Right(bench), row => row.Contains("2 INV-HC-U-1", StringComparison.Ordinal));
        bench.Resize(120, 40);
        Assert.DoesNotContain("List default", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_column_says_which_of_its_circuits_have_changed_parts()
    {
        var desk = new CatalogDesk(_db);
        CancellationToken cancellation = TestContext.Current.CancellationToken;
        Assert.True(desk.Put("default", ListStudyTests.Fit(), SampleRanking.Wanted, null, null, cancellation).IsOk);
        Assert.True(desk.Put("default", SampleRanking.SecondCounter.Choice, SampleRanking.Wanted, null, null, cancellation).IsOk);
        using (Bench second = Open(160, 50))
        {
            Assert.Contains(Right(second), row => row.Contains("2 CNT-14-HC", StringComparison.Ordinal) && Ends(row, "unfit"));
            Assert.DoesNotContain("changed", string.Concat(Right(second)), StringComparison.Ordinal);
        }

        Assert.True(CatalogEdit.Set(_db, "X-04M096-20-H49-10", [("stock", "7000000")], new DateOnly(2026, 1, 2)).IsOk);
        using Bench third = Open(160, 50);
        Assert.Contains(Right(third), row => row.Contains("1 CNT-14-HC", StringComparison.Ordinal) && Ends(row, "changed"));
    }

    [Fact]
    public void At_120_columns_lists_what_is_kept_and_the_keys_open_beside_the_list()
    {
        using Bench bench = Open(120, 40);
        bench.Do(new Key('s'), Key.Enter);
        (char, string)[] pages = [('l', "List default: 1 candidate"), ('w', "Wanted: nothing is kept yet"), ('?', "In the list")];
        foreach ((char key, string title) in pages)
        {
            bench.Do(new Key(key));
            Assert.Contains(title, bench.Text, StringComparison.Ordinal);
            Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
            Assert.All(bench.Rows, row => Assert.True(row.Length <= 120));
            bench.Do(Key.Esc);
        }
    }

    [Fact]
    public void Keys_go_on_while_a_circuit_is_being_put_on_a_list_and_Esc_stops_that()
    {
        using var lockFile = new FileStream(_db + ".lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        using Bench bench = Open(80, 24, settle: false);
        bench.Press(new Key('s'), Key.Enter);
        Assert.Contains("Putting it on the list default; Esc stops it.", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(Key.CursorDown);
        Assert.Equal(1, bench.Model.List.At);
        bench.Press(Key.Esc);
        lockFile.Dispose();
        bench.Settle();
        Assert.Contains("Stopped; it is not on the list.", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Empty(ShortlistStore.ReadAll(_db).Value);
    }

    [Fact]
    public void The_first_start_shows_the_river_logger()
    {
        using var bench = new Bench(requirement: FirstRequirement.RiverLogger);
        Assert.Contains("river logger time base: 1 kHz square, within ±80 ppm for 5 years", bench.Rows[0], StringComparison.Ordinal);
        Assert.Contains("200 boards at 2.50", bench.Text, StringComparison.Ordinal);
        Assert.Contains("5 circuits fit", bench.Text, StringComparison.Ordinal);
    }

    private static bool Ends(string row, string end) => row.EndsWith(end, StringComparison.Ordinal);

    private static string[] Right(Bench bench) => [.. bench.Rows.Select(row => row.Length > 120 ? row[120..] : "")];

    private Bench Open(int width, int height, bool settle = true)
    {
        var bench = new Bench(width, height);
        bench.KeepLists(_db);
        bench.KeepWanted(_db);
        if (settle)
        {
            bench.Do();
            bench.Press(Key.Home);
            bench.Settle();
        }

        return bench;
    }
}
