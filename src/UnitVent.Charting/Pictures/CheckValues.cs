using UnitVent.Charting.Entries;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Pictures;

/// <summary>What the equations of the picture make of one check by itself, at the settings and in the circumstances of its own time. Worked out when it is asked for.</summary>
internal sealed class CheckValues(ChartWindow window, Charted<VentilatorCheck> check)
{
    public Charted<VentilatorCheck> Check => check;

    /// <summary>Mean airway pressure, measured where it agrees with the settings, else computed from them.</summary>
    public PictureValue MeanPressure => field ??= Pictures.MeanPressure.Best(Pictures.MeanPressure.Computed(Sources.Settings, check), Pictures.MeanPressure.Measured(check));

    private PictureSources Sources => field ??= new PictureSources(window, check.At);

    private List<PictureValue> Split => field ??= [.. SplitValues.Of(Sources)];

    private List<PictureValue> Release => field ??= [.. ReleaseValues.Of(Sources)];

    /// <summary>A value that rests on this check and no other; null when there is none.</summary>
    public PictureValue? this[string name] =>
        (SplitValues.Names.Contains(name) ? Split : Release).Find(v => v.Name == name) is { } value && value.AsOf == check.At ? value : null;
}
