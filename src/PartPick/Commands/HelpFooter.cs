using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace PartPick.Commands;

/// <summary>Adds examples or cautions to the end of a command's help.</summary>
internal sealed class HelpFooter(CommandLineAction inner, Command owner, string title, string text) : SynchronousCommandLineAction
{
    /// <summary>What no calculation replaces.</summary>
    public const string Cautions =
        "A signal that is radiated needs a licence where the law says so. Timing on which safety depends needs a review by a\n"
        + "qualified person. Local codes come first.";

    /// <inheritdoc/>
    public override bool ClearsParseErrors => true;

    /// <summary>Adds a footer to the help of a command.</summary>
    /// <param name="command">The command.</param>
    /// <param name="title">Its title.</param>
    /// <param name="text">Its lines.</param>
    public static void AddTo(Command command, string title, string text)
    {
        HelpOption? help = command.Options.OfType<HelpOption>().FirstOrDefault();
        if (help is null)
        {
            help = new HelpOption();
            command.Add(help);
        }

        help.Action = new HelpFooter((CommandLineAction)help.Action!, command, title, text);
    }

    /// <inheritdoc/>
    public override int Invoke(ParseResult parseResult)
    {
        int status = ((SynchronousCommandLineAction)inner).Invoke(parseResult);
        if (parseResult.CommandResult.Command == owner)
        {
            TextWriter output = parseResult.InvocationConfiguration.Output;
            output.WriteLine(title + ":");
            foreach (string line in text.Split('\n'))
            {
                output.WriteLine("  " + line);
            }

            output.WriteLine();
        }

        return status;
    }
}
