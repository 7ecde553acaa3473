using System.Text.Json;
using PartPick.Catalog;

namespace PartPick.Tests;

/// <summary>Which catalogue a command takes, and what it says of one that cannot be used: one line and status 3.</summary>
public class CatalogStateTests
{
    private const string NamesParts = """
        { "circuit": "counter", "crystal": { "part": "X-04M0-18-H49-30" }, "amplifier": { "part": "CNT-14-HC" },
          "c1": "22 pF", "c2": "22 pF", "rs": 220, "rf": "1M", "supply": 5 }
        """;

    public static TheoryData<string, byte[]> Damaged => new()
    {
        { "empty", [] },
        { "a text", "junk"u8.ToArray() },
        { "zeros", new byte[32768] },
        { "noise", Noise() },
    };

    [Theory]
    [MemberData(nameof(Damaged))]
    public void Damaged_catalogue_is_one_line_and_status_3(string kind, byte[] bytes)
    {
        Assert.NotEmpty(kind);
        string path = Run.File("", "catalog.db");
        File.WriteAllBytes(path, bytes);

        string line = Run.WithInput(NamesParts, "check", "-", "--catalog", path).WrongLine(3);

        Assert.Contains("is damaged or no catalogue", line, StringComparison.Ordinal);
        Assert.Equal(bytes, File.ReadAllBytes(path));
    }

    [Fact]
    public void A_piece_of_a_catalogue_and_one_with_a_hole_are_damaged()
    {
        string path = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "own.db");
        Assert.Equal(0, Run.WithInput(NamesParts, "check", "-", "--catalog", path).Status);
        byte[] whole = File.ReadAllBytes(path);

        File.WriteAllBytes(path, whole[..20000]);
        Run.WithInput(NamesParts, "check", "-", "--catalog", path).WrongLine(3);

        byte[] holed = [.. whole];
        holed.AsSpan(8192 * 3 + 100, 4000).Fill(0xAA);
        File.WriteAllBytes(path, holed);
        Run.WithInput(NamesParts, "check", "-", "--catalog", path).WrongLine(3);
    }

    [Fact]
    public void Locked_catalogue_is_one_line_and_status_3()
    {
        string path = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "own.db");
        Assert.Equal(0, Run.WithInput(NamesParts, "check", "-", "--catalog", path).Status);
        using var held = new FileStream(path + ".lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);

        Assert.Contains("is in use by another process",
            Run.WithInput(NamesParts, "check", "-", "--catalog", path).WrongLine(3), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/")]
    [InlineData("/proc/own.db")]
    [InlineData("")]
    public void Path_that_cannot_hold_a_catalogue_is_status_3(string path) =>
        Run.WithInput(NamesParts, "check", "-", "--catalog", path).WrongLine(3);

    [Fact]
    public void Without_any_home_it_says_what_to_give() => Assert.Contains(
        CatalogPath.Variable, Run.In(_ => null, NamesParts, "check", "-").WrongLine(3), StringComparison.Ordinal);

    [Fact]
    public void The_option_counts_before_the_variable_and_the_variable_before_the_data_home()
    {
        string folder = Path.GetDirectoryName(Run.File(""))!;
        string home = Path.Combine(folder, "partpick", "catalog.db");
        string variable = Path.Combine(folder, "variable.db");
        string option = Path.Combine(folder, "option.db");
        string? dataHome(string name) => name == "XDG_DATA_HOME" ? folder : null;
        string? both(string name) => name == CatalogPath.Variable ? variable : dataHome(name);

        Assert.Equal(0, Run.In(both, NamesParts, "check", "-", "--catalog", option).Status);
        Assert.Equal((true, false, false), (File.Exists(option), File.Exists(variable), File.Exists(home)));
        Assert.Equal(0, Run.In(both, NamesParts, "check", "-").Status);
        Assert.Equal((true, false), (File.Exists(variable), File.Exists(home)));
        Assert.Equal(0, Run.In(dataHome, NamesParts, "check", "-").Status);
        Assert.True(File.Exists(home));
    }

    [Fact]
    public void A_circuit_of_plain_values_needs_no_catalogue() => Assert.Equal(
        JsonValueKind.Number,
        Run.In(_ => null, CheckCommandTests.Circuit, "check", "-", "--format", "json").Json.GetProperty("frequency").ValueKind);

    private static byte[] Noise()
    {
        byte[] bytes = new byte[40960];
        new Random(7).NextBytes(bytes);
        return bytes;
    }
}
