using UnitVent.Charting.Episodes;

namespace UnitVent.Web.Shared;

/// <summary>The unit that this circuit looks at, of those that the person may see.</summary>
public sealed class UnitInView
{
    /// <summary>Another unit is in view.</summary>
    public event Action? Changed;

    public IReadOnlyList<UnitProfile> Units { get; private set; } = [];

    /// <summary>Null when the person belongs to no unit.</summary>
    public UnitProfile? Unit { get; private set; }

    /// <summary>Reads the units; the layout does it before it shows a page.</summary>
    public Task LoadAsync(string? preferred)
    {
        Unit = Units.FirstOrDefault(u => u.Code == preferred) ?? (Units.Count > 0 ? Units[0] : null);
        return Task.CompletedTask;
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
