using Microsoft.JSInterop;
using NodaTime;

namespace UnitVent.Web.Shared;

/// <summary>When the person in front of this circuit last touched key or pointer. Updates that the server pushes do not count.</summary>
public sealed class CircuitSession(IClock clock)
{
    public static readonly Duration IdleLimit = Duration.FromMinutes(30);

    private Instant lastInput = clock.GetCurrentInstant();

    public bool IsIdle => clock.GetCurrentInstant() - lastInput > IdleLimit;

    [JSInvokable]
    public void Touch() => lastInput = clock.GetCurrentInstant();
}
