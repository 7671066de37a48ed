using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Projections;

/// <summary>Why the patient, not the numbers, allows no projection of PaCO2 [common practice].</summary>
internal static class ClinicalRefusals
{
    private const double OwnShareThatRules = 50;
    private const double OwnShareThatChanges = 20; // step minimum of the own share
    private static readonly Duration OldestGas = Duration.FromHours(6);

    public static IEnumerable<string> Of(PatientPicture picture) =>
        picture.LatestGas is { } gas ? [.. OfPatient(picture), .. OfGas(picture, gas), .. OfShare(picture), .. Since(picture, gas.Gas.At)] : ["Needs an arterial gas."];

    private static IEnumerable<string> OfPatient(PatientPicture picture)
    {
        if (picture.Has(Circumstance.AirLeak))
        {
            yield return "There is an air leak: release volumes do not describe the lung.";
        }

        if (picture.Has(Circumstance.Obstructive))
        {
            yield return "The lung is obstructive: it does not empty as one compartment.";
        }

        if (picture.OnEcmo)
        {
            yield return "On ECMO the lung does not set PaCO2 alone.";
        }
    }

    private static IEnumerable<string> OfGas(PatientPicture picture, PairedGas gas)
    {
        if (gas.Settings?.Id != picture.Settings?.Id)
        {
            yield return "The settings were changed since the gas: a gas under the present settings is needed.";
        }
        else if (gas.Settings is { } settings && gas.Gas.At - settings.At < Settling.OfCarbonDioxide(picture.Window, settings))
        {
            yield return "The gas was drawn before carbon dioxide had settled under these settings.";
        }

        if (picture.AsOf - gas.Gas.At > OldestGas)
        {
            yield return $"The gas is {Times.Hours(picture.AsOf - gas.Gas.At)} old; 6 h is the limit.";
        }

        if ((gas.Check?.Body.FlowReadings ?? gas.Check?.Body.ReleasesAveraged ?? 1) < 2)
        {
            yield return gas.Check is null
                ? "Needs a ventilator check within 60 min of the gas."
                : "The flow was read from a single release; several are needed.";
        }

        if (gas.Check?.Body.EffortDuringRelease == true)
        {
            yield return "There was effort during the release.";
        }
    }

    private static IEnumerable<string> OfShare(PatientPicture picture)
    {
        var now = picture[ValueNames.SpontaneousSharePercent].Value;
        if (now > OwnShareThatRules)
        {
            yield return $"The patient's own breaths carry {Numbers.Fixed(now.Value)} % of the ventilation; releases say little of PaCO2.";
        }

        if (picture.Series.OfChecks(c => c[ValueNames.SpontaneousSharePercent]?.Value).ToList() is [.., var before, var last] && Math.Abs(last.Value - before.Value) >= OwnShareThatChanges)
        {
            yield return $"The own share is changing: {Numbers.Fixed(before.Value)} → {Numbers.Fixed(last.Value)} %.";
        }
    }

    private static IEnumerable<string> Since(PatientPicture picture, Instant gas) =>
        picture.Window.Of<BedsideEvent>(EntryKind.Event, picture.AsOf)
            .Where(e => e.At > gas)
            .Select(e => e.Body.What switch
            {
                EventKind.RelaxantStart or EventKind.RelaxantStop => "A relaxant was started or stopped since the gas.",
                EventKind.SedationChanged => "Sedation was changed since the gas.",
                EventKind.Prone or EventKind.Supine or EventKind.Side => "The patient was turned since the gas.",
                _ => null,
            })
            .OfType<string>()
            .Distinct();
}
