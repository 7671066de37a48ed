using UnitVent.Charting.Episodes;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Shared;

/// <summary>The unit that this circuit looks at, of those that the person may see.</summary>
public sealed class UnitInView(ChartReader charts, CurrentActor current)
{
    /// <summary>Another unit is in view.</summary>
    public event Action? Changed;

    public IReadOnlyList<UnitProfile> Units { get; private set; } = [];

    /// <summary>Null when the person belongs to no unit.</summary>
    public UnitProfile? Unit { get; private set; }

    /// <summary>Reads the units, and looks at the preferred one when it is among them. The layout does it before it shows a page.</summary>
    public async Task LoadAsync(string? preferred, CancellationToken cancel = default)
    {
        var units = await charts.UnitsAsync(await current.GetAsync(cancel), cancel);
        Units = units.Succeeded ? units.Value : [];
        Unit = Units.FirstOrDefault(u => u.Code == preferred) ?? (Units.Count > 0 ? Units[0] : null);
        Changed?.Invoke();
    }

    /// <summary>Looks at another unit; false when the person may not see it.</summary>
    public bool Use(string code)
    {
        if (Units.FirstOrDefault(u => u.Code == code) is not { } unit)
        {
            return false;
        }

        Unit = unit;
        Changed?.Invoke();
        return true;
    }
}
