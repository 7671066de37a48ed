using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>The thresholds that somebody chose for a unit, whole. Append-only; in force from when nobody or somebody else had to agree.</summary>
internal sealed class ThresholdVersionRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Instant At { get; set; }

    public string By { get; set; } = "";

    public Guid? ById { get; set; }

    public string Reason { get; set; } = "";

    public string Chosen { get; set; } = "";

    public bool NeedsSecond { get; set; }
}

/// <summary>What a second person said of them. Append-only.</summary>
internal sealed class ThresholdAnswerRow
{
    public Guid UnitId { get; set; }

    public Guid VersionId { get; set; }

    public Instant At { get; set; }

    public string By { get; set; } = "";

    public Guid? ById { get; set; }

    public bool Agrees { get; set; }
}
