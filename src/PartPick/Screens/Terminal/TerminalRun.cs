using PartPick.Requirements;
using PartPick.Selection;
using PartPick.Values;
using PartPick.WhyNot;

namespace PartPick.Screens;

/// <summary>Puts the screen together and shows it.</summary>
/// <param name="catalogPath">The path of the catalogue.</param>
/// <param name="ranking">What ranks its parts.</param>
/// <param name="traits">What the terminal can show.</param>
/// <param name="keep">Keeps a requirement; called from any thread.</param>
/// <param name="opening">The reading of the parts, which may go on while the screen is shown.</param>
internal sealed class TerminalRun(
    string catalogPath, CatalogRanking ranking, TerminalTraits traits, Action<Requirement> keep, Task<Result<bool>> opening)
{
    private ScreenWork? _work;

    /// <summary>Shows the screen until it is left.</summary>
    /// <param name="loop">The loop, ready to run.</param>
    /// <param name="start">The requirement to begin with.</param>
    /// <param name="notice">A line to show until the first key; null for none.</param>
    /// <param name="desk">Where the lists of candidates are kept.</param>
    /// <param name="store">Where requirements are kept.</param>
    /// <returns>The requirement at the end.</returns>
    public Requirement Show(IScreenLoop loop, Requirement start, string? notice, IShortlistDesk desk, KeptRequirementStore store)
    {
        Glyphs glyphs = traits.Glyphs;
        Palette palette = traits.HasColour ? Palette.Coloured : Palette.Plain;
        using var live = new LiveRanking(ranking, loop.Post, TimeProvider.System);
        ScreenWork work = _work = new ScreenWork(loop.Post);
        var parts = new PartsModel(catalogPath, work, glyphs, () => DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date));
        var model = new MainModel(start, live, glyphs, notice, ranking.Currency, parts: parts);
        Await(opening);
        model.PartsChanged += () =>
        {
            Await(ranking.Open());
            model.RankAgain();
        };
        model.Settled += requirement => _ = Task.Run(() => keep(requirement));
        model.KeepListsAt(desk, work);
        model.ChangePartsFrom(ranking.Parts, work);
        model.AnswerQuestionsAt(new WhyNotDesk(catalogPath), work);
        model.KeepWantedAt(store, work, ranking);
        model.DrawPicturesWith(work);
        using var screen = new MainScreen(model, palette);
        loop.Run(screen, () => keep(model.Wanted.Accepted));
        model.Stop();
        parts.Stop();
        return model.Wanted.Accepted;

        // Rankings wait for the parts by themselves; this only says so.
        void Await(Task<Result<bool>> reading)
        {
            model.ReadsParts = !reading.IsCompleted;
            _ = reading.ContinueWith(_ => loop.Post(() => model.PartsAreRead(ranking.Currency)), TaskScheduler.Default);
        }
    }

    /// <summary>Waits for what was still being written when the screen was left.</summary>
    /// <param name="longest">The most to wait.</param>
    /// <returns>Whether all of it is done.</returns>
    public bool Finish(TimeSpan longest) => _work is null || SpinWait.SpinUntil(() => _work.IsIdle, longest);
}
