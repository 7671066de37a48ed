using NodaTime;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Flags;

/// <summary>A finding with its life: one flag a rule and episode while it is open.</summary>
/// <param name="Id">The flag's id.</param>
/// <param name="EpisodeId">The episode.</param>
/// <param name="Finding">What was last seen.</param>
/// <param name="Since">Since when it is open.</param>
public sealed record Flag(Guid Id, Guid EpisodeId, Finding Finding, Instant Since)
{
    /// <summary>Gets how it stands.</summary>
    public FlagState State { get; init; } = FlagState.Open;

    /// <summary>Gets when it was cleared or closed.</summary>
    public Instant? ClosedAt { get; init; }

    /// <summary>Gets who has it in hand; null when nobody does or the time is over.</summary>
    public Acknowledgement? InHand { get; init; }
}
