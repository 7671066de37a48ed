using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;
using static UnitVent.Charting.Rules.CarbonDioxide.AcidBaseReadings;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>R23: PaCO2 lies outside its band.</summary>
public sealed class PaCO2Rule : Rule
{
    private const double HalfImportantChangeMmHg = 2; // half of 4 mmHg: Chest 1983;84:14

    /// <inheritdoc/>
    public override string Id => "R23";

    /// <inheritdoc/>
    public override Family Family => Family.CarbonDioxide;

    /// <inheritdoc/>
    public override string Seen => "PaCO2 outside its band";

    /// <inheritdoc/>
    public override string Levels => "outside 35–60 mmHg advisory; over 80 or under 25 urgent; raised intracranial pressure: outside 35–45 caution, under 30 or over 50 urgent";

    /// <inheritdoc/>
    public override string Remarks => "The target of the patient is the band where there is one; chronic retainers: usual value ± 8 mmHg.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var band = Band.Of(picture);
        return Latest(picture) is not { } gas || (PaCO2(gas) >= band.Low + HalfImportantChangeMmHg && PaCO2(gas) <= band.High - HalfImportantChangeMmHg);
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (Latest(picture) is not { } gas)
        {
            return CannotTell("Needs a recent arterial gas.");
        }

        var (band, mmHg) = (Band.Of(picture), PaCO2(gas));
        var level = mmHg < band.UrgentUnder || mmHg > band.UrgentOver ? Severity.Urgent
            : mmHg < band.Low || mmHg > band.High ? band.Outside
            : (Severity?)null;
        return level is not { } severity
            ? Clear(gas.Gas.At)
            : RaiseOnGas(
                picture,
                severity,
                $"PaCO2 {Numbers.Fixed(mmHg)} mmHg, band {Numbers.Fixed(band.Low)}–{Numbers.Fixed(band.High)}; pH {gas.Gas.Body.PH}",
                "release rate, release volume, own breaths, dead space, EtCO2",
                Evidence.Of(Math.Max(band.Low - mmHg, mmHg - band.High), [gas.Gas.Id], ("paCO2MmHg", mmHg), ("bandLow", band.Low), ("bandHigh", band.High)));
    }

    private readonly record struct Band(double Low, double High, double UrgentUnder, double UrgentOver, Severity Outside)
    {
        public static Band Of(PatientPicture picture)
        {
            var o = picture.Window.Unit.Thresholds.PaCO2;
            var band = picture.Has(Circumstance.RaisedIcp) ? new Band(o.RaisedIcpLowMmHg, o.RaisedIcpHighMmHg, o.RaisedIcpUrgentUnderMmHg, o.RaisedIcpUrgentOverMmHg, Severity.Caution)
                : picture.Has(Circumstance.ChronicRetainer) ? new(o.RetainerUsualMmHg - o.RetainerWithinMmHg, o.RetainerUsualMmHg + o.RetainerWithinMmHg, o.UrgentUnderMmHg, o.UrgentOverMmHg, Severity.Advisory)
                : new(o.LowMmHg, o.HighMmHg, o.UrgentUnderMmHg, o.UrgentOverMmHg, Severity.Advisory);
            var own = picture.Targets?.Body;
            return band with { Low = (double?)own?.PaCO2LowMmHg ?? band.Low, High = (double?)own?.PaCO2HighMmHg ?? band.High };
        }
    }
}
