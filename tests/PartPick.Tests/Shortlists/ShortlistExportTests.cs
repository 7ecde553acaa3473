using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Xml.Linq;

namespace PartPick.Tests.Shortlists;

public sealed class ShortlistExportTests
{
    [Theory]
    [InlineData(",", ".", false)]
    [InlineData(";", ",", true)]
    [InlineData("tab", ",", false)]
    [InlineData("bar", ".", true)]
    [InlineData(",", ",", true)]
    public void Two_readers_find_the_same_cells_and_the_lines_add_up_to_the_total(string delimiter, string point, bool mark)
    {
        ShortlistBench bench = new ShortlistBench().With(3);
        string path = bench.NewFile("order.csv");
        string[] wanted = ["shortlist", "export", "logger", "--to", path, "--delimiter", delimiter, "--decimal", point];
        Assert.Equal(0, bench.Of(mark ? [.. wanted, "--bom"] : wanted).Status);
        byte[] bytes = File.ReadAllBytes(path);
        Assert.Equal(mark, bytes.AsSpan().StartsWith(Encoding.UTF8.Preamble));
        string text = new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(bytes).TrimStart('\uFEFF');
        Assert.EndsWith("\r\n", text, StringComparison.Ordinal);
        Assert.DoesNotContain("\n", text.Replace("\r\n", "", StringComparison.Ordinal), StringComparison.Ordinal);

        string[][] rows = CsvTexts.ByBoth(text, delimiter switch { "tab" => '\t', "bar" => '|', _ => delimiter[0] });
        Assert.All(rows, row => Assert.Equal(rows[0].Length, row.Length));
        int[] at = [.. new[] { "lineTotal", "order", "unitPrice" }.Select(name => Array.IndexOf(rows[0], name))];
        decimal sum = 0;
        foreach (string[] row in rows.Skip(1))
        {
            decimal line = Number(row[at[0]]);
            Assert.Equal(decimal.Round(Number(row[at[1]]) * Number(row[at[2]]), 2, MidpointRounding.AwayFromZero), line);
            sum += line;
        }

        JsonElement json = bench.Of("shortlist", "export", "logger", "--format", "json").Json;
        Assert.Equal(json.GetProperty("total").GetDecimal(), sum);

        decimal Number(string cell) => decimal.Parse(
            cell, NumberStyles.AllowDecimalPoint, new NumberFormatInfo { NumberDecimalSeparator = point });
    }

    [Fact]
    public void Cells_that_a_spreadsheet_would_run_are_neutralised_and_foreign_text_stays_text_everywhere()
    {
        var bench = new ShortlistBench();
        Assert.Equal(0, bench.WithInput(
            ShortlistBench.Ranking, "shortlist", "add", "=1+1|<b>", "-", "--note", "<script>alert(1)</script> | [x](y) \"quoted\"").Status);
        string crystal = bench.List("=1+1|<b>").GetProperty("candidates")[0].GetProperty("crystal").GetString()!;
        Assert.Equal(0, bench.Of("catalog", "set", crystal, "supplierPart==2+3", "supplier=@SUM(1;2), \"Ltd\"").Status);

        string csv = bench.Of("shortlist", "export", "=1+1|<b>", "--format", "csv").Output;
        string[][] rows = CsvTexts.ByBoth(csv, ',');
        Assert.All(
            rows.SelectMany(row => row),
            cell => Assert.False(cell.Length > 0 && "=@+-".Contains(cell[0], StringComparison.Ordinal), cell));
        string[] row = rows.Single(each => each.Contains(crystal));
        Assert.Contains("'=2+3", row);
        Assert.Contains("'@SUM(1;2), \"Ltd\"", row);

        string lists = bench.Of("shortlist", "list", "--format", "csv").Output;
        Assert.Equal("'=1+1|<b>", CsvTexts.ByBoth(lists, ',')[1][0]);

        string html = bench.Of("shortlist", "export", "=1+1|<b>", "--format", "html").Output;
        Assert.DoesNotContain("<script", html, StringComparison.Ordinal);
        Assert.DoesNotContain("<b>", html, StringComparison.Ordinal);
        Assert.Contains("&lt;script&gt;", html, StringComparison.Ordinal);

        string markdown = bench.Of("shortlist", "export", "=1+1|<b>", "--format", "markdown").Output;
        Assert.DoesNotContain("<script", markdown.Replace("\\<", "", StringComparison.Ordinal), StringComparison.Ordinal);
        string[] table = [.. markdown.Split('\n').Where(line => line.StartsWith('|'))];
        int[] bars = [.. table.Select(line => line.Replace("\\|", "", StringComparison.Ordinal).Count(sign => sign == '|')).Distinct()];
        Assert.Equal(2, bars.Length);
    }

    [Fact]
    public void The_design_record_is_one_well_formed_page_with_all_that_a_circuit_rests_on()
    {
        ShortlistBench bench = new ShortlistBench().With(2);
        string html = bench.Of("shortlist", "export", "logger", "--format", "html").Output;
        XElement page = XDocument.Parse(html.Replace("<!DOCTYPE html>", "", StringComparison.Ordinal)
            .Replace("<meta charset=\"utf-8\">", "", StringComparison.Ordinal)
            .Replace("<meta name=\"viewport\" content=\"width=device-width\">", "", StringComparison.Ordinal)).Root!;
        XNamespace svg = "http://www.w3.org/2000/svg";
        Assert.Equal(2, page.Descendants(svg + "svg").Count(each => (string?)each.Attribute("class") == "schematic"));
        Assert.Equal(4, page.Descendants(svg + "svg").Count(each => (string?)each.Attribute("class") == "bars"));
        foreach (XElement picture in page.Descendants(svg + "svg"))
        {
            // A letter of 13 px monospace is at most 8 px wide.
            Assert.All(picture.Descendants(svg + "text"), text => Assert.True(
                (int)text.Attribute("x")! + 8 * text.Value.Length <= (int)picture.Attribute("width")! + 8, text.Value));
        }

        JsonElement candidate = bench.List().GetProperty("candidates")[0];
        string drawing = string.Join(' ', page.Descendants(svg + "svg").First().Descendants(svg + "text").Select(text => text.Value));
        foreach (JsonElement use in candidate.GetProperty("parts").EnumerateArray()
            .Where(use => use.GetProperty("role").GetString() != "decoupling"))
        {
            Assert.Contains(use.GetProperty("designator").GetString()!, drawing, StringComparison.Ordinal);
        }

        foreach (string words in new[]
        {
            "needs a licence where the law says so", "review by a qualified person", "Local codes", "Strays of the board",
            "crystal over temperature", "What to order", "worst case, all together", "Wanted: river: square wave 1 kHz",
        })
        {
            Assert.Contains(words, page.Value, StringComparison.Ordinal);
        }

        Assert.DoesNotContain("http", html.Replace("http://www.w3.org/2000/svg", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_is_replaced_only_when_asked_and_nothing_is_left_behind()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        string path = bench.NewFile("order.md");
        File.WriteAllText(path, "mine");
        Assert.Contains("is there already", bench.Of("shortlist", "export", "logger", "--to", path).WrongLine(), StringComparison.Ordinal);
        Assert.Equal("mine", File.ReadAllText(path));
        Assert.Equal(0, bench.Of("shortlist", "export", "logger", "--to", path, "--force").Status);
        Assert.StartsWith("# logger", File.ReadAllText(path), StringComparison.Ordinal);
        Assert.Contains("is a directory", To(Path.GetDirectoryName(path)!), StringComparison.Ordinal);
        Assert.Contains("its directory is not there", To(bench.NewFile("no/such.csv")), StringComparison.Ordinal);
        Assert.DoesNotContain(Directory.GetFiles(Path.GetDirectoryName(path)!), file => file.EndsWith(".new", StringComparison.Ordinal));

        string To(string target) => bench.Of("shortlist", "export", "logger", "--to", target).WrongLine();
    }

    [Fact]
    public void Mixed_currencies_are_refused_with_their_rows_and_totalled_with_a_rate()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        JsonElement candidate = bench.List().GetProperty("candidates")[0];
        string crystal = candidate.GetProperty("crystal").GetString()!;
        decimal before = bench.Of("shortlist", "export", "logger", "--format", "json").Json.GetProperty("total").GetDecimal();
        bench.Reimport("crystals", [crystal], "currency", _ => "USD");
        string line = bench.Of("shortlist", "export", "logger").WrongLine();
        Assert.Contains($"USD: {crystal} (Y1)", line, StringComparison.Ordinal);
        Assert.Contains("--rate", line, StringComparison.Ordinal);
        JsonElement rated = bench.Of("shortlist", "export", "logger", "--format", "json", "--rate", "USD=1").Json;
        Assert.Equal(("EUR", before), (rated.GetProperty("currency").GetString(), rated.GetProperty("total").GetDecimal()));
        JsonElement dollars = bench.Of(
            "shortlist", "export", "logger", "--format", "json", "--rate", "EUR=2", "--currency", "USD").Json;
        Assert.Equal("USD", dollars.GetProperty("currency").GetString());

        // The list says that its cost cannot be had, not a sum of two currencies.
        Assert.Equal(JsonValueKind.Null, bench.List().GetProperty("candidates")[0].GetProperty("now").GetProperty("cost").ValueKind);
        Assert.Contains(
            "in another currency",
            bench.Of("shortlist", "alternates", "logger", "1", "--builds", "--chosen-only").WrongLine(),
            StringComparison.Ordinal);
        JsonElement alternates = bench.Of("shortlist", "alternates", "logger", "1", "--part", "C1", "--format", "json").Json;
        JsonElement first = alternates[0].GetProperty("parts")[0].GetProperty("replacements")[0];
        Assert.Equal(JsonValueKind.Null, first.GetProperty("change").GetProperty("cost").ValueKind);
        string table = bench.Of("shortlist", "alternates", "logger", "1", "--part", "C1").Output;
        Assert.Contains("priced in more than one currency", table, StringComparison.Ordinal);
    }

    [Fact]
    public void A_stock_that_runs_short_is_split_over_equal_parts_with_its_saving()
    {
        var bench = new ShortlistBench();
        string own = Run.File(
            "Part Number,Capacitance (pF),Tolerance,Dielectric,Voltage,Supplier,Price (EUR),Stock\n"
            + "A-1,15,2%,C0G,50 V,first,0.01,150\nB-1,15,2%,C0G,50 V,second,0.02,5000\n", "own.csv");
        Assert.Equal(0, bench.Of("catalog", "import", own, "--kind", "capacitors").Status);
        var candidate = ShortlistBench.Candidate(1);
        candidate["parts"]!.AsArray().Single(part => part!["designator"]!.GetValue<string>() == "C1")!["part"] = "A-1";
        Assert.Equal(0, bench.WithInput(candidate.ToJsonString(), "shortlist", "add", "logger", "-", "--builds", "200").Status);

        // 200 and no attrition: 150 x 0.01 + 50 x 0.02 = 2.50; 200 of the other alone 4.00.
        JsonElement line = bench.Of("shortlist", "export", "logger", "--format", "json", "--attrition", "0%").Json
            .GetProperty("lines").EnumerateArray().Single(each => each.GetProperty("parts")[0].GetString() == "A-1");
        Assert.Equal(2.50m, line.GetProperty("total").GetDecimal());
        Assert.Equal(1.50m, line.GetProperty("saving").GetDecimal());
        Assert.Equal(["A-1", "B-1"], line.GetProperty("orders").EnumerateArray().Select(order => order.GetProperty("part").GetString()));
        Run whole = bench.Of("shortlist", "export", "logger", "--format", "csv", "--no-split");
        Assert.Contains("the stock of A-1 is 150, 206 are to be ordered", whole.Error, StringComparison.Ordinal);
        Assert.Contains("B-1", CsvTexts.ByBoth(whole.Output, ',').Single(row => row.Contains("A-1")));
    }

    [Fact]
    public void Wrong_options_are_one_line_each()
    {
        ShortlistBench bench = new ShortlistBench().With(1);
        (string[] Arguments, string Says)[] cases =
        [
            (["other"], "no list 'other'"),
            (["logger", "--delimiter", "x"], "is no delimiter"),
            (["logger", "--decimal", ";"], "no decimal sign"),
            (["logger", "--format", "pdf"], "'pdf'"),
            (["logger", "--attrition", "150%"], "more than all"),
            (["logger", "--attrition", "-1%"], "--attrition"),
            (["logger", "--attrition", "valves=1%"], "no kind of part"),
            (["logger", "--attrition", ""], "--attrition"),
            (["logger", "--rate", "USD"], "is no rate"),
            (["logger", "--rate", "USD=0"], "is no rate"),
            (["logger", "--rate", "USD=-1"], "is no rate"),
            (["logger", "--rate", "USD=NaN"], "is no rate"),
            (["logger", "--rate", "USD=1e99"], "is no rate"),
            (["logger", "--rate", "USD=1", "--rate", "USD=2"], "given twice"),
            (["logger", "--rate", "EUR=1"], "none is its own"),
            (["logger", "--currency", "USD"], "--rate EUR"),
            (["logger", "--currency", " "], "is empty"),
            (["logger", "--to", "order.pdf"], "ending of no form"),
            (["logger", "--to", ""], "is no path"),
            (["logger", "--to", "/dev/null", "--force"], "is a device"),
            (["logger", "--to", bench.Catalog, "--force"], "is the catalogue itself"),
        ];
        foreach ((string[] arguments, string says) in cases)
        {
            Assert.Contains(says, bench.Of(["shortlist", "export", .. arguments]).WrongLine(), StringComparison.Ordinal);
        }
    }
}
