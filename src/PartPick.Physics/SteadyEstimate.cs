namespace PartPick.Physics;

/// <summary>A quick estimate of a steady state, for leaving out what is far from wanted; never a figure to show.</summary>
/// <param name="FrequencyHz">Frequency at the crystal in hertz.</param>
/// <param name="DriveWatts">Drive level in watts.</param>
/// <param name="HarmonicShare">
/// Third harmonic of a buffered inverter's input over its first; the estimate is the better the smaller it is. Zero elsewhere.
/// </param>
public readonly record struct SteadyEstimate(double FrequencyHz, double DriveWatts, double HarmonicShare);
