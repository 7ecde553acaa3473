using PartPick.Screens;
using PartPick.Selection;
using Terminal.Gui.App;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;
using Terminal.Gui.Testing;
using Terminal.Gui.Time;

namespace PartPick.Tests.Screens;

/// <summary>The real screen without a terminal: keys in, text out.</summary>
internal sealed class Bench : IDisposable
{
    private readonly IApplication _app;
    private readonly LiveRanking _live;
    private readonly MainScreen _screen;

    public Bench(
        int width = 80, int height = 24, FakeRanking? ranking = null, Requirement? requirement = null, Glyphs? glyphs = null,
        IShortlistDesk? desk = null)
    {
        Ranking = ranking ?? new FakeRanking();
        _app = Application.Create(new VirtualTimeProvider()).Init(DriverRegistry.Names.ANSI);
        _app.Driver!.SetScreenSize(width, height);
        _live = new LiveRanking(Ranking, action => action(), TimeProvider.System);
        Model = new MainModel(requirement ?? SampleRanking.Wanted, _live, glyphs ?? Glyphs.Drawn, waits: false, desk: desk);
        _screen = new MainScreen(Model, Palette.Plain);
        _app.Begin(_screen);
        _app.LayoutAndDraw();
    }

    public FakeRanking Ranking { get; }

    public MainModel Model { get; }

    public string Text => _app.ToString()!;

    public string[] Rows => [.. Text.TrimEnd('\r', '\n').Split('\n').Select(row => row.TrimEnd())];

    public void Press(params Key[] keys)
    {
        foreach (Key key in keys)
        {
            _app.InjectKey(key);
            _app.LayoutAndDraw();
        }
    }

    public void Type(string text) => Press([.. text.Select(letter => new Key(letter))]);

    public void Resize(int width, int height)
    {
        _app.Driver!.SetScreenSize(width, height);
        _app.LayoutAndDraw();
    }

    public void Dispose()
    {
        _live.Dispose();
        _screen.Dispose();
        _app.Dispose();
    }
}
