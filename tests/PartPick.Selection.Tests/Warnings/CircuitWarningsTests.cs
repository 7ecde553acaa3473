using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Physics;
using PartPick.Physics.Circuits;
using PartPick.Selection.Tests.Circuits;

namespace PartPick.Selection.Tests.Warnings;

public class CircuitWarningsTests
{
    private static readonly PartsCatalog Parts = PartsCatalog.BuiltIn();

    [Fact]
    public void Circuit_as_it_should_be_has_no_warnings() =>
        Assert.Empty(Of(CircuitTexts.Read(CircuitTexts.GateWith("\"load\": \"18 pF\"", "\"load\": \"13 pF\""))));

    [Theory]
    [InlineData("\"12 fF\"", "\"12 fF\"", "stated at a load of 18 pF and sees 12.9 pF")]
    [InlineData("\"load\": \"18 pF\", ", "", "stated at series resonance and sees")]
    [InlineData("\"rf\": \"1M\"", "\"rf\": \"47k\"", "feedback resistor of 47 kΩ is outside the 1 MΩ to 10 MΩ")]
    [InlineData(", \"rf\": \"1M\"", "", "no feedback resistor: one of 1 MΩ to 10 MΩ")]
    [InlineData("\"resistance\": \"100\"", "\"resistance\": \"260\"", "start-up margin of 4.34 is below the 5")]
    [InlineData("\"resistance\": \"100\"", "\"resistance\": \"500\"", "start-up margin of 2.26 is below 3")]
    [InlineData("\"resistance\": \"100\"", "\"resistance\": \"2k\"", "It does not start: the start-up margin is 0.564")]
    [InlineData("\"500 uW\"", "\"100 uW\"", "is 2.55 times the 100 µW")]
    [InlineData("\"supply\": \"5 V\"", "\"supply\": \"1.5 V\"", "has no gain")]
    public void Cause_gives_its_sentence_with_the_number(string old, string replacement, string expected)
    {
        ImmutableArray<string> warnings = Of(CircuitTexts.Read(CircuitTexts.GateWith(old, replacement)));

        Assert.Contains(warnings, warning => warning.Contains(expected, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_warning_is_a_sentence_with_a_number_in_it()
    {
        CircuitDescription bad = CircuitTexts.Read(CircuitTexts.GateWith("\"500 uW\"", "\"1 uW\"")
            .Replace("\"rf\": \"1M\"", "\"rf\": \"47k\"", StringComparison.Ordinal));

        ImmutableArray<string> warnings = Of(bad);

        Assert.Equal(3, warnings.Length);
        Assert.All(warnings, warning => Assert.Matches(@"^[A-Z].*\d.*\.$", warning));
    }

    [Fact]
    public void Cure_of_the_drive_is_a_resistor_that_does_what_the_sentence_says()
    {
        var gate = (GateCircuit)CircuitTexts.Read(CircuitTexts.GateWith("\"500 uW\"", "\"100 uW\"")).Circuit;

        DampingCure cure = DampingCure.Find(gate, 100e-6, 5)!;

        OscillatorResult with = OscillatorAnalysis.Analyse(gate with { SeriesOhms = cure.Ohms });
        Assert.True(with.Steady!.DriveWatts <= 100e-6 && with.StartUp.Margin >= 5);
        Assert.Equal((with.Steady.DriveWatts, with.StartUp.Margin), (cure.DriveWatts, cure.Margin));
        double below = Values.PreferredSeries.Named("E12").Value.ValuesBetween(1, cure.Ohms * 0.999)[^1];
        Assert.True(OscillatorAnalysis.FindSteadyState(gate with { SeriesOhms = below })!.DriveWatts > 100e-6);
    }

    [Fact]
    public void Drive_that_no_resistor_cures_says_so() => Assert.Contains(
        Of(CircuitTexts.Read(CircuitTexts.GateWith("\"500 uW\"", "\"1 uW\""))),
        warning => warning.Contains("no damping resistor Rs of the E12 series", StringComparison.Ordinal));

    // Vittoz, Degrauwe, Bitz 1988 (from memory): with 20, 20 and 7 pF at 8 MHz and 80 Ω growth ends at 101.8 mS.
    [Theory]
    [InlineData("150 mS", true)]
    [InlineData("25 mS", false)]
    public void Too_much_gain_names_its_cures(string gm, bool expected)
    {
        string json = $$"""
            { "circuit": "gate", "supply": 5, "c1": "20p", "c2": "20p", "amplifier": { "gm": "{{gm}}" },
              "crystal": { "frequency": 8e6, "load": "10p", "shunt": "7p", "motional": "27f", "resistance": 80 } }
            """;

        ImmutableArray<string> warnings = Of(CircuitTexts.Read(json));

        Assert.Equal(expected, warnings.Any(warning =>
            warning.StartsWith("There is too much gain: the transconductance of 150 mS is above the 102 mS", StringComparison.Ordinal)
            && warning.Contains("larger C1 and C2, or a larger Rs", StringComparison.Ordinal)));
    }

    // Arithmetic on the model: Rs = 0 does not start, 330 kΩ has a margin of 6.1; that 220 to 330 kΩ is needed is common practice.
    [Fact]
    public void Strong_gate_with_a_tuning_fork_is_told_which_damping_resistor_it_needs()
    {
        Assert.Contains(Of(CircuitTexts.Read(Fork("5 mS", "5k", "0"))),
            warning => warning.Contains("It does not start", StringComparison.Ordinal)
                && warning.Contains("Rs = 270 kΩ would give it a start-up margin of 5", StringComparison.Ordinal));
        Assert.DoesNotContain(
            Of(CircuitTexts.Read(Fork("5 mS", "5k", "330k"))),
            warning => warning.Contains("does not start", StringComparison.Ordinal));
    }

    [Fact]
    public void Unrated_tuning_fork_is_warned_of_above_a_microwatt()
    {
        Assert.Contains(
            Of(CircuitTexts.Read(Fork("50 uS", "1M", "0"))),
            warning => warning.Contains("tuning fork", StringComparison.Ordinal));
        Assert.DoesNotContain(
            Of(CircuitTexts.Read(Fork("5 mS", "5k", "100k"))),
            warning => warning.Contains("tuning fork", StringComparison.Ordinal));
    }

    [Fact]
    public void Buffered_inverter_is_named_with_its_gain() => Assert.Contains(
        Of(CircuitTexts.Read(CircuitTexts.GateWith(
            "\"gm\": \"10 mS\", \"ro\": \"2k\", \"vt\": \"0.8 V\"", "\"gain\": 20, \"ron\": 500"))),
        warning => warning.Contains("is buffered, with a voltage gain of 20", StringComparison.Ordinal));

    [Fact]
    public void Clock_that_only_typical_devices_reach_is_named()
    {
        CircuitDescription counter = CounterAt12Volts(12e6);

        // Between 8 and 12 MHz at 10 and 15 V the guaranteed clock at 12 V is 9.6 MHz, and the typical one 19.2 MHz.
        Assert.Contains(
            Of(counter),
            warning => warning.Contains("above the 9.6 MHz that CNT-14-BS guarantees at 12 V; only typical", StringComparison.Ordinal));
        Assert.DoesNotContain(Of(CounterAt12Volts(9e6)), warning => warning.Contains("guarantees", StringComparison.Ordinal));
    }

    [Fact]
    public void Supply_outside_the_stated_points_is_named()
    {
        CircuitDescription counter = CounterAt12Volts(4e6);

        Assert.Contains(Of(counter with { Circuit = ((GateCircuit)counter.Circuit) with { SupplyVolts = 18 } }),
            warning => warning.Contains("18 V is outside the 3 V to 15 V", StringComparison.Ordinal));
    }

    [Fact]
    public void Assumed_figures_are_listed_with_their_values()
    {
        CrystalPart crystal = Parts.Crystals.First(part => part.BasisOf("motional") == Basis.Assumed);
        CrystalPart stated = crystal with { Basis = new Dictionary<string, Basis>() };
        CircuitDescription plain = CircuitTexts.Read(CircuitTexts.Gate);

        Assert.Contains(
            Of(plain with { Crystal = crystal }),
            warning => warning.StartsWith($"Assumed, not stated, for {crystal.Id}: motional capacitance 12 fF", StringComparison.Ordinal));
        Assert.DoesNotContain(Of(plain with { Crystal = stated }), warning => warning.StartsWith("Assumed", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("X7R", "±15 %")]
    [InlineData("Y5V", "+22/-82 %")]
    [InlineData("C0G", null)]
    [InlineData("U2J", null)]
    public void Class_2_dielectric_in_a_load_capacitor_is_named(string dielectric, string? change)
    {
        CapacitorPart part = Parts.Capacitors[0] with { Dielectric = dielectric };
        CircuitDescription circuit = CircuitTexts.Read(CircuitTexts.Gate) with { C2 = part };

        IEnumerable<string> warnings = Of(circuit).Where(warning => warning.StartsWith("C2", StringComparison.Ordinal));

        Assert.Equal(change is null ? 0 : 1, warnings.Count(warning => warning.Contains(change ?? "", StringComparison.Ordinal)));
    }

    [Fact]
    public void Follower_limited_by_its_supply_is_named()
    {
        CircuitDescription read = CircuitTexts.Read(CircuitTexts.Follower);
        OscillatorResult result = OscillatorAnalysis.Analyse(read.Circuit);
        OscillatorResult limited = result with { Steady = result.Steady! with { LimitedBySupply = true } };
        OscillatorResult free = result with { Steady = result.Steady! with { LimitedBySupply = false } };

        Assert.Contains(
            CircuitWarnings.Of(read, limited),
            warning => warning.Contains("The supply of 5 V limits the amplitude", StringComparison.Ordinal));
        Assert.DoesNotContain(
            CircuitWarnings.Of(read, free),
            warning => warning.Contains("limits the amplitude", StringComparison.Ordinal));
    }

    // ST AN2867, Table 3.
    [Theory]
    [InlineData(32768, 10e6, 25e6)]
    [InlineData(1e6, 5e6, 10e6)]
    [InlineData(10e6, 1e6, 5e6)]
    [InlineData(20e6, 0.47e6, 5e6)]
    [InlineData(4e6, 1e6, 10e6)]
    [InlineData(40e6, 0.47e6, 5e6)]
    public void Usual_feedback_resistor_follows_the_published_table(double hertz, double least, double most) =>
        Assert.Equal(new FeedbackRange(least, most), FeedbackRange.At(hertz));

    private static ImmutableArray<string> Of(CircuitDescription description) =>
        CircuitWarnings.Of(description, OscillatorAnalysis.Analyse(description.Circuit));

    private static string Fork(string gm, string ro, string series) => $$"""
        { "circuit": "gate", "supply": 5, "c1": "25p", "c2": "24p", "rs": "{{series}}", "rf": "10M",
          "crystal": { "frequency": 32768, "load": "12.5p", "shunt": "1.2p", "motional": "3.5f", "resistance": "50k" },
          "amplifier": { "gm": "{{gm}}", "ro": "{{ro}}", "cout": "5p", "cf": "0.5p" }, "strays": { "across": "1p" } }
        """;

    private static CircuitDescription CounterAt12Volts(double hertz) => CircuitFile.Read($$"""
        { "circuit": "counter", "supply": 12, "c1": "22p", "c2": "22p", "rs": "1k", "rf": "1M",
          "crystal": { "frequency": {{hertz}}, "load": "18p", "shunt": "4p", "motional": "15f", "resistance": 40 },
          "amplifier": { "part": "CNT-14-BS" } }
        """, "c.json", Parts).Value;
}
