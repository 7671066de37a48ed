using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>What was known of a patient from a moment on. Append-only.</summary>
internal sealed class PatientFactRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid PatientId { get; set; }

    public Instant RecordedAt { get; set; }

    public string RecordedBy { get; set; } = "";

    public string? Reason { get; set; }

    public string Facts { get; set; } = "";
}
