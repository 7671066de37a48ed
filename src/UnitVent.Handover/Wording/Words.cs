using System.Text;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Handover.Wording;

/// <summary>The trade's words for what was chosen from a list.</summary>
internal static class Words
{
    public static string Of(SettingChange settings) => settings.Mode switch
    {
        VentilationMode.Aprv => "APRV",
        VentilationMode.Cpap => "CPAP",
        VentilationMode.Other => settings.ModeText ?? "Another mode",
        null => "not recorded",
        { } mode => Spelled(mode),
    };

    public static string Of(Circumstance circumstance) => circumstance switch
    {
        Circumstance.Ards => "ARDS",
        Circumstance.Obstructive => "Obstructive lung disease",
        Circumstance.RaisedIcp => "Raised intracranial pressure",
        Circumstance.EcmoVv => "Veno-venous ECMO",
        Circumstance.EcmoVa => "Veno-arterial ECMO",
        Circumstance.ChestWallStiff => "Stiff chest wall",
        Circumstance.ChronicRetainer => "Chronic CO2 retention",
        _ => Spelled(circumstance),
    };

    /// <summary>What is going on since an event that has not ended.</summary>
    public static string Ongoing(EventKind started) => started switch
    {
        EventKind.TransportOut => "In transport",
        EventKind.OffVentilatorStart => "Off the ventilator",
        EventKind.BreathingTrialStart => "Breathing trial running",
        EventKind.RelaxantStart => "Relaxant running",
        EventKind.NitricOxideOn => "Nitric oxide on",
        EventKind.EcmoStart => "ECMO running",
        _ => Spelled(started),
    };

    public static string Of(AirwayKind airway) => airway switch
    {
        AirwayKind.Oral => "Oral tube",
        AirwayKind.Nasal => "Nasal tube",
        AirwayKind.Tracheostomy => "Tracheostomy",
    };

    public static string Of(Severity severity) => severity switch
    {
        Severity.Urgent => "Look now",
        Severity.Caution => "Look this hour",
        Severity.Advisory => "Next round",
        Severity.Information => "Worth knowing",
    };

    public static string Of(Band band) => band switch
    {
        Band.LookNow => "Look now",
        Band.LookThisHour => "Look this hour",
        Band.NotKnown => "Not known",
        Band.NothingRaised => "Nothing raised",
    };

    /// <summary>The name of a choice as words: <c>SteppingUp</c> is "Stepping up".</summary>
    public static string Spelled<T>(T choice)
        where T : struct, Enum
    {
        var words = new StringBuilder();
        foreach (var letter in choice.ToString())
        {
            words.Append(char.IsUpper(letter) && words.Length > 0 ? $" {char.ToLowerInvariant(letter)}" : letter);
        }

        return words.ToString();
    }
}
