using System.Text;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>
/// Negative resistance above Rm at one amplitude and none at a very large one leave a steady state between them
/// (intermediate values; arithmetic, no publication). Buffered gates are left out of the random draw: with little or no
/// damping resistor a delayed chain of large gain can oscillate through the capacitance across the crystal alone, and then the
/// argument does not hold.
/// </summary>
public sealed class SteadyStateExistsTests
{
    private const double Pico = 1e-12;

    private static Crystal Crystal => new()
    {
        NominalHz = 4e6, LoadFarads = 20 * Pico, ShuntFarads = 4 * Pico, MotionalFarads = 12e-15, ResistanceOhms = 30,
    };

    [Theory]
    [InlineData("one stage", 77, 40)]
    [InlineData("clock", 77, 40)]
    [InlineData("follower", 77, 40)]
    [InlineData("follower", 1, 300)]
    public void A_circuit_that_builds_up_or_has_a_running_margin_has_a_steady_state(string kind, int seed, int count)
    {
        var random = new Random(seed);
        var failures = new StringBuilder();
        int failed = 0, tried = 0;
        for (int k = 0; k < count; k++)
        {
            OscillatorCircuit circuit = RandomCircuits.Next(random, kind);
            OscillatorResult found = OscillatorAnalysis.Analyse(circuit);
            if (found.StartUp.GrowthRatePerSecond > 0 || found.RunningMargin > 1.05)
            {
                tried++;
                if (found.Steady is null || found.Start == StartKind.None)
                {
                    failed++;
                    failures.Append(FormattableString.Invariant($"margin {found.StartUp.Margin:F3}, running {found.RunningMargin:F3}: "))
                        .Append(circuit).AppendLine();
                }
            }
        }

        Assert.True(failed == 0, $"{failed} of {tried}:\n{failures}");
    }

    [Fact]
    public void A_follower_that_only_just_builds_up_runs_at_the_root_of_what_its_margin_has_above_one()
    {
        // The first term of the device's curve that limits is the square of the amplitude (arithmetic, no publication).
        Oscillation time = TimeDomain.Settle(OfMargin(1.05), startPeakAmps: 0.3e-3)!;

        Assert.Equal(10, Running(1.001) / Running(1.000_01), 0.05);
        Assert.Equal(time.PeakAmps, Running(1.05), 0.01 * time.PeakAmps);
    }

    private static FollowerCircuit OfMargin(double margin)
    {
        FollowerCircuit follower = Samples.HardFollower;
        for (int k = 0; k < 20; k++)
        {
            double negative = OscillatorAnalysis.AnalyseStartUp(follower).NegativeResistanceOhms;
            follower = follower with { Crystal = follower.Crystal with { ResistanceOhms = negative / margin } };
        }

        return follower;
    }

    private static double Running(double margin)
    {
        OscillatorResult found = OscillatorAnalysis.Analyse(OfMargin(margin));
        Assert.Equal(StartKind.BuildsUp, found.Start);
        return found.Steady!.CurrentRmsAmps * Math.Sqrt(2);
    }

    // With 0.3 pF of motional capacitance and 1 kΩ the integration in time settles at 13.0 mA peak, vBC reaching 0.67 V.
    [Theory]
    [InlineData(1e3)]
    [InlineData(2.2e3)]
    public void A_follower_of_much_reserve_limited_by_its_supply_has_a_steady_state(double emitter)
    {
        FollowerCircuit follower = Samples.FullFollower(220 * Pico) with
        {
            Crystal = Crystal with { ResistanceOhms = 20 },
            Strays = new Strays(0, 2 * Pico, 1 * Pico),
            EmitterCurrentAmps = null,
            EmitterOhms = emitter,
        };

        Assert.NotNull(OscillatorAnalysis.FindSteadyState(follower));
    }

    [Fact]
    public void A_buffered_gate_that_runs_in_time_has_a_steady_state_and_needs_a_disturbance()
    {
        GateCircuit gate = Samples.BufferedGate(300, 100, 470, 0) with { Crystal = Samples.LowQuality with { ResistanceOhms = 30 } };
        OscillatorResult found = OscillatorAnalysis.Analyse(gate);

        Assert.NotNull(TimeDomain.Settle(gate));
        Assert.True(found.RunningMargin > 1, $"{found}");
        Assert.NotNull(found.Steady);
        Assert.Equal(StartKind.NeedsDisturbance, found.Start);
    }

    // The top of −Re Zc(I) does not depend on Rm, so the running margin is that top over Rm (arithmetic).
    [Theory]
    [InlineData(6)]
    [InlineData(7.3)]
    [InlineData(8.7)]
    [InlineData(10)]
    [InlineData(13)]
    public void A_buffered_gate_of_little_running_margin_runs_exactly_where_it_is_above_one(double delayNanoseconds)
    {
        GateCircuit gate = Samples.BufferedGate(2500, 45, 220, delayNanoseconds * 1e-9) with
        {
            Crystal = Crystal with { ResistanceOhms = 40 },
        };
        double top = 40 * OscillatorAnalysis.Analyse(gate).RunningMargin;

        Assert.True(top > 1, $"{top}");
        Assert.NotNull(OscillatorAnalysis.FindSteadyState(gate with { Crystal = Crystal with { ResistanceOhms = top / 1.01 } }));
        Assert.Null(OscillatorAnalysis.FindSteadyState(gate with { Crystal = Crystal with { ResistanceOhms = top * 1.01 } }));
    }

    // At small signals the output current of a strong gate is the difference of two large ones, so rounding shows in it.
    [Fact]
    public void A_strong_gate_at_32_768_kHz_has_a_steady_state()
    {
        OscillatorResult found = OscillatorAnalysis.Analyse(new GateCircuit
        {
            Crystal = new Crystal
            {
                NominalHz = 32768, LoadFarads = 9 * Pico, ShuntFarads = 1.1 * Pico, MotionalFarads = 2.6e-15, ResistanceOhms = 50e3,
            },
            C1Farads = 2.2 * Pico,
            C2Farads = 18 * Pico,
            SeriesOhms = 680e3,
            FeedbackOhms = 10e6,
            Strays = new Strays(3 * Pico, 3 * Pico, 1 * Pico),
            SupplyVolts = 5,
            Inverter = new OneStageInverter(24.1e-3, 728)
            {
                ThresholdVolts = 0.42, InputFarads = 4.5 * Pico, OutputFarads = 5 * Pico, FeedbackFarads = 1.2 * Pico,
            },
        });

        Assert.True(found.StartUp.GrowthRatePerSecond > 0);
        Assert.NotNull(found.Steady);
    }
}
