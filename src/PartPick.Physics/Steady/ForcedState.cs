using System.Numerics;

namespace PartPick.Physics.Steady;

/// <summary>
/// The periodic state of a circuit whose motional branch is replaced by a sine current of given amplitude, with all harmonics.
/// The state is kept between calls as the next starting point.
/// </summary>
internal abstract class ForcedState
{
    /// <summary>Largest relative residual that a solution leaves, unless it is asked for less.</summary>
    public const double FineTolerance = 1e-11;

    /// <summary>Peak motional current in amperes at which the state was last solved.</summary>
    public double PeakAmps { get; protected set; }

    /// <summary>Zc(I) = V₁/I in ohms of the last solved state.</summary>
    public Complex Impedance { get; protected set; }

    /// <summary>d Re Zc / d ln I in ohms at the last state solved for a given amplitude (for a follower, at any).</summary>
    public double ResistanceSlope { get; protected set; }

    /// <summary>Angular frequency in rad/s.</summary>
    public double Radians { get; protected set; }

    /// <summary>Largest amplitude in amperes at which the circuit still acts as linear, about.</summary>
    public abstract double LinearPeakAmps { get; }

    /// <summary>Amplitude in amperes beyond which no steady state need be looked for.</summary>
    public virtual double LargestPeakAmps => double.PositiveInfinity;

    /// <summary>Third harmonic over the first of what drives a saturating device; zero where it does not matter.</summary>
    public virtual double HarmonicShare => 0;

    /// <summary>True where the supply limits the last solved state (collector junction conducting).</summary>
    public virtual bool LimitedBySupply => false;

    /// <summary>
    /// True where −Re Zc falls for good once it falls along the amplitude: the running amplitude may then be sought at once.
    /// </summary>
    public virtual bool FallsForGood => false;

    /// <summary>
    /// False where a running state was found at which a larger amplitude gives more negative resistance, so that another one, or
    /// none, may be what the circuit comes to.
    /// </summary>
    public virtual bool Stays => true;

    /// <summary>Sets the frequency of the crystal's current; the state stays as the next starting point.</summary>
    public abstract void SetFrequency(double radians);

    /// <summary>Notes the frequency that the state gives, too near the one it was solved at to solve it again.</summary>
    public void CorrectFrequency(double radians) => Radians = radians;

    /// <summary>The state as a starting point for a circuit like this one.</summary>
    public abstract RunningState Keep();

    /// <summary>Gives back what can serve another state; of this one only impedance, amplitude and frequency stay.</summary>
    public virtual void Release()
    {
    }

    /// <summary>Puts the state of small signals at an amplitude as the starting point.</summary>
    public abstract void StartLinear(double peakAmps);

    /// <summary>
    /// Puts a fully limited state as the starting point of a search from large amplitudes down, and returns its amplitude in
    /// amperes; null where the search goes up from small signals.
    /// </summary>
    public virtual double? StartSaturated(double resistanceOhms) => null;

    /// <summary>Remembers the present state, in place of the one remembered before.</summary>
    public abstract void Remember();

    /// <summary>Goes back to the remembered state.</summary>
    public abstract void Recall();

    /// <summary>Solves the periodic state at a given peak current, from the last state.</summary>
    public abstract bool SolveAt(double peakAmps);

    /// <summary>Solves state and amplitude together for Re Zc(I) = −Rm, from the last state.</summary>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    /// <param name="tolerance">Largest relative residual that is left.</param>
    public abstract bool SolveRunning(double resistanceOhms, double tolerance = FineTolerance);

    /// <summary>
    /// Takes one Newton step towards the running state of a circuit that differs little from the one the state was solved for, and
    /// finds the impedance there; right to the first order of the difference.
    /// </summary>
    /// <param name="resistanceOhms">Rm in ohms.</param>
    public abstract bool StepTowardsRunning(double resistanceOhms);

    /// <summary>Whether this state has fewer harmonics than a kept one, for circuits alike to be compared.</summary>
    public virtual bool IsCoarserThan(RunningState near) => false;

    /// <summary>
    /// Lowest and highest output voltage of the last solved state, in volts: an inverter's against half the supply, an emitter's
    /// against ground.
    /// </summary>
    public abstract (double Low, double High) OutputRangeVolts();
}
