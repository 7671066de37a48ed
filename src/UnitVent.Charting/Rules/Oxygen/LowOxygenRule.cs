using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>R25: oxygen is low, by oximeter or by gas.</summary>
public sealed class LowOxygenRule : Rule
{
    private const double HalfImportantSpO2Points = 1.5; // half of 3 points: J Clin Monit 1992;8:111
    private const double HalfImportantPaO2Share = 0.075; // half of 15 %: Chest 1983;84:14

    /// <inheritdoc/>
    public override string Id => "R25";

    /// <inheritdoc/>
    public override Family Family => Family.Oxygen;

    /// <inheritdoc/>
    public override string Seen => "low oxygen";

    /// <inheritdoc/>
    public override string Levels => "SpO2 under 88 % or PaO2 under 55 mmHg urgent; under the patient’s own target caution";

    /// <inheritdoc/>
    public override string Remarks => "The target of the patient shifts it, never below the floor.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.LowOxygen;
        var spO2 = OxygenReadings.SpO2(picture)?.Percent;
        var paO2 = Gas(picture)?.MmHg;
        return !(spO2 < (CautionEdge(picture) ?? UrgentEdge(picture, options)) + HalfImportantSpO2Points)
            && !(!picture.OnEcmo && paO2 < PaO2Edge(picture, options) * (1 + HalfImportantPaO2Share));
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.LowOxygen;
        var spO2 = OxygenReadings.SpO2(picture);
        var gas = picture.OnEcmo ? null : Gas(picture);
        if (spO2 is null && gas is null)
        {
            return CannotTell("Needs a recent SpO2 or arterial gas.");
        }

        var bySpO2 = spO2?.Percent < UrgentEdge(picture, options) ? Severity.Urgent : spO2?.Percent < CautionEdge(picture) ? Severity.Caution : (Severity?)null;
        var byGas = gas?.MmHg < options.PaO2LowMmHg ? Severity.Urgent : gas?.MmHg < (double?)picture.Targets?.Body.PaO2LowMmHg ? Severity.Caution : (Severity?)null;
        var seen = Instant.Max(spO2?.At ?? Instant.MinValue, gas?.At ?? Instant.MinValue);
        if (bySpO2 is null && byGas is null)
        {
            return Clear(seen);
        }

        var parts = new List<string>();
        if (bySpO2 is not null)
        {
            parts.Add($"SpO2 {Numbers.Fixed(spO2!.Value.Percent)} %, edge {Numbers.Fixed(CautionEdge(picture) ?? UrgentEdge(picture, options))} %");
        }

        if (byGas is not null)
        {
            parts.Add($"PaO2 {Numbers.Fixed(gas!.Value.MmHg)} mmHg, edge {Numbers.Fixed(PaO2Edge(picture, options))} mmHg");
        }

        var level = bySpO2 > byGas || byGas is null ? bySpO2!.Value : byGas.Value;
        return Raise(
            level,
            string.Join("; ", parts),
            "the patient, the probe, tube and circuit, the oxygen supply, secretions, pneumothorax",
            bySpO2 is not null ? spO2!.Value.At : gas!.Value.At,
            Evidence.Of(
                Math.Max(100 - (spO2?.Percent ?? 100), 0) + Math.Max(PaO2Edge(picture, options) - (gas?.MmHg ?? double.MaxValue), 0),
                [bySpO2 is null ? null : spO2!.Value.Entry, byGas is null ? null : gas!.Value.Entry],
                [.. spO2 is { } s ? new[] { ("spO2Percent", s.Percent) } : [], .. gas is { } g ? new[] { ("paO2MmHg", g.MmHg) } : []]));
    }

    private static (double MmHg, Instant At, Guid Entry)? Gas(PatientPicture picture) =>
        picture.LatestGas is { } gas && picture.AsOf - gas.Gas.At <= picture.Limits.Gas && OxygenReadings.PaO2(gas) is { } mmHg
            ? (mmHg, gas.Gas.At, gas.Gas.Id)
            : null;

    private static double UrgentEdge(PatientPicture picture, LowOxygenOptions options) => picture.OnEcmo
        ? options.OnEcmoSpO2Percent
        : Math.Max(options.SpO2FloorPercent, Math.Min(options.SpO2LowPercent, (double?)picture.Targets?.Body.SpO2LowPercent ?? options.SpO2LowPercent));

    private static double? CautionEdge(PatientPicture picture) => picture.OnEcmo ? null : (double?)picture.Targets?.Body.SpO2LowPercent;

    private static double PaO2Edge(PatientPicture picture, LowOxygenOptions options) =>
        Math.Max(options.PaO2LowMmHg, (double?)picture.Targets?.Body.PaO2LowMmHg ?? 0);
}
