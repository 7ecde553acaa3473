namespace PartPick.Selection;

/// <summary>The words of a requirement's values.</summary>
internal static class RequirementWords
{
    public static IReadOnlyDictionary<string, Waveform> Waveforms { get; } = new Dictionary<string, Waveform>(StringComparer.Ordinal)
    {
        ["any"] = Waveform.Any,
        ["square"] = Waveform.Square,
        ["sine"] = Waveform.Sine,
    };

    public static string Of(Waveform waveform) => Waveforms.First(word => word.Value == waveform).Key;
}
