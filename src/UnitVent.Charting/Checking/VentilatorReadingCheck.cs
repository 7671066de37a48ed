using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Checking;

/// <summary>Holds the readings of one check against each other.</summary>
public static class VentilatorReadingCheck
{
    private const double ReleaseMlPerKgAskedAbove = 10; // common practice

    internal static IEnumerable<FieldError> Verdict(VentilatorCheck check, ChartWindow window) =>
        Flows(check).Concat(Volumes(check, window)).Concat(Plateau(check));

    private static IEnumerable<FieldError> Flows(VentilatorCheck check)
    {
        if (check.EndReleaseFlowLMin >= check.PeakExpiratoryFlowLMin)
        {
            yield return new(
                "endReleaseFlowLMin",
                "limit.order",
                $"End-release flow {check.EndReleaseFlowLMin} L/min must be below the peak expiratory flow {check.PeakExpiratoryFlowLMin} L/min of the same release.");
        }

        if (check is { CurveNotReadable: true, EndReleaseFlowLMin: not null })
        {
            yield return new("curveNotReadable", "contradiction", "A flow was given and the curve called not readable; one of the two.");
        }
    }

    private static IEnumerable<FieldError> Volumes(VentilatorCheck check, ChartWindow window)
    {
        if (check.SpontaneousMinuteVolumeLMin > check.TotalMinuteVolumeLMin)
        {
            yield return new(
                "spontaneousMinuteVolumeLMin",
                "ask.volumesSwapped",
                $"Own minute volume {check.SpontaneousMinuteVolumeLMin} L/min exceeds the total {check.TotalMinuteVolumeLMin} L/min: swapped?");
        }

        if (check.ReleaseVolumeMl is { } volume
            && BodySize.PredictedWeightKg(window.Episode.Patient) is { } weight
            && (double)volume / weight is > ReleaseMlPerKgAskedAbove and var perKg)
        {
            yield return new("releaseVolumeMl", "ask.releaseVolumeMl", FormattableString.Invariant($"Release volume {volume} mL is {perKg:0.0} mL/kg of predicted body weight, above 10. Is it so?"));
        }
    }

    private static IEnumerable<FieldError> Plateau(VentilatorCheck check) =>
        check.PlateauPressureCmH2O > check.PeakPressureCmH2O
            ? [new("plateauPressureCmH2O", "ask.plateauPressureCmH2O", $"Plateau {check.PlateauPressureCmH2O} cmH2O exceeds the peak {check.PeakPressureCmH2O} cmH2O. Is it so?")]
            : [];
}
