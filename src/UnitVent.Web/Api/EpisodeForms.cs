using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Api;

/// <summary>The flat members of an admission; patient and circumstances are read beside them.</summary>
public sealed record AdmissionForm
{
    [Field("Bed", Required = true, MaxLength = 20)]
    public string? Bed { get; init; }

    [Field("Airway secured", Required = true)]
    public Instant? AirwaySecuredAt { get; init; }

    [Field("Reason", MaxLength = 400)]
    public string? Reason { get; init; }

    [Field("Method")]
    public SettingMethod? Method { get; init; }

    [Field("Phase")]
    public CoursePhase? Phase { get; init; }
}

/// <summary>A move to another bed.</summary>
public sealed record MoveForm
{
    [Field("Bed", Required = true, MaxLength = 20)]
    public string? Bed { get; init; }
}

/// <summary>The end of an episode.</summary>
public sealed record EndForm
{
    [Field("Ended", Required = true)]
    public Instant? EndedAt { get; init; }

    [Field("Outcome", Required = true)]
    public Outcome? Outcome { get; init; }
}

/// <summary>Why something is done.</summary>
public sealed record ReasonForm
{
    [Field("Reason", Required = true, MaxLength = 400)]
    public string? Reason { get; init; }
}
