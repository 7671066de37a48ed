namespace UnitVent.Physiology;

/// <summary>Predicted resting energy, and the carbon dioxide output that goes with it.</summary>
/// <remarks>A prediction for healthy people at rest: fever, sedation and illness move the true value by a third or more.</remarks>
public static class RestingMetabolism
{
    private const double LowestYears = 18;
    private const double HighestYears = 120;
    private const double LowestKilograms = 20;
    private const double HighestKilograms = 400;
    private const double HighestKcalPerDay = 10000;
    private const double RespiratoryQuotient = 0.8;
    private const double MinutesPerDayPerThousand = 1.44; // kcal/day into cal/min

    /// <summary>Computes the resting energy in kcal/day.</summary>
    /// <remarks><para>Men 66.473 + 13.7516 × kg + 5.0033 × cm − 6.755 × years; women 655.0955 + 9.5634 × kg + 1.8496 × cm − 4.6756 × years.</para>
    /// <para>Source: Harris JA, Benedict FG. Proc Natl Acad Sci USA 1918;4:370-373; constants from memory.</para></remarks>
    /// <param name="sex">The sex recorded for the formulas of body size.</param>
    /// <param name="actualMass">Actual, not predicted, body mass, in [20, 400] kg.</param>
    /// <param name="height">Body height.</param>
    /// <param name="years">Age in years, in [18, 120].</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, NaN or outside its range.</exception>
    public static double HarrisBenedictKcalPerDay(LungSizeSex sex, BodyMass actualMass, BodyHeight height, double years)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(height, default);
        var kg = Guard.InRange(actualMass.Kilograms, LowestKilograms, HighestKilograms, nameof(actualMass));
        Guard.InRange(years, LowestYears, HighestYears);

        return sex switch
        {
            LungSizeSex.Male => 66.473 + (13.7516 * kg) + (5.0033 * height.Centimetres) - (6.755 * years),
            LungSizeSex.Female => 655.0955 + (9.5634 * kg) + (1.8496 * height.Centimetres) - (4.6756 * years),
        };
    }

    /// <summary>Computes the carbon dioxide output in mL/min STPD: (REE / 1.44) / (3.941 / R + 1.106), R = 0.8.</summary>
    /// <remarks>Source: Weir JB. J Physiol 1949;109:1-9, without nitrogen; constants from memory.</remarks>
    /// <param name="restingKcalPerDay">Resting energy in kcal/day, in [0, 10 000].</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="restingKcalPerDay"/> is NaN or outside its range.</exception>
    public static double CarbonDioxideMlPerMin(double restingKcalPerDay)
        => Guard.InRange(restingKcalPerDay, 0, HighestKcalPerDay) / MinutesPerDayPerThousand / ((3.941 / RespiratoryQuotient) + 1.106);
}
