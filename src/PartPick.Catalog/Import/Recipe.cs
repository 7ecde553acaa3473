namespace PartPick.Catalog.Import;

/// <summary>Notions that together make a header the name of a field.</summary>
/// <param name="Field">The field.</param>
/// <param name="Required">Those that have to be there.</param>
/// <param name="Allowed">Those that may be there, with the required ones.</param>
/// <param name="IsText">Whether the cells are texts, which prove nothing: then every word has to be known.</param>
internal sealed record Recipe(string Field, UInt128 Required, UInt128 Allowed, bool IsText)
{
    // How much of a header may be words that are not known.
    private const double MostUnknown = 0.4;

    // No cell speaks against a text, so that its words have to be surer.
    private const double MostDoubtOfText = 0.2;

    // Up to this doubt a word is known.
    private const double Sure = 0.05;

    /// <summary>How surely the words of a header are this one, below <see cref="FieldMatch.Whole"/>; 0 where they are not.</summary>
    public double Rate(HeaderNotions header)
    {
        UInt128 covered = 0;
        double doubt = 0;
        (int unknown, int all) = (0, 0);
        foreach ((string word, IReadOnlyList<Notion> notions) in header.Words)
        {
            all += word.Length;
            if (notions.Count == 0)
            {
                if (IsText || char.IsAsciiDigit(word[0]))
                {
                    return 0;
                }

                unknown += word.Length > 1 ? word.Length : 0;
                continue;
            }

            if (Best(notions, covered) is not { } best)
            {
                return 0;
            }

            covered |= best.Marks;
            doubt += best.Doubt;
        }

        if ((covered & Required) != Required || all == 0 || unknown > all * MostUnknown)
        {
            return 0;
        }

        // The more of it a header says, the surer.
        double rate = FieldMatch.Whole - 3 - (20 * doubt / header.Words.Count) + (0.2 * double.CreateChecked(UInt128.PopCount(covered)));
        return unknown > 0 ? Math.Min(rate, 60) - (30.0 * unknown / all) : rate;
    }

    /// <summary>Whether a word of the header is known for something else.</summary>
    public bool IsContradicted(HeaderNotions header) => header.Words.Any(
        word => word.Notions.Any(notion => notion.Doubt <= Sure)
            && word.Notions.All(notion => notion.Doubt > Sure || (notion.Marks & ~Allowed) != 0));

    // What adds a notion that is still missing goes first.
    private Notion? Best(IReadOnlyList<Notion> notions, UInt128 covered)
    {
        Notion? best = null;
        bool adds = false;
        foreach (Notion notion in notions)
        {
            if ((notion.Marks & ~Allowed) != 0 || (IsText && notion.Doubt > MostDoubtOfText))
            {
                continue;
            }

            bool further = (notion.Marks & Required & ~covered) != 0;
            if (best is not { } known || (further && !adds) || (further == adds && notion.Doubt < known.Doubt))
            {
                (best, adds) = (notion, further);
            }
        }

        return best;
    }
}
