using System.Collections.Immutable;

namespace PartPick.Screens;

/// <summary>Where a page is scrolled to.</summary>
public sealed class PageScroll
{
    private int _height = 1;
    private int _length;

    /// <summary>The first line in sight, from zero.</summary>
    public int Top { get; private set; }

    /// <summary>Whether there is more below.</summary>
    public bool HasMore => Top + _height < _length;

    /// <summary>Back to the beginning.</summary>
    public void Reset() => Top = 0;

    /// <summary>Scrolls with the keys that everywhere do so.</summary>
    /// <param name="key">The key.</param>
    /// <returns>Whether it was one of them.</returns>
    public bool Press(KeyPress key)
    {
        int? top = key switch
        {
            { Name: KeyName.Up } => Top - 1,
            { Name: KeyName.Down } => Top + 1,
            { Name: KeyName.PageUp } => Top - _height + 1,
            { Name: KeyName.PageDown } or { Name: KeyName.Letter, Letter: ' ' } => Top + _height - 1,
            { Name: KeyName.Home } => 0,
            { Name: KeyName.End } => _length,
            _ => null,
        };
        if (top is not { } wanted)
        {
            return false;
        }

        Top = Math.Clamp(wanted, 0, Math.Max(0, _length - _height));
        return true;
    }

    /// <summary>The lines in sight.</summary>
    /// <param name="page">The whole page.</param>
    /// <param name="height">Number of rows.</param>
    public ImmutableArray<Line> Cut(ImmutableArray<Line> page, int height)
    {
        _height = Math.Max(1, height);
        _length = page.Length;
        Top = Math.Clamp(Top, 0, Math.Max(0, _length - _height));
        return [.. page.Skip(Top).Take(_height)];
    }
}
