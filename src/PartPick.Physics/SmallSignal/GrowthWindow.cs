using System.Numerics;
using PartPick.Physics.Network;

namespace PartPick.Physics.SmallSignal;

/// <summary>The transconductances in siemens between which the oscillation grows; null where there is no such edge.</summary>
/// <param name="CriticalSiemens">The smaller one.</param>
/// <param name="UpperSiemens">The larger one.</param>
internal readonly record struct GrowthWindow(double? CriticalSiemens, double? UpperSiemens)
{
    private const int MostSteps = 60;

    /// <summary>
    /// Solves Re Zc(jω; gm) = −Rm with ω on the branch's reactance. At a given ω the Möbius form makes it a quadratic in gm;
    /// ω then follows from Im Zc, and the pair is repeated until it stands.
    /// </summary>
    public static GrowthWindow Find<TNetwork>(in CrystalBranch branch, in TNetwork network)
        where TNetwork : struct, ILinearNetwork =>
        new(Edge(branch, network, upper: false), Edge(branch, network, upper: true));

    private static double? Edge<TNetwork>(in CrystalBranch branch, in TNetwork network, bool upper)
        where TNetwork : struct, ILinearNetwork
    {
        double offset = 0;
        double? siemens = null;
        for (int step = 0; step < MostSteps; step++)
        {
            Transfer transfer = network.At(new Complex(0, branch.SeriesRadians * (1 + offset)));
            siemens = Root(transfer, branch.ResistanceOhms, upper);
            double reactance = transfer.Impedance(siemens ?? 0).Imaginary;
            double next = branch.OffsetForReactance(reactance);
            bool settled = Math.Abs(next - offset) < 1e-14;
            offset = next;
            if (settled)
            {
                break;
            }
        }

        return siemens;
    }

    /// <summary>Im Zc(jω) in ohms at the critical transconductance of a given frequency; null where nothing starts there.</summary>
    public static double? CriticalReactance<TNetwork>(in TNetwork network, double radians, double resistanceOhms)
        where TNetwork : struct, ILinearNetwork
    {
        Transfer transfer = network.At(new Complex(0, radians));
        return Root(transfer, resistanceOhms, upper: false) is { } siemens ? transfer.Impedance(siemens).Imaginary : null;
    }

    /// <summary>The critical transconductance in siemens at a given frequency; null where nothing starts there.</summary>
    public static double? Critical(in Transfer transfer, double resistanceOhms) => Root(transfer, resistanceOhms, upper: false);

    // Zc = (p + q g)/(1 + h g); Re Zc + R = 0 times |1 + h g|² is c0 + c1 g + c2 g² = 0.
    private static double? Root(in Transfer transfer, double resistanceOhms, bool upper)
    {
        Complex h = -transfer.Loop;
        Complex p = transfer.Own;
        Complex q = p * h + transfer.Coupling * transfer.Control;
        double c0 = p.Real + resistanceOhms;
        double c1 = q.Real + (p * Complex.Conjugate(h)).Real + 2 * resistanceOhms * h.Real;
        double c2 = (q * Complex.Conjugate(h)).Real + resistanceOhms * (h.Real * h.Real + h.Imaginary * h.Imaginary);
        double discriminant = c1 * c1 - 4 * c0 * c2;
        if (discriminant < 0)
        {
            return null;
        }

        double lead = -(c1 + Math.CopySign(Math.Sqrt(discriminant), c1)) / 2;
        double first = lead / c2;
        double second = c0 / lead;
        (double low, double high) = first < second ? (first, second) : (second, first);
        if (low > 0 && double.IsFinite(low))
        {
            return upper ? (double.IsFinite(high) ? high : null) : low;
        }

        return !upper && high > 0 && double.IsFinite(high) ? high : null;
    }
}
