using System.Collections.Immutable;
using System.Globalization;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>A piece of the sentence: words, or a value that can be changed.</summary>
/// <param name="Words">The words, with ~ for a space at which no line ends; empty for a value.</param>
/// <param name="Field">The value; null for words.</param>
public sealed record SentencePiece(string Words, SentenceField? Field);

/// <summary>The requirement as one sentence.</summary>
public static class Sentence
{
    /// <summary>The pieces, in the order of the sentence; the first value is the name, the second the output frequency.</summary>
    /// <param name="start">The requirement at the beginning: a board of its own stays among the choices.</param>
    /// <param name="currency">The currency of the cost limit, asked for at each drawing; empty where it is not known.</param>
    public static ImmutableArray<SentencePiece> Pieces(Requirement start, Func<string>? currency = null)
    {
        ArgumentNullException.ThrowIfNull(start);
        return
        [
            Value(Name()), Words(": "), Value(Output()), Words(" "), Value(Wave()),
            Words(", within ±"), Value(Budget()), Words(" for "), Value(Years()), Words("~years, "),
            Value(RangeFields.SupplyMin()), Words("~to~"), Value(RangeFields.SupplyMax()), Words(", "),
            Value(RangeFields.TemperatureMin()), Words("~to~"), Value(RangeFields.TemperatureMax()),
            Words(", start-up margin~"), Value(Margin()), Words(", "), Value(Start()), Words(" "), Value(StartUpTime()),
            Words(", "), Value(Builds()), Words("~boards at "), Value(Cost(currency ?? (() => ""))),
            Words(", "), Value(BoardOf(start)), Words(" board, C1,~C2~of~"), Value(Series(start)), Words(", "),
            Value(new CircuitsField()),
            Words("; error ×"), Value(Weight("weight of the error", w => w.Error, (w, v) => w with { Error = v })),
            Words(", margin ×"), Value(Weight("weight of the margin", w => w.Margin, (w, v) => w with { Margin = v })),
            Words(", cost ×"), Value(Weight("weight of the cost", w => w.Cost, (w, v) => w with { Cost = v })), Words("."),
        ];
    }

    private static SentencePiece Words(string words) => new(words, null);

    private static SentencePiece Value(SentenceField field) => new("", field);

    private static TypedField Name() => new(
        "name", "a few words: what it is for", r => r.Name.Length == 0 ? "Wanted" : r.Name, r => r.Name,
        (r, text) => Result.Ok(r with { Name = text.Trim() }), letter => char.IsLetterOrDigit(letter));

    private static TypedField Output() => TypedFields.Value(
        "output frequency", "such as 1 kHz or 4.096 MHz", Dimension.Frequency,
        r => r.OutputHz, (r, v) => r with { OutputHz = v }, (_, v) => v is > 0 and <= 1e9 ? null : "is not above 0 and up to 1 GHz");

    private static ChoiceField Wave() => new("waveform",
    [
        new('a', "any waveform", r => r.Waveform == Waveform.Any, r => r with { Waveform = Waveform.Any }),
        new('s', "square", r => r.Waveform == Waveform.Square, r => r with { Waveform = Waveform.Square }),
        new('i', "sine", r => r.Waveform == Waveform.Sine, r => r with { Waveform = Waveform.Sine }),
    ]);

    private static TypedField Budget() => TypedFields.Value(
        "frequency error", "ppm, or such as 0.01 %", Dimension.Relative,
        r => r.BudgetRatio, (r, v) => r with { BudgetRatio = v }, (_, v) => v is > 0 and < 1 ? null : "is not above 0 and below 100 %");

    private static TypedField Years() => TypedFields.Value(
        "years of service", "0 to 100", Dimension.Number,
        r => r.Years, (r, v) => r with { Years = v }, (_, v) => v <= 100 ? null : "is more than 100");

    private static TypedField Margin() => TypedFields.Value(
        "start-up margin", "5 is usual, 10 for safety", Dimension.Number,
        r => r.Margin, (r, v) => r with { Margin = v }, (_, v) => v is >= 1 and <= 1000 ? null : "is not from 1 to 1000");

    private static ChoiceField Start() => new("start",
    [
        new('s', "self-starting", r => !r.AllowDisturbance, r => r with { AllowDisturbance = false }),
        new('d', "a disturbance allowed", r => r.AllowDisturbance, r => r with { AllowDisturbance = true }),
    ]);

    private static TypedField StartUpTime() => TypedFields.Optional(
        "start-up time", "such as 50 ms, or any", Dimension.Time,
        r => r.StartUpTimeSeconds is { } time ? "within " + ValueText.FormatExact(time, Dimension.Time) : "in any time",
        r => r.StartUpTimeSeconds is { } time ? ValueText.FormatExact(time, Dimension.Time) : "any",
        (r, v) => r with { StartUpTimeSeconds = v });

    private static TypedField Builds() => TypedFields.Value(
        "boards", "a whole number from 1", Dimension.Count,
        r => r.Builds, (r, v) => r with { Builds = (int)v }, (_, v) => v >= 1 ? null : "is below 1");

    private static TypedField Cost(Func<string> currency) => TypedFields.Optional(
        "cost limit", "for one board, such as 2.50, or any", Dimension.Number,
        r => r.CostLimit is { } cost ? $"{Figures.Money(cost)} {(currency() is { Length: > 0 } known ? known : "each")} at most" : "any cost",
        r => r.CostLimit is { } cost ? cost.ToString(CultureInfo.InvariantCulture) : "any",
        (r, v) => r with { CostLimit = v is { } cost ? (decimal)Math.Min(cost, 1e9) : null });

    private static ChoiceField BoardOf(Requirement start) => new("board", Board.Presets
        .Concat(Board.Presets.Contains(start.Board) ? [] : [start.Board])
        .Select(board => new SentenceChoice(
            board.Name.ToLowerInvariant()[0], board.Name, r => r.Board == board, r => r with { Board = board })));

    private static ChoiceField Series(Requirement start) => new("capacitor series",
        PreferredSeries.All.Where(series => series.Name is "E3" or "E6" or "E12" or "E24" || series.Name == start.CapacitorSeries)
            .Select(series => new SentenceChoice(
                series.Name[1], series.Name, r => r.CapacitorSeries == series.Name, r => r with { CapacitorSeries = series.Name })));

    private static TypedField Weight(string name, Func<Weights, double> get, Func<Weights, double, Weights> set) =>
        TypedFields.Value(
            name, "0 to 100; 0 leaves it out", Dimension.Number,
            r => get(r.Weights), (r, v) => r with { Weights = set(r.Weights, v) }, (_, v) => v <= 100 ? null : "is more than 100");
}
