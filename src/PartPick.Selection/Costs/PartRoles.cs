namespace PartPick.Selection;

/// <summary>What a part does in its place, in the words of every list of parts.</summary>
public static class PartRoles
{
    /// <summary>C1 or C2.</summary>
    public const string Load = "load capacitor";

    /// <summary>Decoupling capacitor at the supply.</summary>
    public const string Decoupling = "decoupling";

    /// <summary>Output coupling capacitor of a follower.</summary>
    public const string Coupling = "output coupling";

    /// <summary>Damping resistor.</summary>
    public const string Damping = "damping Rs";

    /// <summary>Feedback resistor.</summary>
    public const string Feedback = "feedback Rf";

    /// <summary>The only base resistor of a follower.</summary>
    public const string Base = "base bias RB";

    /// <summary>The upper one of two base resistors.</summary>
    public const string BaseTop = "base bias, to supply";

    /// <summary>The lower one of two base resistors.</summary>
    public const string BaseBottom = "base bias, to ground";

    /// <summary>Emitter resistor of a follower.</summary>
    public const string Emitter = "emitter RE";

    /// <summary>Inverter, counter, port or transistor.</summary>
    public const string Amplifier = "amplifier";

    /// <summary>The crystal.</summary>
    public const string Crystal = "crystal";
}
