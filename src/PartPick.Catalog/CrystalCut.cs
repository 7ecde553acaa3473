namespace PartPick.Catalog;

/// <summary>How a crystal is cut, which sets how its frequency moves with temperature.</summary>
public enum CrystalCut
{
    /// <summary>The AT cut: a cubic.</summary>
    AT,

    /// <summary>The BT cut: a parabola.</summary>
    BT,

    /// <summary>A tuning fork: a parabola.</summary>
    Fork,
}
