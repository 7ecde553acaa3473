namespace PartPick.Screens;

/// <summary>A piece of text of one tone.</summary>
/// <param name="Text">The text, without line ends.</param>
/// <param name="Tone">What it means.</param>
public readonly record struct Span(string Text, Tone Tone);
