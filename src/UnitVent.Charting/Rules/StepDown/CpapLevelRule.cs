using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.StepDown;

/// <summary>R37: recorded values match the unit's criteria of a level near CPAP.</summary>
public sealed class CpapLevelRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R37";

    /// <inheritdoc/>
    public override Family Family => Family.StepDown;

    /// <inheritdoc/>
    public override string Seen => "recorded values match the unit’s CPAP-level criteria";

    /// <inheritdoc/>
    public override bool OnlyWithoutCaution => true;

    /// <inheritdoc/>
    public override string Levels => "P high up to 15 cmH2O, T high from 10 s, FiO2 up to 0.40, own share from 80 %, for 4 h: information";

    /// <inheritdoc/>
    public override string Remarks => "Left off the cards while a caution is open.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        picture.Settings is { } settings && Matches(settings.Body, picture.Window.Unit.Thresholds.CpapLevel) ? [settings.At + Duration.FromHours(picture.Window.Unit.Thresholds.CpapLevel.ForHours)] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.CpapLevel;
        if (picture.Settings is not { Body: { Mode: VentilationMode.Aprv, PHighCmH2O: { } high, THighS: { } tHigh, FiO2: { } fiO2 } } settings)
        {
            return CannotTell("Needs settings of APRV.");
        }

        var from = picture.AsOf - Duration.FromHours(options.ForHours);
        var within = picture.Window.Of<SettingChange>(EntryKind.SettingChange, picture.AsOf).Where(s => s.At > from).Append(InForce.Settings(picture.Window, from) ?? settings);
        if (InForce.Settings(picture.Window, from) is null || !within.All(s => Matches(s.Body, options)))
        {
            return Clear(settings.At);
        }

        var shares = picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf).Where(c => c.At >= from)
            .Select(c => (c.Id, c.At, Share: new CheckValues(picture.Window, c)[ValueNames.SpontaneousSharePercent]?.Value)).Where(c => c.Share is not null).ToList();
        return shares.Count == 0 ? CannotTell("Needs the own share of minute volume of these hours.")
            : shares.Any(c => c.Share < options.OwnShareFromPercent) ? Clear(shares[^1].At)
            : Raise(
                Severity.Information,
                $"recorded values match the unit’s criteria for a level near CPAP: P high {high} cmH2O, T high {tHigh} s, FiO2 {fiO2}, own share {Numbers.Fixed(shares[^1].Share!.Value)} % for {Numbers.Plain(options.ForHours)} h",
                "work of breathing, sedation, cough, the plan of the day",
                shares[^1].At,
                Evidence.Of(0, [shares[^1].Id, settings.Id], ("ownSharePercent", shares[^1].Share!.Value)));
    }

    private static bool Matches(SettingChange s, CpapLevelOptions options) =>
        s.Mode == VentilationMode.Aprv
        && (double?)s.PHighCmH2O <= options.PHighUpToCmH2O
        && (double?)s.THighS >= options.THighFromS
        && (double?)s.FiO2 <= options.FiO2UpTo;
}
