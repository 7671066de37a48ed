using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What the expiratory flow of a release tells: A2, A11–A14. Estimates of a one-compartment lung.</summary>
internal static class ReleaseValues
{
    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        var flows = s.CheckWith(c => c is { PeakExpiratoryFlowLMin: not null, EndReleaseFlowLMin: not null });
        var whole = s.CheckWith(c => c is { PeakExpiratoryFlowLMin: not null, EndReleaseFlowLMin: not null, ReleaseVolumeMl: not null });
        var release = new Release(s, flows);
        var measured = whole?.Id == flows?.Id ? release : new Release(s, whole);
        return [.. release.Flow, .. measured.Lung, PerKilogram(s)];
    }

    private static PictureValue PerKilogram(PictureSources s)
    {
        var volume = s.FromCheck(s.CheckWith(c => c.ReleaseVolumeMl is not null), "releaseVolumeMl", "release volume", "mL", c => c.ReleaseVolumeMl);
        return CycleValues.InAprv(s, Equations.ReleaseVolumePerKg, [volume, s.PredictedWeight()],
            v => VolumePerKilogram.Compute(GasVolume.FromMillilitres(v[0]), BodyMass.FromKilograms(v[1])),
            doubt: _ => BodyValues.Doubt(s));
    }
}
