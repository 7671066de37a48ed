using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R45: breathing on pressure support is fast or shallow.</summary>
public sealed class SupportUnsettledRule : Rule
{
    private const double HalfImportantChangeMlPerKg = 0.5; // half of 1 mL/kg [common practice]

    /// <inheritdoc/>
    public override string Id => "R45";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "breathing on pressure support unsettled";

    /// <inheritdoc/>
    public override string Levels => "rate over 35/min, tidal volume under 4 mL/kg or rate by tidal volume over 105/min/L caution";

    /// <inheritdoc/>
    public override string Remarks => "Pressure support only; quiet in its first 10 min.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.SupportUnsettled;
        return Breaths.Of(picture) is { } breaths
            && !(breaths.Rate > options.RateAbovePerMin - FastAndLabouringRule.HalfImportantRate)
            && !(breaths.PerKg < options.VolumeUnderMlPerKg + HalfImportantChangeMlPerKg)
            && !(breaths.Index > options.RapidShallowAbove);
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings?.Body.Mode != VentilationMode.PressureSupport)
        {
            return CannotTell("Judged in pressure support.");
        }

        var options = picture.Window.Unit.Thresholds.SupportUnsettled;
        if (Breaths.Of(picture) is not { } breaths || breaths.At - SettingsHeld.ModeSince(picture) < Duration.FromMinutes(options.SettlesMinutes))
        {
            return CannotTell("Needs a recent rate or tidal volume, read when the mode had settled.");
        }

        var says = Signs(breaths, options).ToList();
        return says.Count == 0
            ? Clear(breaths.At)
            : Raise(
                Severity.Caution,
                string.Join(", ", says),
                "effort and comfort, secretions, support pressure, PaCO2 and pH, fever and pain",
                breaths.At,
                Evidence.Of(
                    Math.Max(breaths.Index ?? 0, breaths.Rate ?? 0),
                    [breaths.Entry],
                    [.. breaths.Rate is { } rate ? new[] { ("ratePerMin", rate) } : [], .. breaths.PerKg is { } perKg ? new[] { ("tidalVolumePerKg", perKg) } : []]));
    }

    private static IEnumerable<string> Signs(Breaths breaths, SupportUnsettledOptions options)
    {
        if (breaths.Rate > options.RateAbovePerMin)
        {
            yield return $"{Numbers.Fixed(breaths.Rate.Value)} breaths/min";
        }

        if (breaths.PerKg < options.VolumeUnderMlPerKg)
        {
            yield return $"tidal volume {Numbers.Fixed(breaths.PerKg.Value, 1)} mL/kg";
        }

        if (breaths.Index > options.RapidShallowAbove)
        {
            yield return $"rate by tidal volume {Numbers.Fixed(breaths.Index.Value)}/min/L";
        }
    }

    /// <summary>The breaths of one check.</summary>
    private sealed record Breaths(double? Rate, double? Litres, double? PerKg, Instant At, Guid Entry)
    {
        public double? Index => Rate / Litres;

        public static Breaths? Of(PatientPicture picture)
        {
            if (picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => Volume(c) is not null || RateOf(c) is not null) is not { } check
                || picture.AsOf - check.At > picture.Limits.Readings)
            {
                return null;
            }

            var millilitres = (double?)Volume(check.Body);
            return new((double?)RateOf(check.Body), millilitres / 1000, millilitres / picture[ValueNames.PredictedBodyWeightKg].Value, check.At, check.Id);
        }

        private static decimal? Volume(VentilatorCheck check) => check.SpontaneousTidalVolumeMl ?? check.TidalVolumeMl;

        private static decimal? RateOf(VentilatorCheck check) => check.SpontaneousRatePerMin ?? check.TotalRatePerMin;
    }
}
