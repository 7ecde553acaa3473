using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>A text of a <see cref="TextFolder"/> as it was read.</summary>
/// <param name="Id">The name of its file.</param>
/// <param name="Content">The text, or why it cannot be read.</param>
public sealed record KeptText(string Id, Result<string> Content);
