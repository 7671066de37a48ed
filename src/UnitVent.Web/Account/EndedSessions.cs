using System.Collections.Concurrent;
using NodaTime;

namespace UnitVent.Web.Account;

/// <summary>The sessions that were signed out and whose cookie has not run out: no copy of it and no other tab goes on with it.</summary>
public sealed class EndedSessions(IClock clock)
{
    private readonly ConcurrentDictionary<string, Instant> ended = new();

    public void Add(string session)
    {
        var now = clock.GetCurrentInstant();
        foreach (var (old, at) in ended)
        {
            if (now - at > SessionCheck.Longest)
            {
                ended.TryRemove(old, out _);
            }
        }

        ended[session] = now;
    }

    public bool Contains(string session) => ended.ContainsKey(session);
}
