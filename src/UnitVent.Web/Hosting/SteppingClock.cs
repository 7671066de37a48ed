using NodaTime;

namespace UnitVent.Web.Hosting;

/// <summary>A clock that stands where it was put, for telling a story in the past. Each flow of calls has its own.</summary>
public sealed class SteppingClock : IClock
{
    private readonly AsyncLocal<Instant> now = new();

    public void Set(Instant instant) => now.Value = instant;

    public Instant GetCurrentInstant() => now.Value;
}
