using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Due;

namespace UnitVent.Web.Board;

/// <summary>Something that is due.</summary>
/// <param name="What">What, in words.</param>
/// <param name="At">When.</param>
public sealed record DueItem(string What, Instant At)
{
    /// <summary>What is due for a patient, soonest first.</summary>
    public static IReadOnlyList<DueItem> Of(PatientPicture picture) =>
        [.. picture.FollowUps.Select(f => new DueItem(f.Body.What!, f.Body.DueAt!.Value)).Append(new("check", CheckDueRule.DueAt(picture))).OrderBy(d => d.At)];
}
