using System.Collections.Immutable;
using Terminal.Gui.Input;
using Terminal.Gui.ViewBase;
using Terminal.Gui.Views;

namespace PartPick.Screens;

/// <summary>Shows a <see cref="MainModel"/> row by row, and hands it the keys.</summary>
internal sealed class MainScreen : Runnable
{
    private readonly List<RowView> _rows = [];
    private readonly MainModel _model;
    private readonly Palette _palette;

    public MainScreen(MainModel model, Palette palette)
    {
        _model = model;
        _palette = palette;
        Width = Dim.Fill();
        Height = Dim.Fill();
        CanFocus = true;
        BorderStyle = Terminal.Gui.Drawing.LineStyle.None;
        FrameChanged += (_, _) => Refresh();
        model.Redraw += Refresh;
    }

    /// <summary>Raised when the program is to stop and leave the terminal to the shell.</summary>
    public event Action? StopAsked;

    /// <summary>Raised when the whole screen is to be sent again.</summary>
    public event Action? RepaintAsked;

    /// <summary>Brings every row that looks different up to date.</summary>
    public void Refresh()
    {
        int height = Frame.Height;
        if (height <= 0 || Frame.Width <= 0)
        {
            return;
        }

        while (_rows.Count < height)
        {
            var row = new RowView(_rows.Count, _palette);
            _rows.Add(row);
            Add(row);
        }

        ImmutableArray<Line> lines = _model.Draw(Frame.Width, height);
        for (int i = 0; i < height; i++)
        {
            _rows[i].Show(i < lines.Length ? lines[i] : Line.Empty);
        }
    }

    protected override bool OnKeyDown(Key key)
    {
        if (key == Key.C.WithCtrl && _model.Interrupt())
        {
            Refresh();
            return true;
        }

        if (key == Key.Q.WithCtrl || key == Key.C.WithCtrl)
        {
            App?.RequestStop();
            return true;
        }

        if (key == Key.Z.WithCtrl)
        {
            StopAsked?.Invoke();
            return true;
        }

        if (key == Key.L.WithCtrl)
        {
            RepaintAsked?.Invoke();
            return true;
        }

        ImmutableArray<KeyPress> presses = Keys.Of(key);
        if (presses.IsEmpty)
        {
            return base.OnKeyDown(key);
        }

        foreach (KeyPress press in presses)
        {
            _model.Press(press);
        }

        if (_model.IsDone)
        {
            App?.RequestStop();
            return true;
        }

        Refresh();
        return true;
    }

    protected override void Dispose(bool disposing)
    {
        _model.Redraw -= Refresh;
        base.Dispose(disposing);
    }
}
