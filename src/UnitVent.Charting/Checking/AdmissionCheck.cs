using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Checking;

/// <summary>The one verdict on an admission.</summary>
public static class AdmissionCheck
{
    /// <summary>Everything that speaks against an admission.</summary>
    /// <param name="admission">What somebody wants.</param>
    /// <param name="now">The present instant.</param>
    /// <returns>Empty when the patient may be admitted.</returns>
    public static IReadOnlyList<FieldError> Verdict(Admission admission, Instant now)
    {
        ArgumentNullException.ThrowIfNull(admission);
        return [];
    }
}
