using System.Collections.Immutable;
using PartPick.Selection;

namespace PartPick.Screens;

/// <summary>How the figures of a candidate come about, one after the other; worked out in the background.</summary>
/// <param name="work">Does what takes long.</param>
internal sealed class FigurePage(ScreenWork work)
{
    private readonly LatestWork _study = new(work);
    private string? _name;

    /// <summary>Raised when there is something else to show.</summary>
    public event Action? Changed;

    /// <summary>The candidate; null while it is closed.</summary>
    public Candidate? Candidate { get; private set; }

    /// <summary>The figures; empty until they are worked out.</summary>
    public ImmutableArray<FigureWorking> Figures { get; private set; } = [];

    /// <summary>Number of the chosen figure, from zero.</summary>
    public int At { get; private set; }

    /// <summary>Whether they are being worked out.</summary>
    public bool IsLooking => _study.IsRunning;

    /// <summary>Where the words about the chosen figure are scrolled to.</summary>
    public PageScroll Scroll { get; } = new();

    /// <summary>Opens it at the figure that was looked at last.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="result">The ranking that it belongs to.</param>
    public void Open(Candidate candidate, RankingResult result)
    {
        (Candidate, Figures, At) = (candidate, [], 0);
        Scroll.Reset();
        _study.Start(_ => FigureWorkings.Of(candidate, result.Requirement, result.CheapestCost), figures =>
        {
            Figures = figures;
            At = Math.Max(0, figures.ToList().FindIndex(figure => figure.Name == _name));
            Changed?.Invoke();
        });
    }

    /// <summary>Closes it.</summary>
    public void Close()
    {
        _study.Stop();
        Candidate = null;
    }

    /// <summary>Takes a key.</summary>
    /// <returns>Whether it was taken.</returns>
    public bool Press(KeyPress key)
    {
        if (key.Name is KeyName.Escape or KeyName.Enter or KeyName.Backspace || key.Letter == 'h')
        {
            Close();
            return true;
        }

        if (key is { Name: KeyName.PageUp or KeyName.PageDown } or { Name: KeyName.Letter, Letter: ' ' })
        {
            return Scroll.Press(key);
        }

        int before = At;
        int to = key.Name switch
        {
            KeyName.Up => At - 1,
            KeyName.Down => At + 1,
            KeyName.Home => 0,
            KeyName.End => Figures.Length - 1,
            _ => At,
        };
        At = Math.Clamp(to, 0, Math.Max(0, Figures.Length - 1));
        if (At != before)
        {
            Scroll.Reset();
        }

        _name = At < Figures.Length ? Figures[At].Name : _name;
        return key is not { Name: KeyName.Letter, Letter: '?' or 'q' };
    }
}
