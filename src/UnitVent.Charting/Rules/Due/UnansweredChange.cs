using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Due;

/// <summary>A setting change after which nothing was looked at that would answer it.</summary>
/// <param name="ChangedAt">When.</param>
/// <param name="Entry">Its entry.</param>
/// <param name="What">What was changed.</param>
/// <param name="Awaits">What would answer it.</param>
/// <param name="OnlyGas">Whether the bedside was looked at, and only the later gas is missing.</param>
internal sealed record UnansweredChange(Instant ChangedAt, Guid Entry, string What, string Awaits, bool OnlyGas)
{
    /// <summary>The oldest change that is unanswered; null when there is none.</summary>
    public static UnansweredChange? Of(PatientPicture picture)
    {
        var answered = picture.LatestGas?.Gas.At ?? Instant.MinValue;
        var changes = picture.Window.Of<SettingChange>(EntryKind.SettingChange, picture.AsOf).ToList();
        for (var i = 1; i < changes.Count; i++)
        {
            if (changes[i].At >= answered && Open(picture, changes[i - 1].Body, changes[i]) is { } open)
            {
                return open;
            }
        }

        return null;
    }

    private static UnansweredChange? Open(PatientPicture picture, SettingChange before, Charted<SettingChange> change)
    {
        var (o, now) = (picture.Window.Unit.Thresholds.ChangeUnanswered, change.Body);
        var pressure = now.Mode == before.Mode
            && (By(before.PHighCmH2O, now.PHighCmH2O, o.PressureCmH2O) || By(before.PLowCmH2O, now.PLowCmH2O, o.PressureCmH2O) || By(before.PeepCmH2O, now.PeepCmH2O, o.PressureCmH2O)
                || By(before.InspiratoryPressureAbovePeepCmH2O, now.InspiratoryPressureAbovePeepCmH2O, o.PressureCmH2O) || By(before.PressureSupportCmH2O, now.PressureSupportCmH2O, o.PressureCmH2O));
        var ventilation = pressure || now.Mode != before.Mode || By(before.THighS, now.THighS, o.THighS) || By(before.TLowS, now.TLowS, o.TLowS);
        if (ventilation)
        {
            return AfterVentilation(picture, change);
        }

        var oxygen = By(before.FiO2, now.FiO2, o.FiO2);
        return oxygen && !Seen(picture, change.At, spO2Alone: true) ? new(change.At, change.Id, $"FiO2 {before.FiO2} → {now.FiO2}", "SpO2", OnlyGas: false) : null;
    }

    private static UnansweredChange AfterVentilation(PatientPicture picture, Charted<SettingChange> change) => picture.Phase != CoursePhase.Weaning
        ? new(change.At, change.Id, "pressures or times differ", "arterial gas", OnlyGas: false)
        : Seen(picture, change.At, spO2Alone: false)
            ? new(change.At, change.Id, "pressures or times differ", "arterial gas", OnlyGas: true)
            : new(change.At, change.Id, "pressures or times differ", "SpO2 with rate and EtCO2", OnlyGas: false);

    private static bool Seen(PatientPicture picture, Instant since, bool spO2Alone) =>
        picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.SpO2Percent is not null
            && (spO2Alone || (c.EtCO2MmHg is not null && (c.TotalRatePerMin ?? c.SpontaneousRatePerMin) is not null)))?.At > since
        || (spO2Alone && picture.Window.Latest<BreathingCheck>(EntryKind.BreathingCheck, picture.AsOf, c => c.SpO2Percent is not null)?.At > since);

    private static bool By(decimal? before, decimal? now, double least) => Math.Abs((double?)(now - before) ?? 0) >= least;
}
