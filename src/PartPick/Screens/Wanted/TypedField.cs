using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>A value that is typed.</summary>
public sealed class TypedField : SentenceField
{
    private readonly Func<Requirement, string> _show;
    private readonly Func<Requirement, string> _text;
    private readonly Func<Requirement, string, Result<Requirement>> _take;
    private readonly Func<char, bool> _begins;
    private readonly string _fits;

    /// <summary>Makes a field.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="fits">What fits, with an example.</param>
    /// <param name="show">Its words in the sentence.</param>
    /// <param name="text">Its text when it is to be changed.</param>
    /// <param name="take">Reads a text into the requirement.</param>
    /// <param name="begins">Whether typing can begin with a letter, digit or sign.</param>
    public TypedField(
        string name,
        string fits,
        Func<Requirement, string> show,
        Func<Requirement, string> text,
        Func<Requirement, string, Result<Requirement>> take,
        Func<char, bool> begins)
        : base(name)
    {
        _fits = fits;
        _show = show;
        _text = text;
        _take = take;
        _begins = begins;
    }

    /// <inheritdoc/>
    public override string Help(Requirement requirement) => _fits;

    /// <inheritdoc/>
    public override string Show(Requirement requirement) => _show(requirement);

    /// <summary>Its text when it is to be changed.</summary>
    /// <param name="requirement">The requirement.</param>
    public string EditText(Requirement requirement) => _text(requirement);

    /// <inheritdoc/>
    public override string? Begin(Requirement requirement, KeyPress key)
    {
        string text = EditText(requirement);
        return key switch
        {
            { Name: KeyName.Enter } or { Name: KeyName.Letter, Letter: ' ' } => text,
            { Name: KeyName.Backspace } => text.Length > 0 ? text[..^1] : text,
            { Name: KeyName.Delete } => "",
            { Name: KeyName.Letter } when _begins(key.Letter) => key.Letter.ToString(),
            _ => null,
        };
    }

    /// <summary>The requirement with this value, or what is wrong with it.</summary>
    /// <param name="requirement">The requirement so far.</param>
    /// <param name="text">What was typed.</param>
    public Result<Requirement> Take(Requirement requirement, string text) => _take(requirement, text);
}
