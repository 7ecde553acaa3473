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
    private const int MostScans = 3;
    private const int MostSettlings = 12;
    private const double EstimateTolerance = 1e-5;
    private const double RoughTolerance = 1e-9;
    private const double RoughStep = 1e-7;
    private const double FineStep = 1e-10;

    /// <summary>Scans the amplitude and refines the running state.</summary>
    /// <param name="crystal">The crystal.</param>
    /// <param name="network">The linearised circuit, for the first guess of the frequency.</param>
    /// <param name="siemens">Transconductance at the bias point.</param>
    /// <param name="refinement">The balances of the circuit.</param>
    /// <param name="largestNegativeOhms">Largest −Re Zc(I) over the amplitude, in ohms.</param>
    /// <param name="state">The state, as a starting point for circuits like this one.</param>
    /// <returns>The steady state, or null where there is none.</returns>
    public static SteadyState? Solve<TNetwork>(
        Crystal crystal,
        in TNetwork network,
        double siemens,
        Refinement refinement,
        out double largestNegativeOhms,
        out RunningState? state)
        where TNetwork : struct, ILinearNetwork
    {
        var branch = new CrystalBranch(crystal);
        double radians = FirstGuess(branch, network, siemens);
        state = null;
        largestNegativeOhms = double.NegativeInfinity;
        for (int scans = 0; scans < MostScans; scans++)
        {
            var scan = new AmplitudeScan(refinement, radians, crystal.ResistanceOhms);
            largestNegativeOhms = scan.LargestNegativeOhms;
            if (scan.Running is not { } running)
            {
                return null;
            }

            // Where −Re Zc turns back near Rm, the amplitude found at one frequency may be none at the next.
            radians = FrequencyOf(branch, running);
            if (Refine(branch, refinement, running, out state) is { } refined)
            {
                return Describe(crystal, refined);
            }
        }

        return null;
    }

    /// <summary>
    /// The steady state near one of a circuit like this one; null where it is not found from there.
    /// </summary>
    public static RunningFigures? Follow(
        Crystal crystal, Refinement refinement, RunningState near, Fineness fineness, out RunningState? state)
    {
        state = null;
        var branch = new CrystalBranch(crystal);
        if (refinement.From(near) is not { } balance)
        {
            return null;
        }

        RunningFigures? figures = Follow(crystal, branch, refinement, ref balance, fineness, out state);
        return balance.Stays ? figures : null;
    }

    /// <summary>
    /// The same state, sought from nothing and taken to the fineness that following would have had.
    /// </summary>
    public static RunningFigures? Seek<TNetwork>(
        Crystal crystal,
        in TNetwork network,
        double siemens,
        Refinement refinement,
        RunningState near,
        Fineness fineness,
        out RunningState? state)
        where TNetwork : struct, ILinearNetwork
    {
        state = null;
        var branch = new CrystalBranch(crystal);
        var scan = new AmplitudeScan(refinement, FirstGuess(branch, network, siemens), crystal.ResistanceOhms, runningOnly: true);
        ForcedState? balance = scan.Running;
        while (balance is not null && balance.IsCoarserThan(near))
        {
            ForcedState? finer = Settle(branch, balance, roughly: true) ? refinement.Finer(balance) : null;
            if (finer is null)
            {
                return null;
            }

            balance = finer;
        }

        return balance is null ? null : Follow(crystal, branch, refinement, ref balance, fineness, out state);
    }

    /// <summary>
    /// A quick estimate with the fewest harmonics, from the state of a circuit like this one or from nothing. Its frequency is
    /// off by about a hundredth of the pull from series resonance: good to leave out what is far off, never shown.
    /// </summary>
    public static SteadyEstimate? Estimate<TNetwork>(
        Crystal crystal,
        in TNetwork network,
        double siemens,
        Refinement refinement,
        RunningState? near,
        RunningState? other,
        out RunningState? state)
        where TNetwork : struct, ILinearNetwork
    {
        state = null;
        var branch = new CrystalBranch(crystal);
        ForcedState? balance = EstimateFrom(crystal, refinement, near) ?? EstimateFrom(crystal, refinement, other);
        if (balance is null)
        {
            var scan = new AmplitudeScan(refinement, FirstGuess(branch, network, siemens), crystal.ResistanceOhms, runningOnly: true);
            balance = scan.Running;
        }

        if (balance is null)
        {
            return null;
        }

        double radians = FrequencyOf(branch, balance);
        double rms = balance.PeakAmps / Math.Sqrt(2);
        state = balance.Keep();
        double share = balance.HarmonicShare;
        balance.Release();
        return new SteadyEstimate(radians / (2 * Math.PI), crystal.ResistanceOhms * rms * rms, share);
    }

    private static ForcedState? EstimateFrom(Crystal crystal, Refinement refinement, RunningState? near)
    {
        if (near is null || refinement.From(near) is not { } balance)
        {
            return null;
        }

        if (balance.SolveRunning(crystal.ResistanceOhms, EstimateTolerance) && balance.Stays)
        {
            return balance;
        }

        balance.Release();
        return null;
    }

    /// <summary>
    /// The frequency in hertz of a circuit that differs little from one whose running state is known, right to the first order of
    /// the difference: one Newton step from that state.
    /// </summary>
    public static double? FirstOrder(Crystal crystal, Refinement refinement, RunningState near)
    {
        var branch = new CrystalBranch(crystal);
        if (refinement.From(near) is not { } balance)
        {
            return null;
        }

        double? hertz = balance.StepTowardsRunning(crystal.ResistanceOhms) ? FrequencyOf(branch, balance) / (2 * Math.PI) : null;
        balance.Release();
        return hertz;
    }

    private static RunningFigures? Follow(
        Crystal crystal,
        in CrystalBranch branch,
        Refinement refinement,
        ref ForcedState balance,
        Fineness fineness,
        out RunningState? state)
    {
        state = null;
        if (fineness == Fineness.Converged)
        {
            return Refine(branch, refinement, balance, out state) is { } refined ? FiguresOf(crystal, refined) : null;
        }

        if (fineness == Fineness.OneFinerRoughly)
        {
            balance = refinement.CoarseIsFollowed ? balance : refinement.Finer(balance) ?? balance;
            if (!balance.SolveRunning(branch.ResistanceOhms, EstimateTolerance))
            {
                return null;
            }

            balance.SetFrequency(FrequencyOf(branch, balance));
        }
        else if (fineness == Fineness.OneFiner && !refinement.CoarseIsFollowed && Finer(branch, refinement, balance) is { } finer)
        {
            balance = finer;
        }
        else if (!Settle(branch, balance, roughly: true))
        {
            return null;
        }
        else if (fineness == Fineness.OneFiner && !refinement.CoarseIsFollowed)
        {
            // As from nothing: from the settled state, or the coarse one where no finer one is found.
            balance = Finer(branch, refinement, balance) ?? balance;
        }

        state = balance.Keep();
        RunningFigures figures = FiguresOf(crystal, balance);
        balance.Release();
        return figures;
    }

    private static ForcedState? Finer(in CrystalBranch branch, Refinement refinement, ForcedState balance) =>
        refinement.Finer(balance) is { } finer && Settle(branch, finer, roughly: true) ? finer : null;

    private static ForcedState? Refine(
        in CrystalBranch branch, Refinement refinement, ForcedState balance, out RunningState? state)
    {
        state = null;
        double frequency = double.NaN;
        double current = double.NaN;
        ForcedState? coarser = null;
        for (int level = 0; ; level++)
        {
            if (!Settle(branch, balance))
            {
                return coarser;
            }

            if (state is null || (level == FollowedLevel && !refinement.CoarseIsFollowed))
            {
                state = balance.Keep();
            }

            bool agrees = Math.Abs(balance.Radians - frequency) < FrequencyAgreement * frequency
                && Math.Abs(balance.PeakAmps - current) < CurrentAgreement * current;
            (frequency, current) = (balance.Radians, balance.PeakAmps);
            ForcedState? finer = agrees ? null : refinement.Finer(balance);
            if (finer is null)
            {
                return balance;
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

    // Repeats the running state at the frequency it gives until the frequency stands: loosely first, for the frequency moves it
    // yet. The state changes with ω only as fast as the network does, so what is left is C/Cm times smaller than the last step.
    private static bool Settle(in CrystalBranch branch, ForcedState balance, bool roughly = false)
    {
        for (int step = 0; step < MostSettlings; step++)
        {
            double tolerance = step == 0 ? EstimateTolerance : roughly ? RoughTolerance : ForcedState.FineTolerance;
            if (!balance.SolveRunning(branch.ResistanceOhms, tolerance))
            {
                return false;
            }

            double radians = FrequencyOf(branch, balance);
            if (step > 0 && Math.Abs(radians - balance.Radians) < (roughly ? RoughStep : FineStep) * radians)
            {
                balance.CorrectFrequency(radians);
                return true;
            }

            balance.SetFrequency(radians);
        }

        return true;
    }

    private static double FrequencyOf(in CrystalBranch branch, ForcedState state) =>
        branch.SeriesRadians * (1 + branch.OffsetForReactance(state.Impedance.Imaginary));

    private static RunningFigures FiguresOf(Crystal crystal, ForcedState balance)
    {
        double hertz = balance.Radians / (2 * Math.PI);
        double rms = balance.PeakAmps / Math.Sqrt(2);
        return new RunningFigures(hertz, crystal.LoadAtFrequencyFarads(hertz), rms, crystal.ResistanceOhms * rms * rms);
    }

    private static SteadyState Describe(Crystal crystal, ForcedState balance)
    {
        RunningFigures figures = FiguresOf(crystal, balance);
        (double low, double high) = balance.OutputRangeVolts();
        return new SteadyState
        {
            FrequencyHz = figures.FrequencyHz,
            LoadFarads = figures.LoadFarads,
            CurrentRmsAmps = figures.CurrentRmsAmps,
            DriveWatts = figures.DriveWatts,
            OutputSwingVolts = high - low,
            OutputLowVolts = low,
            OutputHighVolts = high,
            LimitedBySupply = balance.LimitedBySupply,
        };
    }
}
