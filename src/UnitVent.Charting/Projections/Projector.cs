using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Charting.Wording;
using UnitVent.Physiology;

namespace UnitVent.Charting.Projections;

/// <summary>Answers what settings that are considered would do (A16, A17).</summary>
public static class Projector
{
    private const double UsualStepCmH2O = 2; // Crit Care Med 2005;33(3 Suppl):S228-S240, from memory: 2–3
    private const double UsualStretchS = 1;

    private static readonly string[] Assumptions =
    [
        "One lung with one time constant; no recruitment and no collapse by the change.",
        "Carbon dioxide output, dead space and own breathing stay as they are.",
        "Dead space of a breath is taken as 2.2 mL per kg of predicted body weight (from memory); the band takes 0.7 to 1.3 times that.",
        "A new balance needs up to an hour; a gas then tells.",
    ];

    /// <summary>What follows from settings that are considered.</summary>
    /// <param name="picture">The patient.</param>
    /// <param name="proposed">What would change.</param>
    /// <returns>The projection, with refusals inside when PaCO2 cannot be projected; refused when the settings themselves cannot be.</returns>
    public static Result<Projection> Of(PatientPicture picture, ProposedSettings proposed)
    {
        if (picture.Settings is not { Body: { Mode: VentilationMode.Aprv } present })
        {
            return Result<Projection>.Refused(Refusal.Conflict, "", "mode", "Not defined in this mode: only APRV has releases.");
        }

        var planned = present with
        {
            PHighCmH2O = proposed.PHighCmH2O ?? present.PHighCmH2O,
            PLowCmH2O = proposed.PLowCmH2O ?? present.PLowCmH2O,
            THighS = proposed.THighS ?? present.THighS,
            TLowS = proposed.TLowS ?? present.TLowS,
        };
        List<FieldError> errors = [.. FieldLimits.Verdict(proposed).Concat(FieldLimits.Verdict(planned)).Concat(SettingCheck.Verdict(planned, picture.Window)).Where(e => !e.IsAsk)];
        return errors.Count > 0 ? Result<Projection>.Refused(Refusal.Value, errors) : Result<Projection>.Of(Whole(picture, Aprv(present), Aprv(planned), proposed));
    }

    private static Projection Whole(PatientPicture picture, AprvSettings present, AprvSettings planned, ProposedSettings proposed)
    {
        List<string> refusals = [.. ClinicalRefusals.Of(picture)];
        var answer = refusals.Count == 0 ? Ask(picture, present, planned, refusals) : null;
        return new(
            Release(present, answer?.Present),
            Release(planned, answer?.Planned),
            answer is null ? null : PaCO2(picture, answer.PaCO2),
            Held(present, planned),
            [.. StepDownSchedule
                .From(present, AirwayPressure.FromCmH2O((double?)proposed.StepCmH2O ?? UsualStepCmH2O), BreathTime.FromSeconds((double?)proposed.StretchS ?? UsualStretchS))
                .Select(s => new StepDownSetting(s.High.CmH2O, s.TimeHigh.Seconds, s.MeanPressure.CmH2O, s.Rate.PerMinute))],
            Assumptions,
            refusals);
    }

    private static ProjectedChange? Ask(PatientPicture picture, AprvSettings present, AprvSettings planned, List<string> refusals)
    {
        var reading = ProjectionReading.Of(picture, present);
        if (!reading.Succeeded)
        {
            refusals.AddRange(reading.Errors.Select(e => e.Message));
            return null;
        }

        try
        {
            var answer = AprvProjection.Project(reading.Value, planned);
            refusals.AddRange(answer.Refusals.Select(ProjectionWords.Of));
            if (answer.Change is { } change && ProjectionWords.OutsideWindow(picture, 100 * change.Planned.TerminationRatio) is { } outside)
            {
                refusals.Add(outside);
            }

            return refusals.Count == 0 ? answer.Change : null;
        }
        catch (ArgumentOutOfRangeException)
        {
            refusals.Add("Cannot be calculated from these values: one of them lies outside what the model is made for.");
            return null;
        }
    }

    private static ProjectedRelease Release(AprvSettings settings, ReleaseState? state) => new(
        MeanAirwayPressure.Aprv(settings.High, settings.Low, settings.TimeHigh, settings.TimeLow).CmH2O,
        ReleaseCycle.Rate(settings.TimeHigh, settings.TimeLow).PerMinute,
        state?.Volume.Millilitres,
        100 * state?.TerminationRatio,
        state?.AlveolarVentilation.LitresPerMinute);

    private static ProjectedPaCO2 PaCO2(PatientPicture picture, PaCO2Band band)
    {
        var now = ProjectionReading.PaCO2(picture.LatestGas!).MmHg;
        return new(now, band.Expected.MmHg, band.Lowest.MmHg, band.Highest.MmHg, band.WithoutOwnBreaths?.MmHg, ProjectionWords.Direction(now, band.Expected.MmHg));
    }

    private static HeldMean Held(AprvSettings present, AprvSettings planned)
    {
        var mean = MeanAirwayPressure.Aprv(present.High, present.Low, present.TimeHigh, present.TimeLow);
        if (!MeanPressureTrade.CanKeepMean(mean, planned.High, planned.Low, planned.TimeLow))
        {
            return new(mean.CmH2O, null, $"No T high keeps a mean pressure of {Numbers.Fixed(mean.CmH2O, 1)} cmH2O: P high is already at or below it, or would need more than 60 s.");
        }

        var time = MeanPressureTrade.TimeHigh(mean, planned.High, planned.Low, planned.TimeLow);
        return MeanPressureTrade.IsWithinLimits(time, planned.TimeLow)
            ? new(mean.CmH2O, time.Seconds, $"T high {Numbers.Fixed(time.Seconds, 1)} s would keep a mean pressure of {Numbers.Fixed(mean.CmH2O, 1)} cmH2O.")
            : new(mean.CmH2O, null, $"A mean pressure of {Numbers.Fixed(mean.CmH2O, 1)} cmH2O would need a T high of {Numbers.Fixed(time.Seconds, 1)} s: fewer than 5 releases a minute.");
    }

    private static AprvSettings Aprv(SettingChange settings) => new(
        AirwayPressure.FromCmH2O((double)settings.PHighCmH2O!),
        AirwayPressure.FromCmH2O((double)settings.PLowCmH2O!),
        BreathTime.FromSeconds((double)settings.THighS!),
        BreathTime.FromSeconds((double)settings.TLowS!));
}
