namespace PartPick.Values;

/// <summary>The engineering prefixes from femto to tera.</summary>
internal static class Prefix
{
    public const int Smallest = -15;

    /// <summary>The power of ten of a prefix; false when the letter is none. Capital K is taken for kilo.</summary>
    public static bool TryRead(char letter, out int power)
    {
        int? found = letter switch
        {
            'f' => -15,
            'p' => -12,
            'n' => -9,
            'u' or '\u00B5' or '\u03BC' => -6,
            'm' => -3,
            'k' or 'K' => 3,
            'M' => 6,
            'G' => 9,
            'T' => 12,
            _ => null,
        };
        power = found ?? 0;
        return found.HasValue;
    }

    /// <summary>The printed letter of a power of ten that is a multiple of three.</summary>
    public static string Write(int power) => power switch
    {
        -15 => "f",
        -12 => "p",
        -9 => "n",
        -6 => "\u00B5",
        -3 => "m",
        0 => "",
        3 => "k",
        6 => "M",
        9 => "G",
        12 => "T",
        _ => throw new ArgumentOutOfRangeException(nameof(power), power, "No prefix stands for this power."),
    };
}
