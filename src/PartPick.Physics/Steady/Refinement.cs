namespace PartPick.Physics.Steady;

/// <summary>A harmonic balance at one of several finenesses, each with twice the harmonics of the one before.</summary>
internal abstract class Refinement
{
    /// <summary>The balance with the fewest harmonics, for the search over amplitude.</summary>
    public abstract AmplitudeBalance Coarse();

    /// <summary>The same state with twice the harmonics; null at the finest.</summary>
    public abstract AmplitudeBalance? Finer(AmplitudeBalance balance);

    /// <summary>A balance of the fineness of a kept state, in that state; null where the state is of another kind of circuit.</summary>
    public abstract AmplitudeBalance? From(RunningState state);

    /// <summary>Whether the last solution shows a current that the balance leaves out.</summary>
    public virtual bool IsIncomplete(AmplitudeBalance balance) => false;

    /// <summary>The same state at the same fineness with nothing left out.</summary>
    public virtual AmplitudeBalance Complete(AmplitudeBalance balance) => balance;
}
