using System.Globalization;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>Every file of the folder Corpus with what its neighbour says of it; the README there explains the lines.</summary>
public class CorpusTests
{
    private static readonly string Folder = Path.Combine(AppContext.BaseDirectory, "Corpus");

    public static TheoryData<string> Files =>
    [
        .. Directory.GetFiles(Folder, "*.csv").Select(file => Path.GetFileNameWithoutExtension(file)).Order(StringComparer.Ordinal),
    ];

    [Fact]
    public void There_are_at_least_forty_files() => Assert.InRange(Files.Count, 40, 1000);

    [Theory]
    [MemberData(nameof(Files))]
    public void Becomes_what_is_expected(string name)
    {
        string[][] lines = [.. File.ReadAllLines(Path.Combine(Folder, name + ".expected")).Select(line => line.Split(' ', 2))];
        string? One(string word) => lines.FirstOrDefault(line => line[0] == word)?[1];
        using var bench = new ImportBench();
        ImportRequest request = bench.Request(PartKinds.Named(One("kind")).Value, name + ".csv") with
        {
            DecimalSign = One("decimal"),
            Columns = One("option") is { } option ? [option] : [],
        };
        Result<ImportReport> result = bench.Try(request, File.ReadAllBytes(Path.Combine(Folder, name + ".csv")));
        if (One("problem") is { } problem)
        {
            Assert.False(result.IsOk);
            Assert.Contains(problem, result.Problem.ToString(), StringComparison.Ordinal);
            Assert.DoesNotContain('\n', result.Problem.ToString());
            return;
        }

        Assert.True(result.IsOk, result.Problem?.ToString());
        ImportReport report = result.Value;
        string told = string.Join('\n', report.Columns) + "\n" + string.Join('\n', report.Rejections);
        Assert.True(
            One("counts") == string.Create(CultureInfo.InvariantCulture, $"{report.Read} {report.Added} {report.Rejected}"),
            $"{report.Read} {report.Added} {report.Rejected}\n{told}");
        Assert.Equal(report.Read, report.Added + report.Updated + report.Unchanged + report.Rejected);
        Assert.Equal(One("encoding") ?? report.Encoding, report.Encoding);
        foreach (string[] line in lines)
        {
            string[] words = line[1].Split(' ', 3);
            switch (line[0])
            {
                case "column":
                    Assert.Equal(After(line[1]), report.Columns.Single(column => column.Header == Before(line[1])).Field ?? "");
                    break;
                case "why":
                    ImportColumn explained = report.Columns.Single(column => column.Header == Before(line[1]));
                    Assert.Contains(After(line[1]), explained.Why, StringComparison.Ordinal);
                    break;
                case "reject":
                    RowRejection rejection = Assert.Single(
                        report.Rejections, row => row.Line.ToString(CultureInfo.InvariantCulture) == words[0]);
                    Assert.Equal(words[1], rejection.Column?.Replace(' ', '_') ?? "-");
                    Assert.Contains(words[2].Replace('_', ' '), rejection.Reason, StringComparison.Ordinal);
                    break;
                case "part":
                    AssertPart(bench.Entry(words[0]).Part, line[1].Split(' ')[1..]);
                    break;
            }
        }
    }

    private static void AssertPart(Part part, string[] expected)
    {
        var figures = PartFigures.Of(part).ToDictionary(figure => figure.Key);
        foreach (string each in expected)
        {
            int sign = each.IndexOf('=', StringComparison.Ordinal);
            (string key, string value) = (each[..sign].Replace('_', ' '), each[(sign + 1)..].Replace('_', ' '));
            switch (key)
            {
                case "price":
                    Assert.Equal(decimal.Parse(value, CultureInfo.InvariantCulture), part.Offer.Prices[0].UnitPrice);
                    break;
                case var _ when key.StartsWith("price@", StringComparison.Ordinal):
                    int quantity = int.Parse(key[6..], CultureInfo.InvariantCulture);
                    PriceBreak found = Assert.Single(part.Offer.Prices, step => step.Quantity == quantity);
                    Assert.Equal(decimal.Parse(value, CultureInfo.InvariantCulture), found.UnitPrice);
                    break;
                case "assumed":
                    Assert.Equal(Basis.Assumed, part.BasisOf(value));
                    break;
                case "prices" when value.Length == 0:
                    Assert.False(part.Offer.HasPrices);
                    break;
                case var _ when value.Length == 0:
                    Assert.False(figures.ContainsKey(key), key);
                    break;
                case var _ when figures[key].Number is { } number:
                    double wanted = double.Parse(value, CultureInfo.InvariantCulture);
                    Assert.InRange(number, wanted - (Math.Abs(wanted) * 1e-12), wanted + (Math.Abs(wanted) * 1e-12));
                    break;
                default:
                    Assert.Equal(value, figures[key].Text);
                    break;
            }
        }
    }

    private static string Before(string text) => text[..text.IndexOf('=', StringComparison.Ordinal)];

    private static string After(string text) => text[(text.IndexOf('=', StringComparison.Ordinal) + 1)..];
}
