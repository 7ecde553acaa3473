using PartPick.Values;

namespace PartPick.Catalog;

/// <summary>The lock file beside a catalogue: whoever holds it is the only one to have the catalogue open.</summary>
internal static class CatalogLock
{
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(20);

    /// <summary>Takes the lock, waiting while another process has it.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="patience">How long to wait.</param>
    /// <returns>The lock, given back by disposing it; or the problem.</returns>
    public static Result<IDisposable> Take(string path, TimeSpan patience)
    {
        long start = TimeProvider.System.GetTimestamp();
        while (true)
        {
            try
            {
                return Result.Ok<IDisposable>(
                    new FileStream(path + ".lock", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None));
            }
            catch (IOException error) when (IsHeldByAnother(error))
            {
                if (TimeProvider.System.GetElapsedTime(start) >= patience)
                {
                    return Result.Fail<IDisposable>(path, "is in use by another process", "a catalogue that no other program has open");
                }

                Thread.Sleep(Pause);
            }
            catch (Exception error) when (error is IOException or UnauthorizedAccessException)
            {
                return Result.Fail<IDisposable>(
                    path, $"cannot be opened: {error.Message}", "a file in a directory that can be written to");
            }
        }
    }

    // EAGAIN on Linux, the same on macOS, and a sharing or lock violation on Windows.
    private static bool IsHeldByAnother(IOException error) => (error.HResult & 0xFFFF) is 11 or 35 or 32 or 33;
}
