using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Selection.Tests.Circuits;

public class CircuitFileProblemTests
{
    public static TheoryData<string, string, string> Replacements => new()
    {
        // What is replaced, by what, and what the one line has to hold.
        { "\"load\"", "\"laod\"", "circuit.json: crystal.laod: is no key of a crystal; fits 'load'" },
        { "\"rs\": \"220\"", "\"re\": \"220\"", "circuit.json: re: is no key of a gate circuit" },
        { "\"4 MHz\", \"load\"", "\"4 pF\", \"load\"", "circuit.json: crystal.frequency: '4 pF'" },
        { "\"motional\": \"12 fF\", ", "", "circuit.json: crystal.motional: is missing" },
        { "\"resistance\": \"100\"", "\"resistance\": \"-100\"", "circuit.json: crystal.resistance: '-100' is negative" },
        { "\"resistance\": \"100\"", "\"resistance\": 0", "circuit.json: crystal.resistance: is zero" },
        { "\"c1\": \"22 pF\"", "\"c1\": true", "circuit.json: c1: is true; fits a capacitance" },
        { "\"c1\": \"22 pF\"", "\"c1\": [1]", "circuit.json: c1: is a list; fits a capacitance" },
        { "\"gate\"", "\"gatter\"", "circuit.json: circuit: 'gatter' is unknown; fits 'gate'" },
        { "\"circuit\": \"gate\",", "", "circuit.json: circuit: is missing" },
        { "\"gm\": \"10 mS\", ", "", "circuit.json: amplifier.gm: is missing" },
        { "\"gm\": \"10 mS\"", "\"gm\": \"10 mS\", \"gain\": 5", "circuit.json: amplifier.gm: is given beside gain or ron" },
        { "\"vt\": \"0.8 V\"", "\"swing\": \"0.8 V\"", "circuit.json: amplifier.swing: is no key of an inverter of one stage" },
        { "\"supply\": \"5 V\"", "\"supply\": \"0 V\"", "circuit.json: supply: is zero" },
        { "\"temperature\": 25", "\"temperature\": -300", "circuit.json: temperature: '-300' is below absolute zero" },
        { "\"tap\": 0", "\"tap\": 1.5", "circuit.json: tap: '1.5' is not a whole number" },
        { "\"tap\": 0", "\"tap\": 99", "circuit.json: tap: stage 99" },
        { "\"tap\": 0", "\"tap\": 0, \"tap\": 1", "circuit.json: tap: is given twice" },
        { "\"rf\": \"1M\"", "\"rf\": \"\"", "circuit.json: rf: " },
        { "\"rf\": \"1M\"", "\"rf\": 1e999", "circuit.json: rf: " },
        { "\"strays\": {", "\"strays\": { \"in\": 1,", "circuit.json: strays.in: is no key of the strays; fits" },
        {
            "\"c1\": \"22 pF\", \"c2\": \"22 pF\", ", "\"c1\": \"22 pF\" \"c2\": \"22 pF\", ",
            "circuit.json, line 6, column 17: is not valid JSON"
        },
    };

    [Theory]
    [MemberData(nameof(Replacements))]
    public void Wrong_file_gives_one_line_that_names_file_key_and_what_fits(string old, string replacement, string expected)
    {
        Result<CircuitDescription> read = CircuitFile.Read(CircuitTexts.GateWith(old, replacement), "circuit.json");

        Assert.False(read.IsOk);
        string line = read.Problem.ToString();
        Assert.StartsWith(expected, line, StringComparison.Ordinal);
        Assert.DoesNotContain('\n', line);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "is not valid JSON")]
    [InlineData("[]", "holds a list")]
    [InlineData("{}", "circuit: is missing")]
    [InlineData("null", "holds nothing")]
    public void Text_that_is_no_circuit_is_refused(string json, string expected) =>
        Assert.Contains(expected, CircuitFile.Read(json, "circuit.json").Problem!.ToString(), StringComparison.Ordinal);

    [Theory]
    [InlineData("\"rbTop\": \"47k\"", "\"rb\": \"47k\"", "rb: is given beside")]
    [InlineData("\"rbTop\": \"47k\", ", "", "rb: is missing")]
    [InlineData("\"re\": \"2k2\", ", "", "re: is missing")]
    [InlineData("\"beta\": 200, ", "", "amplifier.beta: is missing")]
    public void Follower_needs_one_way_of_bias(string old, string replacement, string expected)
    {
        string json = CircuitTexts.Follower.Replace(old, replacement, StringComparison.Ordinal);

        Assert.Contains(expected, CircuitFile.Read(json, "f.json").Problem!.ToString(), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("CNT-14-HCX", "is not in the catalogue; fits 'CNT-14-HC")]
    [InlineData("INV-HC-U-1", "is not a counter of the catalogue but one of the kind inverter")]
    public void Unknown_part_is_named(string id, string expected)
    {
        string json = $$"""
            { "circuit": "counter", "crystal": { "frequency": 4e6, "motional": "12f", "resistance": 100 },
              "amplifier": { "part": "{{id}}" }, "c1": "22p", "c2": "22p", "supply": 5 }
            """;

        Assert.Contains(expected, CircuitFile.Read(json, "c.json", PartsCatalog.BuiltIn()).Problem!.ToString(), StringComparison.Ordinal);
        Assert.Contains("without a catalogue", CircuitFile.Read(json, "c.json").Problem!.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Supply_outside_a_parts_points_is_refused()
    {
        const string json = """
            { "circuit": "counter", "crystal": { "frequency": 4e6, "motional": "12f", "resistance": 100 },
              "amplifier": { "part": "CNT-14-HC" }, "c1": "22p", "c2": "22p", "supply": 12 }
            """;

        Assert.Equal("c.json: supply: 12 V is outside what CNT-14-HC is specified for; fits 2 V to 6 V",
            CircuitFile.Read(json, "c.json", PartsCatalog.BuiltIn()).Problem!.ToString());
    }

    [Fact]
    public void Circuit_without_any_capacitance_at_a_node_is_refused()
    {
        const string json = """
            { "circuit": "gate", "crystal": { "frequency": 4e6, "motional": "12f", "resistance": 100 },
              "amplifier": { "gm": "1 mS" }, "c1": "22p", "supply": 5 }
            """;

        Assert.StartsWith("c.json: c2: is missing", CircuitFile.Read(json, "c.json").Problem!.ToString(), StringComparison.Ordinal);
    }
}
