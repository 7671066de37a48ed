using NodaTime;
using UnitVent.Charting.Rules;

namespace UnitVent.Store.Units;

/// <summary>A unit's thresholds with how they came to be.</summary>
/// <param name="InForce">The version in force; null while the defaults hold.</param>
/// <param name="Waiting">A version that waits for a second person; null when none does.</param>
/// <param name="History">Every version, the newest first.</param>
public sealed record UnitThresholds(ThresholdVersion? InForce, ThresholdVersion? Waiting, IReadOnlyList<ThresholdVersion> History)
{
    /// <summary>Gets the thresholds in force.</summary>
    public RuleThresholds Now => RuleThresholds.With(InForce?.Chosen ?? new Dictionary<string, double>());
}

/// <summary>Thresholds that somebody chose.</summary>
/// <param name="Id">Its id.</param>
/// <param name="At">When.</param>
/// <param name="By">Who.</param>
/// <param name="ById">Who, as an id.</param>
/// <param name="Reason">Why.</param>
/// <param name="Chosen">What differs from the defaults, by key.</param>
/// <param name="NeedsSecond">Whether a second person had to agree.</param>
/// <param name="Answer">What the second person said; null while nobody has.</param>
public sealed record ThresholdVersion(
    Guid Id, Instant At, string By, Guid? ById, string Reason, IReadOnlyDictionary<string, double> Chosen, bool NeedsSecond, ThresholdAnswer? Answer)
{
    /// <summary>Gets from when it was in force; null when it never was.</summary>
    public Instant? From => !NeedsSecond ? At : Answer is { Agrees: true } ? Answer.At : null;
}

/// <summary>What a second person said.</summary>
/// <param name="At">When.</param>
/// <param name="By">Who.</param>
/// <param name="Agrees">Whether they agreed.</param>
public sealed record ThresholdAnswer(Instant At, string By, bool Agrees);
