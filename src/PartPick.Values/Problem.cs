namespace PartPick.Values;

/// <summary>Something wrong in what was typed or read, said in one line.</summary>
/// <param name="Where">The field, option, key, or file with line and column, that is meant.</param>
/// <param name="What">What is wrong there.</param>
/// <param name="Fits">What would be right, with an example where one helps.</param>
public sealed record Problem(string Where, string What, string Fits)
{
    /// <summary>The problem as one line: <c>where: what; fits ...</c>.</summary>
    public override string ToString() => OneLine($"{Where}: {What}; fits {Fits}");

    /// <summary>Quotes foreign text for a message: one line, no control characters, cut when it is long.</summary>
    /// <param name="text">The text as it was read.</param>
    /// <returns>The text between single quotes.</returns>
    public static string Quote(string? text)
    {
        const int longest = 40;
        string line = OneLine(text ?? "");
        return line.Length <= longest ? $"'{line}'" : $"'{line[..(longest - 3)]}...'";
    }

    private static string OneLine(string text) =>
        string.Create(text.Length, text, static (target, source) =>
        {
            for (int i = 0; i < source.Length; i++)
            {
                target[i] = char.IsControl(source[i]) || source[i] is '\u2028' or '\u2029' ? ' ' : source[i];
            }
        });
}
