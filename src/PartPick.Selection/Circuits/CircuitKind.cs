namespace PartPick.Selection;

/// <summary>The four circuits of the model.</summary>
public enum CircuitKind
{
    /// <summary>A logic inverter with its crystal (Pierce).</summary>
    Gate,

    /// <summary>A ripple counter with a built-in oscillator inverter.</summary>
    Counter,

    /// <summary>A microcontroller's oscillator pins.</summary>
    Port,

    /// <summary>An NPN emitter follower (Colpitts).</summary>
    Follower,
}
