using System.CommandLine;
using PartPick.Output;
using PartPick.Selection;

namespace PartPick.Commands;

/// <summary><c>partpick rank</c>: ranks combinations of the catalogue's parts for a requirement.</summary>
internal static class RankCommand
{
    private const string Examples =
        """
        partpick rank requirement.json
        partpick rank requirement.json --top 5 --budget "50 ppm" --circuits gate counter
        partpick rank --output "1 kHz" --supply "4.5 V..5.5 V" --temperature -10..50 --format json
        partpick rank requirement.json --why-not X-04M096-18-H49-10
        A requirement file: { "output": "1 kHz", "waveform": "square", "budget": "80 ppm", "supply": ["4.5 V", "5.5 V"],
          "temperature": [-10, 50], "years": 5, "margin": 5, "builds": 200, "costLimit": 2.50, "board": "two-layer" }
        Only output is needed. Any key may be given as an option, which then counts instead of the file's.
        Exit status: 0 done, 1 nothing fits (the nearest misses are printed) or the part of --why-not does not, 2 wrong input,
        3 the catalogue cannot be used.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string?>("REQUIREMENT.json")
        {
            Description = "The requirement; - for standard input; may be left out where --output is given",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var top = new Option<string?>("--top") { Description = "Most candidates to list (50)", HelpName = "N" };
        var front = new Option<bool>("--front")
        {
            Description = "The front alone: candidates that no other beats on error, margin and cost",
        };
        var all = new Option<bool>("--all") { Description = "Every fit candidate, not only the best of each group" };
        var whyNot = new Option<string?>("--why-not")
        {
            Description = "Why a crystal or an amplifier is not in the list, and what change would let it in", HelpName = "ID",
        };
        var quiet = new Option<bool>("--no-progress") { Description = "Show no progress" };
        var command = new Command("rank", "Ranks the combinations of parts that fit a requirement, best first.")
        {
            file, top, front, all, whyNot, quiet, context.Format,
        };
        (RequirementKey Key, Option<string?> Option)[] keys = [.. RequirementKeys.All.Select(key => (key, OptionOf(key)))];
        foreach ((_, Option<string?> option) in keys)
        {
            command.Add(option);
        }

        HelpFooter.AddTo(command, "Examples", Examples);
        HelpFooter.AddTo(command, "Cautions", HelpFooter.Cautions);
        command.SetAction(parsed =>
        {
            string? path = parsed.GetValue(file);
            (string? text, string name) = path is null ? (null, "command line") : context.ReadFile(path);
            RequirementOption[] options =
            [
                .. keys.Where(key => parsed.GetResult(key.Option) is not null)
                    .Select(key => new RequirementOption(key.Key, parsed.GetValue(key.Option))),
            ];
            Requirement requirement = CommandFailure.Unless(RequirementFile.Read(text, name, options));
            if (parsed.GetValue(whyNot) is { } id)
            {
                return WhyNotRun.Of(context, parsed, requirement, id, whyNot.Name, parsed.GetValue(quiet));
            }

            var wanted = new RankingOptions
            {
                Top = Counts.Read(parsed.GetValue(top), top.Name) ?? (parsed.GetValue(all) ? null : 50),
                Front = parsed.GetValue(front),
                All = parsed.GetValue(all),
            };
            return Run(context, parsed, requirement, wanted, parsed.GetValue(quiet));
        });
        return command;
    }

    private static int Run(
        CommandContext context, ParseResult parsed, Requirement requirement, RankingOptions options, bool quiet)
    {
        RankingResult result = Rank(context, parsed, requirement, options, quiet);
        var view = new RankView(result, context.Surroundings.UsesColour);
        switch (context.FormatOf(parsed))
        {
            case OutputFormat.Json:
                JsonOutput.Write(context.Output, RankJson.Of(view));
                break;
            case OutputFormat.Csv:
                RankCsv.Write(context.Output, view);
                break;
            default:
                RankTable.Write(context.Output, view);
                break;
        }

        return result.Candidates.IsEmpty ? ExitStatus.NothingFits : ExitStatus.Done;
    }

    /// <summary>Ranks the parts of the catalogue, with its progress on a terminal.</summary>
    internal static RankingResult Rank(
        CommandContext context, ParseResult parsed, Requirement requirement, RankingOptions options, bool quiet)
    {
        var parts = new PartsOnDemand(new Catalog.StoredParts(context.CatalogPath(parsed)));
        CommandFailure.Unless(parts.Open(context.Surroundings.Cancellation), ExitStatus.NoCatalog);
        return RankingProgress.Over(context.Surroundings, quiet, progress => Rank(context, requirement, parts, options, progress));
    }

    private static RankingResult Rank(
        CommandContext context, Requirement requirement, PartsOnDemand parts, RankingOptions options, IProgress<RankingResult>? progress)
    {
        try
        {
            return Ranker.Rank(requirement, parts, options, progress, context.Surroundings.Cancellation);
        }
        catch (PartsUnreadableException unreadable)
        {
            throw new CommandFailure(unreadable.Problem, ExitStatus.NoCatalog);
        }
    }

    private static Option<string?> OptionOf(RequirementKey key)
    {
        string[] aliases = key.Hyphenated == key.Name ? [] : ["--" + key.Hyphenated];
        return new Option<string?>("--" + key.Name, aliases)
        {
            Description = char.ToUpperInvariant(key.Fits[0]) + key.Fits[1..],
            HelpName = "VALUE",
        };
    }
}
