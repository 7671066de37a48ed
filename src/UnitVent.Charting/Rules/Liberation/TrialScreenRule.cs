using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Liberation;

/// <summary>R38: recorded values meet the unit's screen before a breathing trial.</summary>
public sealed class TrialScreenRule : Rule
{
    private static readonly LocalTime Noon = new(12, 0); // Respir Care 2024;69:891

    /// <inheritdoc/>
    public override string Id => "R38";

    /// <inheritdoc/>
    public override Family Family => Family.Liberation;

    /// <inheritdoc/>
    public override string Seen => "recorded values meet the unit’s trial screen";

    /// <inheritdoc/>
    public override bool OnlyWithoutCaution => true;

    /// <inheritdoc/>
    public override string Levels => "information, until noon on a day without a trial";

    /// <inheritdoc/>
    public override string Remarks => "FiO2, PEEP, SpO2, P/F, pH, effort, RASS, vasopressor. Quiet while prone, relaxed, with raised intracranial pressure, within 12 h of a rise of FiO2 and 24 h of a failed trial; left off the cards while a caution is open.";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture)
    {
        if (picture.Settings is not { Body.Mode: VentilationMode.PressureSupport or VentilationMode.Cpap } settings)
        {
            return [];
        }

        var (zone, options) = (picture.Window.Unit.Zone, picture.Window.Unit.Thresholds.TrialScreen);
        var today = picture.AsOf.InZone(zone).Date;
        return
        [
            today.At(Noon).InZoneLeniently(zone).ToInstant(),
            zone.AtStartOfDay(today.PlusDays(1)).ToInstant(),
            settings.At + Duration.FromHours(options.FiO2NotRaisedForHours),
            .. Failed(picture) is { } failed ? new[] { failed + Duration.FromHours(options.FailedTrialForHours) } : [],
        ];
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var local = picture.AsOf.InZone(picture.Window.Unit.Zone);
        if (picture.Settings is not { Body.Mode: VentilationMode.PressureSupport or VentilationMode.Cpap } settings)
        {
            return CannotTell("Not judged in this mode.");
        }

        if (local.TimeOfDay > Noon || TriedOn(picture, local.Date) || Excluded(picture, settings))
        {
            return Clear(picture.AsOf);
        }

        return TrialScreen.Of(picture, settings) is { IsComplete: true } screen
            ? !screen.IsMet ? Clear(picture.AsOf) : Raise(
                Severity.Information,
                $"recorded values match the unit’s criteria for {(picture.Has(Circumstance.Tracheostomy) ? "an off-ventilator trial" : "a breathing trial")}: {screen.Says}",
                "cough, secretions, sedation, the plan of the day",
                picture.LatestGas!.Gas.At,
                Evidence.Of(0, [picture.LatestGas.Gas.Id, settings.Id]))
            : CannotTell("Needs recent SpO2, arterial gas, RASS, effort, and whether a vasopressor runs.");
    }

    private static bool Excluded(PatientPicture picture, Charted<SettingChange> settings) =>
        picture.Prone
        || picture.Has(Circumstance.RaisedIcp)
        || picture.Ongoing.Contains(EventKind.RelaxantStart)
        || picture.Breathing?.Body.Relaxant is Relaxant.Bolus or Relaxant.Infusion
        || FiO2WasRaised(picture, settings)
        || (Failed(picture) is { } failed && picture.AsOf - failed < Duration.FromHours(picture.Window.Unit.Thresholds.TrialScreen.FailedTrialForHours));

    private static bool FiO2WasRaised(PatientPicture picture, Charted<SettingChange> settings)
    {
        var from = picture.AsOf - Duration.FromHours(picture.Window.Unit.Thresholds.TrialScreen.FiO2NotRaisedForHours);
        var lately = picture.Window.Of<SettingChange>(EntryKind.SettingChange, settings.At).ToList();
        return lately.Zip(lately.Skip(1)).Any(pair => pair.Second.At > from && pair.Second.Body.FiO2 > pair.First.Body.FiO2);
    }

    private static Instant? Failed(PatientPicture picture) => picture.Window.Latest<BedsideEvent>(
        EntryKind.Event, picture.AsOf, e => e is { What: EventKind.BreathingTrialResult, Result: TrialResult.Failed })?.At;

    private static bool TriedOn(PatientPicture picture, LocalDate day) => picture.Window.Latest<BedsideEvent>(
        EntryKind.Event, picture.AsOf, e => e.What is EventKind.BreathingTrialStart or EventKind.BreathingTrialResult) is { } trial
        && trial.At.InZone(picture.Window.Unit.Zone).Date == day;
}
