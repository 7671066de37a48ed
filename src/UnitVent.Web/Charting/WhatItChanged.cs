using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>The answer after saving: which numbers are new and what they were, and which flags were raised or cleared.</summary>
public static class WhatItChanged
{
    private static readonly (string Name, string Label, string Unit, int Decimals)[] Told =
    [
        (ValueNames.PfRatio, "P/F", "", 0),
        (ValueNames.OxygenationIndex, "Oxygenation index", "", 1),
        (ValueNames.MeanAirwayPressureComputed, "Mean airway pressure", " cmH2O", 1),
        (ValueNames.EndReleaseFlowPercent, "End of release", " % of peak", 0),
        (ValueNames.ReleaseVolumePerKg, "Release volume", " mL/kg", 1),
        (ValueNames.TidalVolumePerKg, "Tidal volume", " mL/kg", 1),
        (ValueNames.SpontaneousSharePercent, "Own share", " %", 0),
    ];

    /// <summary>One sentence a change; empty when nothing computed changed.</summary>
    public static IReadOnlyList<string> Sentences(PatientPicture before, PatientPicture after, IReadOnlyList<FlagStep> steps) =>
        [.. Numbers(before, after), .. ChangedInBetween(before, after), .. steps.Select(Step).OfType<string>()];

    private static IEnumerable<string> Numbers(PatientPicture before, PatientPicture after)
    {
        foreach (var (name, label, unit, decimals) in Told)
        {
            if (after[name] is not { Value: { } now } value)
            {
                continue;
            }

            var earlier = before[name];
            if (earlier.Value is null)
            {
                yield return $"{label} {Format.Number(now, decimals)}{unit}.";
            }
            else if (value.AsOf != earlier.AsOf || Math.Abs(now - earlier.Value.Value) > 1e-9)
            {
                yield return $"{label} {Format.Number(now, decimals)}{unit}, was {Format.Number(earlier.Value.Value, decimals)}{At(earlier.AsOf, after)}.";
            }
        }
    }

    private static IEnumerable<string> ChangedInBetween(PatientPicture before, PatientPicture after)
    {
        if (before.LatestGas is { Settings: { } then } earlier && after.LatestGas is { Settings: { } now } latest && latest.Gas.Id != earlier.Gas.Id && now.Id != then.Id)
        {
            yield return $"Settings changed in between: {TimelineMarks.Changed(then.Body, now.Body)}.";
        }
    }

    private static string? Step(FlagStep step) => step.Kind switch
    {
        FlagStepKind.Raised => "Raised: " + step.Finding.Says + ".",
        FlagStepKind.Worse => "Worse: " + step.Finding.Says + ".",
        FlagStepKind.Milder => "Milder: " + step.Finding.Says + ".",
        FlagStepKind.Cleared => "Cleared: " + step.Finding.Says + ".",
        FlagStepKind.ClosedByCorrection => "Closed, entry corrected: " + step.Finding.Says + ".",
        FlagStepKind.StillTrue or FlagStepKind.Acknowledged or FlagStepKind.Reopened => null,
    };

    private static string At(Instant? at, PatientPicture picture) => at is { } known ? " at " + Format.Time(known, picture.AsOf, picture.Window.Unit.Zone) : "";
}
