using System.Globalization;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Puts candidates on lists: asks for the list, the boards and a note, and does the rest in the background, while the keys go on
/// where they were.
/// </summary>
/// <param name="desk">Where the lists are kept.</param>
/// <param name="work">Does what takes long.</param>
internal sealed class ListPutting(IShortlistDesk desk, ScreenWork work)
{
    private readonly Lock _oneAtATime = new();
    private CancellationTokenSource? _last;
    private (Candidate Candidate, Requirement Requirement, SupportParts? Support)? _asked;
    private AskedFields _fields = new();
    private int _running;

    /// <summary>Raised when one is on a list: the name of the list, and a line to show.</summary>
    public event Action<string, string>? Put;

    /// <summary>Raised with a line to show when one is not.</summary>
    public event Action<string?>? Failed;

    /// <summary>The fields that are asked for; null where nothing is.</summary>
    public AskedFields? Asking => _asked is null ? null : _fields;

    /// <summary>Asks for what is needed.</summary>
    /// <param name="candidate">The candidate.</param>
    /// <param name="requirement">What is wanted.</param>
    /// <param name="list">The list that is proposed.</param>
    /// <param name="support">The parts that the circuit needs besides; null for the usual ones.</param>
    public void Ask(Candidate candidate, Requirement requirement, string list, SupportParts? support)
    {
        _asked = (candidate, requirement, support);
        _fields = new AskedFields(
            ("list", list, 60), ("boards", requirement.Builds.ToString(CultureInfo.InvariantCulture), 10), ("note", "", 200));
    }

    /// <summary>Takes a key while something is asked, and Esc while something is under way.</summary>
    /// <param name="key">The key.</param>
    /// <param name="elsewhere">Whether Esc belongs to something else.</param>
    /// <param name="notice">A line to show; null for none.</param>
    public bool Press(KeyPress key, bool elsewhere, out string? notice)
    {
        notice = null;
        if (_asked is not { } asked)
        {
            bool stops = key.Name == KeyName.Escape && !elsewhere && _running > 0;
            if (stops)
            {
                _last?.Cancel();
            }

            return stops;
        }

        switch (key.Name)
        {
            case KeyName.Escape:
                _asked = null;
                break;
            case KeyName.Enter:
                notice = Start(asked.Candidate, asked.Requirement, asked.Support);
                break;
            default:
                _fields.Press(key);
                break;
        }

        return true;
    }

    private string? Start(Candidate candidate, Requirement requirement, SupportParts? support)
    {
        Result<string> name = ShortlistName.Read(_fields.Fields[0].Text, "list");
        Result<int> boards = Boards(_fields.Fields[1].Text);
        if (!name.IsOk || !boards.IsOk)
        {
            _fields.Problem = (name.Problem ?? boards.Problem)!.ToString();
            return null;
        }

        string list = name.Value, note = _fields.Fields[2].Text.Trim();
        (AskedFields fields, var asked) = (_fields, _asked);
        _asked = null;
        _running++;
        _last = work.Start(
            stop =>
            {
                lock (_oneAtATime)
                {
                    return desk.Put(
                        list, candidate.Choice, requirement with { Builds = boards.Value }, note.Length == 0 ? null : note, support, stop);
                }
            },
            put =>
            {
                _running--;
                if (put.IsOk)
                {
                    Put?.Invoke(list, FormattableString.Invariant($"Candidate {put.Value.Number} of the list {list}; l shows the list."));
                    return;
                }

                // What was typed comes back, unless something else is being asked by now.
                if (_asked is null)
                {
                    (_asked, _fields) = (asked, fields);
                    _fields.Problem = put.Problem.ToString();
                }

                Failed?.Invoke(null);
            },
            () =>
            {
                _running--;
                Failed?.Invoke("Stopped; it is not on the list.");
            });
        return $"Putting it on the list {list}; Esc stops it.";
    }

    private static Result<int> Boards(string text) => ValueText.Parse(text, Dimension.Count, "boards").Then(count => count >= 1
        ? Result.Ok((int)count)
        : Result.Fail<int>("boards", "is zero", "a whole number from 1"));
}
