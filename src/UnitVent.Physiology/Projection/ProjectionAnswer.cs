namespace UnitVent.Physiology;

/// <summary>A projected change, or every reason why there is none.</summary>
public sealed record ProjectionAnswer
{
    internal ProjectionAnswer(ProjectedChange change) => Change = change;

    internal ProjectionAnswer(IReadOnlyList<ProjectionRefusal> refusals) => Refusals = refusals;

    /// <summary>Gets the change; null exactly when there are refusals.</summary>
    public ProjectedChange? Change { get; }

    /// <summary>Gets the reasons in the order of <see cref="ProjectionRefusal"/>; empty when there is a change.</summary>
    public IReadOnlyList<ProjectionRefusal> Refusals { get; } = [];
}
