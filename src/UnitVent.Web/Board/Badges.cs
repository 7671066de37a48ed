using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Web.Board;

/// <summary>Standing facts that are worth knowing at a glance and are not flags.</summary>
public static class Badges
{
    private static readonly (Circumstance Flag, string Word)[] Circumstances =
    [
        (Circumstance.DifficultAirway, "difficult airway"),
        (Circumstance.AirLeak, "air leak"),
        (Circumstance.EcmoVv, "VV ECMO"),
        (Circumstance.EcmoVa, "VA ECMO"),
        (Circumstance.RaisedIcp, "raised ICP"),
        (Circumstance.Obstructive, "obstruction"),
        (Circumstance.ComfortCare, "comfort care"),
        (Circumstance.PermissiveHypercapnia, "higher PaCO2 accepted"),
        (Circumstance.Tracheostomy, "tracheostomy"),
    ];

    private static readonly (EventKind Event, string Word)[] GoingOn =
    [
        (EventKind.TransportOut, "away from the unit"),
        (EventKind.OffVentilatorStart, "off the ventilator"),
        (EventKind.BreathingTrialStart, "breathing trial"),
        (EventKind.NitricOxideOn, "nitric oxide"),
        (EventKind.EcmoStart, "ECMO"),
    ];

    public static IReadOnlyList<string> Of(PatientPicture picture)
    {
        var badges = new List<string>();
        badges.AddRange(picture.Prone ? ["prone"] : []);
        badges.AddRange(OnRelaxant(picture) ? ["relaxant"] : []);
        badges.AddRange(Circumstances.Where(c => picture.Has(c.Flag)).Select(c => c.Word));
        badges.AddRange(GoingOn.Where(e => picture.Ongoing.Contains(e.Event)).Select(e => e.Word));
        return badges;
    }

    public static bool OnRelaxant(PatientPicture picture) =>
        picture.Ongoing.Contains(EventKind.RelaxantStart) || picture.Breathing?.Body.Relaxant == Relaxant.Infusion;
}
