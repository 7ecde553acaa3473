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
        var even = Vector<double>.Zero;
        var odd = Vector<double>.Zero;
        int i = 0;
        for (; i + 1 < lefts.Length; i += 2)
        {
            even = Vector.FusedMultiplyAdd(lefts[i], rights[i], even);
            odd = Vector.FusedMultiplyAdd(lefts[i + 1], rights[i + 1], odd);
        }

        if (i < lefts.Length)
        {
            even = Vector.FusedMultiplyAdd(lefts[i], rights[i], even);
        }

        double sum = Vector.Sum(even + odd);
        for (int k = lefts.Length * Vector<double>.Count; k < left.Length; k++)
        {
            sum += left[k] * right[k];
        }

        return sum;
    }

    /// <summary>Inner products of two rows with a third.</summary>
    public static void Dots(
        ReadOnlySpan<double> first, ReadOnlySpan<double> second, ReadOnlySpan<double> with, out double firstSum, out double secondSum)
    {
        ReadOnlySpan<Vector<double>> firsts = MemoryMarshal.Cast<double, Vector<double>>(first);
        ReadOnlySpan<Vector<double>> seconds = MemoryMarshal.Cast<double, Vector<double>>(second)[..firsts.Length];
        ReadOnlySpan<Vector<double>> withs = MemoryMarshal.Cast<double, Vector<double>>(with)[..firsts.Length];
        var sum1 = Vector<double>.Zero;
        var sum2 = Vector<double>.Zero;
        for (int i = 0; i < firsts.Length; i++)
        {
            sum1 = Vector.FusedMultiplyAdd(firsts[i], withs[i], sum1);
            sum2 = Vector.FusedMultiplyAdd(seconds[i], withs[i], sum2);
        }

        firstSum = Vector.Sum(sum1);
        secondSum = Vector.Sum(sum2);
        for (int k = firsts.Length * Vector<double>.Count; k < first.Length; k++)
        {
            firstSum += first[k] * with[k];
            secondSum += second[k] * with[k];
        }
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
