using Terminal.Gui.ViewBase;

namespace PartPick.Screens;

/// <summary>One row of the screen; it is drawn again only when it looks different.</summary>
internal sealed class RowView : View
{
    private readonly Palette _palette;
    private Line _line = Line.Empty;

    public RowView(int row, Palette palette)
    {
        _palette = palette;
        X = 0;
        Y = row;
        Width = Dim.Fill();
        Height = 1;
        CanFocus = false;
    }

    public void Show(Line line)
    {
        if (!line.Equals(_line))
        {
            _line = line;
            SetNeedsDraw();
        }
    }

    protected override bool OnClearingViewport() => true;

    protected override bool OnDrawingContent(DrawContext? context)
    {
        Move(0, 0);
        foreach (Span span in _line.Spans)
        {
            SetAttribute(_palette.Of(span.Tone));
            AddStr(span.Text);
        }

        return true;
    }
}
