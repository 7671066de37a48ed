using NodaTime;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class TypedTimeTests
{
    public static TheoryData<string, string, string, string> Past => new()
    {
        { "2026-12-01T13:05:00Z", "0540", "2026-12-01T04:40:00Z", "four digits are a time of day in the unit's zone" },
        { "2026-12-01T13:05:00Z", "05:40", "2026-12-01T04:40:00Z", "so are digits with a colon" },
        { "2026-12-01T13:05:00Z", "14:07", "2026-12-01T13:07:00Z", "two minutes ahead is within the clocks' tolerance" },
        { "2026-11-30T23:10:00Z", "2350", "2026-11-30T22:50:00Z", "ten past midnight, ten to midnight is yesterday" },
        { "2026-12-01T13:05:00Z", "15:00", "2026-12-01T14:00:00Z", "23 h back is too far to guess: it stays today, and is refused as future when saved" },
        { "2026-12-01T13:05:00Z", "30 Nov 15:00", "2026-11-30T14:00:00Z", "with the day it is that day" },
        { "2026-01-02T08:00:00Z", "30 Dec 15:00", "2025-12-30T14:00:00Z", "a day far ahead is of last year" },
    };

    public static TheoryData<string, string> Refused => new()
    {
        { "25:00", "no such hour" },
        { "0560", "no such minute" },
        { "540", "three digits could be 5:40 or 54:0" },
        { "noon", "letters" },
        { "31 Nov 05:40", "no such day" },
        { "05.40", "not a time" },
    };

    [Theory, MemberData(nameof(Past))]
    public void Past_OfTypedTime_ResolvesToTheLatestSuchTime(string now, string text, string expected, string reason)
    {
        var time = TypedTime.Past(text, Parsed(now), ScreenChart.Berlin);

        Assert.True(time.At == Parsed(expected), $"{text} at {now} → {time.At} {time.Problem}: {reason}");
    }

    [Theory, MemberData(nameof(Refused))]
    public void Past_OfAnythingElse_SaysHowToTypeIt(string text, string reason)
    {
        var time = TypedTime.Past(text, ScreenChart.Now, ScreenChart.Berlin);

        Assert.True(time.At is null && time.Problem is not null, $"{text} → {time.At}: {reason}");
    }

    [Fact]
    public void Past_InARepeatedHour_OffersBothAndGuessesNeither()
    {
        // Clocks in Berlin went from 03:00 back to 02:00 on 25 October 2026 (EU directive 2000/84/EC: last Sunday of October, 01:00 UTC).
        var time = TypedTime.Past("25 Oct 02:30", Parsed("2026-10-25T09:00:00Z"), ScreenChart.Berlin);

        Assert.Equal([Parsed("2026-10-25T00:30:00Z"), Parsed("2026-10-25T01:30:00Z")], time.Choices);
    }

    [Fact]
    public void Past_InTheHourThatWasLeftOut_IsRefused()
    {
        // Forward from 02:00 to 03:00 on 29 March 2026, the same directive.
        var time = TypedTime.Past("29 Mar 02:30", Parsed("2026-03-29T09:00:00Z"), ScreenChart.Berlin);

        Assert.Contains("did not exist", time.Problem, StringComparison.Ordinal);
    }

    [Fact]
    public void ToCome_OfATimeThatHasPassedToday_IsTomorrow() =>
        Assert.Equal(Parsed("2026-12-02T08:30:00Z"), TypedTime.ToCome("0930", ScreenChart.Now, ScreenChart.Berlin).At);

    private static Instant Parsed(string text) => NodaTime.Text.InstantPattern.General.Parse(text).Value;
}
