using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Tests.Independent;

namespace PartPick.Physics.Tests;

/// <summary>Compares the steady state of the analysis with the one that an integration in time settles at.</summary>
internal static class TimeDomainAgreement
{
    private const double Pico = 1e-12;

    public static void Check(OscillatorCircuit circuit, double currentRatio, double loadFarads)
    {
        Oscillation? time = TimeDomain.Settle(circuit);
        Assert.NotNull(time);
        Check(circuit, time, currentRatio, loadFarads);
    }

    public static void Check(OscillatorCircuit circuit, Oscillation time, double currentRatio, double loadFarads)
    {
        SteadyState? found = OscillatorAnalysis.FindSteadyState(circuit);
        Assert.True(found is not null, $"No steady state found; in time {time}\n{circuit}");

        string both = "in time " + Figures(time.PeakAmps, time.LoadFarads, time.OutputSwingVolts)
            + "; found " + Figures(found.CurrentRmsAmps * Math.Sqrt(2), found.LoadFarads, found.OutputSwingVolts)
            + $"\n{circuit}";
        Assert.True(Math.Abs(found.CurrentRmsAmps * Math.Sqrt(2) / time.PeakAmps - 1) <= currentRatio, "Current: " + both);
        Assert.True(Math.Abs(found.LoadFarads - time.LoadFarads) <= loadFarads, "Load: " + both);
        if (circuit is not GateCircuit { Inverter: BufferedInverter })
        {
            // The trapezoidal rule rings after the edges of a buffered gate: its extremes mean nothing there.
            Assert.True(Math.Abs(found.OutputSwingVolts / time.OutputSwingVolts - 1) <= 0.02, "Swing: " + both);
        }

        Assert.Equal(circuit.Crystal.LoadAtFrequencyFarads(found.FrequencyHz), found.LoadFarads, 1e-4 * Pico);
        double drive = circuit.Crystal.ResistanceOhms * found.CurrentRmsAmps * found.CurrentRmsAmps;
        Assert.Equal(drive, found.DriveWatts, 1e-9 * found.DriveWatts);
        if (circuit is FollowerCircuit { EmitterCurrentAmps: null })
        {
            Assert.True(
                Math.Abs(time.HighestWatchedVolts - 0.4) < 0.02 || time.HighestWatchedVolts > 0.4 == found.LimitedBySupply,
                FormattableString.Invariant($"vBC reaches {time.HighestWatchedVolts} V, limited: {found.LimitedBySupply}"));
        }
    }

    private static string Figures(double peakAmps, double loadFarads, double swingVolts) =>
        FormattableString.Invariant($"{peakAmps * 1e3:F5} mA peak, {loadFarads / Pico:F4} pF, swing {swingVolts:F4} V");
}
