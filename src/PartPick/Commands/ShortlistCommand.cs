using System.CommandLine;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist</c>: candidates that were chosen, and what to order for them.</summary>
internal static class ShortlistCommand
{
    /// <summary>Builds the command with all that it can do.</summary>
    public static Command Build(CommandContext context) => new(
        "shortlist", "Keeps chosen candidates on named lists, and orders their parts.")
    {
        ShortlistAddCommand.Build(context),
        ShortlistListCommand.Build(context),
        ShortlistRemoveCommand.Build(context),
        ShortlistAlternatesCommand.Build(context),
        ShortlistExportCommand.Build(context),
    };
}
