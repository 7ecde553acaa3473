using System.Diagnostics;
using LiteDB;
using PartPick.Values;

namespace PartPick.Catalog.Tests;

public sealed class CatalogStoreTests : IDisposable
{
    private static readonly TimeSpan Brief = TimeSpan.FromMilliseconds(60);

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-").FullName;

    private string Db => Path.Combine(_directory, "deeper", "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Fact]
    public void The_first_run_makes_the_file_and_later_runs_read_the_same_parts()
    {
        string expected = Samples.Text(new PartsCatalog(Samples.All));
        Assert.Equal(expected, Samples.Text(Load(Samples.All)));
        Assert.Equal(expected, Samples.Text(Load(Samples.All)));
        Assert.Equal(["catalog.db", "catalog.db.lock"], Directory.GetFiles(Path.GetDirectoryName(Db)!).Select(Path.GetFileName).Order());
    }

    [Fact]
    public void The_parts_inside_the_program_are_what_a_new_file_holds() =>
        Assert.Equal(Samples.Text(PartsCatalog.BuiltIn()), Samples.Text(CatalogStore.Load(Db).Value));

    [Fact]
    public void Ids_that_differ_in_case_or_accent_alone_are_different_parts()
    {
        Part[] parts = [.. new[] { "r1", "R1", "ré", "re" }.Select(id => Samples.Resistor with { Id = id })];
        Assert.Equal(["R1", "r1", "re", "ré"], Load(parts).All.Select(part => part.Id));
    }

    [Fact]
    public void Other_built_in_parts_replace_the_earlier_ones_and_the_users_own_stay()
    {
        Load([Samples.Resistor, Samples.Capacitor]);
        Part own = Samples.Resistor with { Id = "own", Note = "mine" };
        Part changed = Samples.Crystal with { Id = "shared", Note = "mine too" };
        CatalogStore.Use(Db, Samples.BuiltIn(), Brief, file =>
        {
            file.PutOwn([own, changed]);
            return true;
        });

        PartsCatalog after = Load([Samples.Resistor with { ValueOhms = 5100 }, Samples.Transistor, Samples.Crystal with { Id = "shared" }]);
        Assert.Equal(["Q-npn", "R-4k7", "own", "shared"], after.All.Select(part => part.Id));
        Assert.Equal(5100, ((ResistorPart)after.Find("R-4k7")!).ValueOhms);
        Assert.Equal("mine too", after.Find("shared")!.Note);
    }

    [Fact]
    public void A_second_opener_waits_and_then_says_that_the_file_is_in_use()
    {
        Load(Samples.All);
        using IDisposable held = CatalogLock.Take(Db, Brief).Value;
        Problem problem = CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), Brief).Problem!;
        Assert.Equal(Db, problem.Where);
        Assert.Equal("is in use by another process", problem.What);
    }

    [Fact]
    public async Task A_second_opener_goes_on_when_the_first_is_done()
    {
        IDisposable held;
        Load(Samples.All);
        held = CatalogLock.Take(Db, Brief).Value;
        Task<Result<PartsCatalog>> second = Task.Run(() => CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), TimeSpan.FromSeconds(20)));
        await Task.Delay(100, TestContext.Current.CancellationToken);
        Assert.False(second.IsCompleted);
        held.Dispose();
        Assert.True((await second).IsOk);
    }

    [Fact]
    public async Task Several_openers_at_once_all_read_a_complete_new_file()
    {
        Result<PartsCatalog>[] results = await Task.WhenAll(Enumerable.Range(0, 4).Select(_ =>
            Task.Run(() => CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), TimeSpan.FromSeconds(20)))));
        Assert.All(results, result => Assert.Equal(Samples.All.Length, result.Value.All.Length));
    }

    [Fact]
    public void A_file_that_was_left_unfinished_is_made_anew()
    {
        Directory.CreateDirectory(Path.GetDirectoryName(Db)!);
        File.WriteAllText(Db + ".new", "half");
        File.WriteAllText(Path.Combine(Path.GetDirectoryName(Db)!, "catalog-log.db"), "left over");
        Assert.Equal(Samples.All.Length, Load(Samples.All).All.Length);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(100)]
    [InlineData(8192)]
    [InlineData(20000)]
    public void A_file_that_was_cut_or_never_was_a_catalogue_is_one_line(int length)
    {
        Load(Samples.All);
        byte[] bytes = File.ReadAllBytes(Db);
        File.WriteAllBytes(Db, length == 20000 ? new byte[16384] : bytes[..length]);
        AssertProblem(CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), Brief), "damaged");
    }

    [Fact]
    public void A_file_of_another_schema_is_one_line()
    {
        Load(Samples.All);
        using (var database = new LiteDatabase(new ConnectionString { Filename = Db, Collation = new Collation("/Ordinal") }))
        {
            database.UserVersion = 99;
        }

        AssertProblem(CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), Brief), "is of schema 99");
    }

    [Fact]
    public void Damaged_bytes_give_parts_or_a_problem_and_never_an_exception()
    {
        Load(Samples.All);
        byte[] good = File.ReadAllBytes(Db);
        var random = new Random(4096);
        int problems = 0;
        for (int trial = 0; trial < 40; trial++)
        {
            byte[] bad = [.. good];
            random.NextBytes(bad.AsSpan(random.Next(bad.Length - 64), 64));
            File.WriteAllBytes(Db, bad);
            Result<PartsCatalog> result = CatalogStore.Load(Db, Samples.BuiltIn(Samples.All), Brief);
            problems += result.IsOk ? 0 : 1;
            Assert.DoesNotContain('\n', result.IsOk ? "" : result.Problem.ToString());
        }

        Assert.InRange(problems, 1, 40);
    }

    [Fact]
    public void A_directory_that_cannot_be_made_is_one_line()
    {
        string file = Path.Combine(_directory, "file");
        File.WriteAllText(file, "");
        AssertProblem(CatalogStore.Load(Path.Combine(file, "catalog.db")), "cannot be opened");
        AssertProblem(CatalogStore.Load(_directory), "is a directory");
    }

    [Fact]
    public void Settings_are_kept_beside_the_parts()
    {
        Assert.Null(CatalogStore.ReadSetting(Db, "requirement").Value);
        Assert.False(File.Exists(Db));
        Assert.Null(CatalogStore.WriteSetting(Db, "requirement", "  {\"output\": \"1 kHz\"} "));
        Assert.Null(CatalogStore.WriteSetting(Db, "other", ""));
        Assert.Equal("  {\"output\": \"1 kHz\"} ", CatalogStore.ReadSetting(Db, "requirement").Value);
        Assert.Equal("", CatalogStore.ReadSetting(Db, "other").Value);
        Assert.Null(CatalogStore.ReadSetting(Db, "Requirement").Value);
        Assert.Equal(Samples.Text(PartsCatalog.BuiltIn()), Samples.Text(CatalogStore.Load(Db).Value));
    }

    [Fact]
    public void A_thousand_parts_are_read_without_a_noticeable_wait()
    {
        Part[] parts = [.. Enumerable.Range(0, 1000).Select(i => (i % 4) switch
        {
            0 => (Part)(Samples.Crystal with { Id = $"Y{i}" }),
            1 => Samples.Inverter with { Id = $"U{i}" },
            _ => Samples.Resistor with { Id = $"R{i}" },
        })];
        BuiltInFiles files = Samples.BuiltIn(parts);
        CatalogStore.Load(Db, files, Brief);
        var clock = Stopwatch.StartNew();
        Assert.Equal(1000, CatalogStore.Load(Db, files, Brief).Value.All.Length);
        TestContext.Current.TestOutputHelper?.WriteLine($"{clock.ElapsedMilliseconds} ms");
        Assert.InRange(clock.ElapsedMilliseconds, 0, 1500);
    }

    private PartsCatalog Load(params IEnumerable<Part> builtIn)
    {
        Result<PartsCatalog> result = CatalogStore.Load(Db, Samples.BuiltIn(builtIn), TimeSpan.FromSeconds(5));
        Assert.True(result.IsOk, result.Problem?.ToString());
        return result.Value;
    }

    private static void AssertProblem(Result<PartsCatalog> result, string what)
    {
        Assert.False(result.IsOk);
        Assert.Contains(what, result.Problem.What, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', result.Problem.ToString());
    }
}
