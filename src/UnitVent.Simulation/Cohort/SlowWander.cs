using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Cohort;

/// <summary>The slow correlated wander of the study's patients: first-order autoregressive, 0.9 from one check to the next. Has to be asked in order of time.</summary>
internal sealed class SlowWander(KeyedRandom random, IReadOnlyList<int> checkMinutes)
{
    private static readonly double CorrelationChecks = -1 / Math.Log(0.9);

    private readonly Wander compliance = new(random.For("compliance"), CorrelationChecks);
    private readonly Wander resistance = new(random.For("resistance"), CorrelationChecks);
    private readonly Wander shunt = new(random.For("shunt"), CorrelationChecks);
    private readonly Wander ownRate = new(random.For("own rate"), CorrelationChecks);
    private readonly Wander ownVolume = new(random.For("own volume"), CorrelationChecks);

    public PatientParameters Of(PatientParameters calm, double hour)
    {
        var check = ChecksUntil(hour * 60);
        var airway = 1 + (0.03 * resistance.At(check));
        return calm with
        {
            ComplianceMlPerCmH2O = calm.ComplianceMlPerCmH2O * (1 + (0.03 * compliance.At(check))),
            InspiratoryResistanceCmH2OSPerL = calm.InspiratoryResistanceCmH2OSPerL * airway,
            ExpiratoryResistanceCmH2OSPerL = calm.ExpiratoryResistanceCmH2OSPerL * airway,
            ShuntFraction = calm.ShuntFraction + (0.006 * shunt.At(check)),
            OwnRatePerMin = calm.OwnRatePerMin * (1 + (0.08 * ownRate.At(check))),
            OwnVolumeMl = calm.OwnVolumeMl * (1 + (0.06 * ownVolume.At(check))),
        };
    }

    /// <summary>How many checks were done, the share of the way to the next included.</summary>
    private double ChecksUntil(double minute)
    {
        var done = 0;
        while (done < checkMinutes.Count && checkMinutes[done] <= minute)
        {
            done++;
        }

        var (from, to) = (done == 0 ? 0 : checkMinutes[done - 1], done == checkMinutes.Count ? int.MaxValue : checkMinutes[done]);
        return done + ((minute - from) / (to - from));
    }
}
