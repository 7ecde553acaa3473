using PartPick.Catalog;
using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Keeps the last requirement in the catalogue's file. May be called from any thread.</summary>
/// <param name="catalogPath">Path of the catalogue's file.</param>
public sealed class RequirementKeeper(string catalogPath)
{
    private const string Setting = "requirement";

    private readonly Lock _lock = new();
    private string? _kept;
    private string? _unread;

    /// <summary>The requirement that was kept.</summary>
    /// <returns>The requirement, null when none has been kept; or the problem.</returns>
    public Result<Requirement?> Recall()
    {
        Result<string?> kept = CatalogStore.ReadSetting(catalogPath, Setting);
        Result<Requirement?> read = kept.Then(json => json is null
            ? Result.Ok<Requirement?>(null)
            : RequirementFile.Read(json, "the requirement that was kept").Map<Requirement?>(requirement => requirement));
        _unread = read.IsOk ? null : kept.ValueOr(null);
        return read;
    }

    /// <summary>Keeps a requirement, if it is another one than before.</summary>
    /// <param name="requirement">The requirement.</param>
    /// <returns>The problem; null when it is kept.</returns>
    public Problem? Keep(Requirement requirement)
    {
        string json = RequirementFile.Write(requirement).ToJsonString();
        lock (_lock)
        {
            if (json == _kept)
            {
                return null;
            }

            // What could not be read is put aside before another one takes its place.
            if (_unread is { } text)
            {
                if (new KeptRequirementStore(catalogPath).PutAside(text) is { } wrong)
                {
                    return wrong;
                }

                _unread = null;
            }

            Problem? problem = CatalogStore.WriteSetting(catalogPath, Setting, json);
            _kept = problem is null ? json : null;
            return problem;
        }
    }
}
