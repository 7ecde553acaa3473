using System.Numerics;
using PartPick.Physics.Network;

namespace PartPick.Physics.SmallSignal;

/// <summary>Start-up figures of a linear network (model of small signals at the bias point).</summary>
internal static class StartUpSolver
{
    // The step after the last one would be smaller by C/Cm again: the figures are good to 1e-9.
    private const double FiguresAccuracy = 1e-7;

    /// <summary>All start-up figures.</summary>
    public static StartUp Solve<TNetwork>(Crystal crystal, in TNetwork network, double siemens)
        where TNetwork : struct, ILinearNetwork
    {
        var branch = new CrystalBranch(crystal);
        NaturalMode mode = NaturalMode.Find(branch, network, siemens);
        double negative = NegativeResistance(network, mode.Radians, siemens);
        GrowthWindow window = GrowthWindow.Find(branch, network);
        return new StartUp
        {
            NaturalHz = mode.Radians / (2 * Math.PI),
            GrowthRatePerSecond = mode.GrowthRate,
            NegativeResistanceOhms = negative,
            Margin = negative / crystal.ResistanceOhms,
            TransconductanceSiemens = siemens,
            CriticalSiemens = window.CriticalSiemens,
            UpperSiemens = window.UpperSiemens,
        };
    }

    /// <summary>Start-up margin and growth rate alone.</summary>
    public static StartFigures Figures<TNetwork>(Crystal crystal, in TNetwork network, double siemens)
        where TNetwork : struct, ILinearNetwork
    {
        NaturalMode mode = NaturalMode.Find(new CrystalBranch(crystal), network, siemens, FiguresAccuracy);
        double negative = NegativeResistance(network, mode.Radians, siemens);
        return new StartFigures(negative / crystal.ResistanceOhms, mode.GrowthRate);
    }

    /// <summary>−Re Zc(jω; gm) in ohms.</summary>
    public static double NegativeResistance<TNetwork>(in TNetwork network, double radians, double siemens)
        where TNetwork : struct, ILinearNetwork =>
        -network.At(new Complex(0, radians)).Impedance(siemens).Real;
}
