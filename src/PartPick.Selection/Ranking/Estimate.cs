using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>The estimated steady state of a combination of values.</summary>
/// <param name="FrequencyHz">Frequency at the crystal in hertz.</param>
/// <param name="LoadFarads">Load capacitance seen by the crystal.</param>
/// <param name="DriveWatts">Drive level in watts.</param>
/// <param name="HarmonicShare">Third harmonic of a buffered inverter's input over its first.</param>
/// <param name="State">The running state, from which the full solution starts.</param>
internal sealed record Estimate(double FrequencyHz, double LoadFarads, double DriveWatts, double HarmonicShare, RunningState State);
