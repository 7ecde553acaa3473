using PartPick.Physics.Circuits;

namespace PartPick.Physics.Tests.Independent;

/// <summary>The transconductances between which the natural mode grows, by a scan of its growth rate and bisection.</summary>
/// <param name="Critical">Smallest transconductance of zero growth in siemens; null where the scan sees no growth.</param>
/// <param name="Upper">Where growth falls back to zero; null where it does not within the scan.</param>
internal sealed record GainWindow(double? Critical, double? Upper)
{
    public const double LowestSiemens = 1e-8;
    public const double HighestSiemens = 1e3;
    private const int PerDecade = 20;

    public static GainWindow Of(OscillatorCircuit circuit)
    {
        double? critical = null;
        double below = LowestSiemens;
        int steps = (int)Math.Round(Math.Log10(HighestSiemens / LowestSiemens)) * PerDecade;
        for (int k = 1; k <= steps; k++)
        {
            double gm = LowestSiemens * Math.Pow(10, (double)k / PerDecade);
            bool grows = NaturalModes.GrowthRate(circuit, gm) > 0;
            if (critical is null && grows)
            {
                critical = Bisect(circuit, below, gm);
            }
            else if (critical is not null && !grows)
            {
                return new GainWindow(critical, Bisect(circuit, gm, below));
            }

            below = gm;
        }

        return new GainWindow(critical, null);
    }

    /// <summary>True where the growth rate changes its sign within a relative distance of a transconductance.</summary>
    public static bool SignChangesAt(OscillatorCircuit circuit, double gm, double relative) =>
        NaturalModes.GrowthRate(circuit, gm * (1 - relative)) > 0 != NaturalModes.GrowthRate(circuit, gm * (1 + relative)) > 0;

    private static double Bisect(OscillatorCircuit circuit, double decays, double grows)
    {
        for (int k = 0; k < 40; k++)
        {
            double middle = Math.Sqrt(decays * grows);
            if (NaturalModes.GrowthRate(circuit, middle) > 0)
            {
                grows = middle;
            }
            else
            {
                decays = middle;
            }
        }

        return Math.Sqrt(decays * grows);
    }
}
