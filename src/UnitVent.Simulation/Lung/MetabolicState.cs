using UnitVent.Physiology;

namespace UnitVent.Simulation.Lung;

/// <summary>pH from PaCO2 and the metabolic state.</summary>
public static class MetabolicState
{
    /// <summary>The pH at which bicarbonate by Henderson–Hasselbalch gives the wanted standard base excess; that rises with pH, so halving finds it.</summary>
    public static double PH(double paCO2MmHg, double standardBaseExcess)
    {
        var tension = PartialPressure.FromMmHg(paCO2MmHg);
        var (low, high) = (6.5, 8.0);
        while (high - low > 1e-9)
        {
            var middle = (low + high) / 2;
            var pH = BloodPH.FromPH(middle);
            var reached = BaseExcess.Standard(pH, HendersonHasselbalch.Bicarbonate(pH, tension));
            (low, high) = reached < standardBaseExcess ? (middle, high) : (low, middle);
        }

        return (low + high) / 2;
    }
}
