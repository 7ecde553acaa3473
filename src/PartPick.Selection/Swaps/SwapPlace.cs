namespace PartPick.Selection;

/// <summary>A place of a circuit whose part can be changed step by step, in the order of the screen.</summary>
public enum SwapPlace
{
    /// <summary>Load capacitor C1.</summary>
    C1,

    /// <summary>Load capacitor C2.</summary>
    C2,

    /// <summary>Damping resistor Rs of a gate, counter or port; a direct connection is one of its values.</summary>
    Series,

    /// <summary>Feedback resistor Rf of a gate, counter or port.</summary>
    Feedback,

    /// <summary>Bias resistor of a follower from the supply to the base.</summary>
    BaseTop,

    /// <summary>Bias resistor of a follower from the base to ground; none is one of its values.</summary>
    BaseBottom,

    /// <summary>Emitter resistor of a follower.</summary>
    Emitter,

    /// <summary>The crystal, at the divider stage that is taken.</summary>
    Crystal,

    /// <summary>Inverter, counter, port or transistor.</summary>
    Amplifier,

    /// <summary>The divider stage of a counter; the crystal goes with it.</summary>
    Stage,
}
