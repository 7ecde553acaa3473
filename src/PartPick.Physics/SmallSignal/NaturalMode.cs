using System.Numerics;
using PartPick.Physics.Network;

namespace PartPick.Physics.SmallSignal;

/// <summary>The natural mode of motional branch and network near the crystal's resonance.</summary>
/// <param name="Radians">Im s in rad/s.</param>
/// <param name="GrowthRate">Re s in 1/s.</param>
internal readonly record struct NaturalMode(double Radians, double GrowthRate)
{
    private const int MostSteps = 60;

    /// <summary>
    /// Solves Rm + sLm + 1/(sCm) + Zc(s; gm) = 0 for s by repeating s → Zc(s) → s. The motional branch is stiffer than the
    /// network by C/Cm, so each step gains three to four digits.
    /// </summary>
    /// <param name="branch">The motional branch.</param>
    /// <param name="network">The rest of the circuit.</param>
    /// <param name="siemens">Transconductance in siemens.</param>
    /// <param name="accuracy">Largest last step, relative to the offset from resonance.</param>
    public static NaturalMode Find<TNetwork>(in CrystalBranch branch, in TNetwork network, double siemens, double accuracy = 1e-15)
        where TNetwork : struct, ILinearNetwork
    {
        Complex offset = Complex.Zero;
        for (int step = 0; step < MostSteps; step++)
        {
            Complex s = new Complex(0, branch.SeriesRadians) * (1 + offset);
            Complex next = branch.OffsetFor(network.At(s).Impedance(siemens));
            double change = Complex.Abs(next - offset);
            offset = next;
            if (change < 1e-17 + accuracy * Complex.Abs(offset))
            {
                break;
            }
        }

        return new NaturalMode(branch.SeriesRadians * (1 + offset.Real), -branch.SeriesRadians * offset.Imaginary);
    }
}
