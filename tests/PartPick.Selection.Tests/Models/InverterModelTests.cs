using PartPick.Catalog;
using PartPick.Physics.Devices;

namespace PartPick.Selection.Tests.Models;

public class InverterModelTests
{
    // Linear interpolation between the points, half way (arithmetic).
    [Theory]
    [InlineData(DeviceStrength.Weakest, 5e-3)]
    [InlineData(DeviceStrength.Typical, 10e-3)]
    [InlineData(DeviceStrength.Strongest, 15e-3)]
    public void Between_the_points_the_figures_are_interpolated(DeviceStrength strength, double gm)
    {
        var inverter = Assert.IsType<OneStageInverter>(InverterModel.At(Sample.Inverter, 4, strength));

        Assert.Equal(gm, inverter.TransconductanceSiemens, 1e-15);

        // The stage keeps its gain over the spread: gm Ro of the typical device.
        Assert.Equal(10e-3 * 5500, inverter.TransconductanceSiemens * inverter.OutputOhms, 1e-9);
        Assert.Equal(
            (0.7, 4e-12, 5e-12, 1e-12),
            (inverter.ThresholdVolts, inverter.InputFarads, inverter.OutputFarads, inverter.FeedbackFarads));
    }

    [Theory]
    [InlineData(2, true)]
    [InlineData(6, true)]
    [InlineData(1.999, false)]
    [InlineData(6.001, false)]
    public void Outside_the_points_a_part_is_not_specified(double supply, bool specified)
    {
        Assert.Equal(specified, InverterModel.Covers(Sample.Inverter, supply));
        Assert.Equal(specified, InverterModel.At(Sample.Inverter, supply, DeviceStrength.Typical) is not null);
        Assert.Equal(specified, InverterModel.GuaranteedClockHz(Sample.Inverter, supply) is not null);
    }

    [Fact]
    public void Clocks_are_interpolated_too()
    {
        Assert.Equal(18e6, InverterModel.GuaranteedClockHz(Sample.Inverter, 4)!.Value, 1e-3);
        Assert.Equal(55e6, InverterModel.TypicalClockHz(Sample.Inverter, 4)!.Value, 1e-3);
    }

    [Fact]
    public void A_buffered_part_keeps_its_on_resistance_over_the_spread()
    {
        InverterPart part = Sample.Inverter with
        {
            Stages = 3,
            Points =
            [
                new SupplyPoint { SupplyVolts = 4, RonOhms = 50, Gain = 2500, DelaySeconds = 12e-9 },
                new SupplyPoint { SupplyVolts = 6, RonOhms = 40, Gain = 2000, DelaySeconds = 8e-9 },
            ],
        };

        var typical = Assert.IsType<BufferedInverter>(InverterModel.At(part, 4, DeviceStrength.Typical));
        var weakest = Assert.IsType<BufferedInverter>(InverterModel.At(part, 4, DeviceStrength.Weakest));

        Assert.Equal((2500, 50.0, 12e-9), (Math.Round(typical.Gain, 9), typical.Ron, typical.DelaySeconds));
        Assert.Equal((1250, 50.0), (Math.Round(weakest.Gain, 9), weakest.Ron));
        Assert.Equal(10e-9, InverterModel.At(part, 5, DeviceStrength.Typical)!.DelaySeconds, 1e-18);
    }

    // A stated maximum critical transconductance is understood to leave a factor of five to the weakest device.
    [Fact]
    public void A_port_that_states_a_critical_transconductance_has_five_times_as_much()
    {
        PortPart port = new()
        {
            Id = "P", Description = "", Offer = Offer.Unknown, Stages = 1, CriticalTransconductanceMaxSiemens = 1e-3, SwingVolts = 1.5,
            Points = [new SupplyPoint { SupplyVolts = 2 }, new SupplyPoint { SupplyVolts = 3.6 }],
        };

        var inverter = Assert.IsType<OneStageInverter>(InverterModel.At(port, 3, DeviceStrength.Weakest));

        Assert.Equal(5e-3, inverter.TransconductanceSiemens, 1e-15);
        Assert.Equal(1.5, inverter.SwingVolts);
    }
}
