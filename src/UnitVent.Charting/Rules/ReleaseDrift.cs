using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Rules;

/// <summary>Drifts of what the releases show, over checks at the same settings.</summary>
internal static class ReleaseDrift
{
    private const double SureLevel = 0.02; // two-sided, as in Drift.Level; found by simulation, see docs/cohort-study.md

    /// <summary>The verdict on mechanics of the releases since an instant, of checks whose end-release flow lies within a range of per cent of peak.</summary>
    public static Drift Of(PatientPicture picture, DriftVariable variable, Instant since, double endFlowFrom, double endFlowTo) =>
        Drift.Of(picture.Series.Mechanics(variable.Name, endFlowFrom, endFlowTo).Where(p => p.At >= since), variable);

    /// <summary>What a drift of one quantity asks for: caution when its direction is surer than a drift has to be, which takes five checks in one order or more; else advisory.</summary>
    public static Severity Level(Drift drift) => drift.Trend!.P <= SureLevel ? Severity.Caution : Severity.Advisory;

    /// <summary>Whether there are checks enough for a verdict, before anything is computed from them.</summary>
    public static bool ChecksEnough(PatientPicture picture, Instant since) =>
        picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf)
            .Count(c => c.At >= since && ReleaseChecks.EndFlowPercent(c.Body) is not null) >= Drift.FewestPoints;

    /// <summary>Why there is no verdict.</summary>
    public static string NotEnough(string atTheSame) => $"Not enough data: {Drift.FewestPoints} valid checks over 4 h at the same {atTheSame}.";
}
