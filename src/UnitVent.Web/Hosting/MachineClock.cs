using NodaTime;

namespace UnitVent.Web.Hosting;

/// <summary>The machine's clock. Start-up registers it; everybody else is handed a clock.</summary>
public static class MachineClock
{
#pragma warning disable RS0030 // The one place that takes it.
    public static IClock Clock { get; } = SystemClock.Instance;
#pragma warning restore RS0030
}
