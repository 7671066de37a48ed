namespace UnitVent.Charting.Timelines;

/// <summary>One lane's line: a quantity over time. Gaps are gaps.</summary>
/// <param name="Name">Its name, for example <c>pfRatio</c>.</param>
/// <param name="Label">The trade's word.</param>
/// <param name="Unit">The unit.</param>
/// <param name="Stepped">Whether a value holds until the next (settings) or stands alone (readings).</param>
/// <param name="Points">The points, oldest first.</param>
public sealed record TimelineSeries(string Name, string Label, string Unit, bool Stepped, IReadOnlyList<TimelinePoint> Points);
