using System.Collections.Immutable;
using PartPick.Physics.Circuits;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The circuit round an inverter: gate, counter or port.</summary>
internal static class GateDrawing
{
    private const int Input = 3;
    private const int Output = 22;

    public static ImmutableArray<Line> Draw(Candidate candidate, Glyphs glyphs)
    {
        var parts = new CircuitParts(candidate);
        int crystalRow = parts.Series is null ? 6 : 9;
        int height = crystalRow + 6;
        var canvas = new TextCanvas(Schematic.Width, height, glyphs);
        var symbols = new Symbols(canvas, glyphs);

        canvas.DownFrom(Input, 1, height - 2);
        canvas.DownFrom(Output, 1, height - 2);
        Amplifier(candidate, parts, canvas, symbols, glyphs);
        Feedback(candidate, parts, canvas, symbols, glyphs);
        if (parts.Series is { } series)
        {
            symbols.Resistor(Output, 4);
            symbols.Label(Output + 3, 4, series);
        }

        canvas.Across(Input, Output, crystalRow);
        canvas.Put(Input, crystalRow, glyphs.TeeRight);
        canvas.Put(Output, crystalRow, glyphs.TeeLeft);
        canvas.Put(11, crystalRow, glyphs.TeeLeft);
        canvas.Put(12, crystalRow, "[]");
        canvas.Put(14, crystalRow, glyphs.TeeRight);
        canvas.PutCentred(Input + 1, Output - 1, crystalRow - 1, parts.Crystal.Designator);
        canvas.PutCentred(Input + 1, Output - 1, crystalRow + 1, parts.Crystal.Value);

        symbols.Capacitor(Input, crystalRow + 2);
        symbols.Label(Input + 3, crystalRow + 2, parts.C1);
        symbols.Capacitor(Output, crystalRow + 2);
        symbols.Label(Output + 3, crystalRow + 2, parts.C2);
        symbols.Ground(Input, height - 1);
        symbols.Ground(Output, height - 1);
        return canvas.Lines();
    }

    private static void Amplifier(Candidate candidate, CircuitParts parts, TextCanvas canvas, Symbols symbols, Glyphs glyphs)
    {
        canvas.Across(Input, Output, 1);
        canvas.Put(Input, 1, glyphs.DownRight);
        symbols.Box(7, 0, 17, 2);
        canvas.Put(7, 1, glyphs.TeeLeft);
        canvas.Put(8, 1, new string(' ', 9));
        canvas.PutCentred(8, 16, 1, parts.Amplifier.Designator + (candidate.Choice.Circuit == CircuitKind.Port ? " pins" : "  1"));
        canvas.Put(17, 1, "o");
        if (candidate.Choice.Circuit == CircuitKind.Port)
        {
            canvas.Put(Output, 1, glyphs.DownLeft);
            return;
        }

        canvas.Put(Output, 1, glyphs.TeeDown);
        canvas.Across(Output + 1, Output + 2, 1);
        string output = candidate.OutputHz is { } hertz ? ValueText.Format(hertz, Dimension.Frequency, 6) : "output";
        if (candidate.Choice.Tap == 0)
        {
            canvas.Put(Output + 4, 1, output);
            return;
        }

        symbols.Box(Output + 3, 0, Output + 12, 2);
        canvas.Put(Output + 3, 1, glyphs.TeeLeft);
        canvas.PutCentred(Output + 4, Output + 11, 1, FormattableString.Invariant($"÷{1L << candidate.Choice.Tap}"));
        canvas.Put(Output + 12, 1, glyphs.TeeRight);
        canvas.Across(Output + 13, Output + 14, 1);
        canvas.PutBefore(Schematic.Width, 3, output);
    }

    private static void Feedback(Candidate candidate, CircuitParts parts, TextCanvas canvas, Symbols symbols, Glyphs glyphs)
    {
        string? label = parts.Feedback is { } use ? use.Designator + " " + symbols.Short(use.Value)
            : candidate.Nominal is GateCircuit { FeedbackOhms: var ohms } && double.IsFinite(ohms)
                ? symbols.Short(ValueText.Format(ohms, Dimension.Resistance)) + " inside"
            : null;
        if (label is null)
        {
            return;
        }

        canvas.Across(Input, Output, 3);
        canvas.Put(Input, 3, glyphs.TeeRight);
        canvas.Put(Output, 3, glyphs.TeeLeft);
        canvas.PutCentred(Input + 1, Output - 1, 3, "[" + label + "]");
    }
}
