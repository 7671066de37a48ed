using NodaTime;

namespace UnitVent.Store.Auditing;

/// <summary>One event of an audit chain.</summary>
/// <param name="Number">Its place in the chain, from 1.</param>
/// <param name="At">When.</param>
/// <param name="Who">Who, by name.</param>
/// <param name="What">What was done.</param>
/// <param name="Subject">To what.</param>
/// <param name="Detail">Kinds and codes.</param>
public sealed record AuditEvent(long Number, Instant At, string Who, string What, Guid? Subject, string Detail);
