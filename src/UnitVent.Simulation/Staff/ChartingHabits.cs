using System.Text.Json.Serialization;

namespace UnitVent.Simulation.Staff;

/// <summary>How a bed is charted.</summary>
public sealed record ChartingHabits
{
    /// <summary>From one round to the next, give or take a few minutes.</summary>
    public required int MinutesBetweenRounds { get; init; }

    /// <summary>A gas goes with every so many rounds.</summary>
    public required int RoundsPerGas { get; init; }

    public int RoundsPerAirwayCheck { get; init; } = 4;

    public int RoundsPerSuction { get; init; } = 3;

    /// <summary>Two or three, as the analyser prints pH.</summary>
    [JsonPropertyName("pHDecimals")]
    public int PHDecimals { get; init; } = 2;

    /// <summary>From which hour on this bed is kept on paper and typed late; null for never.</summary>
    public double? TypedLateFromHour { get; init; }

    public int MinutesTypedLate { get; init; }
}
