using NodaTime;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Flags;

/// <summary>What thresholds would have raised on charts of days that are past.</summary>
/// <param name="PatientDays">How long the charts together were looked at.</param>
/// <param name="Families">Each family that would have had a card, the most frequent first.</param>
public sealed record DryRun(double PatientDays, IReadOnlyList<FamilyCount> Families)
{
    /// <summary>Gets how many cards would have opened for each patient and day; 0 without a day.</summary>
    public double CardsPerPatientDay => PatientDays > 0 ? Families.Sum(f => f.Cards) / PatientDays : 0;

    /// <summary>Tries thresholds on charts.</summary>
    /// <param name="charts">The charts, whole.</param>
    /// <param name="thresholds">The thresholds.</param>
    /// <param name="from">Where the days begin.</param>
    /// <param name="to">Where they end.</param>
    public static DryRun Of(IEnumerable<ChartWindow> charts, RuleThresholds thresholds, Instant from, Instant to)
    {
        ArgumentNullException.ThrowIfNull(charts);
        var (days, opened) = (0.0, new List<(Guid Episode, Family Family, Severity Severity)>());
        foreach (var chart in charts)
        {
            var begin = Instant.Max(from, chart.Episode.AdmittedAt);
            var end = Instant.Min(to, chart.Episode.EndedAt ?? to);
            if (begin < end)
            {
                days += (end - begin).TotalDays;
                opened.AddRange(Opened(new(chart.Episode, chart.Unit with { Thresholds = thresholds }, chart.Standing, chart.FollowUpSteps), begin, end));
            }
        }

        return new(days, [.. opened
            .GroupBy(o => o.Family)
            .Select(g => new FamilyCount(g.Key, g.Count(), g.Count(o => o.Severity >= Severity.Caution), g.Count() - g.Select(o => o.Episode).Distinct().Count()))
            .OrderByDescending(f => f.Cards)]);
    }

    private static IEnumerable<(Guid Episode, Family Family, Severity Severity)> Opened(ChartWindow chart, Instant from, Instant to)
    {
        var open = new Dictionary<Guid, Family>();
        foreach (var (_, step, flags) in Replay.Run(chart, from, to))
        {
            if (step.Kind == FlagStepKind.Raised && !open.ContainsValue(step.Finding.Family))
            {
                yield return (chart.Episode.Id, step.Finding.Family, step.Finding.Severity);
            }

            open = flags.ToDictionary(f => f.Id, f => f.Finding.Family);
        }
    }
}

/// <summary>The cards of one family.</summary>
/// <param name="Family">The family.</param>
/// <param name="Cards">How many cards would have opened.</param>
/// <param name="CautionOrUrgent">How many of them at caution or urgent.</param>
/// <param name="CameBack">How many of them to a patient who had had such a card before.</param>
public sealed record FamilyCount(Family Family, int Cards, int CautionOrUrgent, int CameBack);
