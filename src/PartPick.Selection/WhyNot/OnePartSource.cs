using PartPick.Catalog;

namespace PartPick.Selection.Search;

/// <summary>
/// The parts of a source with one part put among them as it is given here: for a ranking with that part alone of its kind, or with
/// all others.
/// </summary>
/// <param name="inner">The source.</param>
/// <param name="part">A crystal or an amplifier.</param>
/// <param name="alone">Whether it takes the place of all crystals, or all amplifiers.</param>
/// <param name="ratingFactor">By what the rated drive level of every crystal is multiplied; infinite for no rating.</param>
internal sealed class OnePartSource(IPartsSource inner, Part part, bool alone, double ratingFactor = 1) : IPartsSource
{
    private PartsCatalog? _inner;
    private PartsCatalog? _made;

    /// <inheritdoc/>
    public PartsCatalog PartsFor(Requirement requirement, CancellationToken cancellation)
    {
        PartsCatalog parts = inner.PartsFor(requirement, cancellation);
        if (!ReferenceEquals(parts, _inner) || _made is null)
        {
            (_inner, _made) = (parts, Make(parts));
        }

        return _made;
    }

    // Parts in other currencies are left out here, so that what is taken away cannot change which currency counts.
    private PartsCatalog Make(PartsCatalog parts)
    {
        IEnumerable<Part> others = parts.All.Where(other =>
            other.Id != part.Id && other.Offer.Currency == parts.Currency
                && !(alone && IsCrystal(other) == IsCrystal(part) && Varies(other)));
        return new PartsCatalog(others.Append(part).Select(Rated));
    }

    private Part Rated(Part one) => ratingFactor != 1 && one is CrystalPart { DriveLevelWatts: { } watts } crystal
        ? crystal with { DriveLevelWatts = double.IsInfinity(ratingFactor) ? null : watts * ratingFactor }
        : one;

    private static bool IsCrystal(Part one) => one is CrystalPart;

    private static bool Varies(Part one) => one is CrystalPart or AmplifierPart or TransistorPart;
}
