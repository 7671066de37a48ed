using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Checking;

/// <summary>The one verdict on an admission.</summary>
public static class AdmissionCheck
{
    private static readonly Duration LongestBefore = Duration.FromDays(365);

    /// <summary>Everything that speaks against an admission: refusals, and questions that were not yet answered with yes.</summary>
    /// <param name="admission">What somebody wants.</param>
    /// <param name="now">The present instant.</param>
    /// <returns>Empty when the patient may be admitted.</returns>
    public static IReadOnlyList<FieldError> Verdict(Admission admission, Instant now)
    {
        ArgumentNullException.ThrowIfNull(admission);
        return [.. Facts(admission.Patient, now)
            .Concat(Envelope(admission, now))
            .Where(e => !(e.IsAsk && admission.Confirmed.Contains(e.Code)))];
    }

    /// <summary>Everything that speaks against a patient's facts. Field names are prefixed with <c>patient.</c>.</summary>
    public static IEnumerable<FieldError> Facts(PatientFacts patient, Instant now)
    {
        var errors = FieldLimits.Verdict(patient);
        if (patient.BirthDate > now.InUtc().Date)
        {
            errors = errors.Append(new("birthDate", "time.future", "The birth date lies in the future."));
        }

        return errors.Select(e => e with { Field = "patient." + e.Field });
    }

    private static IEnumerable<FieldError> Envelope(Admission admission, Instant now)
    {
        if (admission.Id == Guid.Empty)
        {
            yield return new("id", "missing", "An id is needed.");
        }

        if (string.IsNullOrWhiteSpace(admission.Bed))
        {
            yield return new("bed", "missing", "A bed is needed.");
        }

        if (admission.AirwaySecuredAt > now + TimeCheck.Ahead)
        {
            yield return new("airwaySecuredAt", "time.future", "The time at which the airway was secured lies in the future.");
        }
        else if (admission.AirwaySecuredAt < now - LongestBefore)
        {
            yield return new("airwaySecuredAt", "ask.airwaySecuredAt", "The airway was secured more than a year ago. Is it so?");
        }
    }
}
