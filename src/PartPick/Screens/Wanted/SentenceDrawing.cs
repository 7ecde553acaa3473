using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Puts the sentence on the screen: the values strong, the chosen one marked, the typed one with its caret.</summary>
internal static class SentenceDrawing
{
    /// <summary>Lays the sentence out.</summary>
    /// <param name="model">The sentence.</param>
    /// <param name="pieces">Its pieces.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="chosen">Whether the keys go to the sentence.</param>
    /// <param name="glyphs">The signs.</param>
    public static SentenceLayout Of(
        SentenceModel model, ImmutableArray<SentencePiece> pieces, int width, bool chosen, Glyphs glyphs)
    {
        var texts = new List<SentenceText>();
        int number = 0;
        foreach (SentencePiece piece in pieces)
        {
            if (piece.Field is not { } field)
            {
                texts.Add(new SentenceText(glyphs.Show(piece.Words), Tone.Normal, -1));
                continue;
            }

            bool here = chosen && number == model.At;
            if (here && model.Typed is { } typed)
            {
                int caret = model.Caret;
                texts.Add(new SentenceText(glyphs.Show(typed[..caret]), Tone.Accent, number));
                texts.Add(new SentenceText(glyphs.Show(caret < typed.Length ? typed[caret..(caret + 1)] : " "), Tone.Caret, number));
                texts.Add(new SentenceText(glyphs.Show(caret < typed.Length ? typed[(caret + 1)..] : ""), Tone.Accent, number));
            }
            else
            {
                // While one value is typed, another one may have to move with it: it is shown as it would be.
                string text = field.Show(model.Current);
                Tone tone = here ? Tone.Chosen : text == field.Show(model.Accepted) ? Tone.Strong : Tone.Accent;
                texts.Add(new SentenceText(glyphs.Show(text), tone, number));
            }

            number++;
        }

        return SentenceLayout.Of(texts, width, 2);
    }
}
