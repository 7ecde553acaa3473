using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>
/// Lists written without a look at the words the importer knows, each with what its author says of its columns; the README of the
/// folder Unseen explains the lines.
/// </summary>
public class UnseenListTests
{
    private static readonly string Folder = Path.Combine(AppContext.BaseDirectory, "Unseen");

    public static TheoryData<string> Files =>
    [
        .. Directory.GetFiles(Folder, "*.csv").Select(file => Path.GetFileNameWithoutExtension(file)).Order(StringComparer.Ordinal),
    ];

    [Theory]
    [MemberData(nameof(Files))]
    public void At_least_eight_of_ten_columns_are_right_and_no_figure_is_wrong(string name)
    {
        string[] truth = File.ReadAllLines(Path.Combine(Folder, name + ".truth"));
        using var bench = new ImportBench();
        PartKind kind = PartKinds.Named(truth[0]["kind ".Length..]).Value;
        Result<ImportReport> result = bench.Try(bench.Request(kind, name + ".csv"), File.ReadAllBytes(Path.Combine(Folder, name + ".csv")));
        Assert.True(result.IsOk, result.Problem?.ToString());
        UnseenScore score = UnseenScore.Of(result.Value, truth, id => CatalogReading.Find(bench.Db, id).Value?.Part);
        TestContext.Current.TestOutputHelper?.WriteLine($"{name}: {score}");
        Assert.True(score.Wrong.Count == 0 && score.Right * 10 >= score.Meaningful * 8, $"{name}: {score}");
    }
}
