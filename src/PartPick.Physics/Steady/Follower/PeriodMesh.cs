using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The steps of a period, each a power of two's share of it: short where currents change fast. A step of level n is
/// 2π/2ⁿ long and begins at a multiple of its length.
/// </summary>
internal sealed class PeriodMesh
{
    /// <summary>Level of the longest steps.</summary>
    public const int CoarsestLevel = 4;

    /// <summary>Level of the shortest steps.</summary>
    public const int FinestLevel = 13;

    private static readonly Complex[]?[] KnownTurns = new Complex[]?[FinestLevel + 1];

    private PeriodMesh(int[] levels)
    {
        Levels = levels;
        Starts = new int[levels.Length];
        int start = 0;
        for (int k = 0; k < levels.Length; k++)
        {
            Starts[k] = start;
            start += 1 << (FinestLevel - levels[k]);
        }
    }

    /// <summary>Number of steps.</summary>
    public int Count => Levels.Length;

    /// <summary>Level of each step.</summary>
    public int[] Levels { get; }

    /// <summary>Beginning of each step, in steps of the finest level.</summary>
    public int[] Starts { get; }

    /// <summary>The longest steps throughout.</summary>
    public static PeriodMesh Coarsest { get; } = new([.. Enumerable.Repeat(CoarsestLevel, 1 << CoarsestLevel)]);

    /// <summary>Length of a step in radians.</summary>
    public double Length(int step) => 2 * Math.PI / (1 << Levels[step]);

    /// <summary>Length of a step in steps of the finest level.</summary>
    public double Span(int step) => 1 << (FinestLevel - Levels[step]);

    /// <summary>Where a stage stands, in steps of the finest level.</summary>
    public double Place(int step, int stage) => Starts[step] + Radau.Nodes[stage] * Span(step);

    /// <summary>e^(jθ) at the stages of a step.</summary>
    public ReadOnlySpan<Complex> Turns(int step) =>
        TurnsOf(Levels[step]).AsSpan(Radau.Stages * (Starts[step] >> (FinestLevel - Levels[step])), Radau.Stages);

    /// <summary>Every step halved.</summary>
    public PeriodMesh Halved()
    {
        int[] cuts = new int[Count];
        Array.Fill(cuts, 1);
        return Changed(cuts);
    }

    /// <summary>Each step cut as many times as asked; a negative number on both halves of a longer step joins them.</summary>
    public PeriodMesh Changed(ReadOnlySpan<int> cuts)
    {
        var levels = new List<int>(2 * Count);
        for (int k = 0; k < Count; k++)
        {
            int level = Levels[k];
            int length = 1 << (FinestLevel - level);
            bool joins = k + 1 < Count && cuts[k] < 0 && cuts[k + 1] < 0 && Levels[k + 1] == level && Starts[k] % (2 * length) == 0;
            if (joins)
            {
                levels.Add(level - 1);
                k++;
                continue;
            }

            int target = Math.Min(FinestLevel, level + Math.Max(0, cuts[k]));
            for (int part = 0; part < 1 << (target - level); part++)
            {
                levels.Add(target);
            }
        }

        return new PeriodMesh([.. levels]);
    }

    private static Complex[] TurnsOf(int level) => KnownTurns[level] ??= MakeTurns(level);

    private static Complex[] MakeTurns(int level)
    {
        int count = 1 << level;
        var turns = new Complex[Radau.Stages * count];
        for (int k = 0; k < turns.Length; k++)
        {
            double share = (k / Radau.Stages + Radau.Nodes[k % Radau.Stages]) / count;
            turns[k] = Complex.FromPolarCoordinates(1, 2 * Math.PI * share);
        }

        return turns;
    }
}
