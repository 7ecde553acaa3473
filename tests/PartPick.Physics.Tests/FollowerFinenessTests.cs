using PartPick.Physics.Circuits;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>
/// What the fineness of a follower's steady state leaves open, and that it does not matter where the search for it began
/// (arithmetic, no publication).
/// </summary>
public sealed class FollowerFinenessTests
{
    private const int Circuits = 60;

    [Fact]
    public void Twice_the_steps_of_the_coarsest_state_change_its_frequency_by_tenths_of_a_ppm_and_its_drive_by_less_than_a_hundredth() =>
        ForEach(5, (circuit, state) =>
        {
            RunningFigures coarse = OscillatorAnalysis.FindSteadyState(circuit, state, Fineness.Same, out _)!;
            RunningFigures fine = OscillatorAnalysis.FindSteadyState(circuit, state, Fineness.Converged, out _)!;
            Near(fine, coarse, 3e-7, 1e-2, circuit);
        });

    [Fact]
    public void A_state_found_from_a_neighbour_is_the_one_found_from_nothing() =>
        ForEach(6, (circuit, state) =>
        {
            FollowerCircuit neighbour = circuit with
            {
                C1Farads = 1.05 * circuit.C1Farads,
                SupplyVolts = 0.97 * circuit.SupplyVolts,
                TemperatureCelsius = circuit.TemperatureCelsius + 10,
            };
            if (OscillatorAnalysis.FindSteadyState(neighbour) is { } alone)
            {
                RunningFigures followed = OscillatorAnalysis.FindSteadyState(neighbour, state, Fineness.Converged, out _)!;
                Near(alone.Figures, followed, 3e-8, 1e-3, neighbour);
            }
        });

    private static void ForEach(int seed, Action<FollowerCircuit, RunningState> check)
    {
        var random = new Random(seed);
        int running = 0;
        for (int k = 0; k < Circuits; k++)
        {
            FollowerCircuit circuit = RandomCircuits.Follower(random);
            OscillatorAnalysis.Analyse(circuit, out RunningState? state);
            if (state is not null)
            {
                running++;
                check(circuit, state);
            }
        }

        Assert.True(running > Circuits / 2);
    }

    private static void Near(RunningFigures expected, RunningFigures found, double frequency, double drive, FollowerCircuit circuit)
    {
        double frequencyOff = found.FrequencyHz / expected.FrequencyHz - 1;
        double driveOff = found.DriveWatts / expected.DriveWatts - 1;
        Assert.True(
            Math.Abs(frequencyOff) <= frequency && Math.Abs(driveOff) <= drive,
            FormattableString.Invariant($"frequency {frequencyOff:E2}, drive {driveOff:E2}: {circuit}"));
    }
}
