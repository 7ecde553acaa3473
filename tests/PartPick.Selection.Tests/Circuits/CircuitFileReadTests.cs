using PartPick.Catalog;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;

namespace PartPick.Selection.Tests.Circuits;

public class CircuitFileReadTests
{
    [Fact]
    public void Gate_file_gives_every_value_in_SI()
    {
        CircuitDescription read = CircuitTexts.Read(CircuitTexts.Gate);

        var gate = Assert.IsType<GateCircuit>(read.Circuit);
        Assert.Equal(CircuitKind.Gate, read.Kind);
        Assert.Equal((4e6, 18e-12, 5e-12, 12e-15, 100.0), (gate.Crystal.NominalHz, gate.Crystal.LoadFarads!.Value,
            gate.Crystal.ShuntFarads, gate.Crystal.MotionalFarads, gate.Crystal.ResistanceOhms));
        Assert.Equal(new OneStageInverter(10e-3, 2000)
        {
            ThresholdVolts = 0.8,
            InputFarads = 3e-12,
            OutputFarads = 5e-12,
            FeedbackFarads = 0.5e-12,
        }, gate.Inverter);
        Assert.Equal((22e-12, 22e-12, 220.0, 1e6), (gate.C1Farads, gate.C2Farads, gate.SeriesOhms, gate.FeedbackOhms));
        Assert.Equal(new Strays(3e-12, 3e-12, 1e-12), gate.Strays);
        Assert.Equal((5.0, 25.0, 0, 4e6), (gate.SupplyVolts, gate.TemperatureCelsius, read.Tap, read.TargetHz!.Value));
        Assert.Equal(new CrystalRatings { DriveLevelWatts = 500e-6, ToleranceRatio = 30e-6, StabilityRatio = 50e-6, AgeingRatio = 3e-6 },
            read.Ratings);
    }

    [Fact]
    public void Absent_optional_elements_are_ideal()
    {
        CircuitDescription read = CircuitTexts.Read("""
            { "circuit": "counter", "crystal": { "frequency": 4e6, "motional": "12f", "resistance": 100 },
              "amplifier": { "gm": 0.01 }, "c1": "22p", "c2": "22p", "supply": 5 }
            """);

        var gate = Assert.IsType<GateCircuit>(read.Circuit);
        Assert.Null(gate.Crystal.LoadFarads);
        Assert.Equal(0, gate.Crystal.ShuntFarads);
        Assert.Equal(new OneStageInverter(0.01, double.PositiveInfinity) { ThresholdVolts = 0.7 }, gate.Inverter);
        Assert.Equal((0.0, double.PositiveInfinity, Strays.None), (gate.SeriesOhms, gate.FeedbackOhms, gate.Strays));
        Assert.Equal((25.0, 0, null), (gate.TemperatureCelsius, read.Tap, read.TargetHz));
    }

    [Fact]
    public void Buffered_inverter_has_gain_and_on_resistance()
    {
        string json = CircuitTexts.GateWith(
            "\"gm\": \"10 mS\", \"ro\": \"2k\", \"vt\": \"0.8 V\"", "\"gain\": 5000, \"ron\": 100, \"delay\": \"20 ns\"");

        var inverter = Assert.IsType<BufferedInverter>(((GateCircuit)CircuitTexts.Read(json).Circuit).Inverter);

        Assert.Equal((5000.0, 100.0, 20e-9), (inverter.Gain, inverter.Ron, inverter.DelaySeconds));
    }

    [Fact]
    public void Port_may_state_its_swing()
    {
        string json = CircuitTexts.GateWith("\"gate\"", "\"port\"")
            .Replace("\"ro\": \"2k\"", "\"swing\": \"0.9 V\"", StringComparison.Ordinal);

        Assert.Equal(0.9, ((OneStageInverter)((GateCircuit)CircuitTexts.Read(json).Circuit).Inverter).SwingVolts);
    }

    [Fact]
    public void Follower_file_gives_every_value_in_SI()
    {
        var follower = Assert.IsType<FollowerCircuit>(CircuitTexts.Read(CircuitTexts.Follower).Circuit);

        Assert.Equal(new Transistor
        {
            Beta = 200,
            JunctionFarads = 9e-12,
            TransitSeconds = 0.6e-9,
            CollectorFarads = 3e-12,
            BaseSpreadingOhms = 90,
            BaseEmitterVolts = 0.65,
        }, follower.Transistor);
        Assert.Equal((47e3, 47e3, 2200.0, 10e3), (follower.BaseTopOhms, follower.BaseBottomOhms, follower.EmitterOhms, follower.LoadOhms));
        Assert.Null(follower.EmitterCurrentAmps);
    }

    [Fact]
    public void One_base_resistor_goes_from_base_to_supply()
    {
        string json = CircuitTexts.Follower.Replace(
            "\"rbTop\": \"47k\", \"rbBottom\": \"47k\"", "\"rb\": \"220k\"", StringComparison.Ordinal);

        var follower = (FollowerCircuit)CircuitTexts.Read(json).Circuit;

        Assert.Equal((220e3, double.PositiveInfinity), (follower.BaseTopOhms, follower.BaseBottomOhms));
    }

    [Fact]
    public void Given_emitter_current_needs_no_bias_resistors()
    {
        string json = CircuitTexts.Follower.Replace(
            "\"rbTop\": \"47k\", \"rbBottom\": \"47k\", \"re\": \"2k2\"", "\"emitterCurrent\": \"0.3 mA\"", StringComparison.Ordinal);

        var follower = (FollowerCircuit)CircuitTexts.Read(json).Circuit;

        Assert.Equal(0.3e-3, follower.EmitterCurrentAmps);
        Assert.Equal(double.PositiveInfinity, follower.EmitterOhms);
    }

    [Fact]
    public void Parts_of_the_catalogue_are_named_by_id()
    {
        PartsCatalog catalog = PartsCatalog.BuiltIn();
        CrystalPart crystal = catalog.Crystals.First(part => part.FrequencyHz == 4e6);
        CounterPart counter = catalog.Counters.First(part => part.Id == "CNT-14-HC");
        string json = $$"""
            { "circuit": "counter", "crystal": { "part": "{{crystal.Id}}" }, "amplifier": { "part": "{{counter.Id}}" },
              "c1": "22p", "c2": "22p", "supply": 5 }
            """;

        CircuitDescription read = CircuitFile.Read(json, "circuit.json", catalog).Value;

        Assert.True(CircuitFile.NamesParts(json));
        Assert.Equal(CrystalModel.From(crystal).Crystal, read.Circuit.Crystal);
        Assert.Equal(crystal.DriveLevelWatts, read.Ratings.DriveLevelWatts);
        Assert.Equal(InverterModel.At(counter, 5, DeviceStrength.Typical), ((GateCircuit)read.Circuit).Inverter);
        Assert.Equal((crystal, counter), (read.Crystal, read.Amplifier));
    }

    [Fact]
    public void Plain_file_names_no_parts() => Assert.False(CircuitFile.NamesParts(CircuitTexts.Gate));
}
