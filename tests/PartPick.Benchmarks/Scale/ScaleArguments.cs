using System.Globalization;

namespace PartPick.Benchmarks;

/// <summary>What the scale benchmark is asked for.</summary>
/// <param name="Runs">Rankings of each catalogue, of which the median is taken.</param>
/// <param name="Size">Size of the catalogue.</param>
/// <param name="Limit">After so long a ranking is cancelled.</param>
/// <param name="Drawn">Combinations on which brute force is timed.</param>
internal sealed record ScaleArguments(int Runs, ScaleSize Size, TimeSpan Limit, int Drawn)
{
    /// <summary>Reads [RUNS] [--quick] [--limit SECONDS], in any order; null where one is wrong.</summary>
    public static ScaleArguments? Read(string[] arguments)
    {
        var read = new ScaleArguments(1, ScaleSize.Full, TimeSpan.FromSeconds(120), 2000);
        for (int i = 0; i < arguments.Length; i++)
        {
            if (arguments[i] == "--quick")
            {
                read = read with { Size = ScaleSize.Quick, Drawn = 300 };
            }
            else if (arguments[i] == "--limit" && i + 1 < arguments.Length && Number(arguments[i + 1]) is { } seconds)
            {
                read = read with { Limit = TimeSpan.FromSeconds(seconds) };
                i++;
            }
            else if (Number(arguments[i]) is { } runs)
            {
                read = read with { Runs = runs };
            }
            else
            {
                return null;
            }
        }

        return read;
    }

    private static int? Number(string text) =>
        int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int number) && number > 0 ? number : null;
}
