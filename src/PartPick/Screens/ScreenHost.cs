namespace PartPick.Screens;

/// <summary>Opens the terminal interface.</summary>
internal static class ScreenHost
{
    /// <summary>Runs the interface until the user leaves it.</summary>
    /// <param name="catalogPath">Path of the catalogue.</param>
    /// <param name="requirementPath">Requirement to open with; null for the last one.</param>
    /// <returns>The exit status.</returns>
    public static int Run(string catalogPath, string? requirementPath)
    {
        Console.Error.WriteLine("partpick: no terminal to draw on; fits a command such as partpick rank (see partpick --help)");
        return ExitStatus.WrongInput;
    }
}
