namespace PartPick.Commands;

/// <summary>How data is printed.</summary>
internal enum OutputFormat
{
    /// <summary>For people.</summary>
    Table,

    /// <summary>One JSON document.</summary>
    Json,

    /// <summary>Comma-separated values with a header.</summary>
    Csv,
}
