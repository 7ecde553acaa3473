using System.Collections.Immutable;
using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>Tables of e^(−jπ k/N), k = 0 … N − 1, for sums over half a period.</summary>
internal static class UnitRoots
{
    private const int Quantum = 16;
    private const int MostQuanta = 28;
    private static readonly ImmutableArray<Complex[]> Tables =
        [.. Enumerable.Range(1, MostQuanta).Select(quanta => Table(quanta * Quantum))];

    /// <summary>The shortest table of at least so many points, or the longest there is. Not to be written to.</summary>
    public static Complex[] Of(double points) => Tables[(int)Math.Clamp(Math.Ceiling(points / Quantum), 1, MostQuanta) - 1];

    /// <summary>The k-th power of a table's second entry, for any k.</summary>
    public static Complex Power(Complex[] table, long k)
    {
        long turns = Math.DivRem(k, table.Length, out long place);
        if (place < 0)
        {
            (turns, place) = (turns - 1, place + table.Length);
        }

        return (turns & 1) == 0 ? table[place] : -table[place];
    }

    /// <summary>Powers of a table's second entry from the k-th on, by real and imaginary part.</summary>
    public static void Copy(Complex[] table, int k, Span<double> real, Span<double> imaginary)
    {
        int place = k % (2 * table.Length);
        place = place < 0 ? place + 2 * table.Length : place;
        for (int j = 0; j < real.Length; j++)
        {
            Complex root = place < table.Length ? table[place] : -table[place - table.Length];
            (real[j], imaginary[j]) = (root.Real, root.Imaginary);
            place = place + 1 == 2 * table.Length ? 0 : place + 1;
        }
    }

    private static Complex[] Table(int points) =>
        [.. Enumerable.Range(0, points).Select(k => Complex.FromPolarCoordinates(1, -Math.PI * k / points))];
}
