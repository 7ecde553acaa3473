namespace PartPick.Screens;

/// <summary>How far the import of a list has come.</summary>
public enum ImportStep
{
    /// <summary>The file is named and its columns are looked at.</summary>
    Columns,

    /// <summary>The first rows are looked at as they are read.</summary>
    Rows,

    /// <summary>It runs.</summary>
    Running,

    /// <summary>It is done, or was tried without writing.</summary>
    Done,
}
