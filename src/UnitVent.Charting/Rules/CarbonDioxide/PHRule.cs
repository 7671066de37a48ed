using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;
using static UnitVent.Charting.Rules.CarbonDioxide.AcidBaseReadings;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>R22: arterial pH is low or high.</summary>
public sealed class PHRule : Rule
{
    private const double Normal = 7.40;
    private const double HalfImportantChange = 0.02; // half of 0.04: Clin Chem 1987;33:1416

    /// <inheritdoc/>
    public override string Id => "R22";

    /// <inheritdoc/>
    public override Family Family => Family.CarbonDioxide;

    /// <inheritdoc/>
    public override string Seen => "pH low or high";

    /// <inheritdoc/>
    public override string Levels => "under 7.25 caution, under 7.20 urgent; over 7.50 caution, over 7.55 urgent; higher PaCO2 accepted: under the patient’s floor caution, under 7.15 urgent";

    /// <inheritdoc/>
    public override string Remarks => "A floor of the patient under the edge holds only while base excess is above −4 mmol/L, and not on ECMO; a higher one shifts the caution edge.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        Latest(picture) is not { } gas
        || (PH(gas) >= PHEdges.Of(picture).CautionUnder + HalfImportantChange
            && PH(gas) <= picture.Window.Unit.Thresholds.PH.CautionOver - HalfImportantChange);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (Latest(picture) is not { } gas)
        {
            return CannotTell("Needs a recent arterial gas.");
        }

        var (options, edges, pH) = (picture.Window.Unit.Thresholds.PH, PHEdges.Of(picture), PH(gas));
        var level = pH < edges.UrgentUnder || pH > options.UrgentOver ? Severity.Urgent
            : pH < edges.CautionUnder || pH > options.CautionOver ? Severity.Caution
            : (Severity?)null;
        if (level is not { } severity)
        {
            return Clear(gas.Gas.At);
        }

        var edge = pH < Normal ? edges.CautionUnder : options.CautionOver;
        var baseExcess = BaseExcessOf(gas);
        return RaiseOnGas(
            picture,
            severity,
            $"pH {gas.Gas.Body.PH}, edge {Numbers.Fixed(edge, 2)}; PaCO2 {Numbers.Fixed(PaCO2(gas))} mmHg" + (baseExcess is { } be ? $", base excess {Numbers.Fixed(be, 1)} mmol/L" : ""),
            "minute volume and its parts, lactate, kidneys, perfusion, bicarbonate and chloride load",
            Evidence.Of(
                Math.Abs(pH - Normal),
                [gas.Gas.Id],
                [("pH", pH), ("paCO2MmHg", PaCO2(gas)), .. baseExcess is { } mmolL ? new[] { ("standardBaseExcessMmolL", mmolL) } : []]));
    }
}
