using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>One patient on the board, as it is read: who and why first, then the numbers.</summary>
/// <param name="Picture">What the numbers come from.</param>
/// <param name="Standing">The band and the cards.</param>
/// <param name="Now">The instant at which the screen is drawn; ages count to here.</param>
public sealed record PatientRow(PatientPicture Picture, Standing Standing, Instant Now)
{
    private static readonly Duration AnHour = Duration.FromHours(1);

    private IReadOnlyList<DueItem>? due;

    public EpisodeFacts Episode => Picture.Window.Episode;

    public Guid EpisodeId => Episode.Id;

    public string Bed => Episode.Bed;

    public string Patient => Episode.Patient.DisplayName();

    public DateTimeZone Zone => Picture.Window.Unit.Zone;

    /// <summary>The day on the ventilator; the first is day 1.</summary>
    public string Day => "day " + (Period.DaysBetween(Episode.AirwaySecuredAt.InZone(Zone).Date, Now.InZone(Zone).Date) + 1);

    public Band Band => Standing.Band;

    /// <summary>Who has the leading card in hand, with plan and end; null when nobody does.</summary>
    public string? InHand => Standing.Leading?.Flags.Select(f => f.InHand).FirstOrDefault(i => i is not null) is { } hand
        ? $"in hand: {hand.By}, {hand.Plan ?? "seen, acting"}, until {Format.Time(hand.Until, Now, Zone)}"
        : null;

    public IReadOnlyList<DueItem> Due => due ??= DueItem.Of(Picture);

    public bool DueWithinTheHour => Due.Any(d => d.At <= Now + AnHour);

    public bool OnAprv => Picture.Settings?.Body.Mode == VentilationMode.Aprv;

    public bool Weaning => Picture.Phase == CoursePhase.Weaning;

    /// <summary>Whether no gas was drawn since the settings changed, or none that is young enough.</summary>
    public bool GasDue => Picture.LatestGas is not { } gas || gas.Gas.At < Picture.Settings?.At || Now - gas.Gas.At > Picture.Limits.Gas;
}
