using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Flags;

/// <summary>One step in the life of a flag, kept for ever with the numbers of that moment.</summary>
/// <param name="Kind">What happened.</param>
/// <param name="FlagId">The flag; a new id when it was raised.</param>
/// <param name="Finding">What was seen at that moment.</param>
public sealed record FlagStep(FlagStepKind Kind, Guid FlagId, Finding Finding);
