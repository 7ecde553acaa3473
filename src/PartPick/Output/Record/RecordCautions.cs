namespace PartPick.Output;

/// <summary>What no calculation replaces.</summary>
internal static class RecordCautions
{
    private static readonly string[] Sentences =
    [
        "Local codes and the law come first, before anything on this sheet.",
        "A signal that is radiated needs a licence where the law says so; that includes harmonics.",
        "Timing on which safety depends needs a review by a qualified person before it is built.",
        "The figures come from a model and from the parts' stated data. Measure the first board: its frequency, and its start-up margin by "
            + "adding resistance in series with the crystal.",
        "Layout, coupling and noise on the board are not in the figures.",
    ];

    /// <summary>Writes them in a frame.</summary>
    public static void Write(Html page) => page.Raw("<div class=\"caution\">").Element("h3", "Cautions").List(Sentences).Raw("</div>");
}
