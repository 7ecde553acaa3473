using System.CommandLine;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist add</c>: puts a candidate on a list.</summary>
internal static class ShortlistAddCommand
{
    private const string Examples =
        """
        partpick rank river.json --format json | partpick shortlist add logger -
        partpick shortlist add logger ranking.json --candidate 3 --builds 500 --note "second source"
        partpick shortlist add logger circuit.json --requirement river.json
        FILE is the answer of rank --format json (the first candidate, unless --candidate names another), one candidate of it,
        or a circuit file as for check. Of a circuit file's plain values the parts are looked up by their figures.
        The list is made where it is not there. It keeps each part's data, prices and stock of today.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var name = new Argument<string>("NAME") { Description = "The list" };
        var file = new Argument<string>("FILE.json") { Description = "A ranking, a candidate or a circuit; - for standard input" };
        var which = new Option<string?>("--candidate") { Description = "Number or id of a candidate of a ranking (1)", HelpName = "N" };
        var wanted = new Option<string?>("--requirement") { Description = "What is wanted, where FILE does not say", HelpName = "FILE" };
        var builds = new Option<string?>("--builds") { Description = "Number of boards, else the requirement's", HelpName = "N" };
        var note = new Option<string?>("--note") { Description = "Free text beside it", HelpName = "TEXT" };
        var command = new Command("add", "Puts a candidate on a list.") { name, file, which, wanted, builds, note };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            string list = CommandFailure.Unless(ShortlistName.Read(parsed.GetRequiredValue(name)));
            string? text = NoteOf(parsed.GetValue(note), note.Name);
            int? boards = Counts.Read(parsed.GetValue(builds), builds.Name);
            if (parsed.GetValue(wanted) == "-" && parsed.GetRequiredValue(file) == "-")
            {
                throw new CommandFailure(
                    new Problem(wanted.Name, "standard input is already FILE", "the path of a file"), ExitStatus.WrongInput);
            }

            Requirement? requirement = parsed.GetValue(wanted) is { } path ? ReadRequirement(context, path) : null;
            (string json, string from) = context.ReadFile(parsed.GetRequiredValue(file));
            PartsCatalog catalog = context.LoadCatalog(parsed);
            ShortlistSource source = CommandFailure.Unless(
                ShortlistFile.Read(json, from, catalog, parsed.GetValue(which), requirement));
            requirement = source.Requirement with { Builds = boards ?? source.Requirement.Builds };
            ShortlistEntry entry = CommandFailure.Unless(
                new ShortlistReviewer(catalog).Make(source.Choice, source.Support, requirement, text, Today()));
            entry = CommandFailure.Unless(ShortlistStore.Add(context.CatalogPath(parsed), list, entry), ExitStatus.NoCatalog);
            Tell(context.Surroundings.Error, list, entry, source);
            return ExitStatus.Done;
        });
        return command;
    }

    /// <summary>The day, here.</summary>
    public static DateOnly Today() => DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date);

    private static void Tell(TextWriter error, string list, ShortlistEntry entry, ShortlistSource source)
    {
        CandidateParts choice = source.Choice;
        string parts = $"{choice.Circuit.Word()}, {choice.Crystal.Id}, {choice.Amplifier.Id}";
        error.WriteLine(FormattableString.Invariant(
            $"candidate {entry.Number} of {Problem.Quote(list)}: {parts}, {entry.Builds} boards"));
        foreach (string remark in source.Remarks)
        {
            error.WriteLine(remark);
        }

        foreach (string miss in ShortlistFigures.Read(entry.Figures)?.Misses ?? [])
        {
            error.WriteLine("It does not fit: " + miss);
        }
    }

    private static Requirement ReadRequirement(CommandContext context, string path)
    {
        (string json, string from) = context.ReadFile(path);
        return CommandFailure.Unless(RequirementFile.Read(json, from));
    }

    private static string? NoteOf(string? text, string option) => string.IsNullOrWhiteSpace(text) ? null
        : text.Length <= 1000 && !text.Any(sign => char.IsControl(sign) || char.IsSurrogate(sign)) ? text.Trim()
        : throw new CommandFailure(
            new Problem(option, $"{Problem.Quote(text)} is no note", "one line of at most 1000 letters"), ExitStatus.WrongInput);
}
