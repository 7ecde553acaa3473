using PartPick.Physics.Circuits;

namespace PartPick.Physics.Tests.Independent;

/// <summary>Lets the whole nonlinear circuit of a gate, crystal included, grow in time.</summary>
internal static class GrowthInTime
{
    private const int StepsPerCycle = 128;
    private const int MostCycles = 20_000;

    /// <summary>Time in seconds between two shares of an amplitude, from well below the first.</summary>
    public static double SecondsBetween(GateCircuit gate, double peakAmps, double first, double second)
    {
        var integrator = new Integrator(new GateInTime(gate), gate.Crystal, 1 / (gate.Crystal.SeriesHz * StepsPerCycle))
        {
            Current = 0.2 * first * peakAmps,
        };
        double? began = null;
        double before = 0;
        for (int cycle = 0; cycle < MostCycles; cycle++)
        {
            double crest = 0;
            for (int step = 0; step < StepsPerCycle; step++)
            {
                integrator.Advance();
                crest = Math.Max(crest, Math.Abs(integrator.Current));
            }

            double at = cycle + (Passes(first) ? Part(first) : Part(second));
            began ??= Passes(first) ? at : null;
            if (Passes(second) && began is { } from)
            {
                return (at - from) / gate.Crystal.SeriesHz;
            }

            before = crest;

            bool Passes(double share) => cycle > 0 && before < share * peakAmps && crest >= share * peakAmps;

            double Part(double share) => (share * peakAmps - before) / (crest - before);
        }

        throw new InvalidOperationException("It did not grow so far.");
    }
}
