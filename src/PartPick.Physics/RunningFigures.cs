namespace PartPick.Physics;

/// <summary>The figures of a steady state that corners and sensitivities ask for.</summary>
/// <param name="FrequencyHz">Frequency at the crystal in hertz.</param>
/// <param name="LoadFarads">Load capacitance in farads at which this crystal would run at that frequency.</param>
/// <param name="CurrentRmsAmps">Motional current in amperes rms.</param>
/// <param name="DriveWatts">Drive level in watts.</param>
public sealed record RunningFigures(double FrequencyHz, double LoadFarads, double CurrentRmsAmps, double DriveWatts);
