using System.Collections.Concurrent;
using PartPick.Catalog;
using PartPick.Requirements;
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
    private readonly ConcurrentQueue<Action> _posted = new();
    private readonly ScreenWork _work;

    public Bench(
        int width = 80,
        int height = 24,
        FakeRanking? ranking = null,
        Requirement? requirement = null,
        Glyphs? glyphs = null,
        string? catalogue = null)
    {
        Ranking = ranking ?? new FakeRanking();
        _work = new ScreenWork(_posted.Enqueue);
        PartsModel? parts = catalogue is null
            ? null
            : new PartsModel(catalogue, _work, glyphs ?? Glyphs.Drawn, () => new DateOnly(2026, 3, 1));
        _app = Application.Create(new VirtualTimeProvider()).Init(DriverRegistry.Names.ANSI);
        _app.Driver!.SetScreenSize(width, height);
        _live = new LiveRanking(Ranking, action => action(), TimeProvider.System);
        Model = new MainModel(requirement ?? SampleRanking.Wanted, _live, glyphs ?? Glyphs.Drawn, waits: false, parts: parts);
        Model.DrawPicturesWith(_work);
        _screen = new MainScreen(Model, Palette.Plain);
        _app.Begin(_screen);
        _app.LayoutAndDraw();
    }

    public FakeRanking Ranking { get; }

    public MainModel Model { get; }

    public string Text => _app.ToString()!;

    public string[] Rows => [.. Text.TrimEnd('\r', '\n').Split('\n').Select(row => row.TrimEnd())];

    /// <summary>Keeps lists of candidates in a catalogue.</summary>
    public void KeepLists(string catalogue) => Model.KeepListsAt(new CatalogDesk(catalogue), _work);

    /// <summary>Lets the parts of an open circuit be changed for others.</summary>
    public void ChangeParts(PartsCatalog catalogue) => Model.ChangePartsFrom(new WholeCatalog(catalogue), _work);

    /// <summary>Keeps requirements beside a catalogue.</summary>
    public void KeepWanted(string catalogue) => Model.KeepWantedAt(new KeptRequirementStore(catalogue), _work, Ranking);

    /// <summary>Presses keys, and after each waits until what it began in the background is done.</summary>
    public void Do(params Key[] keys)
    {
        foreach (Key key in keys)
        {
            Press(key);
            Settle();
        }
    }

    /// <summary>Answers questions from a catalogue.</summary>
    public void AnswerQuestions(string catalogue) => AnswerQuestions(new WhyNot.WhyNotDesk(catalogue));

    /// <summary>Answers questions.</summary>
    public void AnswerQuestions(WhyNot.IWhyNotDesk desk) => Model.AnswerQuestionsAt(desk, _work);

    public void Press(params Key[] keys)
    {
        foreach (Key key in keys)
        {
            _app.InjectKey(key);
            _app.LayoutAndDraw();
        }
    }

    public void Type(string text) => Press([.. text.Select(letter => new Key(letter))]);

    /// <summary>Waits until what was begun in the background is done and shown.</summary>
    public void Settle() => SettleUntil(() => _work.IsIdle && _posted.IsEmpty);

    /// <summary>Shows what comes from the background until something is so.</summary>
    public void SettleUntil(Func<bool> isSo)
    {
        long start = TimeProvider.System.GetTimestamp();
        while (!isSo())
        {
            Assert.True(TimeProvider.System.GetElapsedTime(start) < TimeSpan.FromSeconds(60), "It did not settle:\n" + Text);
            if (_posted.TryDequeue(out Action? posted))
            {
                posted();
            }
            else
            {
                Thread.Sleep(1);
            }
        }

        _screen.Refresh();
        _app.LayoutAndDraw();
    }

    public void Resize(int width, int height)
    {
        _app.Driver!.SetScreenSize(width, height);
        _app.LayoutAndDraw();
    }

    public void Dispose()
    {
        Model.Stop();
        Model.Parts?.Stop();
        _live.Dispose();
        _screen.Dispose();
        _app.Dispose();
    }
}
