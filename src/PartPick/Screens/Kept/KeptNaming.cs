using System.Collections.Immutable;
using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>What a name is asked for.</summary>
internal enum NamingAim
{
    /// <summary>To keep the sentence as it stands.</summary>
    Keep,

    /// <summary>To call a kept one otherwise.</summary>
    Rename,

    /// <summary>To keep a kept one once more.</summary>
    Copy,
}

/// <summary>Asks for the name under which a requirement is kept. A name that is taken is given away only by a second Enter.</summary>
internal sealed class KeptNaming
{
    private readonly KeptRow _row;
    private readonly ImmutableArray<KeptRequirement> _kept;
    private string? _confirmed;

    /// <summary>Asks for a name.</summary>
    /// <param name="aim">What it is for.</param>
    /// <param name="row">The row that is named.</param>
    /// <param name="kept">What is kept already.</param>
    public KeptNaming(NamingAim aim, KeptRow row, ImmutableArray<KeptRequirement> kept)
    {
        (Aim, _row, _kept) = (aim, row, kept);
        string name = aim switch
        {
            NamingAim.Copy => NewName(row.Name),
            _ => row.Requirement.Name,
        };
        Fields = new AskedFields(("name", name, RequirementName.Longest));
    }

    /// <summary>What the name is for.</summary>
    public NamingAim Aim { get; }

    /// <summary>The field.</summary>
    public AskedFields Fields { get; }

    /// <summary>What was typed.</summary>
    public string Name => Fields.Fields[0].Text.Trim();

    /// <summary>What Enter does.</summary>
    public string Enter => Aim switch
    {
        NamingAim.Rename => "call it so",
        NamingAim.Copy => "keep the copy",
        _ => "keep the sentence under it",
    };

    /// <summary>Takes a key; Esc is the owner's.</summary>
    /// <param name="key">The key.</param>
    /// <param name="store">Where it is kept.</param>
    /// <returns>What is to be done in the background, with a line to show then; null for nothing yet.</returns>
    public (Func<Result<KeptRequirement>> Work, string Said)? Press(KeyPress key, KeptRequirementStore store)
    {
        if (key.Name != KeyName.Enter)
        {
            _confirmed = null;
            Fields.Press(key);
            return null;
        }

        Result<string> read = RequirementName.Read(Name);
        if (!read.IsOk)
        {
            Fields.Problem = read.Problem.ToString();
            return null;
        }

        string name = read.Value;
        Requirement named = _row.Requirement with { Name = name };
        if (Aim == NamingAim.Rename)
        {
            return (() => store.Replace(_row.Kept!, named), $"It is called {name} now.");
        }

        if (_kept.FirstOrDefault(each => each.Name == name) is not { } taken || Aim == NamingAim.Copy)
        {
            return (() => store.Keep(named), $"Kept as {name}.");
        }

        if (_confirmed != name && !RankedFigures.AreSame(taken.Requirement, named))
        {
            _confirmed = name;
            Fields.Problem = $"{name} is kept with other values: Enter once more puts the sentence in their place.";
            return null;
        }

        return (() => store.Replace(taken, named), $"Kept as {name}.");
    }

    private string NewName(string name)
    {
        for (int number = 2; ; number++)
        {
            string tail = FormattableString.Invariant($" {number}");
            string proposed = name[..Math.Min(name.Length, RequirementName.Longest - tail.Length)] + tail;
            if (_kept.All(each => each.Name != proposed))
            {
                return proposed;
            }
        }
    }
}
