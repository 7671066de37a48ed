using NodaTime;

namespace UnitVent.Store.Tests;

/// <summary>A clock that a test moves.</summary>
internal sealed class SteppingClock(Instant now) : IClock
{
    public Instant Now { get; set; } = now;

    public Instant GetCurrentInstant() => Now;
}
