using System.Text;
using PartPick.Output;
using PartPick.Selection;
using PartPick.Shortlists;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The pictures of one candidate. Takes the keys while it is open; what takes long to compute follows from the background.</summary>
internal sealed class PicturesModel
{
    private readonly PictureCharts? _charts;
    private readonly LatestWork? _writing;
    private AskedFields? _file;

    /// <summary>Without any pictures.</summary>
    public PicturesModel()
    {
    }

    /// <summary>With pictures.</summary>
    /// <param name="work">Does what takes long.</param>
    public PicturesModel(ScreenWork work)
    {
        (_charts, _writing) = (new PictureCharts(work), new LatestWork(work));
        _charts.Changed += () => Redraw?.Invoke();
    }

    /// <summary>Raised when the screen looks different without a key having been pressed.</summary>
    public event Action? Redraw;

    /// <summary>Raised with a line to show.</summary>
    public event Action<string>? Said;

    /// <summary>Whether they are open.</summary>
    public bool IsOpen => Candidate is not null;

    /// <summary>The candidate; null while they are not open.</summary>
    public Candidate? Candidate { get; private set; }

    /// <summary>The ranking that it belongs to; null before the first.</summary>
    public RankingResult? Result { get; private set; }

    /// <summary>The picture that the keys are for.</summary>
    public PictureKind At { get; private set; }

    /// <summary>The name of the file that is asked for; null where nothing is.</summary>
    public AskedFields? Asking => IsOpen ? _file : null;

    /// <summary>The numbers of a picture, or why there are none; null while they are computed, and for what is no chart.</summary>
    /// <param name="kind">The picture.</param>
    public Result<Chart>? ChartOf(PictureKind kind) => _charts?.Of(kind);

    /// <summary>Opens the pictures of a candidate, at the one that was last looked at.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    public void Open(Candidate candidate, RankingResult result)
    {
        if (_charts is not null)
        {
            (Candidate, Result, _file) = (candidate, result, null);
            _charts.Start(candidate, result);
        }
    }

    /// <summary>Takes that the ranking has another answer: the candidate stays, what it stands among changes.</summary>
    /// <param name="result">The answer.</param>
    public void Follow(RankingResult result)
    {
        // For another requirement the candidate's own figures would be others.
        if (Candidate is { } candidate && result.Requirement == Result?.Requirement)
        {
            Result = result;
            Candidate = result.Candidates.FirstOrDefault(each => each.Id == candidate.Id) ?? candidate;
            _charts!.Follow(Candidate, result);
        }
    }

    /// <summary>Closes them, and ends what is being computed.</summary>
    public void Close()
    {
        (Candidate, _file) = (null, null);
        _charts?.Stop();
    }

    /// <summary>Takes a key, if they are open.</summary>
    /// <param name="key">The key.</param>
    /// <param name="notice">A line to show; null for none.</param>
    /// <returns>Whether the key was taken.</returns>
    public bool Press(KeyPress key, out string? notice)
    {
        notice = null;
        if (!IsOpen)
        {
            return false;
        }

        if (_file is not null)
        {
            PressInFile(_file, key);
            return true;
        }

        switch (key)
        {
            case { Name: KeyName.Escape or KeyName.Enter or KeyName.Backspace } or { Name: KeyName.Letter, Letter: 'p' }:
                Close();
                break;
            case { Name: KeyName.Right or KeyName.Tab or KeyName.Down or KeyName.PageDown }:
                Move(1);
                break;
            case { Name: KeyName.Left or KeyName.BackTab or KeyName.Up or KeyName.PageUp }:
                Move(-1);
                break;
            case { Name: KeyName.Letter, Letter: 'x' }:
                notice = AskFile();
                break;
        }

        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }

    private void Move(int step) =>
        At = PictureKinds.All[((int)At + step + PictureKinds.All.Length) % PictureKinds.All.Length];

    private string? AskFile()
    {
        if (PictureSvg.IsChart(At) && ChartOf(At) is not { IsOk: true })
        {
            return ChartOf(At)?.Problem?.ToString() ?? "The picture is still being computed.";
        }

        _file = new AskedFields(("file", $"{At.Word()}.svg", 300));
        return null;
    }

    private void PressInFile(AskedFields file, KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Escape:
                _file = null;
                break;
            case KeyName.Enter:
                Write(file, file.Fields[0].Text.Trim());
                break;
            default:
                file.Press(key);
                break;
        }
    }

    private void Write(AskedFields file, string path)
    {
        string svg = PictureSvg.Of(At, Candidate!, Result!.Requirement, ChartOf(At));
        _writing!.Start(
            _ => PictureFile.Check(path, replaces: false, "file", "another name")
                ?? WholeFile.Write(path, new UTF8Encoding(false).GetBytes(svg), replace: false, "file"),
            problem =>
            {
                file.Problem = problem?.ToString();
                if (problem is null)
                {
                    _file = null;
                    Said?.Invoke($"Written to {path}.");
                }

                Redraw?.Invoke();
            });
    }
}
