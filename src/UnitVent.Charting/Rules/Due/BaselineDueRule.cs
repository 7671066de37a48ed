using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Due;

/// <summary>R51: the first charting of a patient is incomplete.</summary>
public sealed class BaselineDueRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R51";

    /// <inheritdoc/>
    public override Family Family => Family.Due;

    /// <inheritdoc/>
    public override string Seen => "baseline incomplete";

    /// <inheritdoc/>
    public override string Levels => "4 h after admission, due list only (information)";

    /// <inheritdoc/>
    public override string Remarks => "Height and sex, settings, check, arterial gas, RASS, tube.";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) => [DueAt(picture)];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var missing = Missing(picture).ToList();
        return missing.Count == 0 || picture.AsOf <= DueAt(picture) ? Clear(picture.AsOf) : Raise(
            Severity.Information,
            "not charted yet: " + string.Join(", ", missing),
            "what is missing",
            DueAt(picture),
            Evidence.Of(missing.Count, [], ("missing", missing.Count)));
    }

    private static Instant DueAt(PatientPicture picture) => picture.Window.Episode.AdmittedAt + Duration.FromHours(picture.Window.Unit.Thresholds.BaselineDue.Hours);

    private static IEnumerable<string> Missing(PatientPicture picture) => new (string What, bool IsThere)[]
    {
        ("height", picture.Window.Episode.Patient.HeightCm is not null),
        ("sex for lung size", picture.Window.Episode.Patient.Sex is not null),
        ("settings", picture.Settings is not null),
        ("ventilator check", picture.Check is not null),
        ("arterial gas", picture.LatestGas is not null),
        ("RASS", picture.Breathing is not null),
        ("tube", picture.Airway is not null),
    }.Where(m => !m.IsThere).Select(m => m.What);
}
