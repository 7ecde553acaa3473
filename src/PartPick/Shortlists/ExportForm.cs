using PartPick.Values;

namespace PartPick.Shortlists;

/// <summary>The forms in which a list leaves the program.</summary>
public enum ExportForm
{
    /// <summary>The purchase list as CSV.</summary>
    Csv,

    /// <summary>Circuits and purchase list as Markdown.</summary>
    Markdown,

    /// <summary>The design record to print.</summary>
    Html,

    /// <summary>The purchase list as JSON.</summary>
    Json,

    /// <summary>The purchase list for the terminal.</summary>
    Table,
}

/// <summary>The words for the forms.</summary>
public static class ExportForms
{
    /// <summary>The words, as options name them.</summary>
    public static string[] Words { get; } = [.. Enum.GetValues<ExportForm>().Select(form => form.ToString().ToLowerInvariant())];

    /// <summary>The form of a word; null for another word.</summary>
    /// <param name="word">The word.</param>
    public static ExportForm? Named(string? word) => Array.IndexOf(Words, word) is >= 0 and int at ? (ExportForm)at : null;

    /// <summary>The form that the name of a file asks for by its ending: CSV without an ending, a problem where it is another one.</summary>
    /// <param name="path">The path of the file.</param>
    /// <param name="where">The option or field that names the file, for the problem.</param>
    public static Result<ExportForm> Asked(string path, string where) => OfFile(path) is { } form ? Result.Ok(form)
        : Path.GetExtension(path).Length == 0 ? Result.Ok(ExportForm.Csv)
        : Result.Fail<ExportForm>(
            where, $"{Problem.Quote(Path.GetExtension(path))} is the ending of no form", "a name with .csv, .md, .html, .json or .txt");

    /// <summary>The form that the name of a file asks for by its ending; null where it asks for none.</summary>
    /// <param name="path">The path of the file.</param>
    public static ExportForm? OfFile(string path) => Path.GetExtension(path).ToUpperInvariant() switch
    {
        ".CSV" => ExportForm.Csv,
        ".MD" or ".MARKDOWN" => ExportForm.Markdown,
        ".HTM" or ".HTML" => ExportForm.Html,
        ".JSON" => ExportForm.Json,
        ".TXT" => ExportForm.Table,
        _ => null,
    };
}
