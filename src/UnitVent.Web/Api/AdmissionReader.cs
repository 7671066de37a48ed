using System.Text.Json;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>Reads an admission, and says everything that has the wrong shape at once.</summary>
public static class AdmissionReader
{
    private const string PatientMember = "patient";
    private const string FlagsMember = "contextFlags";

    public static Result<Admission> Read(JsonElement body)
    {
        if (body.ValueKind != JsonValueKind.Object)
        {
            return Result<Admission>.Refused(Refusal.Shape, "", "shape.object", "A JSON object is needed.");
        }

        var envelope = new Envelope(body, corrections: false);
        var members = envelope.Rest.EnumerateObject().ToDictionary(m => m.Name, m => m.Value);
        members.Remove(PatientMember, out var patientJson);
        members.Remove(FlagsMember, out var flagsJson);
        var form = FieldReader.Read(typeof(AdmissionForm), JsonSerializer.SerializeToElement(members));
        var patient = Patient(patientJson);
        var flags = Flags(flagsJson);
        List<FieldError> errors = [.. envelope.Errors, .. form.Errors, .. patient.Errors, .. flags.Errors];
        return errors.Count > 0
            ? Result<Admission>.Refused(Refusal.Shape, errors)
            : Result<Admission>.Of(Made(envelope.Around(form.Value), (PatientFacts)patient.Value, flags.Value));
    }

    private static Admission Made(Sent<object> sent, PatientFacts patient, IReadOnlyList<Circumstance> flags)
    {
        var form = (AdmissionForm)sent.Body;
        return new Admission(sent.Id, form.Bed!, patient, form.AirwaySecuredAt!.Value)
        {
            Reason = form.Reason,
            Method = form.Method,
            Phase = form.Phase,
            ContextFlags = flags,
            Confirmed = sent.Confirmed,
        };
    }

    private static Result<object> Patient(JsonElement json)
    {
        if (json.ValueKind is JsonValueKind.Undefined or JsonValueKind.Null)
        {
            return Result<object>.Refused(Refusal.Shape, PatientMember, "missing", "A patient is needed.");
        }

        var read = FieldReader.Read(typeof(PatientFacts), json);
        return read.Succeeded ? read : Result<object>.Refused(Refusal.Shape, [.. read.Errors.Select(e => e with { Field = $"{PatientMember}.{e.Field}" })]);
    }

    private static Result<IReadOnlyList<Circumstance>> Flags(JsonElement json)
    {
        if (json.ValueKind is JsonValueKind.Undefined or JsonValueKind.Null)
        {
            return Result<IReadOnlyList<Circumstance>>.Of([]);
        }

        var read = json.ValueKind == JsonValueKind.Array
            ? json.EnumerateArray().Select(f => f.ValueKind == JsonValueKind.String ? Choices.Read<Circumstance>(f.GetString()) : null).ToList()
            : [null];
        return read.TrueForAll(f => f is not null)
            ? Result<IReadOnlyList<Circumstance>>.Of([.. read.Select(f => f!.Value).Distinct()])
            : Result<IReadOnlyList<Circumstance>>.Refused(Refusal.Shape, FlagsMember, "shape.list", $"{FlagsMember}: a list of {string.Join(", ", Choices.Names<Circumstance>())} is needed.");
    }
}
