using System.CommandLine;
using PartPick.Commands;
using PartPick.Screens;
using PartPick.Values;

namespace PartPick;

/// <summary>Takes the arguments, runs the command that they name, and turns every outcome into a status and, at most, one line.</summary>
internal static class CommandLine
{
    // One line for each command.
    private static readonly Func<CommandContext, Command>[] Commands =
    [
        RankCommand.Build,
        CheckCommand.Build,
        PictureCommand.Build,
        CapsCommand.Build,
        CatalogCommand.Build,
        ShortlistCommand.Build,
    ];

    /// <summary>Runs the program.</summary>
    /// <param name="arguments">The arguments.</param>
    /// <param name="surroundings">Where it reads and writes.</param>
    /// <returns>The exit status.</returns>
    public static int Run(string[] arguments, Surroundings surroundings)
    {
        try
        {
            return Invoke(arguments, surroundings);
        }
        catch (CommandFailure failure)
        {
            return Say(surroundings, failure.Problem.ToString(), failure.Status);
        }
        catch (Exception error) when (IsStop(error))
        {
            return Say(surroundings, "stopped", ExitStatus.Stopped);
        }
        catch (IOException error)
        {
            // Files and catalogue report their own problems: what is left is an output whose reader has gone, or a full disk.
            return Say(surroundings, $"the output cannot be written: {Problem.Quote(error.Message)[1..^1]}", ExitStatus.Stopped);
        }
#pragma warning disable CA1031 // No stack trace may reach a user: this is the one place that catches everything.
        catch (Exception error)
#pragma warning restore CA1031
        {
            string what = Problem.Quote(error.Message)[1..^1];
            return Say(surroundings, $"a fault of the program, please report it: {error.GetType().Name}: {what}", ExitStatus.Fault);
        }
    }

    private static int Invoke(string[] arguments, Surroundings surroundings)
    {
        var context = new CommandContext(surroundings);
        RootCommand root = Root(context);
        ParseResult parsed = root.Parse(RequirementArguments.Gather(arguments));
        if (parsed.Errors.Count > 0)
        {
            string path = PathOf(parsed.CommandResult.Command, root);
            return Say(surroundings, $"{OneLine(parsed.Errors[0].Message)} (see {path} --help)", ExitStatus.WrongInput);
        }

        int status = parsed.Invoke(new InvocationConfiguration
        {
            Output = surroundings.Output,
            Error = surroundings.Error,
            EnableDefaultExceptionHandler = false,
        });
        surroundings.Output.Flush();
        return status;
    }

    private static RootCommand Root(CommandContext context)
    {
        var root = new RootCommand("Chooses the parts of a quartz crystal oscillator: crystal, capacitors, resistors and amplifier. "
            + "Without a command it opens the terminal interface.");
        root.Add(context.Catalog);
        foreach (Func<CommandContext, Command> build in Commands)
        {
            root.Add(build(context));
        }

        var ascii = new Option<bool>("--ascii") { Description = "Draw the terminal interface with ASCII signs alone." };
        root.Add(ascii);
        root.SetAction(parsed => ScreenHost.Run(context.CatalogPath(parsed), null, parsed.GetValue(ascii)));
        HelpFooter.AddTo(root, "Cautions", HelpFooter.Cautions);
        return root;
    }

    private static string PathOf(Command command, RootCommand root) => command == root
        ? "partpick"
        : $"{PathOf(command.Parents.OfType<Command>().FirstOrDefault() ?? root, root)} {command.Name}";

    private static int Say(Surroundings surroundings, string line, int status)
    {
        try
        {
            surroundings.Output.Flush();
        }
        catch (IOException)
        {
            // The reader of the output has gone; the line below may still be seen.
        }

        surroundings.Error.WriteLine("partpick: " + line);
        return status;
    }

    // A search on several threads may be stopped on each of them.
    private static bool IsStop(Exception error) => error is AggregateException several
        ? several.Flatten().InnerExceptions.All(inner => inner is OperationCanceledException)
        : error is OperationCanceledException;

    private static string OneLine(string text) => string.Join(' ', text.Split(default(char[]), StringSplitOptions.RemoveEmptyEntries));
}
