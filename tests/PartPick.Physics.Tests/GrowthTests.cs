using PartPick.Physics.Circuits;
using PartPick.Physics.Growth;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

public sealed class GrowthTests
{
    // Ten or more e-folds of the growth lie below a thousandth of the running amplitude.
    private const double Small = 1e-3;

    public static TheoryData<string> Circuits => new("gate", "clock", "follower", "buffered");

    [Fact]
    public void A_cubic_device_grows_along_the_logistic_curve()
    {
        // Van der Pol's envelope in closed form: I² = Î²/(1 + (Î²/I0² − 1) e^(−2σt)); the excess is one less (I/Î)².
        const double rate = 250, running = 2e-3, start = 3e-10;
        AmplitudeGrowth growth = GrowthSolver.Integrate(start, running, rate, depth => 1 - Math.Exp(-2 * depth));
        double ratio = running * running / (start * start) - 1;

        double ninety = Math.Log(ratio / (1 / 0.81 - 1)) / (2 * rate);
        Assert.Equal(ninety, growth.NinetyPercentSeconds, 1e-5 * ninety);
        Assert.All(growth.Points, point => Assert.Equal(
            running / Math.Sqrt(1 + ratio * Math.Exp(-2 * rate * point.Seconds)), point.PeakAmps, 2e-4 * point.PeakAmps));
    }

    [Theory]
    [MemberData(nameof(Circuits))]
    public void Small_amplitudes_grow_at_the_growth_rate_and_would_run_at_the_start_up_time(string name)
    {
        OscillatorCircuit circuit = Named(name);
        OscillatorResult result = OscillatorAnalysis.Analyse(circuit);
        AmplitudeGrowth growth = OscillatorAnalysis.FindGrowth(circuit, TestContext.Current.CancellationToken)!;

        Assert.Equal(result.StartUpTimeSeconds!.Value, growth.StartUpTimeSeconds, 1e-12 * growth.StartUpTimeSeconds);
        GrowthPoint[] small = [.. growth.Points.Where(point => point.PeakAmps < Small * growth.SteadyPeakAmps)];
        Assert.True(small.Length > 20);
        double rate = Math.Log(small[^1].PeakAmps / small[0].PeakAmps) / small[^1].Seconds;
        Assert.Equal(result.StartUp.GrowthRatePerSecond, rate, 1e-3 * rate);

        // On at that rate, the running amplitude comes at the start-up time.
        double left = Math.Log(growth.SteadyPeakAmps / small[^1].PeakAmps) / rate;
        Assert.Equal(result.StartUpTimeSeconds.Value, small[^1].Seconds + left, 1e-3 * growth.StartUpTimeSeconds);
    }

    [Theory]
    [MemberData(nameof(Circuits))]
    public void The_amplitude_rises_to_the_running_one(string name)
    {
        OscillatorCircuit circuit = Named(name);
        SteadyState steady = OscillatorAnalysis.FindSteadyState(circuit)!;
        AmplitudeGrowth growth = OscillatorAnalysis.FindGrowth(circuit, TestContext.Current.CancellationToken)!;

        Assert.Equal(steady.CurrentRmsAmps * Math.Sqrt(2), growth.SteadyPeakAmps, 1e-12);
        Assert.Equal(OscillatorAnalysis.ThermalPeakAmps(circuit), growth.Points[0].PeakAmps);
        Assert.All(growth.Points.Skip(1).Zip(growth.Points), pair => Assert.True(
            pair.First.Seconds > pair.Second.Seconds && pair.First.PeakAmps > pair.Second.PeakAmps));
        Assert.InRange(growth.Points[^1].PeakAmps / growth.SteadyPeakAmps, 0.994, 1);
    }

    [Theory]
    [InlineData(220)]
    [InlineData(1000)]
    public void From_a_tenth_to_nine_tenths_it_takes_as_long_as_the_whole_circuit_in_time(double rs)
    {
        GateCircuit gate = Samples.StrongGate(3e-3, 5e3, rs);
        AmplitudeGrowth growth = OscillatorAnalysis.FindGrowth(gate, TestContext.Current.CancellationToken)!;

        double found = growth.NinetyPercentSeconds - Crossing(growth, 0.1);
        double inTime = GrowthInTime.SecondsBetween(gate, growth.SteadyPeakAmps, 0.1, 0.9);
        Assert.Equal(inTime, found, 0.02 * inTime);
    }

    [Fact]
    public void A_circuit_that_does_not_build_up_has_no_growth()
    {
        Assert.Null(OscillatorAnalysis.FindGrowth(Samples.StrongGate(0.05e-3, 200e3, 0), TestContext.Current.CancellationToken));
    }

    [Fact]
    public void It_ends_when_it_is_cancelled()
    {
        using var stop = new CancellationTokenSource();
        stop.Cancel();
        Assert.Throws<OperationCanceledException>(() => OscillatorAnalysis.FindGrowth(Named("gate"), stop.Token));
    }

    private static double Crossing(AmplitudeGrowth growth, double share)
    {
        GrowthPoint after = growth.Points.First(point => point.PeakAmps >= share * growth.SteadyPeakAmps);
        GrowthPoint before = growth.Points.Last(point => point.PeakAmps < share * growth.SteadyPeakAmps);
        double part = Math.Log(share * growth.SteadyPeakAmps / before.PeakAmps) / Math.Log(after.PeakAmps / before.PeakAmps);
        return before.Seconds + part * (after.Seconds - before.Seconds);
    }

    private static OscillatorCircuit Named(string name) => name switch
    {
        "gate" => Samples.StrongGate(3e-3, 5e3, 220),
        "clock" => Samples.StrongClock(100e3),
        "follower" => Samples.FullFollower(100e-12),
        _ => Samples.BufferedGate(5, 500, 1000, 0),
    };
}
