using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;
using static UnitVent.Charting.Rules.CarbonDioxide.AcidBaseReadings;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>R21: carbon dioxide rises, or pH falls, against the gases of the hours before.</summary>
public sealed class CarbonDioxideRisingRule : Rule
{
    private const double AlkalaemicAbove = 7.45; // Clin Chem 1987;33:1416: reference range
    private const double NormalPH = 7.35;
    private const double NormalPaCO2MmHg = 45;

    /// <inheritdoc/>
    public override string Id => "R21";

    /// <inheritdoc/>
    public override Family Family => Family.CarbonDioxide;

    /// <inheritdoc/>
    public override string Seen => "CO2 rising: PaCO2 +10 mmHg or pH −0.08 against the median of the last 12 h, or drift";

    /// <inheritdoc/>
    public override string Levels => "caution; with pH under the urgent edge of R22 urgent; across a change of mode, position, relaxant, ECMO or drain advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet while pH is above 7.45, before CO2 has settled, and shortly after a disturbance. Names the part of ventilation that fell, and a metabolic part.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.CarbonDioxideRising;
        return Latest(picture) is not { } gas
            || (PH(gas) >= NormalPH && PaCO2(gas) <= NormalPaCO2MmHg)
            || (PaCO2(gas) <= open.Evidence["paCO2Before"] + open.Evidence["importantRiseMmHg"] / 2 && PH(gas) >= open.Evidence["pHBefore"] - options.PHFall / 2);
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (Latest(picture) is not { } latest)
        {
            return CannotTell("Needs a recent arterial gas.");
        }

        if (IsUnsettled(picture, latest))
        {
            return CannotTell("The latest gas was drawn before CO2 had settled.");
        }

        var earlier = Earlier(picture, latest, out var across);
        if (Step.Of(earlier.Select(g => Point(g, PaCO2)), Point(latest, PaCO2)) is not { } carbon)
        {
            return CannotTell("No earlier gas to compare with.");
        }

        var acid = Step.Of(earlier.Select(g => Point(g, PH)), Point(latest, PH))!;
        var options = picture.Window.Unit.Thresholds.CarbonDioxideRising;
        var stepped = carbon.After - carbon.Before >= options.PaCO2RiseMmHg || Math.Round(acid.Before - acid.After, 3) >= options.PHFall;
        var drift = !stepped && !across && MayDrift(picture, latest) && picture.Drifts["paCO2MmHg"] is { Verdict: DriftVerdict.Drifting, Course: DriftCourse.Worse } drifting ? drifting : null;
        return PH(latest) > AlkalaemicAbove || (!stepped && drift is null)
            ? Clear(latest.Gas.At)
            : Rising(picture, latest, earlier, across, drift is null ? carbon : new(drift.StartMedian!.Value, carbon.After, drift.Count, drift.Span), acid, drift);
    }

    /// <summary>The settled gases of the hours before without repeats, of the same epoch; without any, those before it.</summary>
    private static List<PairedGas> Earlier(PatientPicture picture, PairedGas latest, out bool across)
    {
        var settled = picture.Gases.Where(g => g.Gas.At < latest.Gas.At && latest.Gas.At - g.Gas.At <= Step.Reach && !IsUnsettled(picture, g)).ToList();
        var kept = Repeats.Dropped([.. settled.Select(g => Point(g, PaCO2)), Point(latest, PaCO2)]).Select(p => p.At).ToHashSet();
        var earlier = settled.Where(g => kept.Contains(g.Gas.At)).ToList();
        var epoch = InForce.EpochStart(picture.Window, latest.Gas.At);
        var same = earlier.Where(g => g.Gas.At >= epoch).ToList();
        across = same.Count == 0;
        return across ? earlier : same;
    }

    /// <summary>Whether drift is worth its price: without such a rise above the lowest gas there is none.</summary>
    private static bool MayDrift(PatientPicture picture, PairedGas latest)
    {
        var within = picture.Gases.Where(g => picture.AsOf - g.Gas.At <= picture.Window.Unit.DriftWindow).Select(PaCO2).ToList();
        return within.Count >= Drift.FewestPoints && PaCO2(latest) - within.Min() >= DriftVariables.PaCO2.TrendMinimum.From(within.Min()) / 2;
    }

    private RuleOutcome Rising(PatientPicture picture, PairedGas latest, List<PairedGas> earlier, bool across, Step carbon, Step acid, Drift? drift)
    {
        var options = picture.Window.Unit.Thresholds.CarbonDioxideRising;
        var urgent = PH(latest) < PHEdges.Of(picture).UrgentUnder;
        var fellBy = Step.Of(earlier.Where(g => BaseExcessOf(g) is not null).Select(g => Point(g, x => BaseExcessOf(x)!.Value)), Point(latest, x => BaseExcessOf(x) ?? 0));
        var metabolic = fellBy is { } be && be.Before - be.After >= options.BaseExcessFallMmolL
            ? $"; metabolic part: base excess {Numbers.Fixed(be.Before, 1)} → {Numbers.Fixed(be.After, 1)} mmol/L"
            : "";
        var says = $"PaCO2 {Numbers.Fixed(carbon.Before)} → {Numbers.Fixed(carbon.After)} mmHg, pH {Numbers.Fixed(acid.Before, 2)} → {Numbers.Fixed(acid.After, 2)} in {Times.Hours(carbon.Span)}"
            + (drift is null ? "" : $", drift over {drift.Count} gases") + metabolic + VentilationParts.Fell(picture, latest, earlier, options.PartFall)
            + (across ? "; mode, position, relaxant, ECMO or drain differ" : "");
        return RaiseOnGas(
            picture,
            urgent ? Severity.Urgent : across ? Severity.Advisory : Severity.Caution,
            says,
            "which part of ventilation fell, sedation, secretions, tube and circuit, dead space, fever, perfusion and lactate",
            Evidence.Of(
                carbon.After - carbon.Before + 100 * (acid.Before - acid.After),
                [latest.Gas.Id, .. earlier.Select(g => (Guid?)g.Gas.Id)],
                ("paCO2Before", carbon.Before),
                ("paCO2After", carbon.After),
                ("pHBefore", acid.Before),
                ("pHAfter", acid.After),
                ("importantRiseMmHg", drift is null ? options.PaCO2RiseMmHg : DriftVariables.PaCO2.TrendMinimum.From(carbon.Before))));
    }

    private static SeriesPoint Point(PairedGas gas, Func<PairedGas, double> value) => new(gas.Gas.At, value(gas));
}
