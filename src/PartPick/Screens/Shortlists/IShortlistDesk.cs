using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Selection;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>Keeps and shows the lists of candidates for the screens. All of it reads the disk: never on the screen's thread.</summary>
public interface IShortlistDesk
{
    /// <summary>The names of the lists.</summary>
    Result<ImmutableArray<string>> Names();

    /// <summary>A list at a glance, without reading more of the catalogue than its own parts.</summary>
    /// <param name="list">The name of the list; where it is not there, the first one is meant.</param>
    Result<ListGlance> Glance(string list);

    /// <summary>The candidates of a list, recomputed from today's parts.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="cancellation">Ends the reading.</param>
    Result<ImmutableArray<ShortlistReview>> Read(string list, CancellationToken cancellation);

    /// <summary>A candidate of a list, analysed with today's parts.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="number">Its number.</param>
    /// <param name="cancellation">Ends the reading.</param>
    Result<ListCircuit> Circuit(string list, int number, CancellationToken cancellation);

    /// <summary>Puts a candidate on a list.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="choice">The parts.</param>
    /// <param name="requirement">What is wanted, with the number of boards.</param>
    /// <param name="note">Free text; null for none.</param>
    /// <param name="support">The parts that the circuit needs besides; null for the usual ones.</param>
    /// <param name="cancellation">Ends it, as long as it is not on the list.</param>
    Result<ShortlistEntry> Put(
        string list, CandidateParts choice, Requirement requirement, string? note, SupportParts? support, CancellationToken cancellation);

    /// <summary>Takes a candidate off a list.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="number">Its number.</param>
    /// <returns>The problem; null where it is done.</returns>
    Problem? Remove(string list, int number);

    /// <summary>Writes a list to a file; its ending says in which form.</summary>
    /// <param name="list">The name of the list.</param>
    /// <param name="path">The path of the file.</param>
    /// <param name="replace">Whether a file that is there may be replaced.</param>
    /// <param name="cancellation">Ends it, as long as nothing is written.</param>
    /// <returns>What was written, in a few words; or the problem.</returns>
    Result<string> Export(string list, string path, bool replace, CancellationToken cancellation);

    /// <summary>Whether a file is there already.</summary>
    /// <param name="path">The path of the file.</param>
    bool IsThere(string path);
}
