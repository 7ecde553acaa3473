using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>All keys, what the pictures mean, and the cautions.</summary>
public static class KeysPage
{
    /// <summary>The page.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="fromParts">Whether it was asked for in the catalogue, whose keys come first then.</param>
    public static ImmutableArray<Line> Draw(int width, Glyphs glyphs, bool fromParts = false)
    {
        ArgumentNullException.ThrowIfNull(glyphs);
        var lines = ImmutableArray.CreateBuilder<Line>();
        if (fromParts)
        {
            Parts();
        }

        Head("In the list");
        Key($"{glyphs.Up} {glyphs.Down}", "the circuit before, the next one; also PgUp, PgDn, Home, End");
        Key("Enter", "open the circuit: drawing, parts, error, figures, reasons");
        Key("s", "put the circuit on a list; so in a circuit, too");
        Key("p", "pictures of the circuit, one after the other: " + glyphs.Left + " " + glyphs.Right + "; x writes one to an SVG file");
        Key("d", "differences: marks the circuit, and shows the marked one and another side by side; so in a circuit, too");
        Key("l", "the lists: what changed since, and writing them to files");
        Key("w", "what is kept: requirements by name, to take one, copy it, or put some side by side");
        Key("y", "why not: which limit keeps a crystal or amplifier out of the list, and what would let it in");
        Key("h", "how each figure of the circuit comes about; so in a circuit, too");
        Key("e or Tab", "edit the wanted sentence; so does " + glyphs.Up + " on the first circuit");
        Key("c", "the catalogue: its parts, and the import of a list");
        Key("?", "this page");
        Key("q", "quit; the wanted sentence is kept for the next time");
        Head("In the wanted sentence");
        Key(
            $"{glyphs.Left} {glyphs.Right} Tab",
            "the value before, the next one; " + glyphs.Up + " and " + glyphs.Down + " change the line");
        Key("type", "put in a new value; the list below answers while you type");
        Key("Enter", "change the value that is there; Enter again keeps it");
        Key("Space", "the next choice; the first letter of a choice picks it");
        Key("Esc", "leave the value as it was; once more, back to the list or circuit");
        Head("In a circuit");
        Key($"{glyphs.Up} {glyphs.Down}", "choose a part: capacitors, resistors, crystal, amplifier, stage");
        Key($"{glyphs.Left} {glyphs.Right}", "its value before, its next one: every figure follows, with its change against the ranked " +
            "circuit; s puts the changed circuit on a list as it stands, d shows it beside the ranked one");
        Key("0", "a direct connection in the place of Rs, or no lower base resistor");
        Key("Backspace", "the chosen part as it was ranked; Del takes all changes back");
        Key("n b", "the next circuit, the one before, at the same place of the page");
        Key("PgUp PgDn", "scroll; also Space, Home, End");
        Key("Esc", "back to the list; what was changed is kept until you leave the program");
        Head("The pictures");
        Text($"{Bars.Bar(0.5, 8, glyphs)} is a limit and the part of it that is used up: half of it here. " +
            $"{Bars.Bar(2, 8, glyphs)} is beyond it, {Bars.Bar(0.01, 8, glyphs)} hardly used. " +
            "The margin's bar is the wanted margin over the one there is. The limit that is nearest has the accent, and the " +
            "circuit's page names it.");
        Text("Error is the worst case over tolerance, temperature, ageing, capacitors, strays and amplifier. Margin, drive and " +
            "start-up are taken at their worst corners of supply, temperature, device and capacitance. Cost is for one board, " +
            "with prices at the quantity built.");
        Head("In a list");
        Key($"{glyphs.Up} {glyphs.Down}", "the candidate before, the next one; PgUp and PgDn scroll what is said about it");
        Key($"{glyphs.Left} {glyphs.Right}", "the list before, the next one");
        Key("r", "what may replace each part of the candidate, the one that changes least first; " +
            $"{glyphs.Left} {glyphs.Right} go to its other parts");
        Key("b", "its cost over 1 to 10 000 boards, where it turns, and the best candidate for each number");
        Key("x", "write it to a file: .csv and .md to order from, .html to print");
        Key("Del Del", "take the candidate off");
        Key("Esc", "back");
        Head("In what is kept");
        Key("Enter", "make it the wanted sentence; one that is not kept goes only when Enter is pressed twice");
        Key("n c", "keep the sentence under a name, or call a kept one otherwise; keep a copy of it");
        Key("Space d", "mark some; put the marked ones side by side: what differs, and the best circuit of each");
        Key("Del Del", "take a kept one away");
        Key("Esc", "back");
        Head("Cautions");
        Text("The figures come from a model and from the parts' stated data: measure the start-up margin of the first board. " +
            "Radiating a signal needs a licence where the law says so. Timing that safety rests on needs a review by a qualified " +
            "person. Local codes and the law come before anything shown here.");
        if (!fromParts)
        {
            Parts();
        }

        return lines.ToImmutable();

        void Parts()
        {
            Head("In the catalogue");
            Key($"{glyphs.Up} {glyphs.Down}", "the part before, the next one; also PgUp, PgDn, Home, End");
            Key("f or Tab", "filter: words of a part's texts, and conditions such as load<=18p or frequency=4.096M; Esc takes it away");
            Key($"{glyphs.Left} {glyphs.Right}", "mark a column; o puts the parts in its order, o again turns the order round");
            Key("k", "the next kind of part");
            Key("Enter", "open the part: each figure with what it rests on and where it came from");
            Key("y", "why the part is not in the list of circuits; so in a part");
            Key("i", "import a list; u takes the last import back, when pressed twice");
            Head("In a part of the catalogue");
            Key("Enter", "change the figure; a digit begins a new one; no import changes what was set by hand");
            Key("b", "back to the figure that was supplied; Delete takes a figure away");
            Key("n x", "write a note; exclude the part from every search, or take it in again");
            Key($"{glyphs.Left} {glyphs.Right}", "the part before, the next one");
            Head("In an import");
            Key("Enter", "change what the list or a column is: a figure's name, or its beginning, with a unit behind a colon");
            Key($"{glyphs.Left} {glyphs.Right}", "the choice before, the next one; Delete leaves a column out, b finds it again");
            Key("r", "the first rows as they are read, with what is wrong in them");
            Key("k", "keep the columns under a name, for the next list of this kind");
            Key("d i", "try it without writing; import it, all or nothing; Esc and Ctrl-C stop it");
        }

        void Head(string text)
        {
            if (lines.Count > 0)
            {
                lines.Add(Line.Empty);
            }

            lines.Add(new LineBuilder(glyphs).Add(" " + text, Tone.Strong).Build());
        }

        void Key(string key, string does)
        {
            ImmutableArray<Line> words = Paragraph.Of(does, Math.Max(20, width - 19), glyphs);
            for (int i = 0; i < words.Length; i++)
            {
                lines.Add(new LineBuilder(glyphs).Add("   ").Column(i == 0 ? key : "", 15, Tone.Strong).Add(words[i].Text).Build());
            }
        }

        void Text(string text) => lines.AddRange(Paragraph.Of(text, width - 1, glyphs, "   ", 3));
    }
}
