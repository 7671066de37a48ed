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
    private static readonly Duration QuietFor = Duration.FromHours(12);

    /// <summary>Gets how it stands.</summary>
    public FlagState State { get; init; } = FlagState.Open;

    /// <summary>Gets when it was cleared or closed.</summary>
    public Instant? ClosedAt { get; init; }

    /// <summary>Gets who has it in hand; null when nobody does or the time is over.</summary>
    public Acknowledgement? InHand { get; init; }

    /// <summary>Gets whether it rests on a setting and somebody has heard of it: it leaves the cards until <see cref="ComesBackAt"/> or until the setting is another.</summary>
    public bool IsHeard => InHand is not null && RuleSet.Find(Finding.Rule) is { SaidOnce: true };

    /// <summary>Gets when it is open again though nothing changed: when its time in hand is over, or 12 h after somebody heard of what rests on a setting; null when nobody has it in hand.</summary>
    public Instant? ComesBackAt => InHand is not { } hand ? null : IsHeard ? Instant.Max(hand.Until, hand.At + QuietFor) : hand.Until;
}
