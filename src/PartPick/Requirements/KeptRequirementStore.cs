using System.Collections.Immutable;
using System.Text.Json;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Requirements;

/// <summary>
/// Keeps requirements under names, in a folder beside the catalogue: each is a requirement file as <c>rank</c> takes it. What is
/// changed or taken away must still be as it was read; what cannot be read is never touched.
/// </summary>
/// <param name="catalogPath">Path of the catalogue's file.</param>
public sealed class KeptRequirementStore(string catalogPath)
{
    private static readonly JsonSerializerOptions Indented = new() { WriteIndented = true };

    private readonly TextFolder _folder = new(catalogPath + ".wanted");

    /// <summary>The folder.</summary>
    public string Folder => _folder.Path;

    /// <summary>Reads what is kept.</summary>
    /// <returns>All that can be read, with a line for each file that cannot; or why the folder cannot be read.</returns>
    public Result<KeptRequirements> Read() => _folder.Read().Map(AllOf);

    /// <summary>Keeps a requirement under its name, which must not be taken.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <returns>What is kept now, or the problem.</returns>
    public Result<KeptRequirement> Keep(Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(requirement);
        return Named(requirement).Then(named => _folder.Change(texts => Free(texts, named.Name, null) is { } taken
            ? Result.Fail<KeptRequirement>(taken)
            : Result.Ok(Of(_folder.Add(named.Name, Write(named)), named))));
    }

    /// <summary>Puts another requirement, or the same under another name, in the place of a kept one.</summary>
    /// <param name="before">The kept one, as it was read.</param>
    /// <param name="requirement">The requirement.</param>
    /// <returns>What is kept now, or the problem.</returns>
    public Result<KeptRequirement> Replace(KeptRequirement before, Requirement requirement)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(requirement);
        return Named(requirement).Then(named => _folder.Change(texts =>
            (Same(texts, before) ?? Free(texts, named.Name, before.Id)) is { } problem
                ? Result.Fail<KeptRequirement>(problem)
                : Result.Ok(Of(_folder.Put(before.Id, Write(named)), named))));
    }

    /// <summary>Takes a kept one away.</summary>
    /// <param name="kept">The kept one, as it was read.</param>
    /// <returns>The problem; null where it is done.</returns>
    public Problem? Remove(KeptRequirement kept)
    {
        ArgumentNullException.ThrowIfNull(kept);
        return _folder.Change(texts =>
        {
            if (Same(texts, kept) is { } problem)
            {
                return Result.Fail<bool>(problem);
            }

            _folder.Remove(kept.Id);
            return Result.Ok(true);
        }).Problem;
    }

    /// <summary>Puts a text aside that is no requirement any more, rather than lose it.</summary>
    /// <param name="text">The text.</param>
    /// <returns>The problem; null where it is in the folder.</returns>
    public Problem? PutAside(string text) => _folder.Change(_ => Result.Ok(_folder.Add("not readable", text))).Problem;

    private static Result<Requirement> Named(Requirement requirement) =>
        RequirementName.Read(requirement.Name).Map(name => requirement with { Name = name });

    private static string Write(Requirement requirement) => RequirementFile.Write(requirement).ToJsonString(Indented) + "\n";

    private static KeptRequirement Of(KeptText text, Requirement requirement) => new(text.Id, requirement, text.Content.Value);

    private KeptRequirements AllOf(ImmutableArray<KeptText> texts)
    {
        var items = new List<KeptRequirement>();
        var problems = ImmutableArray.CreateBuilder<Problem>();
        foreach (KeptText text in texts)
        {
            Result<Requirement> read = text.Content.Then(content => RequirementFile.Read(content, Path.Combine(Folder, text.Id)));
            if (read.IsOk)
            {
                items.Add(Of(text, WithName(read.Value, text.Id)));
            }
            else
            {
                problems.Add(read.Problem);
            }
        }

        return new KeptRequirements(
            [.. items.OrderBy(item => item.Name, StringComparer.OrdinalIgnoreCase).ThenBy(item => item.Id, StringComparer.Ordinal)],
            problems.ToImmutable());
    }

    // A file that was put there by hand may have no name: then it is its file's.
    private static Requirement WithName(Requirement requirement, string id) =>
        requirement.Name.Trim().Length > 0 ? requirement : requirement with { Name = Path.GetFileNameWithoutExtension(id) };

    private Problem? Free(ImmutableArray<KeptText> texts, string name, string? except) =>
        AllOf(texts).Items.Any(item => item.Id != except && item.Name == name)
            ? new Problem("name", $"{Problem.Quote(name)} is kept already", "another name")
            : null;

    private static Problem? Same(ImmutableArray<KeptText> texts, KeptRequirement kept) =>
        texts.FirstOrDefault(text => text.Id == kept.Id) is { } now && now.Content.ValueOr("") == kept.Text
            ? null
            : new Problem(
                "wanted", $"{Problem.Quote(kept.Name)} was changed or taken away elsewhere meanwhile", "to look at it as it is now");
}
