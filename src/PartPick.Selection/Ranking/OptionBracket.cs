namespace PartPick.Selection.Search;

/// <summary>
/// The options at which a grid has nodes, seen from one option: those round it along a resistor. For a gate that is Rs; for a
/// follower the base resistor, with the same emitter resistor and the same kind of bias.
/// </summary>
/// <param name="Low">The node at or before it.</param>
/// <param name="High">The node at or after it.</param>
/// <param name="Weight">How far it stands on the way from one to the other, along the logarithm.</param>
internal readonly record struct OptionBracket(int Low, int High, double Weight)
{
    private const int Step = 3;

    /// <summary>Whether it is a node itself.</summary>
    public bool IsNode => Low == High;

    /// <summary>Its two nodes.</summary>
    public (int Low, int High, double Weight) Ends => (Low, High, Weight);

    /// <summary>The brackets of a family's options.</summary>
    public static OptionBracket[] Of(CircuitFamily family)
    {
        var brackets = new OptionBracket[family.Options.Length];
        foreach (var chain in Enumerable.Range(0, brackets.Length).GroupBy(option => Chain(family.Options[option])))
        {
            int[] places = [.. chain];
            double[] along = [.. places.Select(option => Along(family.Options[option]))];
            if (family.IsGate && along.Length > 2)
            {
                // A direct connection stands one step below the smallest resistor.
                along[0] = 2 * along[1] - along[2];
            }

            for (int k = 0; k < places.Length; k++)
            {
                int low = k / Step * Step;
                int high = low == k ? k : Math.Min(low + Step, places.Length - 1);
                low = k == places.Length - 1 ? k : low;
                brackets[places[k]] = new OptionBracket(
                    places[low], places[high], high == low ? 0 : (along[k] - along[low]) / (along[high] - along[low]));
            }
        }

        return brackets;
    }

    private static (string? Emitter, bool Divider) Chain(AmplifierOption option) => (option.Emitter?.Id, option.BaseBottom is not null);

    private static double Along(AmplifierOption option) => Math.Log((option.Emitter is null ? option.Series : option.BaseTop)?.ValueOhms ?? 1);
}
