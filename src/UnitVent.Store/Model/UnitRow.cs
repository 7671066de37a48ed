using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Store.Model;

/// <summary>A unit and its settings. Mutable, audited.</summary>
internal sealed class UnitRow
{
    public Guid Id { get; set; }

    public string Code { get; set; } = "";

    public string Name { get; set; } = "";

    public string TimeZone { get; set; } = "";

    public double AltitudeM { get; set; }

    public TensionUnit TensionUnit { get; set; }

    public SettingMethod Method { get; set; }

    public Duration CheckInterval { get; set; }

    public List<LocalTime> ShiftStarts { get; set; } = [];

    public bool IsDemo { get; set; }

    public Instant CreatedAt { get; set; }

    public uint Version { get; set; }
}
