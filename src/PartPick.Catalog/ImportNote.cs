namespace PartPick.Catalog;

/// <summary>What a catalogue keeps about one import.</summary>
/// <param name="Number">Its number, counted from 1.</param>
/// <param name="File">The name of the file.</param>
/// <param name="Date">The day, as in 2026-03-01.</param>
/// <param name="Kind">The kind of its parts.</param>
/// <param name="Added">How many parts it added.</param>
/// <param name="Updated">How many parts it changed.</param>
public sealed record ImportNote(int Number, string File, string Date, PartKind Kind, int Added, int Updated);
