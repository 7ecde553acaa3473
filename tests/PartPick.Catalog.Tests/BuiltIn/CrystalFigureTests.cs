namespace PartPick.Catalog.Tests.BuiltIn;

public class CrystalFigureTests
{
    private static CrystalPart[] At => [.. BuiltInParts.Catalog.Crystals.Where(crystal => crystal.Cut == CrystalCut.AT)];

    private static CrystalPart[] Forks => [.. BuiltInParts.Catalog.Crystals.Where(crystal => crystal.Cut == CrystalCut.Fork)];

    [Fact]
    public void Resistance_never_rises_with_frequency_in_a_holder() => Assert.All(
        At.GroupBy(crystal => crystal.Holder),
        holder => Assert.All(
            holder.OrderBy(crystal => crystal.FrequencyHz).Neighbours(),
            pair => Assert.True(pair.Second.ResistanceOhms <= pair.First.ResistanceOhms, pair.Second.Id)));

    [Theory]
    [InlineData("HC-49/U", "HC-49/S")]
    [InlineData("5032", "3225")]
    public void A_smaller_holder_has_no_less_resistance_and_less_motional_capacitance(string large, string small)
    {
        var pairs = At.Where(crystal => crystal.Holder == large)
            .Join(
                At.Where(crystal => crystal.Holder == small), one => one.FrequencyHz, other => other.FrequencyHz,
                (one, other) => (one, other))
            .ToArray();
        Assert.NotEmpty(pairs);
        Assert.All(pairs, pair => Assert.True(pair.other.ResistanceOhms >= pair.one.ResistanceOhms, pair.other.Id));
        Assert.All(pairs, pair => Assert.True(pair.other.MotionalFarads < pair.one.MotionalFarads, pair.other.Id));
        Assert.All(pairs, pair => Assert.True(pair.other.DriveLevelWatts <= pair.one.DriveLevelWatts, pair.other.Id));
    }

    // Kyocera CX2520SB data sheet: 300, 150, 100, 50 Ω at most. A 3225 blank is larger, so it may not be worse.
    [Theory]
    [InlineData(13.56e6, 16e6, 300)]
    [InlineData(16e6, 20e6, 150)]
    [InlineData(20e6, 40e6, 100)]
    [InlineData(40e6, 60e6, 50)]
    public void Resistance_of_the_smallest_holder_stays_within_a_published_table(double from, double to, double most)
    {
        CrystalPart[] within =
            [.. At.Where(crystal => crystal.Holder == "3225" && crystal.FrequencyHz >= from && crystal.FrequencyHz < to)];
        Assert.NotEmpty(within);
        Assert.All(within, crystal => Assert.InRange(crystal.ResistanceOhms!.Value, 10, most));
    }

    [Fact]
    public void Quality_is_plausible_at_the_stated_limit_and_at_a_typical_resistance() => Assert.All(
        BuiltInParts.Catalog.Crystals,
        crystal =>
        {
            double atLimit = 1 / (2 * Math.PI * crystal.FrequencyHz * crystal.ResistanceOhms!.Value * crystal.MotionalFarads!.Value);
            Assert.InRange(atLimit, 1e4, 5e5);
            Assert.InRange(atLimit / 0.35, 2e4, 2e6);
        });

    [Theory]
    [InlineData("HC-49/U", 1e6, 4e6, 5, 12)]
    [InlineData("HC-49/U", 4e6, 60e6, 10, 25)]
    [InlineData("HC-49/S", 4e6, 60e6, 10, 25)]
    [InlineData("5032", 1e6, 60e6, 1.5, 6)]
    [InlineData("3225", 1e6, 60e6, 1.5, 6)]
    public void Motional_capacitance_suits_the_holder(string holder, double from, double to, double least, double most) => Assert.All(
        At.Where(crystal => crystal.Holder == holder && crystal.FrequencyHz >= from && crystal.FrequencyHz < to),
        crystal => Assert.InRange(crystal.MotionalFarads!.Value / BuiltInParts.Femto, least, most));

    [Fact]
    public void A_typical_shunt_capacitance_is_two_to_three_hundred_times_the_motional_one() => Assert.All(
        At.Where(crystal => crystal.BasisOf("shunt") == Basis.Typical),
        crystal => Assert.InRange(crystal.ShuntFarads!.Value / crystal.MotionalFarads!.Value, 200, 310));

    [Fact]
    public void A_limit_of_the_shunt_capacitance_lies_above_the_typical_figure()
    {
        CrystalPart[] limits = [.. At.Where(crystal => crystal.BasisOf("shunt") == Basis.Maximum)];
        Assert.InRange(limits.Length, At.Length / 5, At.Length * 4 / 5);
        Assert.All(limits, limit =>
        {
            Assert.InRange(limit.ShuntFarads!.Value, 210 * limit.MotionalFarads!.Value, 7.0000001 * BuiltInParts.Pico);
            Assert.All(At.Where(other => other.FrequencyHz == limit.FrequencyHz && other.Holder == limit.Holder
                && other.BasisOf("shunt") == Basis.Typical), typical => Assert.True(typical.ShuntFarads < limit.ShuntFarads));
        });
    }

    [Fact]
    public void Resistance_and_motional_capacitance_go_with_frequency_and_holder_alone() => Assert.All(
        BuiltInParts.Catalog.Crystals.GroupBy(crystal => (crystal.FrequencyHz, crystal.Holder)),
        same => Assert.Single(same.Select(crystal => (crystal.ResistanceOhms, crystal.MotionalFarads)).Distinct()));

    [Fact]
    public void Motional_capacitance_is_often_assumed_and_the_resistance_is_always_a_limit()
    {
        Assert.All(BuiltInParts.Catalog.Crystals, crystal => Assert.Equal(Basis.Maximum, crystal.BasisOf("resistance")));
        int assumed = At.Count(crystal => crystal.BasisOf("motional") == Basis.Assumed);
        int typical = At.Count(crystal => crystal.BasisOf("motional") == Basis.Typical);
        Assert.Equal(At.Length, assumed + typical);
        Assert.True(assumed >= At.Length / 4 && typical >= At.Length / 4);
    }

    [Fact]
    public void AT_cuts_state_a_stability_and_forks_a_parabola()
    {
        Assert.All(At, crystal => Assert.True(crystal is { StabilityRatio: >= 10e-6 and <= 50e-6, ParabolaPerSquareKelvin: null }));
        Assert.All(Forks, fork =>
        {
            Assert.Null(fork.StabilityRatio);
            Assert.Equal(25, fork.TurnoverCelsius);

            // CTS TF20 data sheet: -0.030 ppm/K² typically; makers go to -0.042 (common practice).
            Assert.InRange(fork.ParabolaPerSquareKelvin!.Value, -0.042e-6, -0.028e-6);
            Assert.Equal(32768, fork.FrequencyHz);
        });
    }

    [Fact]
    public void Forks_have_the_usual_figures() => Assert.All(Forks, fork =>
    {
        // At most 90 kΩ: CTS TF20 data sheet. The rest: common practice.
        Assert.InRange(fork.ResistanceOhms!.Value, 50e3, 90e3);
        Assert.InRange(fork.DriveLevelWatts!.Value, 0.5e-6, 1e-6);
        Assert.InRange(fork.ShuntFarads!.Value, 1 * BuiltInParts.Pico, 1.5 * BuiltInParts.Pico);
        Assert.InRange(fork.MotionalFarads!.Value, 2 * BuiltInParts.Femto, 4 * BuiltInParts.Femto);
    });

    [Fact]
    public void Ageing_is_largest_in_the_first_year() => Assert.All(BuiltInParts.Catalog.Crystals, crystal =>
    {
        Assert.InRange(crystal.AgeingRatio!.Value, 1e-6, 5e-6);
        Assert.True(crystal.AgeingYearlyRatio is null || crystal.AgeingYearlyRatio < crystal.AgeingRatio, crystal.Id);
    });

    [Fact]
    public void Drive_levels_suit_the_holders() => Assert.All(At, crystal =>
    {
        double least = crystal.Holder!.StartsWith("HC", StringComparison.Ordinal) ? 500e-6 : 100e-6;
        Assert.InRange(crystal.DriveLevelWatts!.Value, least * 0.999, least * 2.001);
    });

    [Fact]
    public void Temperatures_are_one_of_the_two_usual_ranges() => Assert.All(
        BuiltInParts.Catalog.Crystals,
        crystal => Assert.Contains(
            (crystal.TemperatureMinCelsius, crystal.TemperatureMaxCelsius), new (double?, double?)[] { (-20, 70), (-40, 85) }));
}
