using System.Text.Json;

namespace PartPick.Selection.Files;

/// <summary>A value of a file or a command option, and the name under which a problem with it is reported.</summary>
/// <param name="Value">The value.</param>
/// <param name="Where">File and key, or the option.</param>
internal readonly record struct Field(JsonElement Value, string Where);
