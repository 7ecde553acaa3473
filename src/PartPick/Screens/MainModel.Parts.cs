namespace PartPick.Screens;

/// <content>The catalogue, and what it does to a ranking.</content>
public sealed partial class MainModel
{
    private bool _putOff;

    private void PressInParts(KeyPress key)
    {
        switch (Parts!.Press(key))
        {
            case PartsAnswer.Leave:
                LeaveParts();
                break;
            case PartsAnswer.NotMine when key.Letter == 'y' && Parts.AskableId is { } id:
                Questions.AskWhyNot(Wanted.Accepted, null, id);
                break;
            case PartsAnswer.NotMine when key.Letter is '?' or 'q':
                PressAnywhere(key);
                break;
        }
    }

    private void EnterParts()
    {
        Place = Place.Parts;
        PutOffRanking();
        Parts!.Enter();
    }

    // A ranking takes all the machine there is; it waits while the catalogue is open or others are compared.
    private void PutOffRanking()
    {
        _putOff |= _ranking.IsRunning;
        _ranking.Stop();
    }

    private void GoOnRanking()
    {
        if (_putOff)
        {
            _putOff = false;
            _ranking.Ask(Wanted.Current, TimeSpan.Zero);
        }
    }

    // The ranking that was put off goes on where the parts are the same; else it waits for the new ones.
    private void LeaveParts()
    {
        Place = _reading.IsThere ? Place.Circuit : Place.List;
        if (Parts!.HasChanged)
        {
            (Parts.HasChanged, _putOff) = (false, false);
            Kept.Figures.Clear();
            Shortlists.Aside?.Refresh();
            PartsChanged?.Invoke();
        }
        else
        {
            GoOnRanking();
        }
    }
}
