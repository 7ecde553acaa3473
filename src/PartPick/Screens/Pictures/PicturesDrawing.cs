using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>Lays out the pictures of a candidate: one, or two or four at once where the screen is large enough.</summary>
internal static class PicturesDrawing
{
    private const int LeastWidth = 55;
    private const int LeastHeight = 16;

    /// <summary>The lines.</summary>
    /// <param name="model">The pictures.</param>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    /// <param name="glyphs">The signs.</param>
    public static ImmutableArray<Line> Draw(PicturesModel model, int width, int height, Glyphs glyphs)
    {
        int across = width >= 2 * LeastWidth ? 2 : 1;
        int down = height > 2 * LeastHeight ? 2 : 1;
        int count = across * down;
        int all = PictureKinds.All.Length;
        int first = Math.Min((int)model.At / count * count, all - count);
        string place = FormattableString.Invariant($"picture {(int)model.At + 1} of {all}");
        var lines = ImmutableArray.CreateBuilder<Line>();
        string circuit = CircuitPane.ShortTitle(model.Candidate!);
        if (count == 1)
        {
            // Which picture of how many counts for more than the stage of the divider.
            CandidateParts choice = model.Candidate!.Choice;
            string title = $"{PictureBlock.Title(model, model.At)}: {choice.Circuit.Word()} {choice.Amplifier.Id}";
            lines.Add(Rules.Draw(title, place, width, glyphs));
            lines.AddRange(PictureBlock.Draw(model, model.At, width, height - 1, glyphs));
            return lines.ToImmutable();
        }

        lines.Add(Rules.Draw(circuit, place, width, glyphs));
        int cell = (width - across + 1) / across;
        for (int row = 0; row < down; row++)
        {
            int rows = (height - 1) / down;
            ImmutableArray<Line>[] blocks =
            [
                .. Enumerable.Range(first + row * across, across).Select(at => Titled(model, PictureKinds.All[at], cell, rows, glyphs)),
            ];
            for (int i = 0; i < rows; i++)
            {
                lines.Add(across == 1 ? blocks[0][i] : blocks[0][i].Beside(cell + 1, blocks[1][i]));
            }
        }

        return lines.ToImmutable();
    }

    // The picture that the keys are for has the mark of what is chosen.
    private static ImmutableArray<Line> Titled(PicturesModel model, PictureKind kind, int width, int height, Glyphs glyphs)
    {
        bool chosen = kind == model.At;
        Line title = new LineBuilder(glyphs).Add(chosen ? glyphs.Chosen : " ", Tone.Accent).Add(" ")
            .Words(PictureBlock.Title(model, kind), width - 2, chosen ? Tone.Accent : Tone.Strong).Build();
        ImmutableArray<Line> picture = PictureBlock.Draw(model, kind, width, height - 1, glyphs);
        return [title, .. picture.Concat(Enumerable.Repeat(Line.Empty, Math.Max(0, height - 1 - picture.Length))).Select(line => line.Fit(width))];
    }
}
