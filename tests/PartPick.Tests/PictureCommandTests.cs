using System.Globalization;
using System.Xml.Linq;

namespace PartPick.Tests;

public class PictureCommandTests
{
    private const string Wanted = """
        { "output": "4.096 MHz", "budget": "150 ppm", "supply": ["4.5 V", "5.5 V"], "temperature": [0, 50], "builds": 100,
          "circuits": ["gate"], "margin": 5, "capacitorSeries": "E6" }
        """;

    private static readonly string Requirement = Run.File(Wanted, "wanted.json");

    [Theory]
    [InlineData("error", "Frequency error over temperature")]
    [InlineData("margin", "Start-up margin over supply")]
    [InlineData("budget", "Error budget")]
    [InlineData("growth", "Growth of the amplitude after switch-on")]
    [InlineData("scatter", "Error against cost")]
    [InlineData("schematic", "Schematic")]
    public void Each_picture_of_the_best_candidate_is_an_SVG_on_standard_output(string word, string title)
    {
        Run run = Run.Of("picture", Requirement, "--of", word);

        Assert.Equal((0, ""), (run.Status, run.Error));
        XElement svg = XElement.Parse(run.Output);
        Assert.StartsWith(title, svg.Elements().First().Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_picture_says_the_figures_that_the_ranking_says()
    {
        var ranked = Run.Of("rank", Requirement, "--format", "json", "--top", "3").Json.GetProperty("candidates")[1];
        string error = Run.Of("picture", Requirement, "--of", "error", "--candidate", "2").Output;
        string margin = Run.Of("picture", Requirement, "--of", "margin", "--candidate", ranked.GetProperty("id").GetString()!).Output;
        string growth = Run.Of("picture", Requirement, "--of", "growth", "--candidate", "2").Output;

        Assert.Contains("worst case " + Text(ranked.GetProperty("errorWorst").GetDouble() * 1e-6, Values.Dimension.Relative), error, StringComparison.Ordinal);
        Assert.Contains("least " + Text(ranked.GetProperty("startUpMargin").GetDouble(), Values.Dimension.Number), margin, StringComparison.Ordinal);
        var circuit = Run.Of("check", Run.File(ranked.GetProperty("circuitFile").GetRawText()), "--format", "json").Json;
        Assert.Contains(
            "start-up time " + XText(Text(circuit.GetProperty("startUpTime").GetDouble(), Values.Dimension.Time)), growth, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_is_written_whole_and_never_over_another_unless_asked()
    {
        string path = Path.Combine(Path.GetDirectoryName(Run.File(""))!, "s.svg");
        Run first = Run.Of("picture", Requirement, "--of", "schematic", "--to", path);
        Assert.Equal((0, ""), (first.Status, first.Output));
        Assert.StartsWith("written to ", first.Error, StringComparison.Ordinal);
        string before = File.ReadAllText(path);

        Assert.StartsWith("--to: ", Run.Of("picture", Requirement, "--of", "error", "--to", path).WrongLine(), StringComparison.Ordinal);
        Assert.Equal(before, File.ReadAllText(path));
        Assert.Equal(0, Run.Of("picture", Requirement, "--of", "error", "--to", path, "--force").Status);
        Assert.NotEqual(before, File.ReadAllText(path));
        Assert.Single(Directory.GetFiles(Path.GetDirectoryName(path)!, "*.svg*"));
    }

    [Theory]
    [InlineData("growth")]
    [InlineData("schematic")]
    public void A_circuit_alone_has_its_growth_and_its_schematic(string word)
    {
        Run run = Run.Of("picture", Run.File(CheckCommandTests.Circuit), "--of", word);

        Assert.Equal((0, ""), (run.Status, run.Error));
        XElement svg = XElement.Parse(run.Output);
        Assert.Contains("gate, from input.json", svg.Value, StringComparison.Ordinal);
        string marked = word == "schematic" ? "22 pF" : "It begins at the thermal current of the crystal";
        Assert.Contains(marked, svg.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_schematic_of_a_circuit_file_has_all_its_values()
    {
        string values = XElement.Parse(Run.Of("picture", Run.File(CheckCommandTests.Circuit), "--of", "schematic").Output).Value;

        Assert.All(
            new[] { "C1", "C2", "22 pF", "Rs", "220 Ω", "Rf 1 MΩ", "4 MHz", "U1", "Y1" }, value => Assert.Contains(value, values, StringComparison.Ordinal));
    }

    [Fact]
    public void A_circuit_that_does_not_build_up_has_no_growth_and_says_so_with_status_1()
    {
        string circuit = CheckCommandTests.Circuit.Replace("10 mS", "1 uS", StringComparison.Ordinal);

        Assert.Contains("does not build up", Run.Of("picture", Run.File(circuit), "--of", "growth").WrongLine(1), StringComparison.Ordinal);
    }

    [Fact]
    public void Where_nothing_fits_the_nearest_miss_is_drawn_with_status_1()
    {
        Run run = Run.Of("picture", Run.File(Wanted.Replace("150 ppm", "2 ppm", StringComparison.Ordinal)), "--of", "error");

        Assert.Equal(1, run.Status);
        Assert.Contains("budget +2 ppm", XElement.Parse(run.Output).Value, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("--of: 'margin' needs a requirement", "CIRCUIT", "--of", "margin")]
    [InlineData("--to: 'a.png' is no name of a picture", "CIRCUIT", "--of", "schematic", "--to", "a.png")]
    [InlineData("--candidate: '99999' is not in the ranking; fits a number from 1 to ", "WANTED", "--of", "schematic", "--candidate", "99999")]
    [InlineData("--candidate: 'no-such' is not in the ranking", "WANTED", "--of", "schematic", "--candidate", "no-such")]
    [InlineData("/no/such.json: is not there", "/no/such.json", "--of", "schematic")]
    [InlineData("--to: '/no/such/a.svg' cannot be written: its directory is not there", "CIRCUIT", "--of", "schematic", "--to", "/no/such/a.svg")]
    public void Wrong_input_is_one_line(string expected, params string[] arguments)
    {
        string circuit = Run.File(CheckCommandTests.Circuit, "circuit.json");
        string[] given = [.. arguments.Select(word => word == "CIRCUIT" ? circuit : word == "WANTED" ? Requirement : word)];

        Assert.StartsWith(expected, Run.Of(["picture", .. given]).WrongLine(), StringComparison.Ordinal);
    }

    [Fact]
    public void Another_word_for_a_picture_is_wrong_input() =>
        Assert.Contains("'paint'", Run.Of("picture", Requirement, "--of", "paint").WrongLine(), StringComparison.Ordinal);

    private static string Text(double value, Values.Dimension dimension) => Values.ValueText.Format(value, dimension);

    // Letters beyond ASCII are written as numbers.
    private static string XText(string text) => string.Concat(
        text.Select(sign => char.IsAscii(sign) ? sign.ToString() : string.Create(CultureInfo.InvariantCulture, $"&#{(int)sign};")));
}
