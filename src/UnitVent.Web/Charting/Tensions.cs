using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>Gas tensions in the unit in which a unit reads them.</summary>
public static class Tensions
{
    public static string Name(TensionUnit unit) => unit == TensionUnit.KPa ? "kPa" : "mmHg";

    /// <summary>A typed tension: exactly as typed in its own unit, converted in the other; an en dash when there is none.</summary>
    public static string Shown(decimal? typed, TensionUnit? typedIn, TensionUnit shownIn) => typed is not { } value ? "–"
        : typedIn == shownIn ? Format.Typed(value)
        : shownIn == TensionUnit.KPa ? Format.Number(PartialPressure.FromMmHg((double)value).Kilopascals, 1)
        : Format.Number(PartialPressure.FromKilopascals((double)value).MmHg, 0);

    /// <summary>A computed tension in mmHg, in the unit in which it is read.</summary>
    public static string Shown(double? mmHg, TensionUnit shownIn) => mmHg is { } value && shownIn == TensionUnit.KPa
        ? Format.Number(value * PartialPressure.FromMmHg(1).Kilopascals, 1)
        : Format.Number(mmHg, 0);
}
