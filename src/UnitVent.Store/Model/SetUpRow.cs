using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>The one row that says whether the first administrator was made, and the secret with which it may be.</summary>
internal sealed class SetUpRow
{
    public int Id { get; set; }

    public byte[] SecretHash { get; set; } = [];

    public Instant? DoneAt { get; set; }
}
