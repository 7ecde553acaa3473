namespace PartPick.Catalog.Browsing;

/// <summary>A column in which parts of a kind are listed.</summary>
/// <param name="Key">The key of the figure or text; <c>price</c> is the price of one.</param>
/// <param name="Name">Its name in a heading.</param>
/// <param name="UnitName">The unit of its numbers in a heading; empty for none.</param>
/// <param name="Unit">What one of these units is in SI; 1 for none.</param>
/// <param name="IsNumber">Whether it holds numbers.</param>
public sealed record ListColumn(string Key, string Name, string UnitName, double Unit, bool IsNumber)
{
    /// <summary>The heading with the unit in brackets.</summary>
    public string Heading => UnitName.Length == 0 ? Name : $"{Name} ({UnitName})";
}
