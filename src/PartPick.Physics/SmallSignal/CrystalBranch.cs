using System.Numerics;

namespace PartPick.Physics.SmallSignal;

/// <summary>The motional branch near series resonance, written so that its two large reactances never cancel by subtraction.</summary>
internal readonly struct CrystalBranch
{
    private readonly double _admittance;

    public CrystalBranch(Crystal crystal)
    {
        SeriesRadians = 2 * Math.PI * crystal.SeriesHz;
        ResistanceOhms = crystal.ResistanceOhms;
        _admittance = SeriesRadians * crystal.MotionalFarads;
    }

    /// <summary>2π fs in rad/s.</summary>
    public double SeriesRadians { get; }

    /// <summary>Rm in ohms.</summary>
    public double ResistanceOhms { get; }

    /// <summary>
    /// Relative offset d of the complex frequency s = jωs(1 + d) at which Rm + sLm + 1/(sCm) + Zc = 0, for a given Zc:
    /// with x = jωsCm(Rm + Zc), (1 + d) − 1/(1 + d) = x.
    /// </summary>
    public Complex OffsetFor(Complex impedance)
    {
        Complex half = new Complex(0, _admittance) * (ResistanceOhms + impedance) / 2;
        return half + half * half / (1 + Complex.Sqrt(1 + half * half));
    }

    /// <summary>The real counterpart: relative offset of ω from ωs at which the branch's reactance is −Im Zc.</summary>
    public double OffsetForReactance(double reactanceOhms)
    {
        double half = -_admittance * reactanceOhms / 2;
        return half + half * half / (1 + Math.Sqrt(1 + half * half));
    }
}
