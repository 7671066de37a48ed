using NodaTime;

namespace UnitVent.Web.Hosting;

/// <summary>The machine's clock, in the microseconds that the store keeps: what is answered at once is what is answered later. Start-up registers it.</summary>
public sealed class MachineClock : IClock
{
    private const long TicksInMicrosecond = 10;

    private MachineClock()
    {
    }

    public static IClock Clock { get; } = new MachineClock();

    public Instant GetCurrentInstant()
    {
#pragma warning disable RS0030 // The one place that takes it; everybody else is handed a clock.
        var ticks = SystemClock.Instance.GetCurrentInstant().ToUnixTimeTicks();
#pragma warning restore RS0030
        return Instant.FromUnixTimeTicks(ticks - (ticks % TicksInMicrosecond));
    }
}
