using CsCheck;
using static UnitVent.Physiology.ProjectionRefusal;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

/// <summary>Worked from the one-compartment model, as in Burke WC, et al. J Appl Physiol 1993;74:922-933.</summary>
public sealed class AprvProjectionTests
{
    /// <summary>28/0 cmH2O, 4.5/0.5 s, ratio 0.60, 420 mL, PaCO2 50, dead space 150 mL, own 2.0 L/min at 10/min.</summary>
    private static ReleaseReading Base => new(
        new(CmH2O(28), CmH2O(0), Seconds(4.5), Seconds(0.5)), 0.60, Ml(420), MmHg(50), Ml(150), LMin(2), PerMin(10));

    /// <summary>What is changed in the base, and every reason that must come of it.</summary>
    private static Dictionary<string, Case> Refused => new()
    {
        ["released too long"] = new(Base with { TerminationRatio = 0.049 }, Base.Settings, TerminationRatio),
        ["released too short"] = new(Base with { TerminationRatio = 0.901 }, Base.Settings, TerminationRatio),
        ["no ratio at all"] = new(Base with { TerminationRatio = double.NaN }, Base.Settings, TerminationRatio),
        ["own ventilation by no breaths"] = new(Base with { OwnRate = default }, Base.Settings, OwnRate),
        ["step up by more than 30 %"] = new(Base, Planned(high: 36.5), PressureStep),
        ["step down by more than 30 %"] = new(Base, Planned(high: 19.5), PressureStep),
        ["step down by a higher P low"] = new(Base, Planned(low: 8.5), PressureStep),
        ["release longer by more than 50 %"] = new(Base, Planned(timeLow: 0.751), TimeLow),
        ["release shorter by more than 50 %"] = new(Base, Planned(timeLow: 0.249), TimeLow),
        ["all at once"] = new(
            Base with { TerminationRatio = 0.95, OwnRate = default }, Planned(high: 40, timeLow: 1), TerminationRatio, OwnRate, PressureStep, TimeLow),
        ["4.9 mL/cmH2O"] = new(Base with { Volume = Ml(55), DeadSpace = Ml(10) }, Base.Settings, ProjectionRefusal.Compliance),
        ["150.1 mL/cmH2O"] = new(Base with { Volume = Ml(1681) }, Base.Settings, ProjectionRefusal.Compliance),
        ["all of the release is dead space now"] = new(Base with { DeadSpace = Ml(420) }, Planned(high: 30), ProjectionRefusal.DeadSpace),
        ["all of the release is dead space then"] = new(Base with { DeadSpace = Ml(400) }, Planned(high: 26), ProjectionRefusal.DeadSpace),
        ["fewer than half the releases"] = new(Quiet(), Planned(timeHigh: 9.6), AlveolarVentilation),
        ["more than twice the releases"] = new(Quiet(), Planned(timeHigh: 1.9), AlveolarVentilation),
        ["152 mmHg"] = new(Quiet() with { PaCO2 = MmHg(100) }, Planned(timeHigh: 7.1), ProjectionRefusal.PaCO2),
        ["14.4 mmHg"] = new(Quiet() with { PaCO2 = MmHg(20) }, Planned(timeHigh: 3.1), ProjectionRefusal.PaCO2),
        ["both"] = new(Quiet() with { PaCO2 = MmHg(100) }, Planned(timeHigh: 9.6), AlveolarVentilation, ProjectionRefusal.PaCO2),
        ["1.3 times is more than the release"] = new(Base with { DeadSpace = Ml(325) }, Base.Settings, DeadSpaceBand),
        ["with 1.3 times less than half is left"] = new(Base with { Volume = Ml(400), DeadSpace = Ml(270) }, Planned(high: 26), DeadSpaceBand),
    };

    /// <summary>The same limits from inside.</summary>
    private static Dictionary<string, Case> Accepted => new()
    {
        ["ratio 0.05 itself"] = new(Base with { TerminationRatio = 0.05 }, Base.Settings),
        ["ratio 0.90 itself"] = new(Base with { TerminationRatio = 0.90, Volume = Ml(250) }, Base.Settings),
        ["no own breaths at all"] = new(Base with { OwnVentilation = default, OwnRate = default }, Base.Settings),
        ["own breaths too small to be measured"] = new(Base with { OwnVentilation = default }, Base.Settings),
        ["step up by 30 %"] = new(Base, Planned(high: 36.4)),
        ["step down by 30 %"] = new(Base with { DeadSpace = Ml(50) }, Planned(high: 19.6)),
        ["release longer by 50 %"] = new(Base, Planned(timeLow: 0.75)),
        ["release shorter by 50 %"] = new(Base with { DeadSpace = Ml(50) }, Planned(timeLow: 0.25)),
        ["50 % that doubles miss by a digit"] = new(At(timeLow: 0.6), Planned(timeLow: 0.9)),
        ["5 mL/cmH2O"] = new(Base with { Volume = Ml(56.1), DeadSpace = Ml(10) }, Base.Settings),
        ["149.9 mL/cmH2O"] = new(Base with { Volume = Ml(1679) }, Base.Settings),
        ["1.3 times is just less than the release"] = new(Base with { DeadSpace = Ml(322) }, Base.Settings),
        ["just more than half the releases"] = new(Quiet(), Planned(timeHigh: 9.4)),
        ["just less than twice the releases"] = new(Quiet(), Planned(timeHigh: 2.1)),
        ["148 mmHg"] = new(Quiet() with { PaCO2 = MmHg(100) }, Planned(timeHigh: 6.9)),
        ["15.6 mmHg"] = new(Quiet() with { PaCO2 = MmHg(20) }, Planned(timeHigh: 3.4)),
        ["half the releases"] = new(Quiet(), Planned(timeHigh: 9.5)),
        ["twice the releases"] = new(Quiet(), Planned(timeHigh: 2)),
        ["150 mmHg itself"] = new(Quiet() with { PaCO2 = MmHg(100) }, Planned(timeHigh: 7)),
        ["15 mmHg itself"] = new(Quiet() with { PaCO2 = MmHg(20) }, Planned(timeHigh: 3.25)),
    };

    /// <summary>P high, T high, T low; release volume, rate, alveolar ventilation, PaCO2, mean pressure, ratio, PaCO2 if own breaths stop.</summary>
    public static TheoryData<double[], double[], string> PublishedChanges => new()
    {
        { [28, 4.5, 0.5], [420, 12, 3.74, 50.0, 25.20, 0.600, 57.7], "no change; own breaths lost" },
        { [28, 5.5, 0.5], [420, 10, 3.20, 58.4, 25.67, 0.600, 69.3], "fewer releases" },
        { [26, 4.5, 0.5], [390, 12, 3.38, 55.3, 23.40, 0.600, 64.9], "a smaller step" },
        { [28, 4.5, 0.6], [481, 11.76, 4.40, 42.5, 24.71, 0.542, 48.0], "a longer release" },
        { [26, 5.5, 0.5], [390, 10, 2.90, 64.5, 23.83, 0.600, 77.9], "drop and stretch" },
    };

    public static TheoryData<string> RefusedCases => [.. Refused.Keys];

    public static TheoryData<string> AcceptedCases => [.. Accepted.Keys];

    [Theory, MemberData(nameof(PublishedChanges))]
    public void Project_OfPublishedChange_LeadsWherePublished(double[] settings, double[] expected, string reason)
    {
        var change = Projected(Base, new(CmH2O(settings[0]), CmH2O(0), Seconds(settings[1]), Seconds(settings[2])));

        Expect.Near(0.979, change.TimeConstant.Seconds, 0.00051, reason);
        Expect.Near(37.5, change.Compliance.MlPerCmH2O, 1e-9, reason);
        Expect.Near(3.74, change.Present.AlveolarVentilation.LitresPerMinute, 1e-9, reason);
        Expect.Near(expected[0], change.Planned.Volume.Millilitres, 0.51, reason);
        Expect.Near(expected[1], change.Planned.Rate.PerMinute, 0.0051, reason);
        Expect.Near(expected[2], change.Planned.AlveolarVentilation.LitresPerMinute, 0.0051, reason);
        Expect.Near(expected[3], change.PaCO2.Expected.MmHg, 0.051, reason);
        Expect.Near(expected[4], change.Planned.MeanPressure.CmH2O, 0.0051, reason);
        Expect.Near(expected[5], change.Planned.TerminationRatio, 0.00051, reason);
        Expect.Near(expected[6], change.PaCO2.WithoutOwnBreaths!.Value.MmHg, 0.051, reason);
    }

    [Fact]
    public void Project_OfPublishedBase_DescribesThePresentAsRead()
    {
        var present = Projected(Base, Planned(high: 26)).Present;

        Assert.Equal(new(Ml(420), PerMin(12), CmH2O(25.2), 0.60, present.AlveolarVentilation), present);
    }

    /// <summary>Dead space 105 and 195 mL instead of 150: alveolar ventilation 3.78 + 0.95 and 2.7 + 0.05 before, 3.15 + 0.95 and 2.25 + 0.05 after.</summary>
    [Fact]
    public void Band_OfFewerReleases_IsThatOfTheTwoOtherDeadSpaces()
    {
        var band = Projected(Base, Planned(timeHigh: 5.5)).PaCO2;

        Assert.Equal(50 * 4.73 / 4.10, band.Lowest.MmHg, 1e-9);
        Assert.Equal(50 * 2.75 / 2.30, band.Highest.MmHg, 1e-9);
    }

    [Fact]
    public void Band_OfALongerRelease_HasTheLargerDeadSpaceBelow()
    {
        var band = Projected(Base, Planned(timeLow: 0.6)).PaCO2;

        Assert.True(band.Lowest.MmHg < band.Expected.MmHg && band.Expected.MmHg < band.Highest.MmHg);
    }

    /// <summary>200 mL a breath, 20 a minute, all of it dead space: it neither adds nor takes away.</summary>
    [Fact]
    public void OwnBreaths_SmallerThanTheDeadSpace_CountAsNothing()
    {
        var shallow = Base with { DeadSpace = Ml(210), OwnVentilation = LMin(4), OwnRate = PerMin(20) };

        Assert.Equal(12 * 0.21, Projected(shallow, Planned()).Present.AlveolarVentilation.LitresPerMinute, 1e-9);
    }

    /// <summary>Own breaths carry 4.75 of 7.99 L/min: alone, 3.24 are left, less than half.</summary>
    [Fact]
    public void WithoutOwnBreaths_WhenTheyCarryMoreThanHalf_HasNoAnswer()
    {
        var change = Projected(Base with { OwnVentilation = LMin(6.25) }, Planned());

        Assert.Equal(50, change.PaCO2.Expected.MmHg, 1e-9);
        Assert.Null(change.PaCO2.WithoutOwnBreaths);
    }

    [Theory, MemberData(nameof(RefusedCases))]
    public void Project_BeyondALimit_GivesEveryReason(string reason)
    {
        var answer = AprvProjection.Project(Refused[reason].Present, Refused[reason].Planned);

        Assert.Null(answer.Change);
        Assert.Equal(Refused[reason].Expected, answer.Refusals);
    }

    [Theory, MemberData(nameof(AcceptedCases))]
    public void Project_AtOrJustInsideALimit_GivesAnAnswer(string reason)
        => _ = Projected(Accepted[reason].Present, Accepted[reason].Planned);

    /// <summary>The first state of <see cref="IncompleteRefillingTests"/>, 351.5 mL at 30 mL/cmH2O and tau 1 s, with T high halved.</summary>
    [Fact]
    public void Project_ToAShortTimeHigh_UsesTheGeneralForm()
    {
        var present = Base with { Settings = new(CmH2O(30), CmH2O(0), Seconds(4), Seconds(0.5)), TerminationRatio = Math.Exp(-0.5), Volume = Ml(351.5) };
        var change = Projected(present, present.Settings with { TimeHigh = Seconds(2) });

        Assert.Equal(30, change.Compliance.MlPerCmH2O, 0.0051);
        Assert.Equal(333.6, change.Planned.Volume.Millilitres, 0.1); // as exact as 351.5 is
    }

    [Theory]
    [InlineData(3.8, 6)]
    [InlineData(6, 3.8)]
    public void Project_AcrossFourTimeConstants_MovesTheVolumeOnlyByTheRefilling(double now, double then)
    {
        var present = Base with { Settings = Planned(timeHigh: now) };
        var change = Projected(present, Planned(timeHigh: then));

        Assert.Equal(Refilled(then) / Refilled(now), change.Planned.Volume.Millilitres / 420, 1e-9);

        double Refilled(double timeHigh) => IncompleteRefilling.ReleaseVolume(
            MlPerCmH2O(1), CmH2O(28), CmH2O(0), Seconds(timeHigh), Seconds(0.5), change.TimeConstant, change.TimeConstant).Millilitres;
    }

    [Fact]
    public void NoChange_OfAnyReading_LeavesEverythingAsItIs()
        => Readings.Sample(reading =>
        {
            var answer = AprvProjection.Project(reading, reading.Settings);
            return answer.Change is not { } change
                || (Near(change.PaCO2.Expected.MmHg, reading.PaCO2.MmHg)
                    && Near(change.PaCO2.Lowest.MmHg, reading.PaCO2.MmHg)
                    && Near(change.PaCO2.Highest.MmHg, reading.PaCO2.MmHg)
                    && Near(change.Planned.Volume.Millilitres, reading.Volume.Millilitres)
                    && Near(change.Planned.TerminationRatio, reading.TerminationRatio));
        });

    [Fact]
    public void LongerTimeHigh_OfAnyReading_LowersRateAndRaisesMeanPressure()
        => Readings.Sample(reading => AprvProjection.Project(reading, reading.Settings with { TimeHigh = Seconds(reading.Settings.TimeHigh.Seconds + 0.5) })
            .Change is not { } change
            || (change.Planned.Rate.PerMinute < change.Present.Rate.PerMinute
                && change.Planned.MeanPressure.CmH2O > change.Present.MeanPressure.CmH2O
                && change.Planned.Volume.Millilitres >= change.Present.Volume.Millilitres - 1e-9));

    [Fact]
    public void Answer_OfAnyReading_StaysInsideItsLimits()
        => Gen.Select(Readings, Readings).Sample((reading, other) =>
        {
            var (change, refusals) = (AprvProjection.Project(reading, other.Settings).Change, AprvProjection.Project(reading, other.Settings).Refusals);
            return change is null
                ? refusals.Count > 0 && refusals.SequenceEqual(refusals.Distinct().Order())
                : change.PaCO2.Lowest.MmHg >= 15 && change.PaCO2.Highest.MmHg <= 150
                    && change.PaCO2.Lowest.MmHg <= change.PaCO2.Expected.MmHg && change.PaCO2.Expected.MmHg <= change.PaCO2.Highest.MmHg
                    && change.Planned.MeanPressure.CmH2O > other.Settings.Low.CmH2O && change.Planned.MeanPressure.CmH2O < other.Settings.High.CmH2O;
        });

    [Fact]
    public void Project_WithoutAReading_Refuses()
    {
        Assert.Throws<ArgumentNullException>(() => AprvProjection.Project(null!, Base.Settings));
        Expect.Refused(() => AprvProjection.Project(Base with { Volume = default }, Base.Settings));
        Expect.Refused(() => AprvProjection.Project(Base with { PaCO2 = default }, Base.Settings));
        Expect.Refused(() => AprvProjection.Project(Base with { Settings = Planned(high: 0) }, Base.Settings));
        Expect.Refused(() => AprvProjection.Project(Base, Planned(low: 28)));
        Expect.Refused(() => AprvProjection.Project(Base, Planned(timeHigh: 0)));
        Expect.Refused(() => AprvProjection.Project(Base, Planned(timeLow: 0)));
        Expect.Refused(() => AprvProjection.Project(At(timeLow: 0), Base.Settings));
        Expect.Refused(() => AprvProjection.Project(Base with { TerminationRatio = 0.95 }, Planned(timeHigh: 60)));
    }

    private static Gen<ReleaseReading> Readings => Gen.Select(
        Gen.Select(Gen.Double[18, 35], Gen.Double[0, 8], Gen.Double[0.8, 10], Gen.Double[0.3, 1]),
        Gen.Select(Gen.Double[0.1, 0.85], Gen.Double[150, 900], Gen.Double[20, 100], Gen.Double[50, 200]),
        Gen.Select(Gen.Double[0, 8], Gen.Double[1, 30]))
        .Select((s, r, own) => new ReleaseReading(
            new(CmH2O(s.Item1), CmH2O(s.Item2), Seconds(s.Item3), Seconds(s.Item4)),
            r.Item1,
            Ml(r.Item2),
            MmHg(r.Item3),
            Ml(r.Item4),
            LMin(own.Item1),
            PerMin(own.Item2)));

    private static bool Near(double actual, double expected) => Math.Abs(actual - expected) <= 1e-9 * expected;

    private static AprvSettings Planned(double high = 28, double low = 0, double timeHigh = 4.5, double timeLow = 0.5)
        => new(CmH2O(high), CmH2O(low), Seconds(timeHigh), Seconds(timeLow));

    private static ReleaseReading At(double timeLow) => Base with { Settings = Planned(timeLow: timeLow) };

    /// <summary>Without own breaths and with a short time constant, ventilation follows the release rate alone: 12 a minute now.</summary>
    private static ReleaseReading Quiet()
        => Base with { TerminationRatio = 0.2, OwnVentilation = default, OwnRate = default };

    private static ProjectedChange Projected(ReleaseReading present, AprvSettings planned)
    {
        var answer = AprvProjection.Project(present, planned);
        Assert.Empty(answer.Refusals);
        return Assert.IsType<ProjectedChange>(answer.Change);
    }

    private sealed record Case(ReleaseReading Present, AprvSettings Planned, params ProjectionRefusal[] Expected);
}
