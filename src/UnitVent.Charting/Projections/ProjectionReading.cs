using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
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
        var check = gas.Check!.Value;
        var values = new CheckValues(picture.Window, check);
        var ratio = values[ValueNames.EndReleaseFlowPercent]?.Value;
        var own = values[ValueNames.SpontaneousMinuteVolumeLMin]?.Value ?? (picture.Ongoing.Contains(EventKind.RelaxantStart) ? 0 : null);
        var weight = BodySize.Predicted(picture.Window.Episode.Patient);
        List<FieldError> missing = [.. Missing(
            (ratio is null, "peak and end-release flow"),
            (check.Body.ReleaseVolumeMl is null, "release volume"),
            (own is null, "total or own minute volume"),
            (own > 0 && check.Body.SpontaneousRatePerMin is null, "own rate"),
            (weight is null, "height and sex"))];
        return missing.Count > 0 ? Result<ReleaseReading>.Refused(Refusal.Value, missing) : Result<ReleaseReading>.Of(new(
            settings,
            ratio!.Value / 100,
            GasVolume.FromMillilitres((double)check.Body.ReleaseVolumeMl!.Value),
            PaCO2(gas),
            GasVolume.FromMillilitres(DeadSpaceMlPerKg * weight!.Value.Kilograms),
            MinuteVentilation.FromLitresPerMinute(own!.Value),
            BreathRate.FromPerMinute((double?)check.Body.SpontaneousRatePerMin ?? 0)));
    }

    private static IEnumerable<FieldError> Missing(params (bool IsMissing, string What)[] needs) =>
        needs.Where(n => n.IsMissing).Select(n => new FieldError("", "missing", $"Needs {n.What} of the check that belongs to the gas."));
}
