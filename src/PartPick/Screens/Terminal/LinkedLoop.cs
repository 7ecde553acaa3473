using System.Drawing;
using System.Runtime.InteropServices;
using System.Runtime.Versioning;
using Terminal.Gui.App;
using Terminal.Gui.Drivers;

namespace PartPick.Screens;

/// <summary>
/// The toolkit's loop, with the program's own link to the terminal: the toolkit lays out, draws into its cells and tells keys apart, and
/// never touches the terminal itself. Its own drivers send what an old terminal shows as rubbish, far more than what has changed, and
/// something at every turn of a loop that never rests.
/// </summary>
[UnsupportedOSPlatform("windows")]
internal sealed class LinkedLoop : IScreenLoop
{
    // Read by the toolkit when it starts: it then works on cells alone.
    private const string CellsAlone = "DisableRealDriverIO";

    // Several answers within a hundredth of a second are drawn together.
    private const ushort MostTurnsPerSecond = 100;

    private static readonly TimeSpan LastMoment = TimeSpan.FromSeconds(3);

    private readonly LoopPace _pace = new();
    private readonly TerminalLink _link;
    private readonly IApplication _app;
    private readonly AutoResetEvent _goesOn = new(false);
    private Action? _beforeEnd;
    private volatile bool _isOver;

    /// <summary>Makes everything ready, without touching the terminal.</summary>
    /// <param name="traits">What the terminal can show.</param>
    public LinkedLoop(TerminalTraits traits)
    {
        _link = new TerminalLink(traits);
        Environment.SetEnvironmentVariable(CellsAlone, "1");
        Driver.Force16Colors = true;
        Application.MaximumIterationsPerSecond = MostTurnsPerSecond;
        _app = Application.Create().Init(DriverRegistry.Names.ANSI);
    }

    /// <inheritdoc/>
    public void Post(Action action) => _app.AddTimeout(
        TimeSpan.Zero,
        () =>
        {
            // What it changes is drawn in the next turn, which is not to wait.
            action();
            _pace.Wake();
            return false;
        });

    /// <inheritdoc/>
    public void Run(MainScreen screen, Action beforeEnd)
    {
        _beforeEnd = beforeEnd;
        IDriver driver = _app.Driver!;
        var intake = new KeyIntake();
        var feed = new KeyFeed(_app);
        PosixSignalRegistration? stopped = null;
        screen.StopAsked += Suspend;
        screen.RepaintAsked += Repaint;
        driver.SetScreenSize(Size.Width, Size.Height);
        _app.TimedEvents!.Added += (_, _) => _pace.Wake();
        _app.Iteration += (_, _) => BeforeTurn(feed);
        _app.LayoutAndDrawComplete += (_, _) => Show();
        using PosixSignalRegistration terminate = PosixSignalRegistration.Create(PosixSignal.SIGTERM, End);
        using PosixSignalRegistration interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, End);
        using PosixSignalRegistration hangUp = PosixSignalRegistration.Create(PosixSignal.SIGHUP, End);
        using PosixSignalRegistration resized = PosixSignalRegistration.Create(PosixSignal.SIGWINCH, _ => _pace.Wake());
        using PosixSignalRegistration goesOn = PosixSignalRegistration.Create(PosixSignal.SIGCONT, GoOn);
        stopped = PosixSignalRegistration.Create(PosixSignal.SIGTSTP, StopFromOutside);
        _link.Enter(Size.Height, Size.Width);
        intake.Start(
            typed =>
            {
                feed.Take(typed);
                _pace.WakeForKeys();
            },
            () => Post(_app.RequestStop));
        try
        {
            _app.Run(screen);
        }
        finally
        {
            stopped?.Dispose();
            intake.Rest();
            _link.Leave();
            _isOver = true;
        }

        void StopFromOutside(PosixSignalContext context)
        {
            context.Cancel = true;
            Post(Suspend);
        }

        // Gives the terminal to the shell. The signal has to find the platform's own answer to it, which is to stop.
        void Suspend()
        {
            stopped?.Dispose();
            intake.Rest();
            _link.Leave();
            _goesOn.Reset();
            NativeTerminal.Stop();

            // Another thread may take the signal a moment later; and where there is no shell to go back to, nothing stops.
            _goesOn.WaitOne(LoopPace.UntilStopped);
            stopped = PosixSignalRegistration.Create(PosixSignal.SIGTSTP, StopFromOutside);
            Enter();
            intake.GoOn();
        }
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        _link.Dispose();
        _app.Dispose();
        _goesOn.Dispose();
    }

    private static Size Size => new(Math.Max(1, Console.WindowWidth), Math.Max(1, Console.WindowHeight));

    private void BeforeTurn(KeyFeed feed)
    {
        _pace.Rest();
        feed.HandOn();
        if (_app.Driver!.Screen.Size != Size)
        {
            Size size = Size;
            _link.Clear(size.Height, size.Width);
            _app.Driver.SetScreenSize(size.Width, size.Height);
        }
    }

    private void Show() => _link.Show(_app.Driver!.Contents!);

    private void Enter()
    {
        Size size = Size;
        _app.Driver!.SetScreenSize(size.Width, size.Height);
        _link.Enter(size.Height, size.Width);
        Show();
    }

    private void Repaint()
    {
        Size size = Size;
        _link.Clear(size.Height, size.Width);
        Show();
    }

    // Something else may have been on the screen, and have set the terminal its own way.
    private void GoOn(PosixSignalContext context)
    {
        context.Cancel = true;
        _goesOn.Set();
        Post(Enter);
    }

    // A terminal that is hung up or held can keep the loop waiting for ever: then the process ends from the side.
    private void End(PosixSignalContext context)
    {
        context.Cancel = true;
        _beforeEnd?.Invoke();
        Post(_app.RequestStop);
        _ = Task.Delay(LastMoment).ContinueWith(
            _ =>
            {
                if (!_isOver)
                {
                    Environment.Exit(ExitStatus.Fault);
                }
            },
            TaskScheduler.Default);
    }
}
