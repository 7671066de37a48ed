using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>Body size and time on the ventilator: A1, A31.</summary>
internal static class BodyValues
{
    private const double ShortestValidatedCm = 140;

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        var height = s.Patient.HeightCm is { } cm
            ? new Given("heightCm", "height", "cm", (double)cm, null, null)
            : Given.Missing("heightCm", "height", "cm");
        var sex = s.Patient.Sex is { } known
            ? new Given("sex", known == Episodes.Sex.Female ? "sex (female)" : "sex (male)", "", (int)known, null, null)
            : Given.Missing("sex", "sex");
        var female = s.Patient.Sex == Episodes.Sex.Female;
        yield return (female ? Equations.PredictedBodyWeightFemale : Equations.PredictedBodyWeightMale).Of(
            [height, sex],
            v => PredictedBodyWeight.Compute(female ? LungSizeSex.Female : LungSizeSex.Male, BodyHeight.FromCentimetres(v[0])).Kilograms,
            doubt: _ => Doubt(s));
        var secured = s.Window.Episode.AirwaySecuredAt;
        yield return Equations.VentilatorDays.Of(
            [new Given("sinceAirwaySecuredH", "time since the airway was secured", "h", (s.Now - secured).TotalHours, secured, null)],
            v => v[0] / 24,
            v => v[0] < 0 ? "the airway was secured later." : null);
    }

    /// <summary>Why predicted body weight is less certain than usual; null when it is not.</summary>
    public static string? Doubt(PictureSources s) =>
        (double?)s.Patient.HeightCm < ShortestValidatedCm ? "outside validated range: height below 140 cm."
        : s.Patient.HeightEstimated == true ? "outside validated range: the height was estimated."
        : null;
}
