namespace PartPick.Physics.Steady;

/// <summary>A harmonic balance at one of several finenesses, each with twice the harmonics of the one before.</summary>
internal abstract class Refinement
{
    /// <summary>The balance with the fewest harmonics, for the search over amplitude.</summary>
    public abstract ForcedState Coarse();

    /// <summary>The same state with twice the harmonics; null at the finest.</summary>
    public abstract ForcedState? Finer(ForcedState balance);

    /// <summary>A balance of the fineness of a kept state, in that state; null where the state is of another kind of circuit.</summary>
    public abstract ForcedState? From(RunningState state);

    /// <summary>Whether the coarsest state is fine enough for figures of circuits alike to be compared.</summary>
    public virtual bool CoarseIsFollowed => false;
}
