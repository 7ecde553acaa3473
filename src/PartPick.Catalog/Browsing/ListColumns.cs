using System.Collections.Immutable;

namespace PartPick.Catalog.Browsing;

/// <summary>The columns in which the parts of each kind are listed.</summary>
public static class ListColumns
{
    private static readonly ImmutableArray<ListColumn> Texts =
    [
        Text("id"), Text("description"), Text("supplierPart", "supplier's number"), Text("supplier"), Text("package"), Text("note"),
    ];

    private static readonly ImmutableArray<ListColumn> Trade =
    [
        new("stock", "stock", "", 1, true), new("price", "price at 1", "", 1, true),
    ];

    private static readonly Dictionary<PartKind, ImmutableArray<ListColumn>> Known =
        PartKinds.All.ToDictionary(kind => kind, kind => ImmutableArray.CreateRange(FiguresOf(kind)));

    private static readonly Dictionary<PartKind, ImmutableArray<ListColumn>> Whole =
        PartKinds.All.ToDictionary(kind => kind, kind => (ImmutableArray<ListColumn>)
            [Texts[0], .. Known[kind], .. Trade, Texts[4], Texts[3], Texts[2], Texts[1], Texts[5]]);

    /// <summary>The figures by which one chooses among parts of a kind.</summary>
    /// <param name="kind">The kind.</param>
    public static ImmutableArray<ListColumn> ChoosingFigures(PartKind kind) => Known[kind];

    /// <summary>All columns of a kind: the id, what one chooses by, stock and price, and the texts.</summary>
    /// <param name="kind">The kind.</param>
    public static ImmutableArray<ListColumn> Of(PartKind kind) => Whole[kind];

    private static ListColumn Text(string key, string? name = null) => new(key, name ?? key, "", 1, false);

    private static ListColumn[] FiguresOf(PartKind kind) => kind switch
    {
        PartKind.Crystal =>
        [
            new("frequency", "frequency", "MHz", 1e6, true), new("load", "load", "pF", 1e-12, true),
            new("resistance", "resistance", "ohm", 1, true), new("tolerance", "tolerance", "ppm", 1e-6, true),
            new("stability", "stability", "ppm", 1e-6, true),
        ],
        PartKind.Capacitor =>
        [
            new("value", "value", "pF", 1e-12, true), new("tolerance", "tolerance", "%", 0.01, true),
            new("toleranceAbsolute", "tolerance", "pF", 1e-12, true), new("dielectric", "dielectric", "", 1, false),
            new("voltage", "voltage", "V", 1, true),
        ],
        PartKind.Resistor => [new("value", "value", "ohm", 1, true), new("tolerance", "tolerance", "%", 0.01, true)],
        PartKind.Transistor =>
        [
            new("beta", "beta", "", 1, true), new("transitionFrequency", "fT", "MHz", 1e6, true),
            new("currentMax", "current", "mA", 1e-3, true), new("voltageMax", "voltage", "V", 1, true),
        ],
        _ =>
        [
            new("stages", "stages", "", 1, true), new("cin", "cin", "pF", 1e-12, true), new("supply 1", "from", "V", 1, true),
            new("gm 1", "gm there", "mS", 1e-3, true),
        ],
    };
}
