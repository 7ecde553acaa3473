namespace PartPick.Physics.Circuits;

/// <summary>Stray capacitances of the board, in farads.</summary>
/// <param name="InputFarads">At the amplifier's input, to ground.</param>
/// <param name="OutputFarads">At the crystal's far side (gate) or the emitter (follower), to ground.</param>
/// <param name="AcrossFarads">Across the crystal.</param>
public sealed record Strays(double InputFarads, double OutputFarads, double AcrossFarads)
{
    /// <summary>No strays.</summary>
    public static Strays None { get; } = new(0, 0, 0);
}
