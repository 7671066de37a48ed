using UnitVent.Charting.Rules;
using UnitVent.Simulation.Cohort;

namespace UnitVent.Simulation.Tests.Cohort;

/// <summary>A cohort in miniature: each kind planted once, and as many quiet patients.</summary>
public sealed class StudyTests
{
    private const ulong Seed = 4;
    private const int Patients = 16;

    private static readonly Lazy<IReadOnlyList<CohortCourse>> Once = new(() => Study.Run(Seed, Patients));

    [Fact]
    public void Study_WithTheSameSeed_IsTheSame() =>
        Assert.Equal(Once.Value.Select(Told), Study.Run(Seed, Patients).Select(Told));

    [Fact]
    public void Study_WithAnotherSeed_IsAnother() =>
        Assert.NotEqual(Once.Value.Select(Told), Study.Run(Seed + 1, Patients).Select(Told));

    [Fact]
    public void Study_WithMorePatients_LeavesTheFirstOnesAsTheyWere() =>
        Assert.Equal(Once.Value.Take(4).Select(Told), Study.Run(Seed, 4).Select(Told));

    [Fact]
    public void Study_OfSixteen_PlantsEachKindOnceAndLetsItMatterWithinTheThreeDays()
    {
        var planted = Once.Value.Where(c => c.Planted is not null).ToList();

        Assert.Equal(Enum.GetValues<Deterioration>(), planted.Select(c => c.Planted!.Kind));
        Assert.All(planted, c => Assert.InRange(c.MattersAt!.Value, c.PlantedAt!.Value, Study.Start + NodaTime.Duration.FromHours(66)));
    }

    [Fact]
    public void Study_WhatWasPlanted_IsFound() =>
        Assert.All(Once.Value.Where(c => c.Planted is not null), c => Assert.True(c.FoundByRules is not null, $"{c.Planted!.What} was not found."));

    /// <summary>Sixteen are too few to measure by: at most a card every third day, where the whole study counts one in nine.</summary>
    [Fact]
    public void Study_QuietPatients_RaiseFewFromCautionOn()
    {
        var quiet = Once.Value.Where(c => c.Planted is null).ToList();

        Assert.InRange(quiet.Sum(c => c.Cautions.Count), 0, (int)(Study.PatientDays(quiet) / 3));
    }

    [Fact]
    public void PlantedKinds_AllAre_InTheTableOnceAndNeverAnsweredByWhatIsDue()
    {
        Assert.Equal(Enum.GetValues<Deterioration>(), PlantedKind.All.Select(k => k.Kind));
        Assert.DoesNotContain(PlantedKind.All, k => k.Fits.Contains(Family.Due));
    }

    private static string Told(CohortCourse course) =>
        string.Join("; ", course.AllCards.Concat(course.Cautions).Concat(course.Baseline).Select(c => $"{c}")) + $" {course.MattersAt} {string.Join(",", course.Gases)}";
}
