using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>What every part of a patient's sheet reads from.</summary>
internal sealed record SheetPart(SheetInput Input, Times Times)
{
    public PatientPicture Now => Input.Now;

    /// <summary>Who charted an entry and when it was so.</summary>
    public string Source<T>(Charted<T> charted)
        where T : Entry => $"{Times.At(charted.At)}, {charted.Entry.RecordedBy}";

    /// <summary>A value of the picture with the time of its oldest input.</summary>
    public KeyValue Value(string label, string name)
    {
        var value = Now[name];
        var at = value is { Value: not null, AsOf: { } asOf } ? $", {Times.At(asOf)}" : "";
        return new KeyValue(label, Printed.Known(value) + at);
    }
}
