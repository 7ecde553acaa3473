namespace PartPick.Physics.Tests.Independent;

/// <summary>A stretch of whole cycles between upward zero crossings of the motional current, and what it shows.</summary>
internal sealed record Window(
    double PeakAmps,
    double LastPeakAmps,
    double FrequencyHz,
    double GrowthPerSecond,
    double SwingVolts,
    double HighestWatchedVolts)
{
    public static Window Run(Integrator integrator, CircuitInTime network, int cycles)
    {
        double step = integrator.Step, time = 0;
        double[] crossings = new double[cycles + 1];
        double[] squares = new double[cycles];
        int seen = -1;
        double square = 0, lowest = double.MaxValue, highest = double.MinValue, watched = double.MinValue;
        double limit = step * 1e4 * (cycles + 4);
        while (seen < cycles)
        {
            double before = integrator.Current;
            integrator.Advance();
            double after = integrator.Current;
            time += step;
            if (time > limit)
            {
                throw new InvalidOperationException("The motional current does not cross zero any more.");
            }

            if (before < 0 && after >= 0)
            {
                double part = after / (after - before);
                if (seen >= 0)
                {
                    squares[seen] = square + before * before * (1 - part) * step / 3;
                }

                seen++;
                crossings[seen] = time - part * step;
                square = after * after * part * step / 3;
            }
            else
            {
                square += (before * before + after * after) / 2 * step;
            }

            double output = integrator.Voltages[network.OutputNode];
            lowest = Math.Min(lowest, output);
            highest = Math.Max(highest, output);
            watched = Math.Max(watched, network.Watched(integrator.Voltages));
        }

        double frequency = cycles / (crossings[cycles] - crossings[0]);
        double[] logs = [.. squares.Select((s, k) => 0.5 * Math.Log(2 * s / (crossings[k + 1] - crossings[k])))];
        (double slope, double mean) = Line(logs);
        return new Window(
            Math.Exp(mean),
            Math.Exp(mean + slope * (cycles - 1) / 2.0),
            frequency,
            slope * frequency,
            highest - lowest,
            watched);
    }

    /// <summary>Slope per cycle and mean of a line through equally spaced values, by least squares.</summary>
    private static (double Slope, double Mean) Line(double[] values)
    {
        double middle = (values.Length - 1) / 2.0, mean = values.Average(), up = 0, down = 0;
        for (int k = 0; k < values.Length; k++)
        {
            up += (k - middle) * (values[k] - mean);
            down += (k - middle) * (k - middle);
        }

        return (up / down, mean);
    }
}
