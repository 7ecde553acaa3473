using System.Text.Json;
using PartPick.Catalog;

namespace PartPick.Tests;

/// <summary>The commands that show the catalogue.</summary>
public class CatalogReadingCommandTests
{
    public static TheoryData<string> Kinds => [.. PartKinds.All.Select(kind => kind.Word())];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void List_gives_every_part_of_a_kind_with_plain_numbers(string kind)
    {
        JsonElement list = Run.Of("catalog", "list", kind, "--format", "json").Json;
        Part[] expected = [.. PartsCatalog.BuiltIn().All.Where(part => part.Kind.Word() == kind)];
        Assert.Equal(expected.Select(part => part.Id), list.EnumerateArray().Select(part => part.GetProperty("id").GetString()));
        Assert.All(list.EnumerateArray(), part =>
        {
            Assert.Equal(kind, part.GetProperty("kind").GetString());
            Assert.Equal("built-in", part.GetProperty("origin").GetProperty("description").GetString());
        });
    }

    [Fact]
    public void Show_gives_ratios_as_ratios_and_names_what_is_assumed()
    {
        JsonElement part = Run.Of("catalog", "show", "X-32K768-12P5-C26-20", "--format", "json").Json;
        Assert.Equal(32768, part.GetProperty("frequency").GetDouble());
        Assert.Equal(12.5e-12, part.GetProperty("load").GetDouble());
        Assert.Equal(20e-6, part.GetProperty("tolerance").GetDouble());
        Assert.Equal(["motional"], part.GetProperty("assumed").EnumerateArray().Select(key => key.GetString()));
        Assert.Equal(1, part.GetProperty("prices")[0].GetProperty("quantity").GetInt32());
        Assert.False(part.TryGetProperty("stability", out _));
    }

    [Fact]
    public void Show_gives_the_supply_points_of_a_counter_and_its_taps()
    {
        JsonElement part = Run.Of("catalog", "show", "CNT-14-HC", "--format", "json").Json;
        JsonElement points = part.GetProperty("points");
        Assert.Equal(4, points.GetArrayLength());
        Assert.Equal(7e-3, points[2].GetProperty("gm").GetDouble());
        Assert.Equal(30e6, points[2].GetProperty("clockMin").GetDouble());
        Assert.Equal([4, 5, 6, 7, 8, 9, 10, 12, 13, 14], part.GetProperty("taps").EnumerateArray().Select(tap => tap.GetInt32()));
    }

    [Fact]
    public void The_table_of_one_part_names_unit_basis_and_origin_of_a_figure()
    {
        string line = Run.Of("catalog", "show", "X-04M0-18-H49-30").Output
            .Split('\n')
            .Single(row => row.StartsWith("resistance ", StringComparison.Ordinal));
        Assert.Contains("Ω", line, StringComparison.Ordinal);
        Assert.Contains("maximum", line, StringComparison.Ordinal);
        Assert.Contains("built-in", line, StringComparison.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Export_is_the_file_of_the_built_in_parts_byte_for_byte(string kind)
    {
        using var text = new StringWriter();
        PartCsv.Write(
            PartKinds.All.Single(each => each.Word() == kind),
            PartsCatalog.BuiltIn().All.Where(part => part.Kind.Word() == kind),
            text);
        string expected = text.ToString();
        Assert.Equal(expected, Run.Of("catalog", "export", kind).Output);

        string file = Run.File("", "out.csv");
        Assert.Equal(0, Run.Of("catalog", "export", kind, "--to", file).Status);
        Assert.Equal(expected, File.ReadAllText(file));
    }

    [Fact]
    public void Info_counts_the_parts_of_each_kind()
    {
        JsonElement info = Run.Of("catalog", "info", "--format", "json").Json;
        Assert.Equal(PartsCatalog.BuiltIn().Crystals.Length, info.GetProperty("kinds").GetProperty("crystals").GetInt32());
        Assert.Equal(0, info.GetProperty("own").GetInt32());
    }

    [Fact]
    public void Filter_and_top_shorten_the_list()
    {
        Assert.Equal(
            3, Run.Of("catalog", "list", "crystals", "--filter", "32.768 kHz", "--top", "3", "--format", "json").Json.GetArrayLength());
        Assert.Equal(0, Run.Of("catalog", "list", "crystals", "--filter", "no such text", "--format", "json").Json.GetArrayLength());
    }

    [Fact]
    public void Unknown_part_and_kind_are_one_line_that_says_what_fits()
    {
        Assert.Contains("is no part of the catalogue", Run.Of("catalog", "show", "no-such").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("crystals", Run.Of("catalog", "list", "crystal").WrongLine(), StringComparison.Ordinal);
        Assert.Contains("partpick catalog list --help", Run.Of("catalog", "list").WrongLine(), StringComparison.Ordinal);
        Assert.Contains(
            "cannot be written",
            Run.Of("catalog", "export", "ports", "--to", "/nowhere/at/all.csv").WrongLine(),
            StringComparison.Ordinal);
    }
}
