using PartPick.Catalog;
using PartPick.Requirements;
using PartPick.Screens;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Tests.Requirements;

/// <summary>Requirements that are kept under names in a folder beside the catalogue.</summary>
public sealed class KeptRequirementStoreTests
{
    private readonly string _catalogue = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "kept.db");

    private string Folder => _catalogue + ".wanted";

    private KeptRequirementStore Store => new(_catalogue);

    [Fact]
    public void What_is_kept_comes_back_with_every_value()
    {
        var odd = new Requirement
        {
            Name = "Prüfling 3/4 „odd“", OutputHz = 12.288e6, Waveform = Waveform.Sine, BudgetRatio = 37.5e-6, SupplyMinVolts = 3,
            SupplyMaxVolts = 3.6, TemperatureMinCelsius = -40, TemperatureMaxCelsius = 85.5, Years = 12.5, Margin = 7.25,
            AllowDisturbance = true, StartUpTimeSeconds = 0.0123, Builds = 4321, CostLimit = 1.875m,
            Board = new Board("own", new Physics.Circuits.Strays(1e-12, 2e-12, 0.4e-12), 0.2), CapacitorSeries = "E24",
            ResistorSeries = "E48", BiasSeries = "E6", Circuits = [CircuitKind.Follower, CircuitKind.Gate],
            Weights = new Weights(2, 0, 0.5),
        };
        Assert.True(Store.Keep(odd).IsOk);
        Requirement back = Store.Read().Value.Items.Single().Requirement;
        Assert.Equal(odd.Circuits, back.Circuits);
        Assert.Equal(odd with { Circuits = [] }, back with { Circuits = [] });
    }

    [Fact]
    public void A_kept_one_is_a_requirement_file_that_rank_takes()
    {
        Assert.True(Store.Keep(FirstRequirement.RiverLogger).IsOk);
        string path = Directory.GetFiles(Folder, "*.json").Single();
        Assert.Equal("river logger time base.json", Path.GetFileName(path));
        Run run = Run.Of("rank", path, "--top", "1", "--format", "json", "--margin", "1000");
        Assert.Equal(1, run.Status);
        Assert.Equal("river logger time base", run.Json.GetProperty("requirement").GetProperty("name").GetString());
    }

    [Fact]
    public void A_requirement_file_put_there_by_hand_is_kept_under_its_name_or_its_files()
    {
        Write("tide.json", """{ "output": "32768 Hz" }""");
        Write("b.json", """{ "output": "1 kHz", "name": "alpha" }""");
        Assert.Equal(["alpha", "tide"], Store.Read().Value.Items.Select(item => item.Name));
    }

    [Fact]
    public void Before_anything_is_kept_nothing_is_and_no_folder_is_made()
    {
        KeptRequirements kept = Store.Read().Value;
        Assert.Empty(kept.Items);
        Assert.Empty(kept.Problems);
        Assert.False(Directory.Exists(Folder));
    }

    [Theory]
    [InlineData("{ \"output\": \"1 kHz\", ")]
    [InlineData("{ \"output\": \"1 kHz\", \"colour\": 3 }")]
    [InlineData("")]
    public void A_damaged_file_is_one_line_and_stays_as_it_is_whatever_is_done(string text)
    {
        Write("logger.json", text);
        Assert.True(Store.Keep(Of("other")).IsOk);
        KeptRequirements kept = Store.Read().Value;
        string line = kept.Problems.Single().ToString();
        Assert.Contains("logger.json", line, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', line);
        Assert.Equal("other", kept.Items.Single().Name);
        Assert.True(Store.Keep(Of("logger")).IsOk);
        Assert.True(Store.Replace(kept.Items[0], Of("logger 3")).IsOk);
        Assert.Equal(text, File.ReadAllText(Path.Combine(Folder, "logger.json")));
        Assert.Equal(["logger", "logger 3"], Store.Read().Value.Items.Select(item => item.Name));
    }

    [Fact]
    public void A_file_that_is_no_text_is_one_line()
    {
        Directory.CreateDirectory(Folder);
        File.WriteAllBytes(Path.Combine(Folder, "x.json"), [0x7b, 0xff, 0xfe]);
        Assert.Contains("x.json: cannot be read", Store.Read().Value.Problems.Single().ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void What_was_changed_elsewhere_is_not_put_over()
    {
        Assert.True(Store.Keep(Of("logger")).IsOk);
        KeptRequirement mine = Store.Read().Value.Items.Single(), theirs = Store.Read().Value.Items.Single();
        Assert.True(Store.Replace(theirs, theirs.Requirement with { Builds = 17 }).IsOk);
        Problem refused = Store.Replace(mine, mine.Requirement with { Builds = 99 }).Problem!;
        Assert.Contains("'logger' was changed or taken away elsewhere", refused.ToString(), StringComparison.Ordinal);
        Assert.NotNull(Store.Remove(mine));
        Assert.Equal(17, Store.Read().Value.Items.Single().Requirement.Builds);
    }

    [Fact]
    public async Task Two_that_keep_at_once_lose_nothing_and_give_no_name_twice()
    {
        CancellationToken cancellation = TestContext.Current.CancellationToken;
        Task<int>[] both = [.. Enumerable.Range(0, 2).Select(_ => Task.Run(
            () => Enumerable.Range(0, 15).Count(i => new KeptRequirementStore(_catalogue).Keep(Of($"w{i}")).IsOk), cancellation))];
        int[] kept = await Task.WhenAll(both);
        Assert.Equal(15, kept.Sum());
        Assert.Equal(15, Store.Read().Value.Items.Select(item => item.Name).Distinct().Count());
    }

    [Fact]
    public void A_name_that_is_taken_is_refused_and_can_be_replaced_or_called_otherwise()
    {
        KeptRequirement first = Store.Keep(Of("logger")).Value;
        Assert.Contains("is kept already", Store.Keep(Of("logger")).Problem!.ToString(), StringComparison.Ordinal);
        KeptRequirement second = Store.Keep(Of("tide")).Value;
        Assert.Contains("is kept already", Store.Replace(second, Of("logger")).Problem!.ToString(), StringComparison.Ordinal);
        Assert.Equal("river", Store.Replace(first, first.Requirement with { Name = " river " }).Value.Name);
        Assert.Equal(["river", "tide"], Store.Read().Value.Items.Select(item => item.Name));
    }

    [Theory]
    [InlineData("../../out")]
    [InlineData("..")]
    [InlineData("a/b\\c:d*?")]
    [InlineData(".hidden")]
    public void Whatever_the_name_the_file_stays_in_the_folder(string name)
    {
        Assert.Equal(name, Store.Keep(Of(name)).Value.Name);
        Assert.Equal(name, Store.Read().Value.Items.Single().Name);
        Assert.Single(Directory.GetFiles(Folder, "*.json"));
    }

    [Theory]
    [InlineData("")]
    [InlineData("  ")]
    [InlineData("tab\there")]
    [InlineData("1234567890123456789012345678901234567890123456789012345678901")]
    public void A_name_that_is_none_is_refused(string name) => Assert.Equal("name", Store.Keep(Of(name)).Problem!.Where);

    [Fact]
    public void Names_that_would_be_one_file_are_kept_apart()
    {
        Assert.True(Store.Keep(Of("a/b")).IsOk);
        Assert.True(Store.Keep(Of("a:b")).IsOk);
        Assert.Equal(["a/b", "a:b"], Store.Read().Value.Items.Select(item => item.Name));
    }

    [Fact]
    public void What_was_left_unfinished_is_no_requirement()
    {
        Assert.True(Store.Keep(Of("logger")).IsOk);
        File.WriteAllText(Path.Combine(Folder, "logger.json.new"), "{ half");
        Assert.Empty(Store.Read().Value.Problems);
        KeptRequirement kept = Store.Read().Value.Items.Single();
        Assert.True(Store.Replace(kept, kept.Requirement with { Years = 9 }).IsOk);
        Assert.Equal(9, Store.Read().Value.Items.Single().Requirement.Years);
        Assert.Empty(Directory.GetFiles(Folder, "*.new"));
    }

    [Fact]
    public void A_folder_that_cannot_be_used_is_said()
    {
        File.WriteAllText(Folder, "a file");
        Assert.Contains(Folder, Store.Keep(Of("logger")).Problem!.ToString(), StringComparison.Ordinal);
        Assert.Equal("a file", File.ReadAllText(Folder));
    }

    [Fact]
    public void A_last_sentence_that_cannot_be_read_is_put_aside_before_another_is_kept()
    {
        Assert.Null(CatalogStore.WriteSetting(_catalogue, "requirement", "{ half"));
        var keeper = new RequirementKeeper(_catalogue);
        Assert.Contains("the requirement that was kept", keeper.Recall().Problem!.ToString(), StringComparison.Ordinal);
        Assert.Null(keeper.Keep(Of("next")));
        Assert.Equal("next", new RequirementKeeper(_catalogue).Recall().Value!.Name);
        Assert.Equal("{ half", File.ReadAllText(Path.Combine(Folder, "not readable.json")));
        Assert.Null(keeper.Keep(Of("last")));
        Assert.Single(Directory.GetFiles(Folder, "*.json"));
    }

    private static Requirement Of(string name) => new() { Name = name, OutputHz = 1000 };

    private void Write(string file, string text)
    {
        Directory.CreateDirectory(Folder);
        File.WriteAllText(Path.Combine(Folder, file), text);
    }
}
