using PartPick.Catalog.Import;
using PartPick.Commands;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>One run of an import, in the background.</summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Runs it.</param>
public sealed class ImportWork(string path, ScreenWork work)
{
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(100);

    private CancellationTokenSource? _stop;

    /// <summary>Is told that it has gone on, or is over.</summary>
    public Action? Changed { get; set; }

    /// <summary>Whether it runs.</summary>
    public bool IsRunning => _stop is not null;

    /// <summary>Whether it was asked to stop.</summary>
    public bool IsStopping => _stop?.IsCancellationRequested == true;

    /// <summary>How far it is.</summary>
    public ImportProgress Progress { get; private set; }

    /// <summary>What became of the rows; null where it did not come to its end.</summary>
    public ImportReport? Report { get; private set; }

    /// <summary>What kept it from its end; null for nothing.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether it was stopped.</summary>
    public bool WasStopped { get; private set; }

    /// <summary>Begins.</summary>
    /// <param name="file">The path of the list.</param>
    /// <param name="request">What is to be imported, and how.</param>
    public void Begin(string file, ImportRequest request)
    {
        (Progress, Report, Problem, WasStopped) = (default, null, null, false);
        _stop = work.Start(
            stop => ListFile.Open(file).Then(stream => CatalogImport.Run(path, stream, request, new Heard(this, work), stop)),
            done =>
            {
                (_stop, Report, Problem) = (null, done.ValueOr(null!), done.Problem);
                Changed?.Invoke();
            },
            () =>
            {
                (_stop, WasStopped) = (null, true);
                Changed?.Invoke();
            });
    }

    /// <summary>Stops it; the catalogue stays as it was.</summary>
    public void Stop() => _stop?.Cancel();

    private sealed class Heard(ImportWork run, ScreenWork work) : IProgress<ImportProgress>
    {
        private TimeSpan _last = -Pause;

        public void Report(ImportProgress value)
        {
            if (value.Elapsed - _last < Pause)
            {
                return;
            }

            _last = value.Elapsed;
            work.Post(() =>
            {
                run.Progress = value;
                run.Changed?.Invoke();
            });
        }
    }
}
