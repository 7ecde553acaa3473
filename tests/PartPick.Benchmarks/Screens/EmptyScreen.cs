using Terminal.Gui.App;
using Terminal.Gui.Drivers;
using Terminal.Gui.Input;
using Terminal.Gui.Views;

namespace PartPick.Benchmarks;

/// <summary>The least program of the toolkit, as its documentation begins: a window with a line of text.</summary>
internal static class EmptyScreen
{
    /// <summary>What is to be read on it.</summary>
    public const string Words = "Nothing here";

    /// <summary>Shows it until Esc.</summary>
    public static int Run()
    {
        using IApplication app = Application.Create().Init(DriverRegistry.Names.ANSI);
        using var window = new Window { Title = "Empty" };
        window.Add(new Label { Text = Words });
        window.KeyDown += (_, key) => key.Handled = key == Key.CursorDown;
        app.Run(window);
        return 0;
    }
}
