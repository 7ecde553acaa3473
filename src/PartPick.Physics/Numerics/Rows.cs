using System.Numerics;
using System.Runtime.InteropServices;

namespace PartPick.Physics.Numerics;

/// <summary>Sums over rows of numbers, in vectors.</summary>
internal static class Rows
{
    /// <summary>Inner product of two rows.</summary>
    public static double Dot(ReadOnlySpan<double> left, ReadOnlySpan<double> right)
    {
        ReadOnlySpan<Vector<double>> lefts = MemoryMarshal.Cast<double, Vector<double>>(left);
        ReadOnlySpan<Vector<double>> rights = MemoryMarshal.Cast<double, Vector<double>>(right);
        var sums = Vector<double>.Zero;
        for (int i = 0; i < lefts.Length; i++)
        {
            sums += lefts[i] * rights[i];
        }

        double sum = Vector.Sum(sums);
        for (int i = lefts.Length * Vector<double>.Count; i < left.Length; i++)
        {
            sum += left[i] * right[i];
        }

        return sum;
    }

    /// <summary>target = a·left + b·right.</summary>
    public static void Combine(Span<double> target, ReadOnlySpan<double> left, double a, ReadOnlySpan<double> right, double b)
    {
        Span<Vector<double>> targets = MemoryMarshal.Cast<double, Vector<double>>(target);
        ReadOnlySpan<Vector<double>> lefts = MemoryMarshal.Cast<double, Vector<double>>(left);
        ReadOnlySpan<Vector<double>> rights = MemoryMarshal.Cast<double, Vector<double>>(right);
        for (int i = 0; i < targets.Length; i++)
        {
            targets[i] = lefts[i] * a + rights[i] * b;
        }

        for (int i = targets.Length * Vector<double>.Count; i < target.Length; i++)
        {
            target[i] = left[i] * a + right[i] * b;
        }
    }
}
