using UnitVent.Physiology;

namespace UnitVent.Charting.Episodes;

/// <summary>What follows from a patient's height and sex.</summary>
public static class BodySize
{
    /// <summary>Predicted body weight in kg; null when height or sex is missing.</summary>
    public static double? PredictedWeightKg(PatientFacts patient) => Predicted(patient)?.Kilograms;

    internal static BodyMass? Predicted(PatientFacts patient) => patient is { Sex: { } sex, HeightCm: { } height }
        ? PredictedBodyWeight.Compute(sex == Sex.Female ? LungSizeSex.Female : LungSizeSex.Male, BodyHeight.FromCentimetres((double)height))
        : null;
}
