using UnitVent.Charting.Rules;

namespace UnitVent.Architecture.Tests;

/// <summary>A rule without a test is a rule that nobody has seen raise.</summary>
public sealed class RuleTests
{
    [Fact]
    public void Rules_AllHaveATestNamedAfterTheirId()
    {
        var tests = string.Join('\n', House.Files("tests/UnitVent.Charting.Tests", ".cs").Select(f => File.ReadAllText(Path.Combine(House.Root, f))));
        Assert.DoesNotContain(RuleSet.All, r => !tests.Contains($" {r.Id}_", StringComparison.Ordinal));
    }

    [Fact]
    public void Rules_AreAllRegistered_WithIdsOfTheirOwn()
    {
        var written = House.Charting.GetTypes().Where(t => t is { IsAbstract: false } && t.IsSubclassOf(typeof(Rule)));
        Assert.Equal(written.Select(t => t.Name).Order(StringComparer.Ordinal), RuleSet.All.Select(r => r.GetType().Name).Order(StringComparer.Ordinal));
        Assert.Equal(RuleSet.All.Count, RuleSet.All.Select(r => r.Id).Distinct().Count());
    }
}
