using System.Text;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Catalog.Tests.Import;

/// <summary>The decimal sign of a column is what all of its cells show, also far behind the first rows.</summary>
public sealed class DecimalSignTests : IDisposable
{
    private readonly ImportBench _bench = new();

    public void Dispose() => _bench.Dispose();

    [Fact]
    public void A_comma_far_down_decides_how_the_first_rows_are_read()
    {
        ImportReport report = _bench.Run(List("2.500", 3000, "0,75"));
        Assert.Equal((3001, 3001, 0), (report.Read, report.Added, report.Rejected));
        Assert.Contains(
            report.Columns,
            column => column.Header == "Price EUR" && column.Why.Contains("decimal comma", StringComparison.Ordinal));
        Assert.Equal(2500m, _bench.Entry("A1").Part.Offer.Prices[0].UnitPrice);
        Assert.Equal(0.75m, _bench.Entry("Z").Part.Offer.Prices[0].UnitPrice);
    }

    [Fact]
    public void Where_nothing_else_shows_it_a_point_before_three_digits_stays_decimal()
    {
        _bench.Run(List("2.500", 3000, "2"));
        Assert.Equal(2.5m, _bench.Entry("A1").Part.Offer.Prices[0].UnitPrice);
    }

    [Fact]
    public void A_number_far_down_that_can_be_read_in_two_ways_is_not_taken_silently()
    {
        ImportReport report = _bench.Run(List("2", 3000, "1,250"));
        Assert.Equal((3000, 1), (report.Added, report.Rejected));
        Assert.Contains("is no price that can be read with certainty", report.Rejections[0].Reason, StringComparison.Ordinal);
    }

    [Fact]
    public void A_row_against_what_its_column_proved_is_rejected_alone()
    {
        ImportReport report = _bench.Run(List("2.5", 3000, "0,75"));
        Assert.Equal((3000, 1), (report.Added, report.Rejected));
    }

    [Fact]
    public void What_is_piped_and_cannot_be_read_again_is_refused_in_one_line()
    {
        Result<ImportReport> result = CatalogImport.Run(
            _bench.Db, new StringReader(List("2.500", 3000, "0,75")), _bench.Request(), TestContext.Current.CancellationToken);
        Assert.False(result.IsOk);
        Assert.Contains("line 3002, column Price EUR", result.Problem.ToString(), StringComparison.Ordinal);
        Assert.Contains("--decimal", result.Problem.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_was_read_twice_is_unchanged_the_next_time()
    {
        string text = List("2.500", 3000, "0,75");
        _bench.Run(text);
        ImportReport again = _bench.Run(text);
        Assert.Equal((3001, 3001), (again.Read, again.Unchanged));
    }

    private static string List(string price, int rows, string last)
    {
        var text = new StringBuilder("Part No;Frequency;Price EUR\n");
        for (int i = 1; i <= rows; i++)
        {
            text.Append(null, $"A{i};8 MHz;{price}\n");
        }

        return text.Append(null, $"Z;8 MHz;{last}\n").ToString();
    }
}
