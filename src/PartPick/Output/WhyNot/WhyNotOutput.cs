using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Prints why a part is not in a ranked list.</summary>
internal static class WhyNotOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, WhyNotAnswer answer)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, WhyNotJson.Of(answer));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(output, ["what", "wanted", "has", "distance", "at", "broken"], Rows(answer));
                break;
            default:
                WriteTable(output, answer);
                break;
        }
    }

    private static void WriteTable(TextWriter output, WhyNotAnswer answer)
    {
        output.WriteLine(RequirementSentence.Of(answer.Requirement));
        output.WriteLine();
        output.WriteLine(WhyNotWords.Verdict(answer));
        string[][] rows = [.. Rows(answer)];
        if (rows.Length > 0)
        {
            output.WriteLine();
            TextTable.Write(
                output,
                [new TextColumn("what"), new("wanted or rated"), new("has or reaches"), new("distance"), new("at"), new("")],
                [.. rows.Select(row => (string[])[.. row[..5], row[5] == "yes" ? "keeps it out" : ""])]);
        }

        if (answer.Candidate is { } candidate)
        {
            output.WriteLine();
            output.WriteLine($"{(answer.Fits ? "Its best circuit" : "Nearest")}: {candidate.Id}");
        }

        if (answer.Changes.Length > 0)
        {
            output.WriteLine();
            output.WriteLine("What lets it in, the smallest change first; each was ranked again:");
            foreach (ChangeSet set in answer.Changes)
            {
                output.WriteLine($"  {WhyNotWords.Shown(set)}{(set.IsOfRequirement ? "" : "   (no matter of the requirement alone)")}");
            }
        }
        else if (!answer.Fits)
        {
            output.WriteLine();
            output.WriteLine("No change of one limit, or of several, lets it in.");
        }

        foreach (string line in WhyNotWords.Beaten(answer).Append(WhyNotWords.Then(answer)).OfType<string>())
        {
            output.WriteLine(line);
        }

        if (!answer.Fits && WhyNotWords.Removed(answer) is { Length: > 0 } removed)
        {
            output.WriteLine($"Combinations with it that each limit removed: {removed}.");
        }
    }

    private static IEnumerable<string[]> Rows(WhyNotAnswer answer) =>
    [
        .. answer.Hurdles.Select(hurdle => (string[])
            [WhyNotWords.Of(hurdle.Name), hurdle.Wanted, hurdle.Has, hurdle.Distance, "", "yes"]),
        .. answer.Limits.Select(limit => (string[])
            [LimitWords.Words(limit.Limit), limit.Wanted, limit.Reached, limit.Distance, limit.At, limit.IsBroken ? "yes" : "no"]),
    ];
}
