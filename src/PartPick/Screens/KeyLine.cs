namespace PartPick.Screens;

/// <summary>Draws the line of keys at the foot of a screen.</summary>
internal static class KeyLine
{
    /// <summary>The keys; where they do not all fit, the last ones stay: they lead on and out.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="keys">The keys with what they do.</param>
    public static Line Draw(int width, Glyphs glyphs, params (string Key, string Does)[] keys)
    {
        int first = 0;
        while (first < keys.Length - 2 && keys[first..].Sum(pair => pair.Key.Length + pair.Does.Length + 4) - 2 > width)
        {
            first++;
        }

        LineBuilder line = new LineBuilder(glyphs).Add(" ");
        foreach ((string key, string does) in keys[first..])
        {
            line.Add(key, Tone.Strong).Add(" " + does + "   ");
        }

        return line.Build();
    }
}
