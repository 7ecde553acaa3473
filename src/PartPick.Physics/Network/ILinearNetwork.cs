using System.Numerics;

namespace PartPick.Physics.Network;

/// <summary>A circuit made linear at its bias point.</summary>
internal interface ILinearNetwork
{
    /// <summary>Transfer impedances at a complex frequency s in 1/s.</summary>
    Transfer At(Complex s);
}
