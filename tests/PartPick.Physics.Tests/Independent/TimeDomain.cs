using PartPick.Physics.Circuits;

namespace PartPick.Physics.Tests.Independent;

/// <summary>What the whole circuit does in time once its amplitude no longer changes.</summary>
internal sealed record Oscillation(
    double PeakAmps, double FrequencyHz, double LoadFarads, double OutputSwingVolts, double HighestWatchedVolts, int Cycles);

/// <summary>
/// Integrates the whole nonlinear circuit, crystal included, and looks for the amplitude at which it neither grows nor
/// decays. Between stretches of time the motional branch is set to a better amplitude, by the secant of growth over
/// amplitude: the steady state is reached in some hundreds of cycles, whatever the crystal's quality.
/// </summary>
internal static class TimeDomain
{
    private const int WindowCycles = 24;

    /// <summary>How far −Re Zc may stay from Rm, as a share of Rm.</summary>
    private const double Tolerance = 1e-4;

    /// <summary>The steady state, or null where the oscillation dies.</summary>
    /// <param name="circuit">Circuit.</param>
    /// <param name="stepsPerCycle">Time steps per cycle.</param>
    /// <param name="startPeakAmps">Motional current to start with; null for one above what the supply can sustain.</param>
    public static Oscillation? Settle(OscillatorCircuit circuit, int stepsPerCycle = 256, double? startPeakAmps = null)
    {
        CircuitInTime network = circuit switch
        {
            GateCircuit gate => new GateInTime(gate),
            FollowerCircuit follower => new FollowerInTime(follower),
            _ => throw new ArgumentException("No such circuit.", nameof(circuit)),
        };
        Crystal crystal = circuit.Crystal;
        double frequency = crystal.SeriesHz;
        double floor = 1e-6 * Guess(circuit);
        var integrator = new Integrator(network, crystal, 1 / (frequency * stepsPerCycle));
        integrator.Current = startPeakAmps ?? Guess(circuit);

        int settleCycles = (int)Math.Clamp(5 * network.SlowestSeconds * frequency, 16, 800);
        double toExcess = 2 * crystal.InductanceHenries / crystal.ResistanceOhms;
        double? lastLog = null, lastExcess = null;
        double slope = -1;
        int cycles = 0;
        for (int round = 0; round < 60; round++)
        {
            Window settle = Window.Run(integrator, network, settleCycles);
            integrator.TuneTo(settle.FrequencyHz);
            Window window = Window.Run(integrator, network, WindowCycles);
            cycles += settleCycles + WindowCycles;
            double log = Math.Log(window.PeakAmps);
            double excess = window.GrowthPerSecond * toExcess;
            if (Math.Abs(excess) < Tolerance)
            {
                return new Oscillation(
                    window.PeakAmps,
                    window.FrequencyHz,
                    crystal.LoadAtFrequencyFarads(window.FrequencyHz),
                    window.SwingVolts,
                    window.HighestWatchedVolts,
                    cycles);
            }

            if (window.PeakAmps < floor)
            {
                return null;
            }

            // Too short a secant measures noise: then the slope known so far serves on.
            if (lastLog is { } l && lastExcess is { } e && Math.Abs(log - l) > 3e-3)
            {
                slope = (excess - e) / (log - l);
            }

            double change = slope < -0.02 ? -excess / slope : Math.Sign(excess) * 0.3;
            change = Math.Clamp(change, -0.4, 0.4);
            (lastLog, lastExcess) = (log, excess);
            Scale(integrator, stepsPerCycle, Math.Exp(change + log) / window.LastPeakAmps);
        }

        throw new InvalidOperationException("The amplitude did not settle.");
    }

    private static double Guess(OscillatorCircuit circuit)
    {
        double susceptance = 2 * Math.PI * circuit.Crystal.SeriesHz * Math.Sqrt(circuit.C1Farads * circuit.C2Farads);
        return circuit switch
        {
            FollowerCircuit follower => Math.Min(4 * FollowerBias.Of(follower).EmitterAmps, 0.5 * circuit.SupplyVolts * susceptance),
            _ => 0.8 * circuit.SupplyVolts * susceptance,
        };
    }

    /// <summary>
    /// Gives the motional current another amplitude at its crest, where the voltages that it makes over capacitances pass
    /// zero: anywhere else the bias would be left with an offset that takes long to decay.
    /// </summary>
    private static void Scale(Integrator integrator, int stepsPerCycle, double factor)
    {
        for (int k = 0; k < stepsPerCycle / 4; k++)
        {
            integrator.Advance();
        }

        integrator.Current *= factor;
    }
}
