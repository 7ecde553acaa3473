using PartPick.Physics.Circuits;

namespace PartPick.Physics;

/// <summary>The one door to the figures of a circuit: every screen, command and ranking calls it.</summary>
public static class OscillatorAnalysis
{
    /// <summary>Analyses a circuit at its supply and temperature: start-up, running margin and steady state.</summary>
    /// <param name="circuit">The circuit; its values must be finite and positive where the model needs them.</param>
    public static OscillatorResult Analyse(OscillatorCircuit circuit) => throw new NotImplementedException();

    /// <summary>The small-signal figures alone: far cheaper than <see cref="Analyse"/>.</summary>
    /// <param name="circuit">The circuit.</param>
    public static StartUp AnalyseStartUp(OscillatorCircuit circuit) => throw new NotImplementedException();

    /// <summary>The steady state alone; null where there is none.</summary>
    /// <param name="circuit">The circuit.</param>
    public static SteadyState? FindSteadyState(OscillatorCircuit circuit) => throw new NotImplementedException();
}
