namespace PartPick.Catalog;

/// <summary>What a check of a catalogue looked at.</summary>
/// <param name="Parts">The parts that were read and built, each with all its figures.</param>
/// <param name="Origins">The figures whose origin was found.</param>
/// <param name="Imports">The imports that were read.</param>
/// <param name="Earlier">The parts that are kept for taking the last import back.</param>
/// <param name="Maps">The column maps that were read.</param>
/// <param name="Faults">What is wrong, one line each; empty where all is well.</param>
public sealed record CatalogCheck(int Parts, int Origins, int Imports, int Earlier, int Maps, IReadOnlyList<string> Faults);
