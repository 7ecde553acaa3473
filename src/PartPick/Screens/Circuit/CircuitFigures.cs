using System.Collections.Immutable;
using PartPick.Physics;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The nominal figures of a circuit, two in a row.</summary>
internal static class CircuitFigures
{
    public static ImmutableArray<Line> Draw(Candidate candidate, Glyphs glyphs)
    {
        (string Name, string Text)[] figures = [.. Of(candidate)];
        var lines = ImmutableArray.CreateBuilder<Line>();
        string supply = ValueText.Format(candidate.Nominal.SupplyVolts, Dimension.Voltage);
        lines.Add(CircuitPage.Heading($"Nominal figures, at {supply} and 25 °C", glyphs));
        int half = (figures.Length + 1) / 2;
        for (int i = 0; i < half; i++)
        {
            LineBuilder line = new LineBuilder(glyphs).Add(" ").Column(figures[i].Name, 23, Tone.Quiet).Column(figures[i].Text, 16);
            if (i + half < figures.Length)
            {
                line.Column(figures[i + half].Name, 23, Tone.Quiet).Add(figures[i + half].Text);
            }

            lines.Add(line.Build());
        }

        lines.Add(Line.Empty);
        return lines.ToImmutable();
    }

    private static IEnumerable<(string Name, string Text)> Of(Candidate candidate)
    {
        StartUp start = candidate.Result.StartUp;
        SteadyState? steady = candidate.Result.Steady;
        yield return ("output frequency", Text(candidate.OutputHz, Dimension.Frequency, 8));
        yield return ("frequency at crystal", Text(steady?.FrequencyHz, Dimension.Frequency, 8));
        yield return ("load capacitance", Text(steady?.LoadFarads, Dimension.Capacitance, 4));
        yield return ("motional current, rms", Text(steady?.CurrentRmsAmps, Dimension.Current));
        yield return ("drive level", Text(steady?.DriveWatts, Dimension.Power));
        yield return ("output swing, p-p", Text(steady?.OutputSwingVolts, Dimension.Voltage));
        yield return ("emitter current, DC", Text(candidate.Result.EmitterCurrentAmps, Dimension.Current));
        yield return ("start", Start(candidate.Result.Start));
        yield return ("start-up margin", Figures.Three(start.Margin));
        yield return ("running margin", Figures.Three(candidate.Result.RunningMargin));
        yield return ("negative resistance", Text(start.NegativeResistanceOhms, Dimension.Resistance));
        yield return ("gain margin", start.GainMargin is { } gain ? Figures.Three(gain) : "-");
        yield return ("transconductance", Text(start.TransconductanceSiemens, Dimension.Transconductance));
        yield return ("  starts from", Text(start.CriticalSiemens, Dimension.Transconductance));
        yield return ("  starts up to", Text(start.UpperSiemens, Dimension.Transconductance));
        yield return ("start-up time", Text(candidate.Result.StartUpTimeSeconds, Dimension.Time));
    }

    private static string Start(StartKind start) => start switch
    {
        StartKind.BuildsUp => "builds up",
        StartKind.NeedsDisturbance => "needs a disturbance",
        _ => "does not start",
    };

    private static string Text(double? value, Dimension dimension, int digits = 3) =>
        value is { } number ? ValueText.Format(number, dimension, digits) : "-";
}
