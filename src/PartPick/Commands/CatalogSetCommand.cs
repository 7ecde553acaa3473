using System.CommandLine;
using PartPick.Catalog;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick catalog set</c>: sets figures of a part by hand.</summary>
internal static class CatalogSetCommand
{
    private const string Examples =
        """
        partpick catalog set ID resistance=45 note="measured on 5 pieces"
        partpick catalog set ID motional=          the figure is taken away
        partpick catalog set ID --back resistance  the supplied figure counts again
        partpick catalog set ID excluded=yes       the part is kept out of every search
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var id = new Argument<string>("ID") { Description = "The id of a part" };
        var changes = new Argument<string[]>("KEY=VALUE") { Description = "Figures with their units", Arity = ArgumentArity.ZeroOrMore };
        var back = new Option<string[]>("--back")
        {
            Description = "A figure whose supplied value is to count again; may be repeated",
            HelpName = "KEY",
            DefaultValueFactory = _ => [],
        };
        var command = new Command("set", "Sets figures of a part by hand; no import changes them.") { id, changes, back };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            (string, string?)[] all =
            [
                .. (parsed.GetValue(changes) ?? []).Select(Change), .. (parsed.GetValue(back) ?? []).Select(key => (key, (string?)null)),
            ];
            if (all.Length == 0)
            {
                throw new CommandFailure(new Problem(changes.Name, "is missing", "a figure such as resistance=45"), ExitStatus.WrongInput);
            }

            string catalog = context.CatalogPath(parsed);
            Result<Part> part = CatalogEdit.Set(
                catalog, parsed.GetRequiredValue(id), all, DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date));
            bool ofCatalog = !part.IsOk && part.Problem.Where == Path.GetFullPath(catalog);
            CommandFailure.Unless(part, ofCatalog ? ExitStatus.NoCatalog : ExitStatus.WrongInput);
            return ExitStatus.Done;
        });
        return command;
    }

    private static (string Key, string? Value) Change(string text)
    {
        int equals = text.IndexOf('=', StringComparison.Ordinal);
        return equals > 0
            ? (text[..equals].Trim(), text[(equals + 1)..])
            : throw new CommandFailure(
                new Problem("KEY=VALUE", $"{Problem.Quote(text)} sets nothing", "a figure such as resistance=45"), ExitStatus.WrongInput);
    }
}
