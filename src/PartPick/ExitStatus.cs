namespace PartPick;

/// <summary>What the program tells the shell.</summary>
internal static class ExitStatus
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>Nothing fits the requirement, or the circuit does not start.</summary>
    public const int NothingFits = 1;

    /// <summary>Wrong input.</summary>
    public const int WrongInput = 2;

    /// <summary>The catalogue cannot be opened, is locked, or is damaged.</summary>
    public const int NoCatalog = 3;

    /// <summary>A fault of the program itself.</summary>
    public const int Fault = 70;

    /// <summary>Stopped from the keyboard, as shells count it.</summary>
    public const int Stopped = 130;
}
