using System.Collections.Immutable;
using PartPick.Catalog;

namespace PartPick.Screens;

/// <summary>The screens of the catalogue: its parts, one part, and the import of a list. Knows nothing of the terminal.</summary>
public sealed class PartsModel
{
    private static readonly TimeSpan LastMoment = TimeSpan.FromSeconds(5);

    private readonly PartListSource _source;
    private readonly ScreenWork _work;
    private readonly Glyphs _glyphs;

    /// <summary>Makes the screens, without reading anything yet.</summary>
    /// <param name="path">The path of the catalogue.</param>
    /// <param name="work">Reads and writes.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="today">The day, for what is set by hand or imported.</param>
    public PartsModel(string path, ScreenWork work, Glyphs glyphs, Func<DateOnly> today)
    {
        (_work, _glyphs) = (work, glyphs);
        _source = new PartListSource(path, work);
        List = new PartList(_source);
        Page = new PartPage(path, work, today);
        Import = new ImportPage(path, work, today);
        Undo = new UndoImport(path, work);
        _source.Changed += () => Redraw?.Invoke();
        Page.Changed += () => Redraw?.Invoke();
        Import.Changed += () => Redraw?.Invoke();
        Undo.Changed += () => Redraw?.Invoke();
        Page.Saved += row =>
        {
            HasChanged = true;
            _source.Put(row);
        };
        Import.Imported += ReadAgain;
        Undo.Undone += ReadAgain;
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Where the keys go.</summary>
    public PartsPlace Place { get; private set; }

    /// <summary>The list of parts.</summary>
    public PartList List { get; }

    /// <summary>The open part.</summary>
    public PartPage Page { get; }

    /// <summary>The import of a list.</summary>
    public ImportPage Import { get; }

    /// <summary>Takes the last import back.</summary>
    public UndoImport Undo { get; }

    /// <summary>Why the catalogue could not be read; null where it could.</summary>
    public Values.Problem? ReadingProblem => _source.Problem;

    /// <summary>Whether the catalogue was changed since this was last set back.</summary>
    public bool HasChanged { get; set; }

    /// <summary>Whether keys are letters of a text here.</summary>
    public bool IsTyping => List.Typed is not null || Page.Typed is not null || Import.Typed is not null;

    /// <summary>The crystal or amplifier that is open or chosen, of which circuits are made; null for none.</summary>
    public string? AskableId => Place == PartsPlace.Import || List.Kind is PartKind.Capacitor or PartKind.Resistor
        ? null
        : Place == PartsPlace.Part ? Page.Id : List.Chosen?.Id;

    /// <summary>Shows the screens.</summary>
    public void Enter() => List.Begin();

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was taken, is for someone else, or leads back.</returns>
    public PartsAnswer Press(KeyPress key)
    {
        bool isUndo = key is { Name: KeyName.Letter, Letter: 'u' } && !IsTyping;
        if (!isUndo)
        {
            Undo.Forget();
        }

        PartsAnswer answer = Place switch
        {
            PartsPlace.Part => PressInPart(key),
            PartsPlace.Import => PressInImport(key),
            _ => PressInList(key),
        };
        if (answer == PartsAnswer.NotMine && isUndo && Place != PartsPlace.Part && Import.Step != ImportStep.Running)
        {
            Undo.Press();
            return PartsAnswer.Taken;
        }

        return answer;
    }

    /// <summary>Stops an import that runs.</summary>
    /// <returns>Whether there was one.</returns>
    public bool Interrupt()
    {
        bool runs = Import.Run.IsRunning;
        Import.Run.Stop();
        return runs;
    }

    /// <summary>Ends all work; waits a moment for an import that is being stopped.</summary>
    public void Stop()
    {
        bool waits = Interrupt();
        _source.Stop();
        if (waits)
        {
            SpinWait.SpinUntil(() => _work.IsIdle, LastMoment);
        }
    }

    /// <summary>The screen as lines, each as wide as the screen.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="height">Height in rows.</param>
    public ImmutableArray<Line> Draw(int width, int height)
    {
        ImmutableArray<Line> foot = new PartsFoot(this, _glyphs, width).Draw();
        int room = height - foot.Length;
        ImmutableArray<Line> body = Place switch
        {
            PartsPlace.Part => new PartPagePicture(Page, _glyphs, width).Draw(room),
            PartsPlace.Import when Import.Step == ImportStep.Columns => new ImportColumnsPicture(Import, _glyphs, width).Draw(room),
            PartsPlace.Import when Import.Step == ImportStep.Rows => new ImportRowsPicture(Import, _glyphs, width).Draw(room),
            PartsPlace.Import => new ImportRunPicture(Import, _glyphs, width).Draw(room),
            _ => new PartListPicture(List, _glyphs, width).Draw(room),
        };
        return [.. body.Concat(Enumerable.Repeat(Line.Empty, room)).Take(room).Concat(foot).Select(line => line.Fit(width))];
    }

    private PartsAnswer PressInList(KeyPress key)
    {
        if (key is { Name: KeyName.Letter, Letter: 'i' } && List.Typed is null)
        {
            Place = PartsPlace.Import;
            Import.Begin(List.Kind);
            return PartsAnswer.Taken;
        }

        PartsAnswer answer = List.Press(key);
        if (answer == PartsAnswer.Open)
        {
            Place = PartsPlace.Part;
            Page.Open(List.Chosen!.Id);
            return PartsAnswer.Taken;
        }

        return answer;
    }

    private PartsAnswer PressInPart(KeyPress key)
    {
        if (Page.Typed is null && key.Name is KeyName.Left or KeyName.Right)
        {
            List.Move(key.Name == KeyName.Left ? -1 : 1);
            if (List.Chosen is { } row && row.Id != Page.Id)
            {
                Page.Open(row.Id);
            }

            return PartsAnswer.Taken;
        }

        PartsAnswer answer = Page.Press(key);
        if (answer == PartsAnswer.Leave)
        {
            Page.Close();
            Place = PartsPlace.List;
            return PartsAnswer.Taken;
        }

        return answer;
    }

    private PartsAnswer PressInImport(KeyPress key)
    {
        PartsAnswer answer = Import.Press(key);
        if (answer == PartsAnswer.Leave)
        {
            Place = PartsPlace.List;
            return PartsAnswer.Taken;
        }

        return answer;
    }

    private void ReadAgain(PartKind kind)
    {
        HasChanged = true;
        List.BeginAgain(kind);
    }
}
