namespace PartPick.Screens;

/// <summary>Runs the screen on a terminal.</summary>
internal interface IScreenLoop : IDisposable
{
    /// <summary>Makes everything ready, without touching the terminal where that can be.</summary>
    /// <param name="traits">What the terminal can show.</param>
    static IScreenLoop Prepare(TerminalTraits traits) => OperatingSystem.IsWindows() ? new ToolkitLoop() : new LinkedLoop(traits);

    /// <summary>
    /// Runs something on the screen's thread, in a later turn even where it is called on that thread: work that is done before its
    /// starter could note that it began would else be answered too early, and wait for that answer for ever.
    /// </summary>
    /// <param name="action">What is run.</param>
    void Post(Action action);

    /// <summary>Shows the screen until it is left, or the program is told to end.</summary>
    /// <param name="screen">The screen.</param>
    /// <param name="beforeEnd">Keeps what is to be kept when the program is told to end; called from any thread.</param>
    void Run(MainScreen screen, Action beforeEnd);
}
