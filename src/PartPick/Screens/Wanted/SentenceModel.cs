using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What became of a key in the sentence.</summary>
public enum SentenceAnswer
{
    /// <summary>The sentence has no use for it.</summary>
    NotMine,

    /// <summary>It is done.</summary>
    Done,

    /// <summary>The way leads out of the sentence, to the list.</summary>
    Leave,
}

/// <summary>The wanted sentence: moving through its values and changing them in place.</summary>
public sealed class SentenceModel
{
    private const int LongestText = 60;

    private readonly ImmutableArray<SentencePiece> _pieces;
    private readonly ImmutableArray<SentenceField> _fields;
    private readonly Glyphs _glyphs;
    private int _width = 80;

    /// <summary>Makes the sentence of a requirement.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="glyphs">The signs.</param>
    public SentenceModel(Requirement requirement, Glyphs glyphs)
    {
        Accepted = requirement;
        Current = requirement;
        _glyphs = glyphs;
        _pieces = Sentence.Pieces(requirement);
        _fields = [.. _pieces.Select(piece => piece.Field).OfType<SentenceField>()];
        At = 1;
    }

    /// <summary>Raised when <see cref="Current"/> is another requirement; true while it is still being typed.</summary>
    public event Action<bool>? Changed;

    /// <summary>The requirement without what is being typed.</summary>
    public Requirement Accepted { get; private set; }

    /// <summary>The requirement with what is being typed, as far as it fits.</summary>
    public Requirement Current { get; private set; }

    /// <summary>Number of the value that is chosen, from zero.</summary>
    public int At { get; private set; }

    /// <summary>The value that is chosen.</summary>
    public SentenceField Field => _fields[At];

    /// <summary>Number of values.</summary>
    public int Count => _fields.Length;

    /// <summary>What is being typed; null while nothing is.</summary>
    public string? Typed { get; private set; }

    /// <summary>Where the next letter goes in <see cref="Typed"/>.</summary>
    public int Caret { get; private set; }

    /// <summary>What is wrong with what was typed; null where nothing is known to be.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public SentenceAnswer Press(KeyPress key)
    {
        Problem = null;
        return Typed is null ? Move(key) : Type(key);
    }

    /// <summary>Leaves what is being typed as it was before.</summary>
    public void Drop()
    {
        Typed = null;
        Become(Accepted, false);
    }

    /// <summary>The sentence on the screen.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="chosen">Whether the keys go to the sentence.</param>
    public ImmutableArray<Line> Draw(int width, bool chosen)
    {
        _width = width;
        return Layout(chosen).Lines;
    }

    private SentenceAnswer Move(KeyPress key)
    {
        switch (key.Name)
        {
            case KeyName.Tab when At == Count - 1:
            case KeyName.BackTab when At == 0:
            case KeyName.Escape:
                return SentenceAnswer.Leave;
            case KeyName.Tab or KeyName.Right:
                At = Math.Min(At + 1, Count - 1);
                return SentenceAnswer.Done;
            case KeyName.BackTab or KeyName.Left:
                At = Math.Max(At - 1, 0);
                return SentenceAnswer.Done;
            case KeyName.Home:
                At = 0;
                return SentenceAnswer.Done;
            case KeyName.End:
                At = Count - 1;
                return SentenceAnswer.Done;
            case KeyName.Up:
                MoveRow(-1);
                return SentenceAnswer.Done;
            case KeyName.Down:
                return MoveRow(1) ? SentenceAnswer.Done : SentenceAnswer.Leave;
            default:
                return Change(key);
        }
    }

    private bool MoveRow(int step)
    {
        ImmutableArray<(int Row, int Column)> places = Layout(true).Places;
        (int row, int column) = places[At];
        var there = Enumerable.Range(0, Count).Where(i => places[i].Row == row + step).ToList();
        if (there.Count == 0)
        {
            return false;
        }

        At = there.MinBy(i => Math.Abs(places[i].Column - column));
        return true;
    }

    private SentenceAnswer Change(KeyPress key)
    {
        bool next = key.Name == KeyName.Enter || key is { Name: KeyName.Letter, Letter: ' ' };
        switch (Field)
        {
            case TypedField typed:
                return Begin(typed, key);
            case ChoiceField choice:
                return Choose(next ? choice.Next(Accepted) : key.Name == KeyName.Letter ? choice.Pick(Accepted, key.Letter) : null);
            case CircuitsField:
                return Choose(
                    next ? CircuitsField.Next(Accepted)
                    : key.Name == KeyName.Letter ? CircuitsField.Toggle(Accepted, key.Letter)
                    : null);
            default:
                return SentenceAnswer.NotMine;
        }
    }

    private SentenceAnswer Choose(Requirement? requirement)
    {
        if (requirement is null)
        {
            return SentenceAnswer.NotMine;
        }

        if (Field is CircuitsField && requirement == Accepted)
        {
            Problem = new Problem(Field.Name, "none would be left", "at least one of them");
        }

        Accepted = requirement;
        Become(requirement, false);
        return SentenceAnswer.Done;
    }

    private SentenceAnswer Begin(TypedField field, KeyPress key)
    {
        string text = field.EditText(Accepted);
        string? begun = key.Name switch
        {
            KeyName.Enter => text,
            KeyName.Backspace => text.Length > 0 ? text[..^1] : text,
            KeyName.Delete => "",
            KeyName.Letter when key.Letter == ' ' => text,
            KeyName.Letter when field.BeginsWith(key.Letter) => key.Letter.ToString(),
            _ => null,
        };
        if (begun is null)
        {
            return SentenceAnswer.NotMine;
        }

        Typed = begun;
        Caret = begun.Length;
        Preview();
        return SentenceAnswer.Done;
    }

    private SentenceAnswer Type(KeyPress key)
    {
        string typed = Typed!;
        switch (key.Name)
        {
            case KeyName.Escape:
                Drop();
                return SentenceAnswer.Done;
            case KeyName.Enter:
                Keep();
                return SentenceAnswer.Done;
            case KeyName.Tab or KeyName.BackTab or KeyName.Up or KeyName.Down:
                return Keep() ? Move(key) : SentenceAnswer.Done;
            case KeyName.Left:
                Caret = Math.Max(0, Caret - 1);
                break;
            case KeyName.Right:
                Caret = Math.Min(typed.Length, Caret + 1);
                break;
            case KeyName.Home:
                Caret = 0;
                break;
            case KeyName.End:
                Caret = typed.Length;
                break;
            case KeyName.Backspace when Caret > 0:
                Typed = typed.Remove(--Caret, 1);
                Preview();
                break;
            case KeyName.Delete when Caret < typed.Length:
                Typed = typed.Remove(Caret, 1);
                Preview();
                break;
            case KeyName.Letter when !char.IsControl(key.Letter) && typed.Length < LongestText:
                Typed = typed.Insert(Caret++, key.Letter.ToString());
                Preview();
                break;
        }

        return SentenceAnswer.Done;
    }

    private bool Keep()
    {
        Result<Requirement> taken = ((TypedField)Field).Take(Accepted, Typed!);
        if (!taken.IsOk)
        {
            Problem = taken.Problem;
            return false;
        }

        Typed = null;
        Accepted = taken.Value;
        Become(taken.Value, false);
        return true;
    }

    private void Preview()
    {
        Result<Requirement> taken = ((TypedField)Field).Take(Accepted, Typed!);
        Become(taken.ValueOr(Accepted), true);
    }

    private void Become(Requirement requirement, bool typing)
    {
        bool same = requirement == Current;
        Current = requirement;
        if (!same)
        {
            Changed?.Invoke(typing);
        }
    }

    private SentenceLayout Layout(bool chosen)
    {
        var texts = new List<SentenceText>();
        int number = 0;
        foreach (SentencePiece piece in _pieces)
        {
            if (piece.Field is null)
            {
                texts.Add(new SentenceText(_glyphs.Show(piece.Words), Tone.Normal, -1));
                continue;
            }

            bool here = chosen && number == At;
            if (here && Typed is not null)
            {
                texts.Add(new SentenceText(_glyphs.Show(Typed[..Caret]), Tone.Accent, number));
                texts.Add(new SentenceText(_glyphs.Show(Caret < Typed.Length ? Typed[Caret..(Caret + 1)] : " "), Tone.Caret, number));
                texts.Add(new SentenceText(_glyphs.Show(Caret < Typed.Length ? Typed[(Caret + 1)..] : ""), Tone.Accent, number));
            }
            else
            {
                texts.Add(new SentenceText(_glyphs.Show(piece.Field.Show(Accepted)), here ? Tone.Chosen : Tone.Strong, number));
            }

            number++;
        }

        return SentenceLayout.Of(texts, _width, 2);
    }
}
