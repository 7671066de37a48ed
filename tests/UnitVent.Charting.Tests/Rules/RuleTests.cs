using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>What holds for all rules.</summary>
public sealed class RuleTests
{
    /// <summary>The imperatives that no message may use: a tool states, it does not order.</summary>
    private static readonly string[] Forbidden =
        ["give", "start", "stop", "increase", "decrease", "raise", "lower", "set", "change", "switch", "wean", "extubate", "intubate", "sedate"];

    private static readonly Dictionary<string, TheoryData<Entry[], Circumstance[], string, string>> Tables = typeof(RuleTable).Assembly.GetTypes()
        .Where(t => t.IsSubclassOf(typeof(RuleTable)))
        .SelectMany(t => t.GetProperties())
        .Where(p => p.PropertyType == typeof(TheoryData<Entry[], Circumstance[], string, string>))
        .ToDictionary(p => p.Name, p => (TheoryData<Entry[], Circumstance[], string, string>)p.GetValue(null)!);

    [Fact]
    public void EveryRule_HasATable_ThatRaisesIt_AndThatDoesNot() => Assert.All(RuleSet.All, rule =>
    {
        var expected = Tables[rule.Id].Select(row => row.Data.Item3).ToList();

        Assert.Contains(expected, e => Enum.TryParse<Severity>(e, out _));
        Assert.Contains("clear", expected);
        Assert.Contains("cannot tell", expected);
    });

    [Fact]
    public void NoFinding_TellsAnyoneWhatToDo()
    {
        var findings = Tables.Values.SelectMany(t => t)
            .SelectMany(row => new Chart().With(row.Data.Item1).InContext(row.Data.Item2).Picture().Outcomes.OfType<RuleOutcome.Raised>())
            .Select(o => o.Finding)
            .ToList();

        Assert.Equal(RuleSet.All.Select(r => r.Id).Order(), findings.Select(f => f.Rule).Distinct().Order());
        Assert.All(findings, f => Assert.DoesNotContain((f.Says + " " + f.LookAt).ToLowerInvariant().Split(' ', ',', ';', ':', '.'), word => Forbidden.Contains(word)));
    }

    [Fact]
    public void EveryThreshold_HasADefaultWithinItsLimits_AndASource() => Assert.All(Threshold.All, t =>
    {
        Assert.InRange(t.Default, t.Is.Low, t.Is.High);
        Assert.NotEmpty(t.Is.Label);
        Assert.NotEmpty(t.Is.Source);
        Assert.Contains(RuleSet.All, r => r.Id == t.Rule);
    });

    [Fact]
    public void EveryNumberOfEveryOptions_IsAThreshold() => Assert.All(
        typeof(RuleThresholds).Assembly.GetTypes().Where(t => t.Name.EndsWith("Options", StringComparison.Ordinal)),
        options => Assert.Contains(typeof(RuleThresholds).GetProperties(), p => p.PropertyType == options && options.GetProperties().All(o => o.PropertyType == typeof(double))));

    [Fact]
    public void Thresholds_ThatAUnitChose_ReplaceTheDefaults_AndTheOthersStay()
    {
        var thresholds = RuleThresholds.With(new Dictionary<string, double> { ["R04.cautionMlPerKg"] = 9, ["R99.unknown"] = 1 });

        Assert.Equal((9, 12), (thresholds.ReleaseVolumeHigh.CautionMlPerKg, thresholds.ReleaseVolumeHigh.UrgentMlPerKg));
        Assert.Equal(10, new RuleThresholds().ReleaseVolumeHigh.CautionMlPerKg);
    }
}
