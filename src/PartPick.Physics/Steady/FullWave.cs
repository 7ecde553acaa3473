using System.Collections.Concurrent;
using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>Periodic waveforms sampled at N points θ = 2πj/N, with harmonics 0 … N/2 − 1. N even.</summary>
internal sealed class FullWave
{
    private static readonly ConcurrentDictionary<int, FullWave> Known = new();
    private readonly int _points;
    private readonly Complex[] _roots;

    private FullWave(int points)
    {
        _points = points;
        _roots = new Complex[points];
        for (int j = 0; j < points; j++)
        {
            _roots[j] = Complex.FromPolarCoordinates(1, 2 * Math.PI * j / points);
        }
    }

    /// <summary>Number of harmonics, the mean included.</summary>
    public int Harmonics => _points / 2;

    /// <summary>The shared tables for a number of points.</summary>
    public static FullWave Of(int points) => Known.GetOrAdd(points, p => new FullWave(p));

    /// <summary>e^(jθ) at a point.</summary>
    public Complex Point(int j) => _roots[j];

    /// <summary>kernel[k − j + N − 1]: the share of sample k in the voltage at point j, for transfer impedances by harmonic.</summary>
    public void Kernel(ReadOnlySpan<Complex> impedances, Span<double> kernel)
    {
        for (int lag = 0; lag < _points; lag++)
        {
            double sum = impedances[0].Real / 2;
            int index = lag;
            for (int h = 1; h < impedances.Length; h++)
            {
                Complex root = _roots[index];
                sum += impedances[h].Real * root.Real - impedances[h].Imaginary * root.Imaginary;
                index += lag;
                if (index >= _points)
                {
                    index -= _points;
                }
            }

            kernel[_points - 1 - lag] = sum * 2 / _points;
            if (lag > 0)
            {
                kernel[2 * _points - 1 - lag] = sum * 2 / _points;
            }
        }
    }

    /// <summary>Complex amplitude of harmonic n (twice the mean for n = 0).</summary>
    public Complex Phasor(ReadOnlySpan<double> samples, int n)
    {
        Complex sum = Complex.Zero;
        for (int k = 0; k < samples.Length; k++)
        {
            sum += samples[k] * Complex.Conjugate(_roots[n * k % _points]);
        }

        return sum * (2.0 / _points);
    }

    /// <summary>Fills a finer period with the same harmonics.</summary>
    public void Interpolate(ReadOnlySpan<double> samples, Span<double> finer)
    {
        finer.Fill(Phasor(samples, 0).Real / 2);
        FullWave fine = Of(finer.Length);
        for (int h = 1; h < Harmonics; h++)
        {
            Complex phasor = Phasor(samples, h);
            for (int j = 0; j < finer.Length; j++)
            {
                finer[j] += (phasor * fine._roots[h * j % fine._points]).Real;
            }
        }
    }
}
