using System.Globalization;
using PartPick.Commands;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>Prints the candidates of one list with the figures of today.</summary>
internal static class ShortlistOutput
{
    /// <summary>Prints it in the chosen format.</summary>
    public static void Write(TextWriter output, OutputFormat format, ShortlistView list)
    {
        switch (format)
        {
            case OutputFormat.Json:
                JsonOutput.Write(output, ShortlistJson.Of(list));
                break;
            case OutputFormat.Csv:
                CsvOutput.Write(
                    output,
                    [
                        "number", "added", "builds", "circuit", "crystal", "amplifier", "tap", "errorWorst (ppm)", "startUpMargin",
                        "driveLevel (W)", "startUpTime (s)", "cost", "currency", "state", "changes", "note",
                    ],
                    list.Candidates.Select(CsvRow));
                break;
            default:
                WriteTable(output, list);
                break;
        }
    }

    private static void WriteTable(TextWriter output, ShortlistView list)
    {
        string currency = list.Candidates.Select(each => each.Now.Currency).FirstOrDefault(each => each.Length > 0, "");
        output.WriteLine($"{list.Name}: figures of today's parts.");
        output.WriteLine();
        TextTable.Write(
            output,
            [
                new("#", true), new("added"), new("boards", true), new("circuit"), new("crystal"), new("amplifier"), new("tap", true),
                new("error (ppm)", true), new("margin", true), new("drive (uW)", true), new("start-up (ms)", true),
                new(currency.Length == 0 ? "cost" : $"cost ({currency})", true), new("state"), new("note"),
            ],
            [.. list.Candidates.Select(Row)]);
        string[] lines =
        [
            .. list.Candidates.SelectMany(each => ReviewWords.Lines(each).Select(line => $"{Figures.Whole(each.Entry.Number)}: {line}")),
        ];
        if (lines.Length > 0)
        {
            output.WriteLine();
            foreach (string line in lines)
            {
                output.WriteLine(line);
            }
        }
    }

    private static string[] Row(ShortlistReview review) =>
    [
        Figures.Whole(review.Entry.Number),
        review.Entry.Added,
        Figures.Whole(review.Entry.Builds),
        review.Chosen.Circuit.Word(),
        review.Chosen.Ids["crystal"],
        review.Chosen.Ids["amplifier"],
        Figures.Whole(review.Chosen.Tap),
        Figures.Fixed(review.Now.ErrorWorst, 1, 1),
        Figures.Fixed(review.Now.Margin, 1, 2),
        Figures.Short(review.Now.DriveWatts, 1e-6),
        Figures.Short(review.Now.StartUpSeconds, 1e-3),
        review.Now.Cost is { } cost ? ReviewWords.Money(cost) : Figures.None,
        ReviewWords.State(review),
        review.Entry.Note ?? "",
    ];

    private static string[] CsvRow(ShortlistReview review) =>
    [
        Figures.Whole(review.Entry.Number),
        review.Entry.Added,
        Figures.Whole(review.Entry.Builds),
        review.Chosen.Circuit.Word(),
        review.Chosen.Ids["crystal"],
        review.Chosen.Ids["amplifier"],
        Figures.Whole(review.Chosen.Tap),
        Figures.Exact(review.Now.ErrorWorst),
        Figures.Exact(review.Now.Margin),
        Figures.Exact(review.Now.DriveWatts),
        Figures.Exact(review.Now.StartUpSeconds),
        review.Now.Cost?.ToString(CultureInfo.InvariantCulture) ?? "",
        review.Now.Currency,
        ReviewWords.State(review),
        string.Join(" | ", ReviewWords.Lines(review)),
        review.Entry.Note ?? "",
    ];
}
