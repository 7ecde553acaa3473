namespace PartPick.Selection;

/// <summary>A place on the board that a part stands in, in the order of the parts list.</summary>
public enum PartPlace
{
    /// <summary>Load capacitor C1.</summary>
    C1,

    /// <summary>Load capacitor C2.</summary>
    C2,

    /// <summary>Decoupling capacitor at the supply.</summary>
    Decoupling,

    /// <summary>Output coupling capacitor of a follower.</summary>
    Coupling,

    /// <summary>Damping resistor Rs.</summary>
    Series,

    /// <summary>Feedback resistor Rf.</summary>
    Feedback,

    /// <summary>Bias resistor of a follower from the supply to the base.</summary>
    BaseTop,

    /// <summary>Bias resistor of a follower from the base to ground.</summary>
    BaseBottom,

    /// <summary>Emitter resistor of a follower.</summary>
    Emitter,

    /// <summary>Inverter, counter, port or transistor.</summary>
    Amplifier,

    /// <summary>The crystal.</summary>
    Crystal,
}
