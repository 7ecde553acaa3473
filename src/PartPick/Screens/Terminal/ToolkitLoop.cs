using Terminal.Gui.App;
using Terminal.Gui.Drivers;

namespace PartPick.Screens;

/// <summary>The toolkit's loop with its own link to the terminal, for Windows, whose consoles understand what it sends.</summary>
internal sealed class ToolkitLoop : IScreenLoop
{
    private const ushort TurnsPerSecond = 60;

    private readonly IApplication _app;

    public ToolkitLoop()
    {
        Driver.Force16Colors = true;
        Application.MaximumIterationsPerSecond = TurnsPerSecond;
        _app = Application.Create().Init(DriverRegistry.Names.ANSI);
    }

    /// <inheritdoc/>
    public void Post(Action action) => _app.AddTimeout(
        TimeSpan.Zero,
        () =>
        {
            action();
            return false;
        });

    /// <inheritdoc/>
    public void Run(MainScreen screen, Action beforeEnd) => _app.Run(screen);

    /// <inheritdoc/>
    public void Dispose() => _app.Dispose();
}
