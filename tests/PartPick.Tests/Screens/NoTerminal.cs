using System.Runtime.CompilerServices;
using Terminal.Gui.Drivers;

namespace PartPick.Tests.Screens;

/// <summary>No test touches the terminal of whoever runs it.</summary>
internal static class NoTerminal
{
    [ModuleInitializer]
    internal static void Begin()
    {
        Environment.SetEnvironmentVariable("DisableRealDriverIO", "1");
        Driver.Force16Colors = true;
    }
}
