using System.CommandLine;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick shortlist remove</c>: takes a candidate off a list.</summary>
internal static class ShortlistRemoveCommand
{
    private const string Examples =
        """
        partpick shortlist remove logger 2
        partpick shortlist remove logger --all
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var name = new Argument<string>("NAME") { Description = "The list" };
        var number = new Argument<string?>("NUMBER")
        {
            Description = "The number of a candidate, as shortlist list shows it",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var all = new Option<bool>("--all") { Description = "The whole list" };
        var command = new Command("remove", "Takes a candidate off a list, or a list away.") { name, number, all };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            string list = CommandFailure.Unless(ShortlistName.Read(parsed.GetRequiredValue(name)));
            int? which = Counts.Read(parsed.GetValue(number), number.Name);
            if (which is null != parsed.GetValue(all))
            {
                throw new CommandFailure(
                    new Problem(
                        number.Name, which is null ? "is missing" : "is given beside --all",
                        "the number of a candidate, or --all for the whole list"),
                    ExitStatus.WrongInput);
            }

            Result<int> gone = ShortlistStore.Remove(context.CatalogPath(parsed), list, which);
            int count = CommandFailure.Unless(
                gone, gone.Problem?.Where is "NAME" or "NUMBER" ? ExitStatus.WrongInput : ExitStatus.NoCatalog);
            context.Surroundings.Error.WriteLine(FormattableString.Invariant(
                $"{count} {(count == 1 ? "candidate" : "candidates")} taken off {Problem.Quote(list)}"));
            return ExitStatus.Done;
        });
        return command;
    }
}
