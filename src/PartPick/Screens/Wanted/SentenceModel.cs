using System.Collections.Immutable;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>The wanted sentence: moving through its values and changing them in place.</summary>
public sealed class SentenceModel
{
    private readonly ImmutableArray<SentencePiece> _pieces;
    private readonly ImmutableArray<SentenceField> _fields;
    private readonly SentenceWalk _walk;
    private readonly Glyphs _glyphs;
    private TypedText? _typed;
    private int _width = 80;

    /// <summary>Makes the sentence of a requirement.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <param name="glyphs">The signs.</param>
    /// <param name="currency">The currency of the cost limit; empty where it is not known.</param>
    public SentenceModel(Requirement requirement, Glyphs glyphs, string currency = "")
    {
        Accepted = requirement;
        Current = requirement;
        _glyphs = glyphs;
        Currency = currency;
        _pieces = Sentence.Pieces(requirement, () => Currency);
        _fields = [.. _pieces.Select(piece => piece.Field).OfType<SentenceField>()];
        _walk = new SentenceWalk(1);
    }

    /// <summary>Raised when <see cref="Current"/> is another requirement; true while it is still being typed.</summary>
    public event Action<bool>? Changed;

    /// <summary>The currency of the cost limit; empty where it is not known.</summary>
    public string Currency { get; set; }

    /// <summary>The requirement without what is being typed.</summary>
    public Requirement Accepted { get; private set; }

    /// <summary>The requirement with what is being typed, as far as it fits.</summary>
    public Requirement Current { get; private set; }

    /// <summary>Number of the value that is chosen, from zero.</summary>
    public int At => _walk.At;

    /// <summary>The value that is chosen.</summary>
    public SentenceField Field => _fields[At];

    /// <summary>What is being typed; null while nothing is.</summary>
    public string? Typed => _typed?.Text;

    /// <summary>Where the next letter goes in <see cref="Typed"/>.</summary>
    public int Caret => _typed?.Caret ?? 0;

    /// <summary>Whether what is being typed is a value already; true while nothing is.</summary>
    public bool IsFit => _typed is null || ((TypedField)Field).Take(Accepted, Typed!).IsOk;

    /// <summary>What is wrong with what was typed; null where nothing is known to be.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Takes a key.</summary>
    /// <param name="key">The key.</param>
    public SentenceAnswer Press(KeyPress key)
    {
        if (_typed is { } typed)
        {
            return Type(typed, key);
        }

        Problem = null;
        return Move(key);
    }

    /// <summary>Leaves what is being typed as it was before.</summary>
    public void Drop()
    {
        _typed = null;
        Problem = null;
        Become(Accepted, false);
    }

    /// <summary>Gives it another name, which is none of its wants.</summary>
    /// <param name="name">The name.</param>
    public void Rename(string name)
    {
        Accepted = Accepted with { Name = name };
        Current = Current with { Name = name };
    }

    /// <summary>The sentence on the screen.</summary>
    /// <param name="width">Width in cells.</param>
    /// <param name="chosen">Whether the keys go to the sentence.</param>
    /// <param name="rows">The most rows it may take: those about the chosen value are shown, or the first ones.</param>
    public ImmutableArray<Line> Draw(int width, bool chosen, int rows = int.MaxValue)
    {
        _width = width;
        SentenceLayout layout = Layout(chosen);
        if (layout.Lines.Length <= rows)
        {
            return layout.Lines;
        }

        int top = chosen ? Math.Clamp(layout.Places[At].Row - rows / 2, 0, layout.Lines.Length - rows) : 0;
        ImmutableArray<Line> shown = layout.Lines.Slice(top, rows);
        return top + rows == layout.Lines.Length ? shown
            : shown.SetItem(rows - 1, new LineBuilder(_glyphs).Add(shown[^1], width - _glyphs.Show(" …").Length).Add(" …").Build());
    }

    private SentenceAnswer Move(KeyPress key) => _walk.Press(key, Layout(true).Places) ?? Change(key);

    private SentenceAnswer Change(KeyPress key)
    {
        if (Field.Begin(Accepted, key) is { } text)
        {
            _typed = new TypedText(text);
            Preview();
            return SentenceAnswer.Done;
        }

        if (Field.Change(Accepted, key) is not { } requirement)
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

    private SentenceAnswer Type(TypedText typed, KeyPress key)
    {
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
        }

        if (typed.Press(key))
        {
            Preview();
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

        _typed = null;
        Problem = null;
        Accepted = taken.Value;
        Become(taken.Value, false);
        return true;
    }

    // What was refused stays named until the text fits.
    private void Preview()
    {
        Result<Requirement> taken = ((TypedField)Field).Take(Accepted, Typed!);
        Problem = Problem is null || taken.IsOk ? null : taken.Problem;
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

    private SentenceLayout Layout(bool chosen) => SentenceDrawing.Of(this, _pieces, _width, chosen, _glyphs);
}
