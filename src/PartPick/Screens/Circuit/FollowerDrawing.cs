using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The circuit round an emitter follower.</summary>
internal static class FollowerDrawing
{
    private const int CrystalColumn = 1;
    private const int BiasColumn = 13;
    private const int CapacitorColumn = 20;
    private const int EmitterColumn = 31;
    private const int BaseRow = 5;
    private const int EmitterRow = 10;
    private const int GroundRow = 15;

    public static ImmutableArray<Line> Draw(Candidate candidate, Glyphs glyphs)
    {
        var parts = new CircuitParts(candidate);
        var canvas = new TextCanvas(Schematic.Width, GroundRow + 1, glyphs);
        var symbols = new Symbols(canvas, glyphs);
        Supply(candidate, parts, canvas, symbols, glyphs);
        Base(parts, canvas, symbols, glyphs);
        Emitter(candidate, parts, canvas, symbols, glyphs);
        return canvas.Lines();
    }

    private static void Supply(Candidate candidate, CircuitParts parts, TextCanvas canvas, Symbols symbols, Glyphs glyphs)
    {
        string supply = "+" + ValueText.Format(candidate.Nominal.SupplyVolts, Dimension.Voltage);
        canvas.PutBefore(BiasColumn - 2, 0, supply);
        canvas.Across(BiasColumn - 1, EmitterColumn, 0);
        canvas.Put(EmitterColumn, 0, glyphs.DownLeft);
        canvas.DownFrom(EmitterColumn, 1, 3);
        if (parts.BaseTop is { } top)
        {
            canvas.Put(BiasColumn, 0, glyphs.TeeDown);
            symbols.Resistor(BiasColumn, 1);
            canvas.DownFrom(BiasColumn, 4, 4);
            symbols.LabelBefore(BiasColumn - 2, 1, top);
        }
    }

    private static void Base(CircuitParts parts, TextCanvas canvas, Symbols symbols, Glyphs glyphs)
    {
        symbols.Box(EmitterColumn - 4, BaseRow - 1, EmitterColumn + 4, BaseRow + 1);
        canvas.Put(EmitterColumn, BaseRow - 1, glyphs.TeeUp);
        canvas.Put(EmitterColumn, BaseRow + 1, glyphs.TeeDown);
        canvas.PutCentred(EmitterColumn - 3, EmitterColumn + 3, BaseRow, parts.Amplifier.Designator + " NPN");

        canvas.Across(CrystalColumn, EmitterColumn - 5, BaseRow);
        canvas.Put(EmitterColumn - 4, BaseRow, glyphs.TeeLeft);
        canvas.Put(CrystalColumn, BaseRow, glyphs.DownRight);
        canvas.Put(CapacitorColumn, BaseRow, glyphs.TeeDown);
        canvas.DownFrom(CrystalColumn, BaseRow + 1, GroundRow - 1);
        symbols.Crystal(CrystalColumn, BaseRow + 2);
        canvas.Put(CrystalColumn + 2, BaseRow + 6, parts.Crystal.Designator);
        string[] frequency = parts.Crystal.Value.Split(' ');
        for (int i = 0; i < frequency.Length; i++)
        {
            canvas.Put(CrystalColumn + 2, BaseRow + 7 + i, frequency[i]);
        }

        symbols.Ground(CrystalColumn, GroundRow);

        if (parts.BaseBottom is not { } bottom)
        {
            canvas.Put(BiasColumn, BaseRow, glyphs.TeeUp);
            return;
        }

        canvas.Put(BiasColumn, BaseRow, parts.BaseTop is null ? glyphs.TeeDown : glyphs.Cross);
        canvas.DownFrom(BiasColumn, BaseRow + 1, GroundRow - 1);
        symbols.Resistor(BiasColumn, BaseRow + 2);
        symbols.LabelBefore(BiasColumn - 2, BaseRow + 2, bottom);
        symbols.Ground(BiasColumn, GroundRow);
    }

    private static void Emitter(Candidate candidate, CircuitParts parts, TextCanvas canvas, Symbols symbols, Glyphs glyphs)
    {
        canvas.DownFrom(CapacitorColumn, BaseRow + 1, GroundRow - 1);
        symbols.Capacitor(CapacitorColumn, BaseRow + 2);
        symbols.Label(CapacitorColumn + 3, BaseRow + 2, parts.C1);
        symbols.Capacitor(CapacitorColumn, EmitterRow + 2);
        symbols.Label(CapacitorColumn + 3, EmitterRow + 2, parts.C2);
        symbols.Ground(CapacitorColumn, GroundRow);

        canvas.DownFrom(EmitterColumn, BaseRow + 2, GroundRow - 1);
        canvas.Across(CapacitorColumn, EmitterColumn, EmitterRow);
        canvas.Put(CapacitorColumn, EmitterRow, glyphs.TeeRight);
        canvas.Put(EmitterColumn, EmitterRow, glyphs.Cross);
        canvas.Across(EmitterColumn + 1, EmitterColumn + 4, EmitterRow);
        canvas.Put(EmitterColumn + 6, EmitterRow, "out");
        if (parts.Coupling is { } coupling)
        {
            canvas.Put(EmitterColumn + 2, EmitterRow, glyphs.TeeLeft);
            canvas.Put(EmitterColumn + 3, EmitterRow, glyphs.TeeRight);
            canvas.Put(EmitterColumn + 2, EmitterRow - 2, coupling.Designator);
            canvas.Put(EmitterColumn + 2, EmitterRow - 1, symbols.Short(coupling.Value));
        }

        if (parts.Emitter is { } emitter)
        {
            symbols.Resistor(EmitterColumn, EmitterRow + 2);
            symbols.Label(EmitterColumn + 3, EmitterRow + 2, emitter);
        }

        symbols.Ground(EmitterColumn, GroundRow);
    }
}
