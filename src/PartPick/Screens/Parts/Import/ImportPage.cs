using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Import;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The import of a list: what the file is, what its columns are, how its rows are read, and what became of them.</summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Reads and writes.</param>
/// <param name="today">The day of the import.</param>
public sealed class ImportPage(string path, ScreenWork work, Func<DateOnly> today)
{
    private readonly ImportLooking _looking = new(path, work, today);

    /// <summary>Raised when the page looks different without a key having been pressed.</summary>
    public event Action? Changed;

    /// <summary>Raised when parts of a kind were imported.</summary>
    public event Action<PartKind>? Imported;

    /// <summary>How far it has come.</summary>
    public ImportStep Step { get; private set; }

    /// <summary>What the user says.</summary>
    public ImportWishes Wishes { get; private set; } = new();

    /// <summary>What the file looks like; null before it is looked at.</summary>
    public ImportLook? Look => _looking.Seen;

    /// <summary>Whether the file is being looked at.</summary>
    public bool IsLooking => _looking.IsLooking;

    /// <summary>What is wrong; null for nothing.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Something to say until the next key; null for nothing.</summary>
    public string? Notice { get; private set; }

    /// <summary>The rows in which something can be chosen or typed, and those of the columns.</summary>
    public ImportChoices Choices { get; } = new();

    /// <summary>What is typed; null while nothing is.</summary>
    public TypedText? Typed { get; private set; }

    /// <summary>Whether what is typed is the name under which the columns are kept.</summary>
    public bool IsNaming { get; private set; }

    /// <summary>The names of the maps of the kind that are kept.</summary>
    public ImmutableArray<string> Maps => _looking.Maps;

    /// <summary>The run, with its progress and its report.</summary>
    public ImportWork Run { get; } = new(path, work);

    /// <summary>The chosen row of those that are looked at.</summary>
    public int RowAt { get; private set; }

    /// <summary>Where the report is scrolled to.</summary>
    public PageScroll ReportScroll { get; } = new();

    /// <summary>Begins.</summary>
    /// <param name="kind">The kind of the parts.</param>
    public void Begin(PartKind kind)
    {
        Run.Changed = Follow;
        _looking.Changed = () => Changed?.Invoke();
        if (Step == ImportStep.Running)
        {
            return;
        }

        Step = ImportStep.Columns;
        (Problem, Notice) = (null, null);
        Wishes = Wishes.File.Length == 0 ? Wishes with { Kind = kind } : Wishes;
        Typed = Wishes.File.Length == 0 ? new TypedText("", 1000) : null;
        Choices.Reset();
        _looking.ReadMaps(Wishes.Kind);
    }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public PartsAnswer Press(KeyPress key)
    {
        Notice = null;
        if (Typed is not null)
        {
            PressInTyped(key);
            return PartsAnswer.Taken;
        }

        return Step switch
        {
            ImportStep.Running => PressInRun(key),
            ImportStep.Done => PressInReport(key),
            ImportStep.Rows => PressInRows(key),
            _ => PressInColumns(key),
        };
    }

    private PartsAnswer PressInColumns(KeyPress key)
    {
        Problem = Look is null ? Problem : null;
        if (Choices.Move(key, Look?.Columns.Length ?? 0))
        {
            return PartsAnswer.Taken;
        }

        switch (key)
        {
            case { Name: KeyName.Enter } when !Choices.IsChoice:
                Typed = new TypedText(Choices.TextOf(this), 1000);
                return PartsAnswer.Taken;
            case { Name: KeyName.Enter or KeyName.Right }:
                Wish(Choices.Next(this, 1));
                return PartsAnswer.Taken;
            case { Name: KeyName.Left }:
                Wish(Choices.Next(this, -1));
                return PartsAnswer.Taken;
            case { Name: KeyName.Delete } when Choices.ColumnOf(this) is { } column:
                Wish(Wishes.With(column.Header, ""));
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'b' } when Choices.ColumnOf(this) is { } column:
                Wish(Wishes.With(column.Header, null));
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'r' } when Look is { Rows.IsEmpty: false }:
                (Step, RowAt) = (ImportStep.Rows, 0);
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'k' } when Look is not null:
                (Typed, IsNaming) = (new TypedText(Wishes.Map ?? ""), true);
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'd' or 'i' } when Look is not null:
                Start(key.Letter == 'd');
                return PartsAnswer.Taken;
            case { Name: KeyName.Escape }:
                return PartsAnswer.Leave;
            default:
                return PartsAnswer.NotMine;
        }
    }

    private PartsAnswer PressInRows(KeyPress key)
    {
        if (ImportChoices.Step(key, RowAt, Look?.Rows.Length ?? 0) is { } to)
        {
            RowAt = to;
            return PartsAnswer.Taken;
        }

        switch (key)
        {
            case { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } or { Name: KeyName.Letter, Letter: 'r' }:
                Step = ImportStep.Columns;
                return PartsAnswer.Taken;
            case { Name: KeyName.Letter, Letter: 'd' or 'i' }:
                Start(key.Letter == 'd');
                return PartsAnswer.Taken;
            default:
                return PartsAnswer.NotMine;
        }
    }

    private PartsAnswer PressInRun(KeyPress key)
    {
        if (key.Name == KeyName.Escape)
        {
            Run.Stop();
        }

        return PartsAnswer.Taken;
    }

    private PartsAnswer PressInReport(KeyPress key)
    {
        if (ReportScroll.Press(key))
        {
            return PartsAnswer.Taken;
        }

        switch (key)
        {
            case { Name: KeyName.Letter, Letter: 'i' } when Run.Report is { DryRun: true }:
                Start(false);
                return PartsAnswer.Taken;
            case { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } when Run.Report is { DryRun: true }:
                Step = ImportStep.Columns;
                return PartsAnswer.Taken;
            case { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace }:
                (Wishes, Step) = (new ImportWishes { Kind = Wishes.Kind }, ImportStep.Columns);
                _looking.Forget();
                return PartsAnswer.Leave;
            default:
                return PartsAnswer.NotMine;
        }
    }

    private void PressInTyped(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                (Typed, IsNaming, Problem) = (null, false, null);
                break;
            case KeyName.Tab when Choices.At == ImportChoices.File && !IsNaming:
                Typed = new TypedText(PathCompletion.Of(Typed!.Text), 1000);
                break;
            case KeyName.Enter when IsNaming:
                Keep(Typed!.Text.Trim());
                break;
            case KeyName.Enter:
                Result<ImportWishes> read = Choices.Read(this, Typed!.Text.Trim());
                Problem = read.Problem;
                if (read.IsOk)
                {
                    Typed = null;
                    Wish(read.Value);
                }

                break;
            default:
                Problem = null;
                Typed!.Press(key);
                break;
        }
    }

    private void Wish(ImportWishes wishes)
    {
        bool otherKind = wishes.Kind != Wishes.Kind;
        Wishes = otherKind ? wishes with { Map = null, Columns = ImmutableDictionary<string, string>.Empty } : wishes;
        if (otherKind)
        {
            _looking.ReadMaps(Wishes.Kind);
        }

        if (Wishes.File.Length > 0)
        {
            _looking.Look(Wishes, problem =>
            {
                Problem = problem;
                Choices.Fit(Look?.Columns.Length ?? 0);
            });
        }
    }

    private void Keep(string name)
    {
        if (name.Length == 0)
        {
            Problem = new Problem("name", "is empty", "a name under which the columns are found again");
            return;
        }

        (Typed, IsNaming) = (null, false);
        _looking.Keep(name, Wishes, kept =>
        {
            Problem = kept.Problem;
            Notice = kept.IsOk ? $"The columns are kept under {name}." : null;
            Wishes = kept.IsOk ? Wishes with { Map = name } : Wishes;
        });
    }

    private void Start(bool dryRun)
    {
        if (Look is { HasNumbers: false })
        {
            (Step, Problem) = (ImportStep.Columns, new Problem(
                "columns", "none of them holds a supplier's number or an id", "a column that is supplierPart or id"));
            return;
        }

        Step = ImportStep.Running;
        Problem = null;
        ReportScroll.Reset();
        Run.Begin(Wishes.FullPath, Wishes.Request(today(), dryRun));
    }

    private void Follow()
    {
        if (Step == ImportStep.Running && !Run.IsRunning)
        {
            Step = Run.Report is not null ? ImportStep.Done : ImportStep.Columns;
            Problem = Run.Problem;
            Notice = Run.WasStopped ? "Stopped; the catalogue is as it was." : null;
            if (Run.Report is { DryRun: false } report && report.Added + report.Updated > 0)
            {
                Imported?.Invoke(Wishes.Kind);
            }
        }

        Changed?.Invoke();
    }
}
