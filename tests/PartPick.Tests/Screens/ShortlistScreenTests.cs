using PartPick.Catalog;
using PartPick.Screens;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens;

/// <summary>Putting circuits on lists and the page of a list, by the keys that a person presses.</summary>
public sealed class ShortlistScreenTests
{
    private readonly string _db = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "screens.db");

    [Fact]
    public void S_and_Enter_put_the_chosen_circuit_on_the_usual_list_for_the_wanted_boards()
    {
        using Bench bench = Open();
        bench.Do(Key.CursorDown, new Key('s'));
        Assert.Contains("list default", bench.Text, StringComparison.Ordinal);
        Assert.Contains("boards 200", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Enter);
        Assert.Contains("Candidate 1 of the list default; l shows the list.", bench.Rows[^1], StringComparison.Ordinal);
        ShortlistEntry entry = Entries("default").Single();
        Assert.Equal(200, entry.Builds);
        Assert.Contains(SampleRanking.SecondCounter.Choice.Crystal.Id, entry.Choice, StringComparison.Ordinal);
        Assert.Equal(1, bench.Model.List.At);
    }

    [Fact]
    public void Name_boards_and_note_are_typed_in_place_and_the_name_stays_for_the_next()
    {
        using Bench bench = Open();
        bench.Do(new Key('s'));
        bench.Type("logger");
        bench.Do(Key.Tab);
        bench.Type("75");
        bench.Do(Key.Tab);
        bench.Type("quiet one?");
        bench.Do(Key.Enter);
        ShortlistEntry entry = Entries("logger").Single();
        Assert.Equal((75, "quiet one?"), (entry.Builds, entry.Note));
        bench.Do(new Key('s'));
        Assert.Contains("list logger", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Esc);
        Assert.Single(Entries("logger"));
        Assert.Contains("Enter open", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Wrong_boards_are_said_and_can_be_mended()
    {
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Tab);
        bench.Type("many");
        bench.Do(Key.Enter);
        Assert.Contains("! boards: 'many'", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.Backspace, Key.Backspace, Key.Backspace, Key.Backspace);
        bench.Type("12");
        bench.Do(Key.Enter);
        Assert.Equal(12, Entries("default").Single().Builds);
    }

    [Fact]
    public void A_circuit_that_is_open_can_be_put_on_a_list_too()
    {
        using Bench bench = Open();
        bench.Do(Key.Enter, new Key('s'), Key.Enter);
        Assert.Single(Entries("default"));
        Assert.Equal(Place.Circuit, bench.Model.Place);
    }

    [Fact]
    public void The_page_shows_each_candidate_and_marks_what_changed_since()
    {
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Enter, Key.CursorDown, new Key('s'), Key.Enter);
        string crystal = SampleRanking.Counter.Choice.Crystal.Id;
        Assert.True(CatalogEdit.Set(_db, crystal, [("stock", "50")], new DateOnly(2026, 1, 2)).IsOk);
        bench.Do(new Key('l'));
        string text = bench.Text;
        Assert.Contains("List default: 2 candidates, 1 changed, ", text, StringComparison.Ordinal);
        Assert.Contains("unfit, changed", text, StringComparison.Ordinal);
        Assert.Contains(crystal + ": stock ", text, StringComparison.Ordinal);
        Assert.Contains("→ 50", text, StringComparison.Ordinal);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= 80));
        bench.Do(Key.CursorDown);
        Assert.DoesNotContain("→ 50", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.Esc);
        Assert.Contains("circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(40, 12)]
    [InlineData(60, 16)]
    [InlineData(160, 50)]
    public void The_page_and_the_question_fit_every_size(int width, int height)
    {
        using Bench bench = Open(width, height);
        bench.Do(new Key('s'), Key.Enter, new Key('l'));
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        Assert.Contains("List default", bench.Text, StringComparison.Ordinal);
        bench.Do(new Key('x'));
        bench.Type(new string('a', 200));
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        Assert.Contains("aaa", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void X_writes_the_list_to_a_file_and_never_over_another_one_unasked()
    {
        string path = Path.Combine(Path.GetDirectoryName(_db)!, "r.html");
        File.WriteAllText(path, "mine");
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Enter, new Key('l'), new Key('x'));
        Assert.Contains("default.html", bench.Text, StringComparison.Ordinal);
        bench.Type(path);
        bench.Do(Key.Enter);
        Assert.Contains("It is there already", bench.Rows[^1], StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(path));
        bench.Do(Key.Enter);
        Assert.StartsWith("<!DOCTYPE html>", File.ReadAllText(path), StringComparison.Ordinal);
        Assert.Contains("lines", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_cannot_be_is_said_and_asked_again()
    {
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Enter, new Key('l'), new Key('x'));
        bench.Type(" ");
        bench.Do(Key.Enter);
        Assert.Contains("! file: '' is no path", bench.Rows[^1], StringComparison.Ordinal);
        bench.Type(_db);
        bench.Do(Key.Enter, Key.Enter);
        Assert.Contains("! file: is the catalogue itself", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.Esc);
        Assert.Contains("List default", bench.Text, StringComparison.Ordinal);
        Assert.Single(Entries("default"));
    }

    [Fact]
    public void Del_twice_takes_a_candidate_off_and_another_key_between_keeps_it()
    {
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Enter, Key.CursorDown, new Key('s'), Key.Enter, new Key('l'));
        bench.Do(Key.Delete, Key.CursorDown, Key.Delete);
        Assert.Equal(2, Entries("default").Length);
        bench.Do(Key.Delete);
        Assert.Equal([1], Entries("default").Select(entry => entry.Number));
        bench.Do(Key.Delete, Key.Delete);
        Assert.Contains("There is no list yet", bench.Text, StringComparison.Ordinal);
        bench.Do(Key.CursorDown);
        Assert.Contains("circuits fit", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Without_any_list_l_says_how_one_is_made()
    {
        using Bench bench = Open();
        bench.Do(new Key('l'));
        Assert.Contains("There is no list yet; s puts the chosen circuit on one.", bench.Rows[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void A_catalogue_that_cannot_be_used_is_one_line()
    {
        File.WriteAllText(_db, new string('x', 8192));
        using Bench bench = Open();
        bench.Do(new Key('s'), Key.Enter);
        Assert.Contains("! ", bench.Rows[^1], StringComparison.Ordinal);
        bench.Do(Key.Esc, new Key('q'));
        Assert.True(bench.Model.IsDone);
    }

    private Bench Open(int width = 80, int height = 24)
    {
        var bench = new Bench(width, height);
        bench.KeepLists(_db);
        return bench;
    }

    private ShortlistEntry[] Entries(string list) => [.. ShortlistStore.Read(_db, list).Value.Entries];
}
