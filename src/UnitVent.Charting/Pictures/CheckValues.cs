using UnitVent.Charting.Entries;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Pictures;

/// <summary>What the equations of the picture make of one check by itself, at the settings and in the circumstances of its own time.</summary>
internal sealed class CheckValues
{
    private readonly Dictionary<string, PictureValue> values;

    public CheckValues(ChartWindow window, Charted<VentilatorCheck> check)
    {
        Check = check;
        var sources = new PictureSources(window, check.At);
        MeanPressure = Pictures.MeanPressure.Best(Pictures.MeanPressure.Computed(sources.Settings, check), Pictures.MeanPressure.Measured(check));
        values = ReleaseValues.Of(sources).Concat(SplitValues.Of(sources)).Where(v => v.AsOf == check.At).ToDictionary(v => v.Name);
    }

    public Charted<VentilatorCheck> Check { get; }

    /// <summary>Mean airway pressure, measured where it agrees with the settings, else computed from them.</summary>
    public PictureValue MeanPressure { get; }

    /// <summary>A value that rests on this check and no other; null when there is none.</summary>
    public PictureValue? this[string name] => values.GetValueOrDefault(name);
}
