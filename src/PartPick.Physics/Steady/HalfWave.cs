using System.Collections.Concurrent;
using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// Waveforms with half-wave symmetry (odd harmonics only), sampled at M points θ = πj/M of half a period. M even.
/// </summary>
internal sealed class HalfWave
{
    private static readonly ConcurrentDictionary<int, HalfWave> Known = new();
    private readonly int _points;
    private readonly Complex[] _roots;

    private HalfWave(int points)
    {
        _points = points;
        _roots = new Complex[2 * points];
        for (int j = 0; j < _roots.Length; j++)
        {
            _roots[j] = Complex.FromPolarCoordinates(1, Math.PI * j / points);
        }
    }

    /// <summary>Number of odd harmonics 1, 3, … M − 1.</summary>
    public int Harmonics => _points / 2;

    /// <summary>The shared tables for a number of points.</summary>
    public static HalfWave Of(int points) => Known.GetOrAdd(points, p => new HalfWave(p));

    /// <summary>e^(jθ) at a point.</summary>
    public Complex Point(int j) => _roots[j];

    /// <summary>
    /// The response at one point to a unit value at another: kernel[k − j + M − 1] is the share of sample k in the voltage
    /// at point j, for transfer impedances at the odd harmonics.
    /// </summary>
    public void Kernel(ReadOnlySpan<Complex> impedances, Span<double> kernel)
    {
        double scale = 2.0 / _points;
        for (int lag = 0; lag < _points; lag++)
        {
            double sum = 0;
            int index = lag;
            int step = 2 * lag;
            for (int h = 0; h < impedances.Length; h++)
            {
                Complex root = _roots[index];
                sum += impedances[h].Real * root.Real - impedances[h].Imaginary * root.Imaginary;
                index += step;
                if (index >= 2 * _points)
                {
                    index -= 2 * _points;
                }
            }

            // Antiperiodic: the response at lag − M is minus that at lag.
            kernel[_points - 1 - lag] = sum * scale;
            if (lag > 0)
            {
                kernel[2 * _points - 1 - lag] = -sum * scale;
            }
        }
    }

    /// <summary>Fills a finer half period with the same harmonics.</summary>
    public void Interpolate(ReadOnlySpan<double> samples, Span<double> finer)
    {
        finer.Clear();
        HalfWave fine = Of(finer.Length);
        for (int h = 0; h < Harmonics; h++)
        {
            int n = 2 * h + 1;
            Complex phasor = Phasor(samples, n);
            for (int j = 0; j < finer.Length; j++)
            {
                finer[j] += (phasor * fine._roots[n * j % (2 * fine._points)]).Real;
            }
        }
    }

    /// <summary>Complex amplitude of the odd harmonic n.</summary>
    public Complex Phasor(ReadOnlySpan<double> samples, int n)
    {
        Complex sum = Complex.Zero;
        for (int k = 0; k < samples.Length; k++)
        {
            sum += samples[k] * Complex.Conjugate(_roots[n * k % (2 * _points)]);
        }

        return sum * (2.0 / _points);
    }

    /// <summary>Largest magnitude of the waveform, by a parabola through the largest sample and its neighbours.</summary>
    public static double LargestMagnitude(ReadOnlySpan<double> samples)
    {
        int peak = 0;
        for (int j = 1; j < samples.Length; j++)
        {
            if (Math.Abs(samples[j]) > Math.Abs(samples[peak]))
            {
                peak = j;
            }
        }

        double sign = Math.Sign(samples[peak]);
        double middle = Math.Abs(samples[peak]);
        double before = sign * (peak > 0 ? samples[peak - 1] : -samples[^1]);
        double after = sign * (peak < samples.Length - 1 ? samples[peak + 1] : -samples[0]);
        double curvature = before - 2 * middle + after;
        double slope = (after - before) / 2;
        return curvature < 0 ? middle - slope * slope / (2 * curvature) : middle;
    }
}
