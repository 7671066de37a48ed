namespace UnitVent.Charting.Entries;

/// <summary>An entry that somebody wants recorded.</summary>
/// <param name="Id">Made by whoever records it.</param>
/// <param name="Body">What is charted.</param>
public sealed record NewEntry(Guid Id, Entry Body)
{
    /// <summary>Gets the codes of the questions that were answered with yes.</summary>
    public IReadOnlyList<string> Confirmed { get; init; } = [];

    /// <summary>Gets the entry that this one replaces.</summary>
    public Guid? Corrects { get; init; }

    /// <summary>Gets why it replaces another; needed when it does.</summary>
    public string? CorrectionReason { get; init; }
}
