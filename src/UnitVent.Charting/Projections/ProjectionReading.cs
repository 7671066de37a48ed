using UnitVent.Charting.Checking;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;

namespace UnitVent.Charting.Projections;

/// <summary>What a projection starts from: the latest arterial gas with the check that belongs to it.</summary>
internal static class ProjectionReading
{
    private const double DeadSpaceMlPerKg = 2.2; // from memory: Radford, per kg of predicted body weight; includes no apparatus

    public static PartialPressure PaCO2(PairedGas gas) => GasConsistency.Tension(gas.Gas.Body.PCO2!.Value, gas.Gas.Body.TensionUnit);

    public static Result<ReleaseReading> Of(PatientPicture picture, AprvSettings settings)
    {
        var gas = picture.LatestGas!;
        var check = gas.Check!.Value.Body;
        var own = OwnVentilation(picture, settings, check);
        List<FieldError> missing = [.. Missing(
            (check.PeakExpiratoryFlowLMin is null || check.EndReleaseFlowLMin is null, "peak and end-release flow"),
            (check.ReleaseVolumeMl is null, "release volume"),
            (own is null, "total or own minute volume"),
            (own > 0 && check.SpontaneousRatePerMin is null, "own rate"),
            (BodySize.Predicted(picture.Window.Episode.Patient) is null, "height and sex"))];
        if (missing.Count > 0)
        {
            return Result<ReleaseReading>.Refused(Refusal.Value, missing);
        }

        return Result<ReleaseReading>.Of(new(
            settings,
            (double)(check.EndReleaseFlowLMin!.Value / check.PeakExpiratoryFlowLMin!.Value),
            GasVolume.FromMillilitres((double)check.ReleaseVolumeMl!.Value),
            PaCO2(gas),
            GasVolume.FromMillilitres(DeadSpaceMlPerKg * BodySize.Predicted(picture.Window.Episode.Patient)!.Value.Kilograms),
            MinuteVentilation.FromLitresPerMinute(own!.Value),
            BreathRate.FromPerMinute((double?)check.SpontaneousRatePerMin ?? 0)));
    }

    private static double? OwnVentilation(PatientPicture picture, AprvSettings settings, Entries.VentilatorCheck check) =>
        check.SpontaneousMinuteVolumeLMin is { } measured ? (double)measured
        : check is { TotalMinuteVolumeLMin: { } total, ReleaseVolumeMl: { } volume }
            ? Math.Max(0, (double)total - ((double)volume / 1000 * ReleaseCycle.Rate(settings.TimeHigh, settings.TimeLow).PerMinute))
        : picture.Ongoing.Contains(Entries.EventKind.RelaxantStart) ? 0
        : null;

    private static IEnumerable<FieldError> Missing(params (bool IsMissing, string What)[] needs) =>
        needs.Where(n => n.IsMissing).Select(n => new FieldError("", "missing", $"Needs {n.What} of the check that belongs to the gas."));
}
