using System.Collections.Immutable;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>The answer why a part is not in the list, as lines: the verdict, what lets it in, the limits, and what was tried.</summary>
internal static class WhyNotLines
{
    /// <summary>The lines.</summary>
    public static ImmutableArray<Line> Of(WhyNotAnswer answer, int width, Glyphs glyphs)
    {
        var lines = ImmutableArray.CreateBuilder<Line>();
        Say(Verdict(answer), " ", Tone.Strong);
        foreach (Hurdle hurdle in answer.Hurdles)
        {
            Say(
                $"{WhyNotWords.Of(hurdle.Name)}: {(hurdle.Wanted.Length == 0 ? "" : $"wanted {hurdle.Wanted}; ")}{hurdle.Has}"
                    + (hurdle.Distance.Length == 0 ? "" : $"; {hurdle.Distance}"),
                " ! ", Tone.Warning);
        }

        foreach (LimitReading limit in answer.Limits.Where(limit => limit.IsBroken))
        {
            string wanted = limit.Limit == Limit.Drive ? "rated" : "wanted";
            string at = limit.At.Length == 0 ? "" : $", at {limit.At}";
            Say($"{LimitWords.Words(limit.Limit)}: {wanted} {limit.Wanted}; {limit.Reached} reached, {limit.Distance}{at}", " ! ",
                Tone.Warning);
        }

        if (answer.Changes.Length > 0)
        {
            Head("What lets it in, the smallest change first; each was ranked again");
            foreach (ChangeSet set in answer.Changes)
            {
                Say(WhyNotWords.Shown(set) + (set.IsOfRequirement ? "" : ", which is no matter of the wanted alone"), "   ", Tone.Accent);
            }
        }
        else if (!answer.Fits)
        {
            Say("No change of one limit, or of several, lets it in.", " ", Tone.Normal);
        }

        foreach (string sentence in WhyNotWords.Beaten(answer).Append(WhyNotWords.Then(answer)).OfType<string>())
        {
            Say(sentence, " ", Tone.Normal);
        }

        if (answer.Candidate is { } candidate)
        {
            Head(answer.Fits ? "Its best circuit" : answer.Hurdles.IsEmpty ? "The nearest that it comes"
                : "The nearest, with that out of the way");
            Say(CircuitPane.Title(candidate), " ", Tone.Normal);
            lines.AddRange(Bars.Draw(LimitUses.Of(candidate, answer.Requirement), width, glyphs));
        }

        if (!answer.Fits && WhyNotWords.Removed(answer) is { Length: > 0 } removed)
        {
            lines.Add(Line.Empty);
            Say($"Combinations with it that each limit removed: {removed}.", " ", Tone.Quiet);
        }

        return lines.ToImmutable();

        void Say(string text, string first, Tone tone) => lines.AddRange(Paragraph.Of(text, width - 1, glyphs, first, first.Length, tone));

        void Head(string text)
        {
            lines.Add(Line.Empty);
            lines.Add(new LineBuilder(glyphs).Add(" ").Words(text, width - 2, Tone.Strong).Build());
        }
    }

    // What keeps it out follows line by line, so the sentence is the short one.
    private static string Verdict(WhyNotAnswer answer) => answer.Fits
        ? WhyNotWords.Verdict(answer)
        : $"{answer.Part.Id} is not in the list.";
}
