using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Shortlists;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick picture</c>: draws a picture of a circuit or of a ranking as SVG.</summary>
internal static class PictureCommand
{
    private const string Examples =
        """
        partpick picture requirement.json --of error --to error.svg
        partpick picture requirement.json --of scatter --candidate 3 --to candidates.svg
        partpick picture circuit.json --of schematic > schematic.svg
        error     frequency error over temperature with its band and the budget
        margin    start-up margin over supply, at the limits of device and temperature, with the wanted margin
        budget    the terms of the frequency error as bars
        growth    growth of the amplitude after switch-on
        scatter   the candidates by error and cost, the front marked
        schematic the circuit with its values
        A requirement is ranked first, as by partpick rank; a circuit, as for partpick check, has growth and schematic alone.
        Exit status: 0 done, 1 nothing fits (the nearest miss is drawn) or the circuit has no such picture, 2 wrong input,
        3 the catalogue cannot be used.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string>("FILE.json") { Description = "A requirement or a circuit; - for standard input" };
        var of = new Option<string>("--of")
        {
            Description = string.Join(", ", PictureKinds.All.Select(kind => kind.Word())), HelpName = "PICTURE", Required = true,
        };
        of.AcceptOnlyFromAmong([.. PictureKinds.All.Select(kind => kind.Word())]);
        var to = new Option<string>("--to")
        {
            Description = "The file to write; - for standard output", HelpName = "FILE.svg", DefaultValueFactory = _ => "-",
        };
        var candidate = new Option<string>("--candidate")
        {
            Description = "Which candidate: its number in the ranking, or its id", HelpName = "N", DefaultValueFactory = _ => "1",
        };
        var force = new Option<bool>("--force") { Description = "Replace FILE.svg where it is there" };
        var quiet = new Option<bool>("--no-progress") { Description = "Show no progress" };
        var command = new Command("picture", "Draws a picture of a circuit or of a ranking as SVG.") { file, of, to, candidate, force, quiet };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            PictureKind kind = PictureKinds.All.First(each => each.Word() == parsed.GetRequiredValue(of));
            string path = parsed.GetValue(to)!;
            var target = new ExportTarget(path, parsed.GetValue(force), to.Name, path == "-" ? "" : context.CatalogPath(parsed));
            Check(target);
            (string text, string name) = context.ReadFile(parsed.GetRequiredValue(file));
            (string svg, int status) = CircuitPicture.IsCircuit(text)
                ? OfCircuit(context, parsed, kind, text, name)
                : OfRequirement(context, parsed, kind, parsed.GetValue(candidate)!, parsed.GetValue(quiet), text, name);
            Write(context, target, svg);
            return status;
        });
        return command;
    }

    private static (string Svg, int Status) OfCircuit(
        CommandContext context, ParseResult parsed, PictureKind kind, string text, string name)
    {
        if (kind is not (PictureKind.Growth or PictureKind.Schematic))
        {
            throw new CommandFailure(
                new Problem("--of", $"{Problem.Quote(kind.Word())} needs a requirement, and {name} is a circuit", "growth or schematic"),
                ExitStatus.WrongInput);
        }

        PartsCatalog? catalog = CircuitFile.NamesParts(text) ? context.LoadCatalog(parsed) : null;
        CircuitDescription description = CommandFailure.Unless(CircuitFile.Read(text, name, catalog));
        return (CommandFailure.Unless(CircuitPicture.Of(kind, description, name, context.Surroundings.Cancellation), ExitStatus.NothingFits),
            ExitStatus.Done);
    }

    private static (string Svg, int Status) OfRequirement(
        CommandContext context, ParseResult parsed, PictureKind kind, string which, bool quiet, string text, string name)
    {
        Requirement requirement = CommandFailure.Unless(RequirementFile.Read(text, name));
        RankingResult result = RankCommand.Rank(context, parsed, requirement, new RankingOptions(), quiet);
        Candidate candidate = CommandFailure.Unless(Find(result, which), result.Candidates.IsEmpty ? ExitStatus.NothingFits : ExitStatus.WrongInput);
        Result<Chart>? chart = Chart(kind, candidate, result, context.Surroundings.Cancellation);
        if (chart is { Problem: { } problem })
        {
            throw new CommandFailure(problem, ExitStatus.NothingFits);
        }

        return (PictureSvg.Of(kind, candidate, requirement, chart), candidate.IsFit ? ExitStatus.Done : ExitStatus.NothingFits);
    }

    private static Result<Chart>? Chart(PictureKind kind, Candidate candidate, RankingResult result, CancellationToken stop) => kind switch
    {
        PictureKind.Error => ErrorOverTemperature.Of(candidate, result.Requirement),
        PictureKind.Margin => MarginOverSupply.Of(candidate, result.Requirement, stop),
        PictureKind.Growth => GrowthAfterSwitchOn.Of(candidate, stop),
        PictureKind.Scatter => ErrorAgainstCost.Of(result, candidate),
        _ => null,
    };

    private static Result<Candidate> Find(RankingResult result, string which)
    {
        Candidate[] listed = [.. result.Candidates.IsEmpty ? result.NearestMisses : result.Candidates];
        Candidate? found = int.TryParse(which, System.Globalization.CultureInfo.InvariantCulture, out int number)
            ? listed.ElementAtOrDefault(number - 1)
            : listed.FirstOrDefault(candidate => candidate.Id == which);
        return found is not null
            ? Result.Ok(found)
            : Result.Fail<Candidate>(
                "--candidate", $"{Problem.Quote(which)} is not in the ranking",
                listed.Length == 0 ? "a requirement that some circuit fits" : FormattableString.Invariant($"a number from 1 to {listed.Length}, or an id"));
    }

    // A ranking takes its time: what cannot be written is said before it.
    private static void Check(ExportTarget target)
    {
        if (target.Path != "-"
            && PictureFile.Check(target.Path, target.Replaces, target.Where, "another name, or --force to replace it") is { } problem)
        {
            throw new CommandFailure(problem, ExitStatus.WrongInput);
        }
    }

    private static void Write(CommandContext context, ExportTarget target, string svg)
    {
        if (target.Path == "-")
        {
            context.Output.Write(svg);
        }
        else if (ShortlistExport.Save(target, svg, mark: false) is { } problem)
        {
            throw new CommandFailure(problem, ExitStatus.WrongInput);
        }
        else
        {
            context.Surroundings.Error.WriteLine($"written to {target.Path}");
        }
    }
}
