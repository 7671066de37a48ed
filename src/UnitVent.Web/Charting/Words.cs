using System.Text.Json;

namespace UnitVent.Web.Charting;

/// <summary>The trade's words for the choices of a chart. The default is the name itself, taken apart: <c>trialStart</c> → Trial start.</summary>
public static class Words
{
    private static readonly Dictionary<string, string> Own = new()
    {
        ["aprv"] = "APRV",
        ["cpap"] = "CPAP",
        ["mmHg"] = "mmHg",
        ["kPa"] = "kPa",
        ["pHigh"] = "P high",
        ["pLow"] = "P low",
        ["flowPercent"] = "Share of peak flow",
        ["notStated"] = "Not stated",
        ["other"] = "Another mode",
        ["fixedRate"] = "Fixed rate",
        ["flowGuided"] = "Flow-guided",
        ["twoLevel"] = "Two-level",
        ["ards"] = "ARDS",
        ["raisedIcp"] = "Raised ICP",
        ["ecmoVv"] = "VV ECMO",
        ["ecmoVa"] = "VA ECMO",
        ["permissiveHypercapnia"] = "Higher PaCO2 accepted",
        ["chronicRetainer"] = "Chronic CO2 retention",
        ["chestWallStiff"] = "Stiff chest wall",
        ["obstructive"] = "Obstructive lung",
        ["recruitment"] = "Recruitment manoeuvre",
        ["drainIn"] = "Chest drain in",
        ["drainOut"] = "Chest drain out",
        ["tubeRefixed"] = "Tube fixed anew",
        ["transportOut"] = "Left for transport or theatre",
        ["transportBack"] = "Back from transport or theatre",
        ["offVentilatorStart"] = "Off the ventilator",
        ["offVentilatorEnd"] = "Back on the ventilator",
        ["breathingTrialStart"] = "Breathing trial started",
        ["breathingTrialResult"] = "Breathing trial ended",
        ["relaxantStart"] = "Relaxant started",
        ["relaxantStop"] = "Relaxant stopped",
        ["ecmoStart"] = "ECMO started",
        ["ecmoStop"] = "ECMO stopped",
        ["prone"] = "Turned prone",
        ["supine"] = "Turned supine",
        ["side"] = "Turned to the side",
        ["passive"] = "Heat and moisture exchanger",
        ["heated"] = "Heated humidifier",
        ["liberated"] = "Off the ventilator",
        ["tracheostomyWeaned"] = "Off the ventilator, tracheostomy",
        ["transferred"] = "Moved to another unit or hospital",
        ["cancelledInError"] = "Admitted by mistake",
        ["bloodGas"] = "Blood gas",
        ["context"] = "Circumstance",
        ["target"] = "Targets",
        ["followUp"] = "Follow-up",
        ["carbonDioxide"] = "Carbon dioxide",
        ["volumeAndPressure"] = "Volume and pressure",
        ["stepDown"] = "Step down",
    };

    /// <summary>The words for a choice.</summary>
    public static string Of(Enum choice) => Of(JsonNamingPolicy.CamelCase.ConvertName(choice.ToString()));

    /// <summary>The words for a choice as the HTTP interface spells it.</summary>
    public static string Of(string choice) => Own.GetValueOrDefault(choice) ?? TakenApart(choice);

    /// <summary>The words for a choice in the middle of a sentence.</summary>
    public static string Within(Enum choice)
    {
        var words = Of(choice);
        return words.Length > 1 && char.IsUpper(words[1]) ? words : char.ToLowerInvariant(words[0]) + words[1..];
    }

    private static string TakenApart(string name) =>
        char.ToUpperInvariant(name[0]) + string.Concat(name[1..].Select(c => char.IsUpper(c) ? " " + char.ToLowerInvariant(c) : c.ToString()));
}
