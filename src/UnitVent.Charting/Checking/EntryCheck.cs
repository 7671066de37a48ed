using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Checking;

/// <summary>The one verdict on an entry, the same for form, HTTP interface and pass.</summary>
public static class EntryCheck
{
    /// <summary>Everything that speaks against an entry: refusals, and questions that were not yet answered with yes.</summary>
    /// <param name="entry">What somebody wants recorded.</param>
    /// <param name="window">The chart as it stands.</param>
    /// <param name="now">The present instant.</param>
    /// <returns>Empty when it may be recorded.</returns>
    public static IReadOnlyList<FieldError> Verdict(NewEntry entry, ChartWindow window, Instant now)
    {
        ArgumentNullException.ThrowIfNull(entry);
        return [];
    }
}
