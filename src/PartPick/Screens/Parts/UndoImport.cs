using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Takes the last import back, when the key was pressed twice.</summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Reads and writes.</param>
public sealed class UndoImport(string path, ScreenWork work)
{
    /// <summary>Raised when there is something else to say.</summary>
    public event Action? Changed;

    /// <summary>Raised with the kind of the parts of an import that was taken back.</summary>
    public event Action<PartKind>? Undone;

    /// <summary>What there is to say; null for nothing.</summary>
    public string? Words { get; private set; }

    /// <summary>The import that goes at the next press; null where none was asked for.</summary>
    public ImportNote? Asked { get; private set; }

    /// <summary>Whether one is being taken back.</summary>
    public bool IsBusy { get; private set; }

    /// <summary>Another key was pressed: nothing is taken back.</summary>
    public void Forget()
    {
        if (!IsBusy)
        {
            (Asked, Words) = (null, null);
        }
    }

    /// <summary>Asks which import it would be; or, if that was said just before, takes it back.</summary>
    public void Press()
    {
        if (IsBusy)
        {
            return;
        }

        IsBusy = true;
        if (Asked is null)
        {
            work.Start(_ => CatalogReading.Undoable(path), Say);
        }
        else
        {
            Words = $"Taking back the import of {Asked.File}.";
            Asked = null;
            work.Start(_ => CatalogImport.Undo(path), Done);
        }
    }

    private void Say(Result<ImportNote?> found)
    {
        IsBusy = false;
        Asked = found.ValueOr(null);
        Words = !found.IsOk ? found.Problem.ToString()
            : Asked is { } note
                ? $"u once more takes back {note.File} of {note.Date}: {note.Added} added, {note.Updated} updated {note.Kind.Word()}."
            : "There is no import to take back.";
        Changed?.Invoke();
    }

    private void Done(Result<ImportNote?> undone)
    {
        IsBusy = false;
        ImportNote? note = undone.ValueOr(null);
        Words = !undone.IsOk ? undone.Problem.ToString()
            : note is null ? "There is no import to take back."
            : $"Taken back: {note.File} of {note.Date}, {note.Added} added and {note.Updated} updated {note.Kind.Word()}.";
        if (note is not null)
        {
            Undone?.Invoke(note.Kind);
        }

        Changed?.Invoke();
    }
}
