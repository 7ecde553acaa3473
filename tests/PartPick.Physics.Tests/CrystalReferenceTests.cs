namespace PartPick.Physics.Tests;

/// <summary>The crystal's formulas against published examples and exact identities.</summary>
public sealed class CrystalReferenceTests
{
    private const double Pico = 1e-12;

    /// <summary>8 Ω, 14.7 mH, 0.027 pF, C0 5.57 pF (ST AN2867, Table 2); stated by its inductance, so the frequency follows.</summary>
    private static Crystal NoteExample => new()
    {
        NominalHz = 1 / (2 * Math.PI * Math.Sqrt(14.7e-3 * 0.027 * Pico)),
        ShuntFarads = 5.57 * Pico,
        MotionalFarads = 0.027 * Pico,
        ResistanceOhms = 8,
    };

    [Fact]
    public void Series_resonance_is_that_of_the_published_example()
    {
        // ST AN2867, Table 2: 7 988 768 Hz from rounded values; its own values recompute to 7 988 763.83.
        Assert.Equal(7_988_768, NoteExample.SeriesHz, 5.0);
        Assert.Equal(7_988_763.83, NoteExample.SeriesHz, 0.01);
        Assert.Equal(14.7e-3, NoteExample.InductanceHenries, 1e-12);
    }

    [Fact]
    public void Parallel_resonance_is_the_frequency_without_a_load()
    {
        // ST AN2867, Table 2: 8 008 102 Hz; the square-root form on its rounded values comes within 5 Hz of series' 5 Hz.
        Assert.Equal(8_008_102, NoteExample.FrequencyAtLoadHz(0), 10.0);
    }

    [Fact]
    public void Loaded_frequency_follows_the_square_root()
    {
        // ST AN2867, Table 2: 7 995 695 Hz at 10 pF; the square root gives 7 995 687.5 (arithmetic).
        Assert.Equal(7_995_695, NoteExample.FrequencyAtLoadHz(10 * Pico), 8.0);
        Assert.Equal(7_995_687.5, NoteExample.FrequencyAtLoadHz(10 * Pico), 0.1);
    }

    [Fact]
    public void The_load_for_8_MHz_is_that_of_the_published_example()
    {
        // ST AN2867: 4.02 pF; the square root gives 4.0216 (arithmetic).
        Assert.Equal(4.0216 * Pico, NoteExample.LoadAtFrequencyFarads(8e6), 0.0001 * Pico);
    }

    [Fact]
    public void Quality_ratio_and_sensitivity_are_those_of_a_published_test_report()
    {
        // Abracon ABM8-16.000MHz-10-1-U test report: Q 271.58 thousand, C0/Cm 488.76, 7.55 ppm/pF at 10 pF. Its motional
        // capacitance is printed to three figures (±0.28 %), which Q and the sensitivity inherit.
        var crystal = new Crystal
        {
            NominalHz = 16e6,
            LoadFarads = 10 * Pico,
            ShuntFarads = 0.87 * Pico,
            MotionalFarads = 1.78e-15,
            ResistanceOhms = 20.53,
        };

        Assert.Equal(271.58e3, crystal.QualityFactor, 0.003 * 271.58e3);
        Assert.Equal(488.76, crystal.ShuntFarads / crystal.MotionalFarads, 0.01);
        Assert.Equal(-7.55e-6 / Pico, crystal.TrimSensitivityPerFarad(10 * Pico), 0.0028 * 7.55e-6 / Pico);
    }

    [Theory]
    [InlineData(80, 7, 10, 231.2)]
    [InlineData(50, 7, 18, 96.451)]
    [InlineData(40, 5, 20, 62.5)]
    public void Resistance_at_load_is_the_exact_identity(double resistance, double shunt, double load, double expected)
    {
        // Arithmetic: Rm (1 + C0/CL)².
        var crystal = new Crystal
        {
            NominalHz = 8e6, MotionalFarads = 1e-14, ShuntFarads = shunt * Pico, ResistanceOhms = resistance,
        };

        Assert.Equal(expected, crystal.ResistanceAtLoadOhms(load * Pico), 5e-4);
    }

    [Fact]
    public void A_wrong_load_shifts_by_the_exact_amount_not_by_the_slope()
    {
        // Arithmetic: 18 → 20 pF with 12 fF and 4 pF is −22.715 ppm exactly, −24.793 ppm by the slope at 18 pF.
        var crystal = new Crystal
        {
            NominalHz = 10e6, LoadFarads = 18 * Pico, ShuntFarads = 4 * Pico, MotionalFarads = 12e-15, ResistanceOhms = 30,
        };

        Assert.Equal(-22.715e-6, crystal.FrequencyAtLoadHz(20 * Pico) / crystal.NominalHz - 1, 0.0006e-6);
        Assert.Equal(-24.793e-6, crystal.TrimSensitivityPerFarad(18 * Pico) * 2 * Pico, 0.0006e-6);
    }

    [Fact]
    public void At_its_stated_load_a_crystal_runs_at_its_nominal_frequency()
    {
        // Arithmetic: the definition of fN.
        var random = new Random(1);
        for (int k = 0; k < 200; k++)
        {
            double load = 4 + 28 * random.NextDouble();
            var crystal = new Crystal
            {
                NominalHz = 1e6 + 29e6 * random.NextDouble(),
                LoadFarads = load * Pico,
                ShuntFarads = 7 * Pico * random.NextDouble(),
                MotionalFarads = 30e-15 * (0.1 + random.NextDouble()),
                ResistanceOhms = 50,
            };

            Assert.Equal(1, crystal.FrequencyAtLoadHz(load * Pico) / crystal.NominalHz, 1e-14);
            Assert.Equal(load, crystal.LoadAtFrequencyFarads(crystal.NominalHz) / Pico, 1e-6);
        }
    }

    [Fact]
    public void The_sensitivity_is_the_slope_of_the_frequency()
    {
        // Arithmetic: central difference of f(C)/fs, to the first order in Cm.
        Crystal crystal = NoteExample;
        double slope = (crystal.FrequencyAtLoadHz(10.001 * Pico) - crystal.FrequencyAtLoadHz(9.999 * Pico))
            / (0.002 * Pico) / crystal.SeriesHz;

        Assert.Equal(slope, crystal.TrimSensitivityPerFarad(10 * Pico), 1e-3 * Math.Abs(slope));
    }
}
