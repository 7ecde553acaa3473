using System.CommandLine;
using PartPick.Catalog;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Values;
using PartPick.WhyNot;

namespace PartPick.Commands;

/// <summary><c>partpick rank --why-not</c>: says why a part is not in the list.</summary>
internal static class WhyNotRun
{
    /// <summary>Finds the answer and prints it.</summary>
    /// <returns>0 where the part fits, 1 where it does not.</returns>
    public static int Of(CommandContext context, ParseResult parsed, Requirement requirement, string id, string option, bool quiet)
    {
        string path = context.CatalogPath(parsed);
        var desk = new WhyNotDesk(path);
        CommandFailure.Unless(CatalogReading.Undoable(path), ExitStatus.NoCatalog);
        Part part = CommandFailure.Unless(desk.Find(id, option), ExitStatus.WrongInput);
        var progress = quiet || !context.Surroundings.ErrorIsTerminal ? null : new LineProgress(context.Surroundings.Error);
        Result<WhyNotAnswer> answer;
        try
        {
            answer = desk.Ask(requirement, part.Id, progress, context.Surroundings.Cancellation);
        }
        finally
        {
            progress?.Clear();
        }

        WhyNotOutput.Write(context.Output, context.FormatOf(parsed), CommandFailure.Unless(answer, ExitStatus.NoCatalog));
        return answer.Value.Fits ? ExitStatus.Done : ExitStatus.NothingFits;
    }

    private sealed class LineProgress(TextWriter error) : IProgress<string>
    {
        private int _width;

        public void Report(string value)
        {
            error.Write("\r" + value.PadRight(_width));
            _width = value.Length;
        }

        public void Clear() => error.Write("\r" + new string(' ', _width) + "\r");
    }
}
