using System.Collections.Immutable;
using PartPick.Catalog;
using PartPick.Catalog.Browsing;
using PartPick.Values;

namespace PartPick.Screens;

/// <summary>
/// Reads the rows of the catalogue in the background, and makes the view of them that was asked for last; an older wish is
/// dropped. Everything but the work itself happens where the screen's thread is.
/// </summary>
/// <param name="path">The path of the catalogue.</param>
/// <param name="work">Does the work.</param>
public sealed class PartListSource(string path, ScreenWork work)
{
    private ImmutableDictionary<PartKind, PartRows> _rows = ImmutableDictionary<PartKind, PartRows>.Empty;
    private (PartFilter Filter, ListColumn Column, bool IsDescending)? _wish;
    private CancellationTokenSource? _reading;
    private CancellationTokenSource? _viewing;
    private bool _hasNewRows;

    /// <summary>Raised when there is another view, or reading has gone on.</summary>
    public event Action? Changed;

    /// <summary>The view that was made last.</summary>
    public PartView View { get; private set; } = PartView.None(PartKind.Crystal);

    /// <summary>Whether not all rows are there yet.</summary>
    public bool IsReading => _reading is not null;

    /// <summary>Whether a view is being made.</summary>
    public bool IsViewing => _viewing is not null;

    /// <summary>Why the catalogue could not be read; null where it could.</summary>
    public Problem? Problem { get; private set; }

    /// <summary>Whether rows were asked for already.</summary>
    public bool IsBegun { get; private set; }

    /// <summary>Reads all rows, again where that was done before.</summary>
    public void Read()
    {
        _reading?.Cancel();
        IsBegun = true;
        Problem = null;
        CancellationTokenSource? own = null;
        own = work.Start(
            stop => PartListing.Read(path, rows => work.Post(() => Take(rows, stop)), stop),
            result =>
            {
                if (_reading != own)
                {
                    return;
                }

                _reading = null;
                Problem = result.Problem;
                Take(result.ValueOr(_rows), CancellationToken.None);
                Changed?.Invoke();
            });
        _reading = own;
    }

    /// <summary>Asks for a view.</summary>
    /// <param name="filter">What it lets through.</param>
    /// <param name="column">The column that gives the order.</param>
    /// <param name="descending">Whether the order is turned round.</param>
    public void Show(PartFilter filter, ListColumn column, bool descending)
    {
        _wish = (filter, column, descending);
        _viewing?.Cancel();
        Make();
    }

    /// <summary>Puts a row in the place of the one of the same part.</summary>
    /// <param name="row">The row.</param>
    public void Put(PartRow row)
    {
        ArgumentNullException.ThrowIfNull(row);
        if (_rows.TryGetValue(row.Kind, out PartRows? rows))
        {
            Take(_rows.SetItem(row.Kind, rows.With(row)), CancellationToken.None);
        }
    }

    /// <summary>Ends all work.</summary>
    public void Stop()
    {
        _reading?.Cancel();
        _viewing?.Cancel();
    }

    private void Take(ImmutableDictionary<PartKind, PartRows> rows, CancellationToken stop)
    {
        if (stop.IsCancellationRequested)
        {
            return;
        }

        _rows = rows;
        _hasNewRows = true;
        if (_viewing is null)
        {
            Make();
        }
    }

    private void Make()
    {
        if (_wish is not { } wish)
        {
            return;
        }

        _hasNewRows = false;
        PartView earlier = View;
        PartRows rows = _rows.GetValueOrDefault(wish.Filter.Kind) ?? PartRows.None(wish.Filter.Kind);
        CancellationTokenSource? own = null;
        own = work.Start(
            stop => PartView.Of(rows, wish.Filter, wish.Column, wish.IsDescending, earlier, stop),
            view =>
            {
                if (_viewing != own)
                {
                    return;
                }

                _viewing = null;
                View = view;
                if (_hasNewRows)
                {
                    Make();
                }

                Changed?.Invoke();
            });
        _viewing = own;
    }
}
