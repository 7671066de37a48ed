using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Simulation.Staff;

/// <summary>The questions that a careful person answers with yes when they record an entry.</summary>
internal static class Confirmations
{
    private static readonly Duration AskedWhenOlder = Duration.FromHours(2);

    public static IReadOnlyList<string> Of(Entry body, Instant recordedAt) =>
        [.. FieldLimits.Verdict(body).Where(e => e.IsAsk).Select(e => e.Code)
            .Concat(Late(body, recordedAt))
            .Concat(Consistency(body))
            .Distinct()];

    private static IEnumerable<string> Late(Entry body, Instant recordedAt) =>
        body.EffectiveAt() is { } at && recordedAt - at > AskedWhenOlder
            ? ["ask." + EntryFields.Of(body.GetType()).First(f => f.Kind == FieldKind.Time && f.Required).Name]
            : [];

    private static IEnumerable<string> Consistency(Entry body) =>
        body is BloodGas gas && GasConsistency.Of(gas) is { BeyondRounding: > GasConsistency.CautionBeyond } ? ["ask.gasConsistency"] : [];
}
