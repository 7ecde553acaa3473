using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Commands;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Looks at a list in the background, and keeps its columns; a look that was asked for later counts.</summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Reads and writes.</param>
/// <param name="today">The day of the import.</param>
internal sealed class ImportLooking(string path, ScreenWork work, Func<DateOnly> today)
{
    private int _number;
    private PartKind _kind;

    /// <summary>Is told that there is something else to show.</summary>
    public Action? Changed { get; set; }

    /// <summary>What the file looks like; null before it is looked at, and where it cannot be read.</summary>
    public ImportLook? Seen { get; private set; }

    /// <summary>Whether the file is being looked at.</summary>
    public bool IsLooking { get; private set; }

    /// <summary>The names of the maps of the kind that are kept.</summary>
    public ImmutableArray<string> Maps { get; private set; } = [];

    /// <summary>Forgets what was seen.</summary>
    public void Forget()
    {
        (Seen, IsLooking) = (null, false);
        _number++;
    }

    /// <summary>Looks at a file.</summary>
    /// <param name="wishes">What the user says of it.</param>
    /// <param name="done">Is told when it was looked at, with what is wrong or null.</param>
    public void Look(ImportWishes wishes, Action<Problem?> done)
    {
        IsLooking = true;
        int number = ++_number;
        ImportRequest request = wishes.Request(today(), true);
        work.Start(
            _ => ListFile.Open(wishes.FullPath).Then(stream => ImportPreview.Look(path, stream, request)),
            look =>
            {
                if (number == _number)
                {
                    (IsLooking, Seen) = (false, look.ValueOr(null!));
                    done(look.Problem);
                    Changed?.Invoke();
                }
            });
    }

    /// <summary>Reads the names of the maps of a kind.</summary>
    /// <param name="kind">The kind.</param>
    public void ReadMaps(PartKind kind)
    {
        _kind = kind;
        work.Start(_ => ColumnMaps.Names(path, kind), names =>
        {
            Maps = kind == _kind ? names.ValueOr([]) : Maps;
            Changed?.Invoke();
        });
    }

    /// <summary>Keeps the columns under a name.</summary>
    /// <param name="name">The name.</param>
    /// <param name="wishes">What the user says of the file.</param>
    /// <param name="done">Is told when they are kept, or why not.</param>
    public void Keep(string name, ImportWishes wishes, Action<Result<string>> done)
    {
        ImportRequest request = wishes.Request(today(), true);
        work.Start(
            _ => ListFile.Open(wishes.FullPath).Then(stream => ColumnMaps.Keep(path, name, stream, request)),
            kept =>
            {
                done(kept);
                ReadMaps(wishes.Kind);
                Changed?.Invoke();
            });
    }
}
