using System.Collections.Immutable;
using System.CommandLine;
using System.Globalization;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary>What is asked of the alternates of a list.</summary>
/// <param name="List">Name of the list.</param>
/// <param name="Number">Number of the candidate; null for all.</param>
/// <param name="Parts">The parts that are to be replaced; all where none is named.</param>
/// <param name="SamePackage">Whether only parts of the same package are wanted.</param>
/// <param name="Gone">The part that cannot be had; null where replacements are wanted.</param>
/// <param name="Equal">Whether equal parts cannot be had either.</param>
/// <param name="Quantities">Whether cost and choice over the number of boards are wanted.</param>
/// <param name="Builds">The numbers of boards of the table; empty for the usual ones.</param>
/// <param name="ChosenOnly">Whether nothing is ranked.</param>
/// <param name="Top">Most lines; null for the usual number.</param>
/// <param name="Quiet">Whether no progress is shown.</param>
internal sealed record AlternatesWish(
    string List,
    int? Number,
    ImmutableArray<string> Parts,
    bool SamePackage,
    string? Gone,
    bool Equal,
    bool Quantities,
    ImmutableArray<int> Builds,
    bool ChosenOnly,
    int? Top,
    bool Quiet);

/// <summary>The arguments and options of <c>partpick shortlist alternates</c>.</summary>
internal sealed class AlternatesArguments
{
    private const int MostBuilds = 10_000;

    private readonly Argument<string> _name = new("NAME") { Description = "The list" };

    private readonly Argument<string?> _number = new("NUMBER")
    {
        Description = "The number of a candidate, as shortlist list shows it; all without",
        Arity = ArgumentArity.ZeroOrOne,
    };

    private readonly Option<string[]> _part = new("--part")
    {
        Description = "Only this part: designator, what it is, or id; may be given several times",
        HelpName = "PART",
        Arity = ArgumentArity.OneOrMore,
        AllowMultipleArgumentsPerToken = false,
    };

    private readonly Option<bool> _samePackage = new("--same-package") { Description = "Only parts of the package that they replace" };

    private readonly Option<string?> _gone = new("--gone")
    {
        Description = "This part cannot be had: rank what else meets the requirement, keeping crystal or amplifier",
        HelpName = "PART",
    };

    private readonly Option<bool> _equal = new("--equal") { Description = "With --gone: parts equal to it cannot be had either" };

    private readonly Option<string?> _builds = new("--builds")
    {
        Description = "Cost per unit and best candidate over 1 to 10 000 boards; with numbers, the rows of the table",
        HelpName = "N,N,...",
        Arity = ArgumentArity.ZeroOrOne,
    };

    private readonly Option<bool> _chosenOnly = new("--chosen-only")
    {
        Description = "With --builds: only what the chosen circuit costs; nothing is ranked",
    };

    private readonly Option<string?> _top = new("--top")
    {
        Description = "Most replacements of a part (5), or candidates (10)",
        HelpName = "N",
    };

    private readonly Option<bool> _quiet = new("--no-progress") { Description = "Show no progress" };

    /// <summary>Adds them to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_name);
        command.Add(_number);
        foreach (Option option in new Option[] { _part, _samePackage, _gone, _equal, _builds, _chosenOnly, _top, _quiet })
        {
            command.Add(option);
        }
    }

    /// <summary>What was asked, or the end of the command with wrong input.</summary>
    public AlternatesWish Read(ParseResult parsed)
    {
        bool quantities = parsed.GetResult(_builds) is { Implicit: false };
        var wish = new AlternatesWish(
            CommandFailure.Unless(ShortlistName.Read(parsed.GetRequiredValue(_name))),
            Counts.Read(parsed.GetValue(_number), _number.Name),
            [.. parsed.GetValue(_part) ?? []],
            parsed.GetValue(_samePackage),
            parsed.GetValue(_gone),
            parsed.GetValue(_equal),
            quantities,
            quantities ? Numbers(parsed.GetValue(_builds)) : [],
            parsed.GetValue(_chosenOnly),
            Counts.Read(parsed.GetValue(_top), _top.Name),
            parsed.GetValue(_quiet));
        Refuse(wish.Gone is not null && quantities, _builds.Name, "does not go with --gone", "one of the two");
        Refuse(wish.Gone is not null && !wish.Parts.IsEmpty, _part.Name, "does not go with --gone", "one of the two");
        Refuse(quantities && !wish.Parts.IsEmpty, _part.Name, "does not go with --builds", "one of the two");
        Refuse(wish.Equal && wish.Gone is null, _equal.Name, "says nothing without --gone", "--gone PART --equal");
        Refuse(wish.ChosenOnly && !quantities, _chosenOnly.Name, "says nothing without --builds", "--builds --chosen-only");
        Refuse(
            wish.SamePackage && (quantities || wish.Gone is not null),
            _samePackage.Name, "goes with replacements only", "no --gone and no --builds");
        return wish;
    }

    private ImmutableArray<int> Numbers(string? text)
    {
        if (text is null)
        {
            return [];
        }

        var numbers = new SortedSet<int>();
        foreach (string word in text.Split(',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))
        {
            Refuse(
                !int.TryParse(word, NumberStyles.None, CultureInfo.InvariantCulture, out int builds) || builds is < 1 or > MostBuilds,
                _builds.Name,
                $"{Problem.Quote(word)} is no number of boards",
                $"whole numbers from 1 to {Figures.Whole(MostBuilds)} such as 50,75,300");
            numbers.Add(builds);
        }

        Refuse(numbers.Count == 0, _builds.Name, "holds no number", "whole numbers such as 50,75,300");
        return [.. numbers];
    }

    private static void Refuse(bool wrong, string where, string what, string fits)
    {
        if (wrong)
        {
            throw new CommandFailure(new Problem(where, what, fits), ExitStatus.WrongInput);
        }
    }
}
