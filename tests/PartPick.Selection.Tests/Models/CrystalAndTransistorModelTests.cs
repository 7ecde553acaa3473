using PartPick.Catalog;
using PartPick.Physics.Devices;

namespace PartPick.Selection.Tests.Models;

public class CrystalAndTransistorModelTests
{
    [Fact]
    public void Stated_figures_of_a_crystal_are_kept_and_certain()
    {
        CrystalModel model = CrystalModel.From(Sample.Crystal);

        Assert.Equal((12e-15, 4e-12, 60.0), (model.Crystal.MotionalFarads, model.Crystal.ShuntFarads, model.Crystal.ResistanceOhms));
        Assert.False(model.MotionalAssumed || model.ShuntUncertain);
    }

    // Plausible class figures: a fork of Cm 2 to 7 fF and C0 about 1 pF, an AT cut of Cm 2 to 20 fF and C0 up to 7 pF (makers' tables).
    [Theory]
    [InlineData(CrystalCut.Fork, 32768, null, 2, 7, 0.6, 2)]
    [InlineData(CrystalCut.AT, 4e6, null, 8, 20, 2, 7)]
    [InlineData(CrystalCut.AT, 16e6, "SMD 3.2 x 2.5 mm", 2, 8, 0.8, 5)]
    public void What_a_crystal_does_not_state_is_assumed_by_its_class(
        CrystalCut cut, double hertz, string? package, double leastFemto, double mostFemto, double leastPico, double mostPico)
    {
        CrystalModel model = CrystalModel.From(Sample.Crystal with
        {
            Cut = cut,
            FrequencyHz = hertz,
            Package = package,
            MotionalFarads = null,
            ShuntFarads = null,
            ResistanceOhms = null,
        });

        Assert.True(model.MotionalAssumed && model.ShuntUncertain);
        Assert.InRange(model.Crystal.MotionalFarads * 1e15, leastFemto, mostFemto);
        Assert.InRange(model.Crystal.ShuntFarads * 1e12, leastPico, mostPico);
        Assert.True(model.Crystal.ResistanceOhms > 0);
    }

    [Fact]
    public void A_shunt_capacitance_that_is_a_maximum_is_uncertain()
    {
        CrystalPart part = Sample.Crystal with
        {
            Basis = new Dictionary<string, Basis> { ["shunt"] = Basis.Maximum, ["motional"] = Basis.Assumed },
        };

        Assert.True(CrystalModel.From(part).ShuntUncertain);
        Assert.True(CrystalModel.From(part).MotionalAssumed);
    }

    // Without a transit time it follows from the transition frequency: 1/(2π fT), 0.53 ns at 300 MHz (arithmetic).
    [Fact]
    public void A_transistor_takes_its_transit_time_from_its_transition_frequency()
    {
        var part = new TransistorPart { Id = "Q", Description = "", Offer = Offer.Unknown, Beta = 150, TransitionFrequencyHz = 300e6 };

        Transistor typical = TransistorModel.At(part, DeviceStrength.Typical);

        Assert.Equal(0.5305e-9, typical.TransitSeconds, 1e-13);
        Assert.Equal((75.0, 150.0, 300.0), (
            TransistorModel.At(part, DeviceStrength.Weakest).Beta, typical.Beta, TransistorModel.At(part, DeviceStrength.Strongest).Beta));
        Assert.Equal(60, TransistorModel.At(part with { BetaMin = 60 }, DeviceStrength.Weakest).Beta);
        Assert.Equal(0.72, TransistorModel.At(part with { VbeVolts = 0.72 }, DeviceStrength.Typical).BaseEmitterVolts);
    }
}
