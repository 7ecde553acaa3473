using PartPick.Physics.Network;
using PartPick.Physics.SmallSignal;

namespace PartPick.Physics.Steady;

/// <summary>
/// The large-signal steady state: found with few harmonics, then refined until twice the harmonics change the frequency by
/// less than 0.03 ppm and the current by less than 0.1 %; the finer of the two is taken.
/// </summary>
internal static class SteadySolver
{
    private const double FrequencyAgreement = 3e-8;
    private const double CurrentAgreement = 1e-3;
    private const int FollowedLevel = 1;
    private const double EstimateTolerance = 1e-4;

    /// <summary>Scans the amplitude and refines the running state.</summary>
    /// <param name="crystal">The crystal.</param>
    /// <param name="network">The linearised circuit, for the first guess of the frequency.</param>
    /// <param name="siemens">Transconductance at the bias point.</param>
    /// <param name="refinement">The balances of the circuit.</param>
    /// <param name="largestNegativeOhms">Largest −Re Zc(I) over the amplitude, in ohms.</param>
    /// <param name="state">The state, as a starting point for circuits like this one.</param>
    /// <returns>The steady state, or null where there is none.</returns>
    public static SteadyState? Solve<TNetwork>(
        Crystal crystal, in TNetwork network, double siemens, Refinement refinement, out double largestNegativeOhms, out RunningState? state)
        where TNetwork : struct, ILinearNetwork
    {
        var branch = new CrystalBranch(crystal);
        var scan = new AmplitudeScan(refinement, FirstGuess(branch, network, siemens), crystal.ResistanceOhms);
        largestNegativeOhms = scan.LargestNegativeOhms;
        state = null;
        return scan.Running is { } running ? Refine(crystal, branch, refinement, running, out state) : null;
    }

    /// <summary>
    /// The steady state near one of a circuit like this one; null where it is not found from there.
    /// </summary>
    public static SteadyState? Follow(
        Crystal crystal, Refinement refinement, RunningState near, Fineness fineness, out RunningState? state)
    {
        state = null;
        var branch = new CrystalBranch(crystal);
        if (refinement.From(near) is not { } balance)
        {
            return null;
        }

        if (fineness == Fineness.Converged)
        {
            return Refine(crystal, branch, refinement, balance, out state);
        }

        if (!Settle(branch, balance) || refinement.IsIncomplete(balance))
        {
            return null;
        }

        if (fineness == Fineness.OneFiner)
        {
            balance = refinement.Finer(balance) ?? balance;
            if (!Settle(branch, balance) || refinement.IsIncomplete(balance))
            {
                return null;
            }
        }

        state = balance.Keep();
        return Describe(crystal, balance);
    }

    /// <summary>
    /// A quick estimate with the fewest harmonics, from the state of a circuit like this one or from nothing. Its frequency is
    /// off by about a hundredth of the pull from series resonance: good to leave out what is far off, never shown.
    /// </summary>
    public static SteadyEstimate? Estimate<TNetwork>(
        Crystal crystal, in TNetwork network, double siemens, Refinement refinement, RunningState? near, out RunningState? state)
        where TNetwork : struct, ILinearNetwork
    {
        state = null;
        var branch = new CrystalBranch(crystal);
        AmplitudeBalance? balance = near is null ? null : refinement.From(near);
        if (balance is null || !balance.SolveRunning(crystal.ResistanceOhms, EstimateTolerance) || refinement.IsIncomplete(balance))
        {
            var scan = new AmplitudeScan(refinement, FirstGuess(branch, network, siemens), crystal.ResistanceOhms);
            balance = scan.Running;
        }

        if (balance is null)
        {
            return null;
        }

        double radians = branch.SeriesRadians * (1 + branch.OffsetForReactance(balance.Impedance.Imaginary));
        double rms = balance.PeakAmps / Math.Sqrt(2);
        state = balance.Keep();
        return new SteadyEstimate(radians / (2 * Math.PI), crystal.ResistanceOhms * rms * rms);
    }

    private static SteadyState? Refine(
        Crystal crystal, in CrystalBranch branch, Refinement refinement, AmplitudeBalance balance, out RunningState? state)
    {
        state = null;
        double frequency = double.NaN;
        double current = double.NaN;
        AmplitudeBalance? coarser = null;
        for (int level = 0; ; level++)
        {
            if (!Settle(branch, balance))
            {
                return coarser is null ? null : Describe(crystal, coarser);
            }

            if (refinement.IsIncomplete(balance))
            {
                balance = refinement.Complete(balance);
                level--;
                continue;
            }

            if (state is null || (level == FollowedLevel && !state.Reverse))
            {
                state = balance.Keep();
            }

            bool agrees = Math.Abs(balance.Radians - frequency) < FrequencyAgreement * frequency
                && Math.Abs(balance.PeakAmps - current) < CurrentAgreement * current;
            (frequency, current) = (balance.Radians, balance.PeakAmps);
            AmplitudeBalance? finer = agrees ? null : refinement.Finer(balance);
            if (finer is null)
            {
                return Describe(crystal, balance);
            }

            coarser = balance;
            balance = finer;
        }
    }

    // ω at the critical transconductance, to which the device's effective one falls.
    private static double FirstGuess<TNetwork>(in CrystalBranch branch, in TNetwork network, double siemens)
        where TNetwork : struct, ILinearNetwork
    {
        GrowthWindow window = GrowthWindow.Find(branch, network);
        double guess = window.CriticalSiemens is { } critical && critical < siemens ? critical : siemens;
        double radians = branch.SeriesRadians;
        for (int step = 0; step < 3; step++)
        {
            double reactance = network.At(new System.Numerics.Complex(0, radians)).Impedance(guess).Imaginary;
            radians = branch.SeriesRadians * (1 + branch.OffsetForReactance(reactance));
        }

        return radians;
    }

    /// <summary>Repeats the running state at the frequency it gives until the frequency stands.</summary>
    private static bool Settle(in CrystalBranch branch, AmplitudeBalance balance)
    {
        for (int step = 0; step < 12; step++)
        {
            if (!balance.SolveRunning(branch.ResistanceOhms))
            {
                return false;
            }

            double radians = branch.SeriesRadians * (1 + branch.OffsetForReactance(balance.Impedance.Imaginary));
            bool stands = Math.Abs(radians - balance.Radians) < 2e-13 * radians;
            balance.SetFrequency(radians);
            if (stands)
            {
                return true;
            }
        }

        return true;
    }

    private static SteadyState Describe(Crystal crystal, AmplitudeBalance balance)
    {
        double hertz = balance.Radians / (2 * Math.PI);
        double rms = balance.PeakAmps / Math.Sqrt(2);
        return new SteadyState
        {
            FrequencyHz = hertz,
            LoadFarads = crystal.LoadAtFrequencyFarads(hertz),
            CurrentRmsAmps = rms,
            DriveWatts = crystal.ResistanceOhms * rms * rms,
            OutputSwingVolts = balance.OutputSwingVolts(),
            LimitedBySupply = balance.LimitedBySupply,
        };
    }
}
