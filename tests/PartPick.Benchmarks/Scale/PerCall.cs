using System.Diagnostics;

namespace PartPick.Benchmarks;

/// <summary>Time and allocation of one call on one core.</summary>
/// <param name="Microseconds">Microseconds, of the quickest of several batches.</param>
/// <param name="Bytes">Bytes allocated.</param>
internal sealed record PerCall(double Microseconds, double Bytes)
{
    private const int Batches = 20;
    private const double BatchSeconds = 0.02;

    /// <summary>Measures a call.</summary>
    /// <param name="call">The call.</param>
    public static PerCall Of(Action call)
    {
        // Long enough to be compiled for good.
        int calls = 0;
        for (long start = Stopwatch.GetTimestamp(); calls < 200 || Stopwatch.GetElapsedTime(start).TotalSeconds < 0.5; calls++)
        {
            call();
        }

        Thread.Sleep(200);
        double seconds = Batch(call, 20) / 20;
        int count = Math.Max(1, (int)(BatchSeconds / seconds));
        double least = double.PositiveInfinity;
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < Batches; i++)
        {
            least = Math.Min(least, Batch(call, count) / count);
        }

        double bytes = (double)(GC.GetAllocatedBytesForCurrentThread() - before) / count / Batches;
        return new PerCall(least * 1e6, bytes);
    }

    private static double Batch(Action call, int count)
    {
        long start = Stopwatch.GetTimestamp();
        for (int i = 0; i < count; i++)
        {
            call();
        }

        return Stopwatch.GetElapsedTime(start).TotalSeconds;
    }
}
