using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Rules;

/// <summary>Whether arterial carbon dioxide rose: the latest gas against the median of the gases of the 12 h before it.</summary>
internal static class CarbonDioxideRise
{
    /// <summary>The rise in mmHg from the reference to the latest gas when it matters; null when it does not or cannot be told.</summary>
    public static Step? Of(PatientPicture picture)
    {
        if (picture.LatestGas is not { } latest || picture.AsOf - latest.Gas.At > picture.Limits.Gas)
        {
            return null;
        }

        var points = picture.Series.OfCarbonDioxide(g => GasPairing.Tension(g.Gas, "pCO2", "PaCO2", b => b.PCO2).Value).ToList();
        return points.Count > 1 && points[^1].Entry == latest.Gas.Id
            && Step.Of(points.SkipLast(1), points[^1]) is { } step
            && step.After - step.Before >= DriftVariables.PaCO2.StepMinimum.From(step.Before)
            ? step
            : null;
    }
}
