using NodaTime;
using UnitVent.Web.Hosting;

namespace UnitVent.Web.Tests.Hosting;

/// <summary>The machine's clock, which a test may put forward.</summary>
public sealed class TestClock : IClock
{
    public Duration Ahead { get; set; }

    public Instant GetCurrentInstant() => MachineClock.Clock.GetCurrentInstant() + Ahead;
}
