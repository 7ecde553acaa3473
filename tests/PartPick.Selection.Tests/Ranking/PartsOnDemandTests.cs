using System.Globalization;
using System.Text;
using PartPick.Catalog;
using PartPick.Catalog.Import;

namespace PartPick.Selection.Tests.Ranking;

/// <summary>Ranking with what is read on demand answers what ranking with all parts does.</summary>
public sealed class PartsOnDemandTests : IDisposable
{
    private static readonly DateOnly Day = new(2026, 3, 1);

    private readonly string _directory = Directory.CreateTempSubdirectory("partpick-on-demand-").FullName;

    private static CancellationToken Stop => TestContext.Current.CancellationToken;

    private string Db => Path.Combine(_directory, "catalog.db");

    public void Dispose() => Directory.Delete(_directory, recursive: true);

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(3)]
    public void The_answer_is_that_of_all_parts(int seed)
    {
        Requirement requirement = SmallWorld.Draw(seed).Requirement with { CapacitorSeries = "E3", BiasSeries = "E3" };
        var random = new Random(seed);
        Import(Crystals(random, requirement.OutputHz));
        Exclude("R3", "R7");
        var source = new PartsOnDemand(new StoredParts(Db, 0));
        Compare(requirement, source);
        Exclude("R1", "R11");

        // Nothing fits: the relaxed search needs crystals from farther away.
        Compare(requirement with { BudgetRatio = 2e-6 }, source);
    }

    private void Compare(Requirement requirement, PartsOnDemand source)
    {
        PartsCatalog all = CatalogStore.Load(Db).Value;

        // With several threads, by which limit a combination goes depends on which comes first.
        var options = new RankingOptions { Threads = 1 };
        RankingResult expected = Ranker.Rank(requirement, all, options, cancellation: Stop);
        RankingResult result = Ranker.Rank(requirement, source, options, cancellation: Stop);
        Assert.True(source.PartsFor(requirement, Stop).Crystals.Length < all.Crystals.Length);
        Assert.True(expected.Combinations > 0);
        Assert.Equal(
            (expected.Combinations, expected.Covered, expected.Fit), (result.Combinations, result.Covered, result.Fit));
        Assert.Equal(expected.Front, result.Front);
        Assert.Equal(expected.Candidates.Select(each => (each.Id, each.Score)), result.Candidates.Select(each => (each.Id, each.Score)));
        Assert.Equal(expected.NearestMisses.Select(each => each.Id), result.NearestMisses.Select(each => each.Id));
        Assert.Equal(expected.Rejections.OrderBy(pair => pair.Key), result.Rejections.OrderBy(pair => pair.Key));
    }

    private static string Crystals(Random random, double output)
    {
        var text = new StringBuilder("Part Number,Frequency,Load Cap.,ESR max,Freq Tol,Overtone,Price,Currency\n");
        for (int i = 0; i < 60; i++)
        {
            double crystal = output < 10e3 ? output * (1 << random.Next(11, 14)) : output;
            double away = random.Next(3) switch { 0 => 0, 1 => 3e-3 * (random.NextDouble() - 0.5), _ => random.NextDouble() };
            text.AppendLine(string.Create(
                CultureInfo.InvariantCulture,
                $"R{i},{crystal * (1 + away):F1}Hz,{random.Next(8, 33)}pF,{(crystal < 100e3 ? 50000 : 60)} Ohm,±{random.Next(1, 4) * 10}ppm,"
                + $"{(random.Next(8) == 0 ? 3 : 1)},{random.Next(10, 90) / 100.0:F2},{(random.Next(8) == 0 ? "USD" : "EUR")}"));
        }

        return text.ToString();
    }

    private void Import(string list)
    {
        var request = new ImportRequest { Kind = PartKind.Crystal, Name = "list.csv", Date = Day };
        ImportReport report = CatalogImport.Run(Db, new MemoryStream(Encoding.UTF8.GetBytes(list)), request, null, Stop).Value;
        Assert.True(report.Added > 50, report.Rejections.FirstOrDefault()?.ToString());
    }

    private void Exclude(params string[] ids) =>
        Assert.All(ids, id => Assert.True(CatalogEdit.Set(Db, id, [("excluded", "yes")], Day).IsOk));
}
