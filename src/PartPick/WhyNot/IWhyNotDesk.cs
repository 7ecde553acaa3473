using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.WhyNot;

/// <summary>Answers why a part is not in a ranked list.</summary>
public interface IWhyNotDesk
{
    /// <summary>Finds the answer; it may take a while.</summary>
    /// <param name="requirement">What is needed.</param>
    /// <param name="id">The id of a crystal or an amplifier.</param>
    /// <param name="progress">Is told from any thread what is being looked for; may be null.</param>
    /// <param name="cancellation">Ends it with <see cref="OperationCanceledException"/>.</param>
    /// <returns>The answer, or the problem.</returns>
    Result<WhyNotAnswer> Ask(Requirement requirement, string id, IProgress<string>? progress, CancellationToken cancellation);

    /// <summary>The parts of the catalogue as lines of a list, by kind.</summary>
    /// <param name="cancellation">Ends it with <see cref="OperationCanceledException"/>.</param>
    Result<ImmutableDictionary<PartKind, PartRows>> Rows(CancellationToken cancellation);
}
