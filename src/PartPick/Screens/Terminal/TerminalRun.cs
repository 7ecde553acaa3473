using System.Runtime.InteropServices;
using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;
using PartPick.WhyNot;
using Terminal.Gui.App;
using Terminal.Gui.Drivers;

namespace PartPick.Screens;

/// <summary>Owns the terminal from the first to the last drawn row.</summary>
/// <param name="catalogPath">The path of the catalogue.</param>
/// <param name="ranking">What ranks its parts.</param>
/// <param name="traits">What the terminal can show.</param>
/// <param name="keep">Keeps a requirement; called from any thread.</param>
/// <param name="opening">The reading of the parts, which may go on while the screen is shown.</param>
internal sealed class TerminalRun(
    string catalogPath, CatalogRanking ranking, TerminalTraits traits, Action<Requirement> keep, Task<Result<bool>> opening)
{
    private const string MouseReportsOff = "\x1b[?1003l\x1b[?1015l\x1b[?1006l";

    // A key is answered in the next iteration: 25 a second, as set at first, would let most keys wait.
    private const ushort IterationsPerSecond = 60;

    private static readonly TimeSpan LastMoment = TimeSpan.FromSeconds(3);

    private ScreenWork? _work;

    /// <summary>Shows the screen until it is left.</summary>
    /// <param name="start">The requirement to begin with.</param>
    /// <param name="notice">A line to show until the first key; null for none.</param>
    /// <param name="desk">Where the lists of candidates are kept.</param>
    /// <param name="store">Where requirements are kept.</param>
    /// <returns>The requirement at the end.</returns>
    public Requirement Show(Requirement start, string? notice, IShortlistDesk desk, KeptRequirementStore store)
    {
        // The terminal's own sixteen colours: they fit its background, and few of them are sent.
        Driver.Force16Colors = true;
        Application.MaximumIterationsPerSecond = IterationsPerSecond;
        Glyphs glyphs = traits.Glyphs;
        Palette palette = traits.HasColour ? Palette.Coloured : Palette.Plain;
        using IApplication app = Application.Create().Init(DriverRegistry.Names.ANSI);
        app.Driver!.WriteRaw(MouseReportsOff);
        using var live = new LiveRanking(ranking, action => Post(app, action), TimeProvider.System);
        ScreenWork work = _work = new ScreenWork(action => Post(app, action));
        var parts = new PartsModel(catalogPath, work, glyphs, () => DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date));
        var model = new MainModel(start, live, glyphs, notice, ranking.Currency, parts: parts);
        Await(opening);
        model.PartsChanged += () =>
        {
            Await(ranking.Open());
            model.RankAgain();
        };
        model.Settled += requirement => _ = Task.Run(() => keep(requirement));
        model.KeepListsAt(desk, work);
        model.ChangePartsFrom(ranking.Parts, work);
        model.AnswerQuestionsAt(new WhyNotDesk(catalogPath), work);
        model.KeepWantedAt(store, work, ranking);
        model.DrawPicturesWith(work);
        using var screen = new MainScreen(model, palette);
        using PosixSignalRegistration terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, Leave);
        using PosixSignalRegistration interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, Leave);
        using PosixSignalRegistration hangUp = PosixSignalRegistration.Create(PosixSignal.SIGHUP, HangUp);
        app.Run(screen);
        model.Stop();
        parts.Stop();
        return model.Wanted.Accepted;

        // Rankings wait for the parts by themselves; this only says so.
        void Await(Task<Result<bool>> reading)
        {
            model.ReadsParts = !reading.IsCompleted;
            _ = reading.ContinueWith(_ => Post(app, () => model.PartsAreRead(ranking.Currency)), TaskScheduler.Default);
        }

        void Leave(PosixSignalContext context)
        {
            context.Cancel = true;
            Post(app, app.RequestStop);
        }

        // After a real hang-up there is no terminal to give back: keep the requirement, and let the process end.
        void HangUp(PosixSignalContext context)
        {
            keep(model.Wanted.Accepted);
            if (HasTerminal())
            {
                Leave(context);

                // Should it be gone a moment later, waiting for it would last for ever.
                _ = Task.Delay(LastMoment).ContinueWith(_ => Environment.Exit(ExitStatus.Fault), TaskScheduler.Default);
            }
        }
    }

    /// <summary>Waits for what was still being written when the screen was left.</summary>
    /// <param name="longest">The most to wait.</param>
    /// <returns>Whether all of it is done.</returns>
    public bool Finish(TimeSpan longest) => _work is null || SpinWait.SpinUntil(() => _work.IsIdle, longest);

    private static bool HasTerminal()
    {
        try
        {
            using FileStream terminal = File.OpenWrite("/dev/tty");
            return true;
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException)
        {
            return false;
        }
    }

    private static void Post(IApplication app, Action action)
    {
        try
        {
            app.Invoke(action);
        }
        catch (NotInitializedException)
        {
            // The screen was left in the meantime.
        }
    }
}
