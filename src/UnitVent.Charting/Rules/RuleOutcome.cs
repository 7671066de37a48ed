using NodaTime;

namespace UnitVent.Charting.Rules;

/// <summary>What one rule makes of one picture: raised, clear, or cannot tell. Cannot tell never clears what was raised.</summary>
public abstract record RuleOutcome(string Rule)
{
    /// <summary>The rule saw something.</summary>
    /// <param name="Finding">What it saw.</param>
    public sealed record Raised(Finding Finding) : RuleOutcome(Finding.Rule);

    /// <summary>The rule looked and saw nothing.</summary>
    /// <param name="Rule">The rule's id.</param>
    /// <param name="SeenAt">When the youngest entry it looked at was so.</param>
    public sealed record Clear(string Rule, Instant SeenAt) : RuleOutcome(Rule);

    /// <summary>The rule could not look, or does not apply.</summary>
    /// <param name="Rule">The rule's id.</param>
    /// <param name="Because">Why, in one sentence.</param>
    public sealed record CannotTell(string Rule, string Because) : RuleOutcome(Rule);
}
