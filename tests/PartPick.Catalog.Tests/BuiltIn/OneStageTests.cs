namespace PartPick.Catalog.Tests.BuiltIn;

/// <summary>The square law of Shichman and Hodges (1968) must be able to carry the stated figures of every one-stage amplifier.</summary>
public class OneStageTests
{
    public static TheoryData<string> Parts =>
        [.. BuiltInParts.Amplifiers.Where(part => part.Stages == 1).Select(part => part.Id)];

    [Theory]
    [MemberData(nameof(Parts))]
    public void The_transistors_conduct_at_half_the_supply(string id) =>
        Assert.All(Part(id).Points, point => Assert.True(Overdrive(Part(id), point) > 0.2));

    [Theory]
    [MemberData(nameof(Parts))]
    public void Gain_is_that_of_one_stage(string id)
    {
        // Unbuffered HC inverters: 15 to 25 (memory); more at the lowest supply, and in the slow amplifiers of 32 kHz ports.
        double most = id.StartsWith("MCU", StringComparison.Ordinal) ? 52 : 31;
        Assert.All(Part(id).Points, point => Assert.InRange(Gm(Part(id), point) * point.RoOhms!.Value, 14, most));
    }

    [Theory]
    [MemberData(nameof(Parts))]
    public void Channel_length_modulation_is_plausible(string id) => Assert.All(Part(id).Points, point =>
    {
        AmplifierPart part = Part(id);
        double q = 2 / (Gm(part, point) * point.RoOhms!.Value * Overdrive(part, point));
        Assert.InRange(q / (1 - (q * Range(part, point) / 2)), 0.01, 0.2);
    });

    [Theory]
    [MemberData(nameof(Parts))]
    public void Output_resistance_falls_with_the_supply_and_nothing_of_a_buffered_part_is_stated(string id)
    {
        Assert.All(Part(id).Points.Neighbours(), pair => Assert.True(pair.Second.RoOhms < pair.First.RoOhms));
        Assert.All(Part(id).Points, point => Assert.True(point is { RonOhms: null, Gain: null, DelaySeconds: null or 0 }));
    }

    // Output on-resistance of an HC counter's oscillator: maker's data sheet 74HC/HCT4060, December 1990. The resistance of the
    // square-law transistor that is fully on follows from gm, so it tells whether gm and resistance are of one device.
    [Theory]
    [InlineData(4.5, 130)]
    [InlineData(6, 100)]
    public void The_HC_counter_has_the_published_on_resistance(double supply, double ohms)
    {
        AmplifierPart part = Part("CNT-14-HC");
        SupplyPoint point = Assert.Single(part.Points, point => point.SupplyVolts == supply);
        double v = Overdrive(part, point);
        double q = 2 / (point.GmSiemens!.Value * point.RoOhms!.Value * v);
        double lambda = q / (1 - (q * supply / 2));
        double k = point.GmSiemens.Value / (2 * v * (1 + (lambda * supply / 2)));
        double on = 1 / (k * (supply - part.ThresholdVolts!.Value));
        Assert.InRange(on, ohms * 0.75, ohms * 1.25);
    }

    private static AmplifierPart Part(string id) => (AmplifierPart)BuiltInParts.Catalog.Find(id)!;

    private static double Range(AmplifierPart part, SupplyPoint point) => (part as PortPart)?.SwingVolts ?? point.SupplyVolts;

    private static double Overdrive(AmplifierPart part, SupplyPoint point) => (Range(part, point) / 2) - part.ThresholdVolts!.Value;

    // A port that states the critical transconductance is understood to have five times as much.
    private static double Gm(AmplifierPart part, SupplyPoint point) =>
        point.GmSiemens ?? (5 * ((PortPart)part).CriticalTransconductanceMaxSiemens!.Value);
}
