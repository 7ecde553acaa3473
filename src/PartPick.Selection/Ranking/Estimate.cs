using PartPick.Physics;

namespace PartPick.Selection.Search;

/// <summary>The estimated steady state of a combination of values.</summary>
/// <param name="LoadFarads">Load capacitance seen by the crystal.</param>
/// <param name="DriveWatts">Drive level in watts.</param>
/// <param name="State">The running state, from which the full solution starts.</param>
internal sealed record Estimate(double LoadFarads, double DriveWatts, RunningState State);
