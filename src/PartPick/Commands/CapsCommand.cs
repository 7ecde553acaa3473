using System.Collections.Immutable;
using System.CommandLine;
using PartPick.Output;
using PartPick.Physics;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Commands;

/// <summary><c>partpick caps</c>: nearest-standard load capacitors without any catalogue.</summary>
internal static class CapsCommand
{
    private const string Examples =
        """
        partpick caps --load 18p --stray 4p --series E24
        partpick caps --load 12.5p --pin-stray 3p --parallel --top 5
        partpick caps --crystal crystal.json --stray 4p --format csv
        CL = C1 C2/(C1 + C2) + Cs, with the stray Cs as one figure, 2 to 7 pF on most boards. Where the stray Cp at each
        pin is known, --pin-stray adds it to each capacitor: CL = (C1 + Cp)(C2 + Cp)/(C1 + C2 + 2 Cp) + Cs.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var load = new Option<string?>("--load") { Description = "Wanted load capacitance; else the crystal's", HelpName = "VALUE" };
        var stray = new Option<string?>("--stray") { Description = "Stray capacitance as one figure (0)", HelpName = "VALUE" };
        var pin = new Option<string?>("--pin-stray") { Description = "Stray capacitance at each pin to ground (0)", HelpName = "VALUE" };
        var series = new Option<string>("--series")
        {
            Description = "Series of preferred values",
            HelpName = "NAME",
            DefaultValueFactory = _ => "E24",
        };
        var parallel = new Option<bool>("--parallel") { Description = "Allow two capacitors in parallel at each side" };
        var top = new Option<string?>("--top") { Description = "Number of pairs (10)", HelpName = "N" };
        var crystal = new Option<string?>("--crystal")
        {
            Description = "A crystal file (the keys of a circuit file's crystal): adds the frequency in ppm",
            HelpName = "FILE",
        };
        var command = new Command("caps", "Finds the load capacitors of a series that come nearest to a load, with the strays.")
        {
            load, stray, pin, series, parallel, top, crystal, context.Format,
        };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed =>
        {
            Crystal? known = parsed.GetValue(crystal) is { } path ? ReadCrystal(context, parsed, path) : null;
            double? given = Capacitance(parsed.GetValue(load), load.Name);
            var request = new LoadPairRequest
            {
                LoadFarads = given ?? known?.LoadFarads ?? throw Missing(load.Name, known),
                StrayFarads = Capacitance(parsed.GetValue(stray), stray.Name) ?? 0,
                PinStrayFarads = Capacitance(parsed.GetValue(pin), pin.Name) ?? 0,
                Series = CommandFailure.Unless(PreferredSeries.Named(parsed.GetValue(series), series.Name)),
                Parallel = parsed.GetValue(parallel),
                Top = Counts.Read(parsed.GetValue(top), top.Name) ?? 10,
                Crystal = known,
            };
            return Run(context, parsed, request);
        });
        return command;
    }

    private static int Run(CommandContext context, ParseResult parsed, LoadPairRequest request)
    {
        if (request.LoadFarads == 0 || request.LoadFarads > 1e-6)
        {
            throw new CommandFailure(
                new Problem("--load", "is no load of a crystal", "a capacitance above zero and up to 1 uF such as 18 pF"),
                ExitStatus.WrongInput);
        }

        ImmutableArray<LoadPair> pairs = LoadCapacitorPairs.Find(request);
        if (pairs.IsEmpty || request.ExactFarads <= 0)
        {
            throw new CommandFailure(
                new Problem(
                    request.StrayFarads > 0 || request.PinStrayFarads == 0 ? "--stray" : "--pin-stray",
                    "the strays alone make the load or more",
                    "strays that leave room for capacitors"),
                ExitStatus.WrongInput);
        }

        CapsOutput.Write(context.Output, context.FormatOf(parsed), request, pairs);
        return ExitStatus.Done;
    }

    private static Crystal ReadCrystal(CommandContext context, ParseResult parsed, string path)
    {
        (string text, string name) = context.ReadFile(path);
        return CommandFailure.Unless(
            CrystalFile.Read(text, name, CrystalFile.NamesPart(text) ? context.LoadCatalog(parsed) : null));
    }

    private static double? Capacitance(string? text, string option) =>
        text is null ? null : CommandFailure.Unless(ValueText.Parse(text, Dimension.Capacitance, option));

    private static CommandFailure Missing(string option, Crystal? known) => new(
        new Problem(
            option,
            known is null ? "is missing" : "is missing, and the crystal is stated at series resonance",
            "a capacitance such as 18 pF"),
        ExitStatus.WrongInput);
}
