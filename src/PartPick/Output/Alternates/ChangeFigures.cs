using System.Globalization;
using System.Text.Json.Nodes;
using PartPick.Selection;

namespace PartPick.Output;

/// <summary>The changes of a candidate's figures, for columns, cells and keys.</summary>
internal static class ChangeFigures
{
    /// <summary>The columns of a change.</summary>
    /// <param name="currency">Currency of the cost.</param>
    public static TextColumn[] Columns(string currency) =>
    [
        new("frequency (ppm)", true), new("error (ppm)", true), new("margin", true), new("drive (uW)", true), new("start-up (ms)", true),
        new($"cost ({currency})", true), new("change", true), new("most in"),
    ];

    /// <summary>The cells of a change, each with its sign.</summary>
    public static string[] Cells(CandidateChange change) =>
    [
        Signed(change.FrequencyRatio, 1e-6, 2),
        Signed(change.ErrorRatio, 1e-6, 2),
        Signed(change.Margin, 1, 2),
        Signed(change.DriveWatts, 1e-6, 1),
        Signed(change.StartUpSeconds, 1e-3, 2),
        Signed((double?)change.Cost, 1, 4),
        change.Size.ToString(change.Size < 10 ? "0.000" : "0.0", CultureInfo.InvariantCulture),
        change.Size == 0 ? "" : Words(change.Most),
    ];

    /// <summary>The headings of a change in files.</summary>
    public static string[] Header =>
    [
        "changeFrequency (ppm)", "changeErrorWorst (ppm)", "changeStartUpMargin", "changeDriveLevel (W)", "changeStartUpTime (s)",
        "changeCost", "changeSize", "changeMost",
    ];

    /// <summary>The cells of a change in files.</summary>
    public static string[] ExactCells(CandidateChange change) =>
    [
        Figures.Exact(change.FrequencyRatio * 1e6),
        Figures.Exact(change.ErrorRatio * 1e6),
        Figures.Exact(change.Margin),
        Figures.Exact(change.DriveWatts),
        Figures.Exact(change.StartUpSeconds),
        change.Cost?.ToString(CultureInfo.InvariantCulture) ?? "",
        Figures.Exact(change.Size),
        Key(change.Most),
    ];

    /// <summary>A change as JSON.</summary>
    public static JsonObject Json(CandidateChange change) => new()
    {
        ["frequency"] = change.FrequencyRatio * 1e6,
        ["errorWorst"] = change.ErrorRatio * 1e6,
        ["startUpMargin"] = double.IsFinite(change.Margin) ? change.Margin : null,
        ["driveLevel"] = change.DriveWatts,
        ["startUpTime"] = change.StartUpSeconds,
        ["cost"] = change.Cost,
        ["size"] = change.Size,
        ["most"] = Key(change.Most),
    };

    private static string Words(ChangedFigure figure) => figure switch
    {
        ChangedFigure.Drive => "drive level",
        ChangedFigure.StartUpTime => "start-up time",
        _ => figure.ToString().ToLowerInvariant(),
    };

    private static string Key(ChangedFigure figure) => figure switch
    {
        ChangedFigure.Error => "errorWorst",
        ChangedFigure.Margin => "startUpMargin",
        ChangedFigure.Drive => "driveLevel",
        ChangedFigure.StartUpTime => "startUpTime",
        _ => figure.ToString().ToLowerInvariant(),
    };

    private static string Signed(double? value, double unit, int decimals)
    {
        string text = Figures.Fixed(value, unit, decimals);
        bool zero = text.All(letter => letter is '0' or '.' or '-');
        return text == Figures.None ? text : zero ? text.TrimStart('-') : text[0] == '-' ? text : "+" + text;
    }
}
