using NodaTime;

namespace UnitVent.Charting.Entries;

/// <summary>An entry as it stands in the chart: what was charted, with who, when and what became of it.</summary>
/// <param name="Id">Made by whoever recorded it; the same id is one entry however often it is sent.</param>
/// <param name="EpisodeId">The episode it belongs to.</param>
/// <param name="EffectiveAt">When it was so at the bedside.</param>
/// <param name="RecordedAt">When it was recorded.</param>
/// <param name="RecordedBy">Who recorded it, by name.</param>
/// <param name="Sequence">The order of recording within the unit.</param>
/// <param name="Body">What was charted.</param>
public sealed record ChartEntry(
    Guid Id, Guid EpisodeId, Instant EffectiveAt, Instant RecordedAt, string RecordedBy, long Sequence, Entry Body)
{
    /// <summary>Gets the entry that this one replaces; null when it replaces none.</summary>
    public Guid? Corrects { get; init; }

    /// <summary>Gets why it replaces another.</summary>
    public string? CorrectionReason { get; init; }

    /// <summary>Gets the questions that were answered with yes when it was recorded.</summary>
    public IReadOnlyList<string> Confirmed { get; init; } = [];

    /// <summary>Gets how it was struck out; null while it stands.</summary>
    public StrikeOut? Struck { get; init; }

    /// <summary>Gets the entry that replaced it; null while it stands.</summary>
    public Guid? ReplacedBy { get; init; }

    /// <summary>Gets whether it counts: neither struck out nor replaced.</summary>
    public bool Stands => Struck is null && ReplacedBy is null;

    /// <summary>Gets the kind of entry.</summary>
    public EntryKind Kind => Body.Kind;
}
