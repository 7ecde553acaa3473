namespace PartPick.Physics;

/// <summary>How finely a steady state near a known one is resolved.</summary>
public enum Fineness
{
    /// <summary>As finely as the known state: good for differences between circuits alike.</summary>
    Same,

    /// <summary>With twice the harmonics of the known state.</summary>
    OneFiner,

    /// <summary>With twice the harmonics of the known state, at its frequency: the frequency that comes of it is good, the rest is not.
    /// Where it is not found from there, it is not sought from nothing.</summary>
    OneFinerRoughly,

    /// <summary>Until twice the harmonics change nothing that matters, like a state sought from nothing.</summary>
    Converged,
}
