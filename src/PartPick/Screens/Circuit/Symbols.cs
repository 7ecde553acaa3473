using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Symbols of parts on a drawing; all stand on a vertical wire.</summary>
/// <param name="canvas">The drawing.</param>
/// <param name="glyphs">The signs.</param>
internal sealed class Symbols(TextCanvas canvas, Glyphs glyphs)
{
    /// <summary>A capacitor, two rows.</summary>
    public void Capacitor(int x, int y)
    {
        Plate(x, y, glyphs.TeeUp);
        Plate(x, y + 1, glyphs.TeeDown);
    }

    /// <summary>A crystal, three rows.</summary>
    public void Crystal(int x, int y)
    {
        Plate(x, y, glyphs.TeeUp);
        canvas.Put(x - 1, y + 1, "[ ]");
        Plate(x, y + 2, glyphs.TeeDown);
    }

    /// <summary>A resistor, three rows.</summary>
    public void Resistor(int x, int y)
    {
        Box(x - 1, y, x + 1, y + 2);
        canvas.Put(x, y + 1, " ");
        canvas.Put(x, y, glyphs.TeeUp);
        canvas.Put(x, y + 2, glyphs.TeeDown);
    }

    /// <summary>Ground, one row.</summary>
    public void Ground(int x, int y) => canvas.Put(x - 1, y, glyphs.Ground);

    /// <summary>A box.</summary>
    public void Box(int left, int top, int right, int bottom)
    {
        canvas.Across(left, right, top);
        canvas.Across(left, right, bottom);
        canvas.DownFrom(left, top, bottom);
        canvas.DownFrom(right, top, bottom);
        canvas.Put(left, top, glyphs.DownRight);
        canvas.Put(right, top, glyphs.DownLeft);
        canvas.Put(left, bottom, glyphs.UpRight);
        canvas.Put(right, bottom, glyphs.UpLeft);
    }

    /// <summary>Designator and value to the right of a symbol, on two rows.</summary>
    public void Label(int x, int y, PartUse use)
    {
        canvas.Put(x, y, use.Designator);
        canvas.Put(x, y + 1, Short(use.Value));
    }

    /// <summary>Designator and value to the left of a symbol, on two rows.</summary>
    public void LabelBefore(int end, int y, PartUse use)
    {
        canvas.PutBefore(end, y, use.Designator);
        canvas.PutBefore(end, y + 1, Short(use.Value));
    }

    /// <summary>A value as it is drawn: in ASCII the ohm is left out, or R where nothing else would stand there.</summary>
    public string Short(string value) => !glyphs.IsAscii ? value : value.EndsWith(" Ω", StringComparison.Ordinal)
        ? value.Replace("Ω", "R", StringComparison.Ordinal)
        : value.Replace("Ω", "", StringComparison.Ordinal);

    private void Plate(int x, int y, char middle)
    {
        canvas.Across(x - 1, x + 1, y);
        canvas.Put(x, y, middle);
    }
}
