using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Physics;
using PartPick.Selection;

namespace PartPick.Commands;

/// <summary><c>partpick check</c>: analyses one given circuit.</summary>
internal static class CheckCommand
{
    private const string Examples =
        """
        partpick check circuit.json
        partpick check circuit.json --working
        partpick check - --format json < circuit.json
        A circuit file: { "circuit": "gate", "supply": "5 V", "c1": "22 pF", "c2": "22 pF", "rs": "220", "rf": "1M",
          "crystal": { "frequency": "4 MHz", "load": "18 pF", "shunt": "5 pF", "motional": "12 fF", "resistance": "100" },
          "amplifier": { "gm": "10 mS", "ro": "2k", "cin": "3 pF", "cout": "5 pF" },
          "strays": { "input": "3 pF", "output": "3 pF", "across": "1 pF" } }
        circuit is gate, counter, port or follower; crystal and amplifier may be { "part": "ID" } of the catalogue.
        Exit status: 0 done, 1 the circuit does not start, 2 wrong input, 3 the catalogue cannot be used.
        """;

    /// <summary>Builds the command.</summary>
    public static Command Build(CommandContext context)
    {
        var file = new Argument<string>("CIRCUIT.json") { Description = "The circuit; - for standard input" };
        var working = new Option<bool>("--working") { Description = "Print every formula with its numbers and its source" };
        var command = new Command("check", "Analyses one given circuit: start, frequency, drive level, load and warnings.")
        {
            file, working, context.Format,
        };
        HelpFooter.AddTo(command, "Examples", Examples);
        command.SetAction(parsed => Run(context, parsed, parsed.GetRequiredValue(file), parsed.GetValue(working)));
        return command;
    }

    private static int Run(CommandContext context, ParseResult parsed, string path, bool working)
    {
        (string text, string name) = context.ReadFile(path);
        PartsCatalog? catalog = CircuitFile.NamesParts(text) ? context.LoadCatalog(parsed) : null;
        CircuitDescription description = CommandFailure.Unless(CircuitFile.Read(text, name, catalog));
        OscillatorResult result = OscillatorAnalysis.Analyse(description.Circuit);
        CheckOutput.Write(context.Output, context.FormatOf(parsed), description, result, working);
        return result.Start == StartKind.None ? ExitStatus.NothingFits : ExitStatus.Done;
    }
}
