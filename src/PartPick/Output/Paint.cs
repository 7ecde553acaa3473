namespace PartPick.Output;

/// <summary>Emphasis on a terminal; plain text elsewhere. Nothing is told by emphasis alone.</summary>
internal static class Paint
{
    /// <summary>Bold where colour may be used.</summary>
    public static string Strong(string text, bool colour) => colour ? $"\u001b[1m{text}\u001b[0m" : text;
}
