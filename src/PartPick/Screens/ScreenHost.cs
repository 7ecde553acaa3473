using PartPick.Catalog;
using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Opens the terminal interface.</summary>
public static class ScreenHost
{
    private static readonly TimeSpan ReadingTime = TimeSpan.FromMilliseconds(300);
    private static readonly TimeSpan WritingTime = TimeSpan.FromSeconds(60);

    private const string WithoutScreens = "the commands work without one (partpick --help)";

    /// <summary>Runs the terminal interface until it is left.</summary>
    /// <param name="catalogPath">Path of the catalogue's file.</param>
    /// <param name="requirementPath">A requirement file to begin with; null to go on with the one that was kept.</param>
    /// <param name="ascii">Whether to draw with ASCII signs alone, whatever the locale says.</param>
    /// <returns>0; 2 where there is no fit terminal or the file is wrong; 3 where the catalogue cannot be used.</returns>
    public static int Run(string catalogPath, string? requirementPath, bool ascii = false)
    {
        if (Console.IsInputRedirected || Console.IsOutputRedirected)
        {
            return Fail(ExitStatus.WrongInput, "the screens need a terminal; " + WithoutScreens);
        }

        TerminalTraits traits = TerminalTraits.Of(Environment.GetEnvironmentVariable);
        if (!traits.CanPlace)
        {
            string name = traits.Name.Length == 0 ? "none is named in TERM" : $"TERM names {Problem.Quote(traits.Name)}";
            return Fail(ExitStatus.WrongInput, $"the screens need a terminal that can place the cursor, and {name}; {WithoutScreens}");
        }

        try
        {
            return Open(catalogPath, requirementPath, ascii ? traits with { IsUtf8 = false } : traits);
        }
        catch (Exception error)
        {
            // The terminal is back as it was: what went wrong is one line below the prompt.
            return Fail(ExitStatus.Fault, $"a fault of the program: {error.GetType().Name}: {error.Message}");
        }
    }

    private static int Open(string catalogPath, string? requirementPath, TerminalTraits traits)
    {
        Result<ImportNote?> probe = CatalogReading.Undoable(catalogPath);
        if (!probe.IsOk)
        {
            return Fail(ExitStatus.NoCatalog, probe.Problem.ToString());
        }

        // A small catalogue is read in this time, and any problem of it is said before the screen opens.
        var ranking = new CatalogRanking(new PartsOnDemand(new StoredParts(catalogPath)));
        Task<Result<bool>> opening = ranking.Open();
        using IScreenLoop loop = IScreenLoop.Prepare(traits);
        if (opening.Wait(ReadingTime) && opening.GetAwaiter().GetResult() is { IsOk: false } failed)
        {
            return Fail(ExitStatus.NoCatalog, failed.Problem.ToString());
        }

        var keeper = new RequirementKeeper(catalogPath);
        Result<Requirement?> start = requirementPath is null ? keeper.Recall() : ReadFile(requirementPath);
        if (!start.IsOk && requirementPath is not null)
        {
            return Fail(ExitStatus.WrongInput, start.Problem.ToString());
        }

        string? notice = !start.IsOk ? "! " + start.Problem
            : start.Value is null ? "A river-level logger, as an example: press e to change it, ? for all keys."
            : null;
        var run = new TerminalRun(catalogPath, ranking, traits, requirement => keeper.Keep(requirement), opening);
        Requirement end = run.Show(
            loop, start.ValueOr(null) ?? FirstRequirement.RiverLogger, notice, new CatalogDesk(catalogPath),
            new KeptRequirementStore(catalogPath));
        if (!run.Finish(WritingTime))
        {
            return Fail(ExitStatus.NoCatalog, "what was put on a list at the end was not written in time; look at the list");
        }

        return keeper.Keep(end) is { } problem ? Fail(ExitStatus.NoCatalog, problem.ToString()) : ExitStatus.Done;
    }

    private static Result<Requirement?> ReadFile(string path)
    {
        try
        {
            return RequirementFile.Read(File.ReadAllText(path), path).Map<Requirement?>(requirement => requirement);
        }
        catch (Exception error) when (error is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            return Result.Fail<Requirement?>(path, "cannot be read: " + error.Message, "a requirement file");
        }
    }

    private static int Fail(int status, string line)
    {
        Console.Error.WriteLine("partpick: " + line.ReplaceLineEndings(" "));
        return status;
    }
}
