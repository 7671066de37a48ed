namespace UnitVent.Simulation.Lung;

/// <summary>A value that a parameter reaches at a time.</summary>
/// <param name="Hour">Hours since the start.</param>
/// <param name="Value">The value, in the parameter's unit.</param>
public sealed record Keyframe(double Hour, double Value)
{
    /// <summary>The value at a time: straight lines between keyframes, level before the first and after the last.</summary>
    public static double At(IReadOnlyList<Keyframe> track, double hour)
    {
        var next = 0;
        while (next < track.Count && track[next].Hour <= hour)
        {
            next++;
        }

        if (next == 0 || next == track.Count)
        {
            return track[Math.Max(0, next - 1)].Value;
        }

        var (from, to) = (track[next - 1], track[next]);
        return double.Lerp(from.Value, to.Value, (hour - from.Hour) / (to.Hour - from.Hour));
    }
}
