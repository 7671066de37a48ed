namespace UnitVent.Charting.Entries;

/// <summary>A circumstance that changes how values are read.</summary>
public enum Circumstance
{
    /// <summary>Acute respiratory distress syndrome, as diagnosed by the team.</summary>
    Ards,

    /// <summary>Obstructive lung disease.</summary>
    Obstructive,

    /// <summary>Air leak.</summary>
    AirLeak,

    /// <summary>Raised intracranial pressure.</summary>
    RaisedIcp,

    /// <summary>Veno-venous ECMO.</summary>
    EcmoVv,

    /// <summary>Veno-arterial ECMO.</summary>
    EcmoVa,

    /// <summary>Comfort care.</summary>
    ComfortCare,

    /// <summary>Higher PaCO2 accepted.</summary>
    PermissiveHypercapnia,

    /// <summary>Stiff chest wall.</summary>
    ChestWallStiff,

    /// <summary>Chronic carbon dioxide retention.</summary>
    ChronicRetainer,

    /// <summary>Difficult airway.</summary>
    DifficultAirway,

    /// <summary>Tracheostomy.</summary>
    Tracheostomy,
}
