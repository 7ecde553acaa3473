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

    public override AmplitudeBalance Coarse() => new OneStageBalance(network, law, FewestPoints);

    public override AmplitudeBalance? Finer(AmplitudeBalance balance) =>
        balance.State.Length < MostPoints ? ((OneStageBalance)balance).Refined() : null;

    public override AmplitudeBalance? From(RunningState state) =>
        state.Kind == typeof(OneStageBalance) ? state.PutInto(new OneStageBalance(network, law, state.Points)) : null;
}

/// <summary>Finenesses of the buffered gate: 4 to 32 odd harmonics of the input.</summary>
internal sealed class BufferedRefinement(GateNetwork network, BufferedInverter inverter, double supplyVolts) : Refinement
{
    private const int FewestHarmonics = 4;
    private const int MostHarmonics = 32;

    public override AmplitudeBalance Coarse() =>
        new BufferedBalance(network, inverter.Gain, inverter.Ron, supplyVolts, FewestHarmonics);

    public override AmplitudeBalance? Finer(AmplitudeBalance balance) =>
        balance.State.Length < 2 * MostHarmonics ? ((BufferedBalance)balance).Refined() : null;

    public override AmplitudeBalance? From(RunningState state) => state.Kind == typeof(BufferedBalance)
        ? state.PutInto(new BufferedBalance(network, inverter.Gain, inverter.Ron, supplyVolts, state.Points))
        : null;
}

/// <summary>Finenesses of the follower: 32 to 512 points per period, with the collector junction where it conducts.</summary>
internal sealed class FollowerRefinement(FollowerCircuit circuit, FollowerBias bias) : Refinement
{
    private const int FewestPoints = 32;
    private const int MostPoints = 512;

    public override AmplitudeBalance Coarse() => new FollowerBalance(circuit, bias, reverse: false, FewestPoints);

    public override AmplitudeBalance? Finer(AmplitudeBalance balance)
    {
        var follower = (FollowerBalance)balance;
        return follower.Points < MostPoints ? follower.Refined(follower.Reverse, 2 * follower.Points) : null;
    }

    public override AmplitudeBalance? From(RunningState state) =>
        state.Kind == typeof(FollowerBalance) && state.HoldsCurrent == circuit.EmitterCurrentAmps is not null
            ? state.PutInto(new FollowerBalance(circuit, bias, state.Reverse, state.Points))
            : null;

    public override bool IsIncomplete(AmplitudeBalance balance) => ((FollowerBalance)balance).NeedsReverse;

    public override AmplitudeBalance Complete(AmplitudeBalance balance)
    {
        var follower = (FollowerBalance)balance;
        return follower.Refined(reverse: true, follower.Points);
    }
}
