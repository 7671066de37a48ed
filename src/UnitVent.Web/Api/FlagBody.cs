using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Web.Api;

/// <summary>A flag as the interface writes it.</summary>
public sealed record FlagBody(
    Guid Id,
    Guid EpisodeId,
    string Rule,
    Family Family,
    Severity Severity,
    string Says,
    string LookAt,
    Instant Since,
    Instant SeenAt,
    FlagState State,
    Instant? ClosedAt,
    AcknowledgedBody? Acknowledged)
{
    public static FlagBody Of(Flag flag) => new(
        flag.Id,
        flag.EpisodeId,
        flag.Finding.Rule,
        flag.Finding.Family,
        flag.Finding.Severity,
        flag.Finding.Says,
        flag.Finding.LookAt,
        flag.Since,
        flag.Finding.SeenAt,
        flag.State,
        flag.ClosedAt,
        AcknowledgedBody.Of(flag.InHand));
}

/// <summary>Who has a flag in hand.</summary>
public sealed record AcknowledgedBody(Instant At, string By, string? Plan, Instant Until, ToldBody? Told)
{
    public static AcknowledgedBody? Of(Acknowledgement? hand) => hand is null
        ? null
        : new(hand.At, hand.By, hand.Plan, hand.Until, hand.ToldWho is null ? null : new ToldBody(hand.ToldWho, hand.ToldAt));
}

/// <summary>Who was told, and when.</summary>
public sealed record ToldBody(string Who, Instant? At);
