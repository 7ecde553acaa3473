using PartPick.Physics.Bias;
using PartPick.Physics.Circuits;
using PartPick.Physics.Devices;
using PartPick.Physics.Network;

namespace PartPick.Physics.Steady;

/// <summary>Finenesses of the one-stage gate: 16 to 512 points per half period.</summary>
internal sealed class OneStageRefinement(GateNetwork network, SquareLaw law) : Refinement
{
    private const int FewestPoints = 16;
    private const int MostPoints = 512;

    public override ForcedState Coarse() => new OneStageBalance(network, law, FewestPoints);

    public override ForcedState? Finer(ForcedState balance) =>
        balance is OneStageBalance { State.Length: < MostPoints } coarse ? coarse.Refined() : null;

    public override ForcedState? From(RunningState state) =>
        state.Kind == typeof(OneStageBalance) ? state.PutInto(new OneStageBalance(network, law, state.Points)) : null;
}

/// <summary>Finenesses of the buffered gate: 4 to 32 odd harmonics of the input.</summary>
internal sealed class BufferedRefinement(GateNetwork network, BufferedInverter inverter, double supplyVolts) : Refinement
{
    private const int FewestHarmonics = 4;
    private const int MostHarmonics = 32;

    public override ForcedState Coarse() =>
        new BufferedBalance(network, inverter.Gain, inverter.Ron, supplyVolts, FewestHarmonics);

    public override ForcedState? Finer(ForcedState balance) =>
        balance is BufferedBalance { State.Length: < 2 * MostHarmonics } coarse ? coarse.Refined() : null;

    public override ForcedState? From(RunningState state) => state.Kind == typeof(BufferedBalance)
        ? state.PutInto(new BufferedBalance(network, inverter.Gain, inverter.Ron, supplyVolts, state.Points))
        : null;
}

/// <summary>Finenesses of the follower: steps that follow the currents, halved from one fineness to the next.</summary>
internal sealed class FollowerRefinement(FollowerCircuit circuit, FollowerBias bias) : Refinement
{
    private const int MostSteps = 1000;

    public override bool CoarseIsFollowed => true;

    public override ForcedState Coarse() => new FollowerPeriod(circuit, bias);

    public override ForcedState? Finer(ForcedState state) =>
        state is FollowerPeriod { Steps: < MostSteps } coarse ? coarse.Refined() : null;

    public override ForcedState? From(RunningState state)
    {
        if (state.Mesh is not { } mesh || state.HoldsCurrent != circuit.EmitterCurrentAmps is not null)
        {
            return null;
        }

        var period = new FollowerPeriod(circuit, bias);
        period.TakeState(state, mesh);
        return period;
    }
}
