using PartPick.Requirements;
using PartPick.WhyNot;

namespace PartPick.Screens;

/// <content>The pages that open over the list, where the program has given them what they work with.</content>
public sealed partial class MainModel
{
    /// <summary>The lists of candidates.</summary>
    internal ShortlistModel Shortlists { get; private set; } = new();

    /// <summary>The kept requirements.</summary>
    internal KeptModel Kept { get; private set; } = new();

    /// <summary>The pictures of a candidate.</summary>
    internal PicturesModel Pictures { get; private set; } = new();

    /// <summary>What can be asked of the list and of a circuit.</summary>
    internal QuestionModel Questions { get; private set; } = new();

    /// <summary>Lets circuits be put on lists; without it there are none.</summary>
    /// <param name="desk">Where the lists are kept.</param>
    /// <param name="work">Does what takes long.</param>
    public void KeepListsAt(IShortlistDesk desk, ScreenWork work)
    {
        Shortlists = new ShortlistModel(desk, work, _glyphs.IsAscii);
        Shortlists.Redraw += () => Redraw?.Invoke();
        Shortlists.Said += Say;
    }

    /// <summary>Lets requirements be kept; without it none are.</summary>
    /// <param name="store">Where they are kept.</param>
    /// <param name="work">Does what takes long.</param>
    /// <param name="service">What ranks those that are compared.</param>
    public void KeepWantedAt(KeptRequirementStore store, ScreenWork work, IRankingService service)
    {
        Kept = new KeptModel(store, work, service);
        if (List.Result is { } result)
        {
            Kept.Figures.Take(result);
        }

        Kept.Changed += said =>
        {
            Notice = said ?? Notice;
            Redraw?.Invoke();
        };
        Kept.Named += name => Wanted.Rename(name);
        Kept.Taken += Begin;
        Kept.Comparison!.Ranked += TakeInstead;
        Kept.Comparison.Ranks += ranks =>
        {
            if (ranks)
            {
                PutOffRanking();
            }
            else
            {
                GoOnRanking();
            }
        };
    }

    /// <summary>Lets pictures of circuits be opened; without it there are none.</summary>
    /// <param name="work">Does what takes long.</param>
    public void DrawPicturesWith(ScreenWork work)
    {
        Pictures = new PicturesModel(work);
        Pictures.Redraw += () => Redraw?.Invoke();
        Pictures.Said += Say;
    }

    /// <summary>Lets questions be asked; without it there are none.</summary>
    /// <param name="desk">What answers why a part is not in the list.</param>
    /// <param name="work">Does what takes long.</param>
    public void AnswerQuestionsAt(IWhyNotDesk desk, ScreenWork work)
    {
        Questions = new QuestionModel(desk, work);
        Questions.Redraw += () => Redraw?.Invoke();
    }
}
