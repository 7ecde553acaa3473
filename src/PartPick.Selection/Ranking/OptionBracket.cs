namespace PartPick.Selection.Search;

/// <summary>
/// The options at which a grid has nodes, along a resistor: for a gate that is Rs; for a follower the base resistor, with the same
/// emitter resistor and the same kind of bias.
/// </summary>
internal static class OptionBracket
{
    private const int Step = 3;

    /// <summary>The brackets of a family's options.</summary>
    public static NodeBracket[] Of(CircuitFamily family)
    {
        var brackets = new NodeBracket[family.Options.Length];
        foreach (var chain in Enumerable.Range(0, brackets.Length).GroupBy(option => Chain(family.Options[option])))
        {
            int[] places = [.. chain];
            double[] along = [.. places.Select(option => Along(family.Options[option]))];
            if (family.IsGate && along.Length > 2)
            {
                // A direct connection stands one step below the smallest resistor.
                along[0] = 2 * along[1] - along[2];
            }

            NodeBracket[] found = NodeBracket.Along(along, Step);
            for (int k = 0; k < places.Length; k++)
            {
                brackets[places[k]] = found[k].Renamed(place => places[place]);
            }
        }

        return brackets;
    }

    private static (string? Emitter, bool Divider) Chain(AmplifierOption option) => (option.Emitter?.Id, option.BaseBottom is not null);

    private static double Along(AmplifierOption option) =>
        Math.Log((option.Emitter is null ? option.Series : option.BaseTop)?.ValueOhms ?? 1);
}
