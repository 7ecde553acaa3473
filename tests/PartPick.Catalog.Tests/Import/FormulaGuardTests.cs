using PartPick.Catalog.Import;

namespace PartPick.Catalog.Tests.Import;

/// <summary>A cell that a spreadsheet would run goes out harmless and comes back as it was.</summary>
public sealed class FormulaGuardTests : IDisposable
{
    private const string Signs = "=+-@＝＋－＠";

    private readonly ImportBench _bench = new();

    public void Dispose() => _bench.Dispose();

    [Theory]
    [InlineData("=1+1")]
    [InlineData("=HYPERLINK(\"http://x\",\"y\")")]
    [InlineData("+cmd|' /C calc'!A0")]
    [InlineData("-2+3")]
    [InlineData("@SUM(A1)")]
    [InlineData(" =1+1")]
    [InlineData("\u00A0=1+1")]
    [InlineData("＝1+1")]
    [InlineData("-Infinity")]
    [InlineData("'=1+1")]
    [InlineData("''@x")]
    [InlineData("\t=1+1")]
    public void A_text_that_would_run_is_guarded_once_and_comes_back(string text)
    {
        string cell = FormulaGuard.Guard(text);
        Assert.Equal("'" + text, cell);
        Assert.Equal(text, FormulaGuard.Unguard(cell));
    }

    [Theory]
    [InlineData("-40")]
    [InlineData("+1.5e-3")]
    [InlineData("-.5")]
    [InlineData("18 pF")]
    [InlineData("'quoted'")]
    [InlineData("")]
    public void Numbers_and_plain_texts_stay_as_they_are(string text)
    {
        Assert.Equal(text, FormulaGuard.Guard(text));
        Assert.Equal(text, FormulaGuard.Unguard(text));
    }

    [Fact]
    public void Any_text_comes_back()
    {
        var random = new Random(7);
        const string letters = "='+-@ 1aE.\"\t＝;,";
        for (int i = 0; i < 20_000; i++)
        {
            string text = string.Concat(Enumerable.Range(0, random.Next(0, 7)).Select(_ => letters[random.Next(letters.Length)]));
            string cell = FormulaGuard.Guard(text);
            Assert.Equal(text, FormulaGuard.Unguard(cell));
            string told = cell.Trim();
            Assert.False(told.Length > 0 && Signs.Contains(told[0], StringComparison.Ordinal)
                && !double.TryParse(told, System.Globalization.CultureInfo.InvariantCulture, out _), $"{text} becomes {cell}");
        }
    }

    [Fact]
    public void Formulas_in_every_text_of_a_part_survive_export_and_import()
    {
        ImportReport report = _bench.Run(
            "Part No,Description,Frequency,Package,Supplier,Notes\n=A1+1,\"=cmd|' /C calc'!A0\",8 MHz,@SUM(A1),+49,-1-1\n");
        Assert.Equal(1, report.Added);
        string exported = _bench.Export(PartKind.Crystal);
        string row = exported.Split('\n').Single(line => line.Contains("calc", StringComparison.Ordinal));
        Assert.StartsWith("'=A1+1,'=cmd|' /C calc'!A0,", row, StringComparison.Ordinal);
        Assert.DoesNotContain(row.Split(','), cell => cell.Length > 0 && cell[0] is '=' or '@');

        using var other = new ImportBench();
        ImportReport again = other.Run(exported.Split('\n')[0] + "\n" + row + "\n");
        Assert.Equal((1, 0), (again.Read, again.Rejected));
        Part part = other.Entry("=A1+1").Part;
        Assert.Equal(("=cmd|' /C calc'!A0", "-1-1", "@SUM(A1)"), (part.Description, part.Note, part.Package));
        Assert.Contains(row, other.Export(PartKind.Crystal), StringComparison.Ordinal);
    }
}
