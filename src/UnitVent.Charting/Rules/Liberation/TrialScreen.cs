using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.CarbonDioxide;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Liberation;

/// <summary>The recorded values that the unit screens before a breathing trial.</summary>
internal sealed record TrialScreen(bool IsComplete, bool IsMet, string Says)
{
    public static TrialScreen Of(PatientPicture picture, Charted<SettingChange> settings)
    {
        var o = picture.Window.Unit.Thresholds.TrialScreen;
        var (spO2, pf, gas, breathing) = (OxygenReadings.SpO2(picture)?.Percent, picture[ValueNames.PfRatio].Value, AcidBaseReadings.Latest(picture), picture.Breathing);
        var vasopressor = picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.Vasopressor is not null)?.Body.Vasopressor;
        var recent = breathing is { } seen && picture.AsOf - seen.At <= picture.Limits.Readings;
        if (spO2 is null || pf is null || gas is null || !recent || breathing?.Body is not { Rass: { } rass, Effort: { } effort } || vasopressor is null)
        {
            return new(false, false, "");
        }

        var (fiO2, peep, pH) = ((double?)settings.Body.FiO2, (double?)settings.Body.PeepCmH2O, AcidBaseReadings.PH(gas));
        var met = fiO2 <= o.FiO2UpTo && peep <= o.PeepUpToCmH2O && spO2 >= o.SpO2FromPercent && pf >= o.PfFromMmHg && pH >= o.PHFrom
            && effort != Effort.None && rass >= o.RassFrom && rass <= o.RassTo && vasopressor != Vasopressor.Rising;
        return new(
            true,
            met,
            $"FiO2 {Numbers.Fixed(fiO2 ?? 0, 2)}, PEEP {Numbers.Fixed(peep ?? 0)} cmH2O, SpO2 {Numbers.Fixed(spO2.Value)} %, P/F {Numbers.Fixed(pf.Value)}, pH {gas.Gas.Body.PH}, RASS {Numbers.Fixed(rass)}");
    }
}
