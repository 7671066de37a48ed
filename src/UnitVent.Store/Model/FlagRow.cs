using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Store.Model;

/// <summary>The head of a flag: derived from its events, and rebuildable from them.</summary>
internal sealed class FlagRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid EpisodeId { get; set; }

    public string Rule { get; set; } = "";

    public FlagState State { get; set; }

    public Instant Since { get; set; }

    public Instant? ClosedAt { get; set; }

    public string Finding { get; set; } = "";

    public string? InHand { get; set; }

    public Flag ToFlag() => new(Id, EpisodeId, JsonSerializer.Deserialize<Finding>(Finding, ChartJson.Options)!, Since)
    {
        State = State,
        ClosedAt = ClosedAt,
        InHand = InHand is null ? null : JsonSerializer.Deserialize<Acknowledgement>(InHand, ChartJson.Options),
    };

    public void Take(Flag flag)
    {
        (EpisodeId, Rule, State, Since, ClosedAt) = (flag.EpisodeId, flag.Finding.Rule, flag.State, flag.Since, flag.ClosedAt);
        Finding = JsonSerializer.Serialize(flag.Finding, ChartJson.Options);
        InHand = flag.InHand is null ? null : JsonSerializer.Serialize(flag.InHand, ChartJson.Options);
    }
}
