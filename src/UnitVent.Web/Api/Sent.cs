namespace UnitVent.Web.Api;

/// <summary>What a caller sent: what every write carries, and the thing itself.</summary>
/// <param name="Id">Made by the caller; the same id again is the same thing.</param>
/// <param name="Body">The thing.</param>
public sealed record Sent<T>(Guid Id, T Body)
{
    /// <summary>The questions that the caller answers with yes.</summary>
    public IReadOnlyList<string> Confirmed { get; init; } = [];

    public Guid? Corrects { get; init; }

    public string? CorrectionReason { get; init; }
}
