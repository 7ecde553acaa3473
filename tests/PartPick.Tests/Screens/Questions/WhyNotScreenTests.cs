using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Selection;
using PartPick.Values;
using PartPick.WhyNot;
using Terminal.Gui.Input;

namespace PartPick.Tests.Screens.Questions;

public sealed class WhyNotScreenTests : IDisposable
{
    // A small space: the counters of the built-in parts with capacitors and resistors of E3.
    private static readonly Requirement Wanted = SampleRanking.Wanted with
    {
        Circuits = [CircuitKind.Counter],
        CapacitorSeries = "E3",
        ResistorSeries = "E3",
    };

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-whynot-").FullName;

    private string CatalogFile => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Theory]
    [InlineData(80, 24)]
    [InlineData(120, 40)]
    [InlineData(52, 16)]
    public void A_part_is_picked_by_its_words_and_the_answer_names_the_limit_and_the_change(int width, int height)
    {
        using Bench bench = Open(width, height);

        bench.Press(new Key('y'));
        bench.Settle();
        bench.Type("04m096 load>=30p h49");
        bench.Settle();
        Assert.Equal(
            PartsCatalog.BuiltIn().Crystals.Count(part =>
                part.LoadFarads > 29.9e-12 && part.Id.Contains("04M096", StringComparison.Ordinal)
                    && part.Id.Contains("H49", StringComparison.Ordinal)),
            bench.Rows.Count(row => row.Contains("X-04M096-", StringComparison.Ordinal)));
        bench.Press(Key.Enter);
        Assert.Contains("computing", bench.Text, StringComparison.Ordinal);
        bench.Settle();

        Assert.Contains("X-04M096-30-H49-30 is not in the list.", bench.Text, StringComparison.Ordinal);
        Assert.Matches(@"! frequency error: wanted 80 ppm; \d+(\.\d+)? ppm reached", bench.Text);
        Assert.Matches(@"budget 80 ppm -> \d+(\.\d+)? ppm", bench.Text);
        Assert.All(bench.Rows, row => Assert.True(row.Length <= width));
        bench.Press(Key.Esc);
        bench.Settle();
        Assert.Contains("Part with 04m096 load>=30p h49", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.DoesNotContain("Part with", bench.Text, StringComparison.Ordinal);
        Assert.Contains(SampleRanking.Counter.Choice.Amplifier.Id, bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_part_that_the_list_holds_is_answered_at_once()
    {
        using Bench bench = Open(120, 40);
        string id = SampleRanking.SecondCounter.Choice.Crystal.Id;

        bench.Press(new Key('y'));
        bench.Settle();
        bench.Type(id);
        bench.Settle();
        bench.Press(Key.Enter);

        Assert.Contains($"{id} is in the list: its best circuit is number 2 of 5.", bench.Text, StringComparison.Ordinal);
        Assert.Contains($"The first is better: {SampleRanking.Counter.Choice.Crystal.Id}", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_word_for_a_kind_leaves_the_others_out()
    {
        using Bench bench = Open();

        bench.Press(new Key('y'));
        bench.Settle();
        bench.Type("counter");
        bench.Settle();

        int counters = PartsCatalog.BuiltIn().Counters.Length;
        Assert.Contains($"{counters} crystals and amplifiers", bench.Text, StringComparison.Ordinal);
        Assert.Equal(counters,
            bench.Rows.Count(row => row.Contains("CNT-", StringComparison.Ordinal) && row.Contains(" counter ", StringComparison.Ordinal)));
    }

    [Fact]
    public void While_it_computes_the_screen_answers_and_Esc_stops_it()
    {
        var desk = new SlowDesk(CatalogFile);
        using Bench bench = Asking(desk);
        bench.SettleUntil(() => bench.Model.Draw(80, 24).Any(line => line.Text.Contains("Looking for nothing", StringComparison.Ordinal)));

        bench.Resize(100, 30);
        Assert.Contains("computing", bench.Text, StringComparison.Ordinal);
        Assert.Contains("Esc stop it", bench.Rows[^1], StringComparison.Ordinal);
        bench.Press(new Key('?'));
        Assert.Contains("In the list", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.False(desk.IsStopped);
        bench.Press(Key.Esc);
        bench.Settle();

        Assert.True(desk.IsStopped);
        Assert.Contains("Part with", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Ctrl_C_stops_it_without_leaving()
    {
        var desk = new SlowDesk(CatalogFile);
        using Bench bench = Asking(desk);

        bench.Press(Key.C.WithCtrl);
        bench.Settle();

        Assert.True(desk.IsStopped);
        Assert.False(bench.Model.IsDone);
        Assert.Contains("Part with", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void In_the_catalogue_it_is_asked_of_the_chosen_part_and_Esc_leads_back_to_it()
    {
        using Bench bench = Open(catalogue: true);
        bench.Press(new Key('c'));
        bench.Settle();
        bench.Press(new Key('k'), new Key('k'), new Key('k'), new Key('k'));
        bench.Settle();
        Assert.Contains("Listed: counters", bench.Text, StringComparison.Ordinal);
        bench.Press(new Key('y'));
        bench.Settle();
        string id = PartsCatalog.BuiltIn().Counters[0].Id;
        Assert.Contains($"Why not {id}", bench.Text, StringComparison.Ordinal);
        bench.Press(Key.Esc);
        Assert.Contains("Listed: counters", bench.Text, StringComparison.Ordinal);

        bench.Press(Key.Enter);
        bench.Settle();
        bench.Press(new Key('y'));
        bench.Settle();
        Assert.Contains($"Why not {id}", bench.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void A_capacitor_of_the_catalogue_is_no_such_part()
    {
        using Bench bench = Open(catalogue: true);
        bench.Press(new Key('c'));
        bench.Settle();
        bench.Press(new Key('k'));
        bench.Settle();

        bench.Press(new Key('y'));

        Assert.Contains("Listed: capacitors", bench.Text, StringComparison.Ordinal);
        Assert.DoesNotContain("Why not", bench.Rows[3], StringComparison.Ordinal);
    }

    private Bench Asking(SlowDesk desk)
    {
        Bench bench = Open();
        bench.AnswerQuestions(desk);
        bench.Press(new Key('y'));
        bench.Settle();
        bench.Press(Key.Enter);
        return bench;
    }

    private Bench Open(int width = 80, int height = 24, bool catalogue = false)
    {
        var bench = new Bench(width, height, requirement: Wanted, catalogue: catalogue ? CatalogFile : null);
        bench.AnswerQuestions(CatalogFile);
        return bench;
    }

    // Says what it does and then waits to be stopped.
    private sealed class SlowDesk(string path) : IWhyNotDesk
    {
        private readonly WhyNotDesk _parts = new(path);

        public bool IsStopped { get; private set; }

        public Result<WhyNotAnswer> Ask(Requirement requirement, string id, IProgress<string>? progress, CancellationToken cancellation)
        {
            progress?.Report("looking for nothing");
            cancellation.WaitHandle.WaitOne(TimeSpan.FromMinutes(1));
            IsStopped = cancellation.IsCancellationRequested;
            cancellation.ThrowIfCancellationRequested();
            return Result.Fail<WhyNotAnswer>("part", "was not stopped", "Esc");
        }

        public Result<ImmutableDictionary<PartKind, PartRows>> Rows(CancellationToken cancellation) => _parts.Rows(cancellation);
    }
}
