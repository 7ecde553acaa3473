using PartPick.Selection;

namespace PartPick.Screens;

/// <content>The open circuit: what is changed in it, and two circuits side by side.</content>
public sealed partial class MainModel
{
    /// <summary>What was changed in the open circuit.</summary>
    internal SwapModel Swaps { get; private set; } = new();

    /// <summary>Two circuits side by side.</summary>
    internal DifferencesModel Differences { get; }

    /// <summary>Lets the parts of an open circuit be changed; without it they cannot.</summary>
    /// <param name="parts">The parts that are ranked.</param>
    /// <param name="work">Computes.</param>
    public void ChangePartsFrom(IPartsSource parts, ScreenWork work)
    {
        Swaps = new SwapModel(parts, work);
        Swaps.Redraw += () => Redraw?.Invoke();
        List.IsChanged = Swaps.IsKept;
    }

    private void PressInCircuit(KeyPress key)
    {
        if (Swaps.Press(key, out string? notice))
        {
            Notice = notice;
            CircuitScroll.Reset();
            return;
        }

        if (CircuitScroll.Press(key))
        {
            return;
        }

        switch (key)
        {
            case { Name: KeyName.Escape or KeyName.Enter }:
                Notice = Swaps.Leave();
                _reading.Close();
                Place = Place.List;
                break;
            case { Name: KeyName.Letter, Letter: 'n' or 'b' }:
                List.Move(key.Letter == 'b' ? -1 : 1);
                OpenCircuit();
                break;
            default:
                PressAnywhere(key);
                break;
        }
    }

    private void OpenCircuit()
    {
        _reading.Open();
        Swaps.Show(List.Chosen!, List.Result!);
    }

    private void TakeInCircuit(RankingResult result)
    {
        if (_reading.IsThere)
        {
            Swaps.Show(List.Chosen!, result);
        }

        Notice = Differences.Take(result) ?? Notice;
    }

    private void PutOnList(Candidate chosen, Requirement requirement)
    {
        if (Place != Place.Circuit)
        {
            Shortlists.Ask(chosen, requirement);
        }
        else if (!IsStillComputing())
        {
            Shortlists.Ask(Swaps.Shown!, requirement, Swaps.IsChanged);
        }
    }

    private void SetBeside(Candidate chosen, Requirement requirement)
    {
        if (Place != Place.Circuit || !IsStillComputing())
        {
            Notice = Differences.Ask(chosen, Place == Place.Circuit ? Swaps.Shown! : chosen, requirement);
        }
    }

    private bool IsStillComputing()
    {
        Notice = Swaps.IsComputing ? "The figures of the changed circuit are still being computed." : null;
        return Swaps.IsComputing;
    }
}
