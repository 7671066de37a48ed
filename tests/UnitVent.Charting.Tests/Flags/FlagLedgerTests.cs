using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Flags;

public sealed class FlagLedgerTests
{
    private static readonly Acknowledgement InHand = new(Chart.Ago(20), "Nurse", "suction", Chart.Now + Duration.FromHours(1), null, null);

    [Fact]
    public void Finding_WithoutAFlag_IsRaisedOnce()
    {
        var picture = LongRelease(40).Picture();

        var flags = Run([], picture);

        var flag = Assert.Single(flags, f => f.Finding.Rule == "R01");
        Assert.Equal(Severity.Caution, flag.Finding.Severity);
        Assert.Empty(FlagLedger.Next(flags, picture, Guid.NewGuid));
    }

    [Fact]
    public void CannotTell_NeverClears_WhatWasRaised()
    {
        var open = Run([], LongRelease(40).Picture());
        var stale = LongRelease(40).Picture(Chart.Now + Duration.FromHours(10));

        Assert.IsType<RuleOutcome.CannotTell>(stale.Outcomes.Single(o => o.Rule == "R01"));
        Assert.DoesNotContain(FlagLedger.Next(open, stale, Guid.NewGuid), s => s.Finding.Rule == "R01");
    }

    public static TheoryData<decimal, FlagStepKind, string> LaterFlows => new()
    {
        { 60, FlagStepKind.Cleared, "well inside" },
        { 50, FlagStepKind.Cleared, "inside by half the minimum important change" },
        { 49, FlagStepKind.Milder, "an advisory is left of the caution" },
        { 38, FlagStepKind.Worse, "a new worse value" },
        { 42, FlagStepKind.StillTrue, "a new better value, still outside" },
    };

    [Theory, MemberData(nameof(LaterFlows))]
    public void LaterValue_MovesTheFlag(decimal endPercent, FlagStepKind expected, string reason)
    {
        var open = Run([], LongRelease(40).Picture());
        var later = LongRelease(40).With(Chart.Check(5, peak: 100, end: endPercent)).Picture();

        var step = FlagLedger.Next(open, later, Guid.NewGuid).SingleOrDefault(s => s.Finding.Rule == "R01");

        Assert.True(expected == step?.Kind, $"{reason}: {step}");
    }

    [Theory]
    [InlineData(89, false, "inside, but by less than half the minimum important change")]
    [InlineData(90, true, "inside by more")]
    public void ValueBarelyInside_DoesNotClear(int spO2, bool cleared, string reason)
    {
        var open = Run([], new Chart().With(Chart.Aprv(), Chart.Check(spO2: 86)).Picture());
        var later = new Chart().With(Chart.Aprv(), Chart.Check(spO2: 86), Chart.Check(5, spO2: spO2)).Picture();

        Assert.True(cleared == FlagLedger.Next(open, later, Guid.NewGuid).Any(s => s is { Kind: FlagStepKind.Cleared, Finding.Rule: "R25" }), reason);
    }

    [Fact]
    public void WorseValue_TakesTheFlagOutOfHand_AndTheSameOneDoesNot()
    {
        var open = Run([], LongRelease(40).Picture()).Select(f => f with { InHand = InHand }).ToList();

        Assert.Empty(FlagLedger.Next(open, LongRelease(40).Picture(), Guid.NewGuid));
        var after = Run(open, LongRelease(40).With(Chart.Check(5, peak: 100, end: 20)).Picture());
        Assert.Null(after.Single(f => f.Finding.Rule == "R01").InHand);
    }

    [Fact]
    public void Acknowledgement_WhenItsTimeIsOver_IsReopened()
    {
        var open = Run([], LongRelease(40).Picture()).Select(f => f with { InHand = InHand with { Until = Chart.Ago(1) } }).ToList();

        var step = Assert.Single(FlagLedger.Next(open, LongRelease(40).Picture(), Guid.NewGuid), s => s.Finding.Rule == "R01");

        Assert.Equal(FlagStepKind.Reopened, step.Kind);
        Assert.Null(FlagLedger.Apply(open.Single(f => f.Id == step.FlagId), step, Guid.Empty, Chart.Now).InHand);
    }

    [Fact]
    public void StruckEntry_ClosesWhatRestedOnIt_AsCorrected()
    {
        var chart = LongRelease(40);
        var open = Run([], chart.Picture());
        var check = chart.Window().Standing.Single(e => e.Kind == EntryKind.VentilatorCheck);
        var without = PatientPicture.At(chart.Window().Without(check.Id), Chart.Now);

        var step = FlagLedger.Next(open, without, Guid.NewGuid).Single(s => s.Finding.Rule == "R01");

        Assert.Equal(FlagStepKind.ClosedByCorrection, step.Kind);
    }

    [Fact]
    public void CorrectedEntry_IsReevaluatedNow()
    {
        var chart = LongRelease(40);
        var open = Run([], chart.Picture());
        var check = chart.Window().Standing.Single(e => e.Kind == EntryKind.VentilatorCheck);
        var corrected = check with { Id = Chart.Id(50), Corrects = check.Id, Body = Chart.Check(peak: 100, end: 60) };

        var step = FlagLedger.Next(open, PatientPicture.At(chart.Window().With([corrected]), Chart.Now), Guid.NewGuid).Single(s => s.Finding.Rule == "R01");

        Assert.Equal(FlagStepKind.ClosedByCorrection, step.Kind);
    }

    /// <summary>The reference of a step moves on with time; the flag is held against the reference it was raised with.</summary>
    [Fact]
    public void OxygenationWorse_WhenTheLowValueHasBecomeUsual_StaysOpen()
    {
        Chart Fallen() => new Chart().With(Chart.Aprv(2500), Chart.Gas(1400, 100), Chart.Gas(1100, 75), Chart.Gas(700, 76), Chart.Gas(400, 75));
        var open = Run([], Fallen().Picture(Chart.Ago(1000)));
        Assert.Contains(open, f => f.Finding.Rule == "R24");

        Assert.DoesNotContain(FlagLedger.Next(open, Fallen().Picture(Chart.Ago(300)), Guid.NewGuid), s => s is { Kind: FlagStepKind.Cleared, Finding.Rule: "R24" });
        var recovered = Fallen().With(Chart.Gas(30, 91)).Picture();
        Assert.Contains(FlagLedger.Next(open, recovered, Guid.NewGuid), s => s is { Kind: FlagStepKind.Cleared, Finding.Rule: "R24" });
    }

    [Fact]
    public void SuddenChange_WhenTheNextCheckIsJustAsBad_StaysOpen()
    {
        Chart Fallen() => new Chart().With(Chart.Check(300, spO2: 95, map: 80), Chart.Check(200, spO2: 88, map: 60));
        var open = Run([], Fallen().Picture(Chart.Ago(190)));

        Assert.DoesNotContain(FlagLedger.Next(open, Fallen().With(Chart.Check(20, spO2: 88, map: 60)).Picture(), Guid.NewGuid), s => s.Finding.Rule == "R56");
        Assert.Contains(
            FlagLedger.Next(open, Fallen().With(Chart.Check(20, spO2: 94, map: 75)).Picture(), Guid.NewGuid),
            s => s is { Kind: FlagStepKind.Cleared, Finding.Rule: "R56" });
    }

    /// <summary>What rests on a setting is said once: heard, it is quiet for 12 h, though it was in hand for one.</summary>
    [Theory]
    [InlineData(11.9, false, "not yet 12 h")]
    [InlineData(12, true, "12 h")]
    public void HeardOfASetting_IsQuietFor12Hours(double hours, bool back, string reason)
    {
        var chart = new Chart().With(Chart.Aprv(high: 32), Chart.Check());
        var open = Run([], chart.Picture()).Select(f => f with { InHand = new(Chart.Now, "Nurse", null, Chart.Now + Duration.FromHours(1), null, null) }).ToList();
        var later = chart.Picture(Chart.Now + Duration.FromHours(hours));

        Assert.True(back == FlagLedger.Next(open, later, Guid.NewGuid).Any(s => s is { Kind: FlagStepKind.Reopened, Finding.Rule: "R06" }), reason);
    }

    [Fact]
    public void HeardOfASetting_ComesBackWhenTheSettingIsAnother()
    {
        var hand = InHand with { At = Chart.Ago(200), Until = Chart.Now + Duration.FromHours(5) };
        var open = Run([], new Chart().With(Chart.Aprv(high: 33)).Picture()).Select(f => f with { InHand = hand }).ToList();

        var after = Run(open, new Chart().With(Chart.Aprv(high: 33), Chart.Aprv(60, high: 32)).Picture());

        Assert.Null(after.Single(f => f.Finding.Rule == "R06").InHand);
        Assert.StartsWith("P high 32", after.Single(f => f.Finding.Rule == "R06").Finding.Says, StringComparison.Ordinal);
    }

    private static Chart LongRelease(decimal endPercent) => new Chart().With(Chart.Aprv(), Chart.Gas(), Chart.Check(peak: 100, end: endPercent));

    private static List<Flag> Run(IReadOnlyList<Flag> open, PatientPicture picture)
    {
        var flags = open.ToDictionary(f => f.Id);
        foreach (var step in FlagLedger.Next(open, picture, Guid.NewGuid))
        {
            flags[step.FlagId] = FlagLedger.Apply(flags.GetValueOrDefault(step.FlagId), step, Guid.Empty, picture.AsOf);
        }

        return [.. flags.Values.Where(f => f.State == FlagState.Open)];
    }
}
