using PartPick.Catalog.Import;

namespace PartPick.Output;

/// <summary>Shows on one line how far an import is: rows, rate, time left.</summary>
internal sealed class ImportProgressLine(TextWriter error) : IProgress<ImportProgress>
{
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(200);
    private TimeSpan _last = -Pause;
    private int _shown;

    public void Report(ImportProgress value)
    {
        if (value.Elapsed - _last < Pause)
        {
            return;
        }

        _last = value.Elapsed;
        string line = ImportPace.Words(value);
        error.Write("\r" + line.PadRight(_shown));
        _shown = line.Length;
    }

    /// <summary>Removes the line.</summary>
    public void Clear()
    {
        if (_shown > 0)
        {
            error.Write("\r" + new string(' ', _shown) + "\r");
        }
    }
}
