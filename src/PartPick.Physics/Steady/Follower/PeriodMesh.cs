using System.Collections.Concurrent;
using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The steps of a period, each a power of two's share of it: short where currents change fast. A step of level n is
/// 2π/2ⁿ long and begins at a multiple of its length.
/// </summary>
internal sealed class PeriodMesh
{
    public const int FinestLevel = 13;
    private static readonly ConcurrentDictionary<int, Complex[]> Turns = new();

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

    /// <summary>All steps of one level.</summary>
    public static PeriodMesh Uniform(int level)
    {
        int[] levels = new int[1 << level];
        Array.Fill(levels, level);
        return new PeriodMesh(levels);
    }

    /// <summary>e^(jθ) at the stages of all steps of one level.</summary>
    public static Complex[] TurnsOf(int level) => Turns.GetOrAdd(level, MakeTurns);

    /// <summary>Index in <see cref="TurnsOf"/> of a step's first stage.</summary>
    public int TurnIndex(int step) => Radau.Stages * (Starts[step] >> (FinestLevel - Levels[step]));

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
