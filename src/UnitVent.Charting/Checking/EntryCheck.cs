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
        ArgumentNullException.ThrowIfNull(window);
        var open = Envelope(entry)
            .Concat(FieldLimits.Verdict(entry.Body, (entry.Body as BloodGas)?.TensionUnit ?? TensionUnit.MmHg))
            .Concat(TimeCheck.Verdict(entry.Body, window, now))
            .Concat(OfKind(entry.Body, window))
            .Where(e => !(e.IsAsk && entry.Confirmed.Contains(e.Code)))
            .DistinctBy(e => (e.Field, e.Code))
            .ToList();
        return [.. open.Where(e => !open.Exists(other => Explains(other, e)))];
    }

    /// <summary>One question is better than three: what one mistake explains is not asked about as well.</summary>
    private static bool Explains(FieldError one, FieldError other) => other.IsAsk && one != other && (
        (!one.IsAsk && one.Field == other.Field)
        || (one.Code == "ask.tensionUnit" && (other.Code is "ask.pO2" or "ask.pCO2" or "ask.gasConsistency"))
        || (one.Code == "ask.timesSwapped" && (other.Code is "ask.tHighS" or "ask.tLowS")));

    private static IEnumerable<FieldError> Envelope(NewEntry entry)
    {
        if (entry.Id == Guid.Empty)
        {
            yield return new("id", "missing", "An id is needed.");
        }

        if (entry.Corrects is not null && string.IsNullOrWhiteSpace(entry.CorrectionReason))
        {
            yield return new("correctionReason", "missing", "A correction needs its reason.");
        }
    }

    private static IEnumerable<FieldError> OfKind(Entry body, ChartWindow window) => body switch
    {
        SettingChange settings => SettingCheck.Verdict(settings, window),
        BloodGas gas => GasCheck.Verdict(gas, window),
        VentilatorCheck check => VentilatorReadingCheck.Verdict(check, window),
        BreathingCheck breathing => BreathingVerdict(breathing),
        BedsideEvent happened => EventVerdict(happened),
        ContextChange context => Ordered(context.From, context.Until, "until", "The end"),
        TargetSet target => TargetVerdict(target),
        _ => [],
    };

    private static IEnumerable<FieldError> BreathingVerdict(BreathingCheck breathing) =>
        breathing is { Rass: not null, RassNotAssessable: true }
            ? [new("rass", "contradiction", "RASS was given and called not assessable; one of the two.")]
            : [];

    private static IEnumerable<FieldError> EventVerdict(BedsideEvent happened) =>
        happened.Result is not null && happened.What != EventKind.BreathingTrialResult
            ? [new("result", "contradiction", "A result belongs to the end of a breathing trial.")]
            : Ordered(happened.At, happened.Until, "until", "The end");

    private static IEnumerable<FieldError> TargetVerdict(TargetSet target)
    {
        var pairs = new (decimal? Low, decimal? High, string Field, string Label)[]
        {
            (target.SpO2LowPercent, target.SpO2HighPercent, "spO2HighPercent", "SpO2"),
            (target.PaO2LowMmHg, target.PaO2HighMmHg, "paO2HighMmHg", "PaO2"),
            (target.PaCO2LowMmHg, target.PaCO2HighMmHg, "paCO2HighMmHg", "PaCO2"),
            (target.RassLow, target.RassHigh, "rassHigh", "RASS"),
        };
        return pairs.Where(p => p.Low > p.High)
            .Select(p => new FieldError(p.Field, "limit.order", $"{p.Label}: the upper edge {p.High} lies below the lower edge {p.Low}."))
            .Concat(Ordered(target.From, target.ExpiresAt, "expiresAt", "The expiry"));
    }

    private static IEnumerable<FieldError> Ordered(Instant? from, Instant? until, string field, string label) =>
        until <= from ? [new(field, "time.order", $"{label} lies before the start.")] : [];
}
