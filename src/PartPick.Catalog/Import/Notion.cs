namespace PartPick.Catalog.Import;

/// <summary>One way in which a word of a header can be understood.</summary>
/// <param name="Marks">The notions that it stands for together.</param>
/// <param name="Doubt">How far it is from a word that is known: 0 for the word itself.</param>
internal readonly record struct Notion(UInt128 Marks, double Doubt);
