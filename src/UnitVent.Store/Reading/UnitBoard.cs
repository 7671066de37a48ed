using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Episodes;

namespace UnitVent.Store.Reading;

/// <summary>Every ventilated patient of a unit at one instant. Immutable; one is shared by all who look.</summary>
/// <param name="Unit">The unit.</param>
/// <param name="AsOf">The instant.</param>
/// <param name="Rows">The patients in the order in which they want attention.</param>
public sealed record UnitBoard(UnitProfile Unit, Instant AsOf, IReadOnlyList<BoardRow> Rows)
{
    /// <summary>Gets the first instant at which time alone changes anything; null when none does.</summary>
    public Instant? NextChangeAt { get; } = Rows.Select(r => r.Picture.NextChangeAt).Where(i => i is not null).DefaultIfEmpty(null).Min();

    internal static UnitBoard Of(UnitProfile unit, Instant asOf, IEnumerable<BoardRow> rows) => new(
        unit,
        asOf,
        [.. rows.OrderBy(r => r.Standing.Band)
            .ThenBy(r => r.Standing.Band == Band.LookNow && r.Standing.Leading?.InHand == true)
            .ThenBy(r => WithinBand(r))
            .ThenBy(r => Place(unit, r))]);

    // Look now: newest first. Look this hour: soonest due first. Not known: oldest first. The rest: by bed.
    private static long WithinBand(BoardRow row) => row.Standing.Band switch
    {
        Band.LookNow => -(row.Standing.Since ?? Instant.MinValue).ToUnixTimeTicks(),
        Band.LookThisHour => (row.Standing.DueAt ?? Instant.MaxValue).ToUnixTimeTicks(),
        Band.NotKnown => (row.Standing.Since ?? Instant.MaxValue).ToUnixTimeTicks(),
        Band.NothingRaised => 0,
    };

    private static int Place(UnitProfile unit, BoardRow row) => unit.Beds.ToList().IndexOf(row.Picture.Window.Episode.Bed);
}
