namespace UnitVent.Physiology;

/// <summary>Why the numbers of a setting change allow no projection. Clinical reasons (leak, sedation, a venous gas …) are not among them.</summary>
public enum ProjectionRefusal
{
    /// <summary>The termination ratio is outside [0.05, 0.90], where a small error of flow is a large one of the time constant.</summary>
    TerminationRatio,

    /// <summary>Release volume over alveolar swing is outside [5, 150] mL/cmH2O, so the readings do not describe a lung.</summary>
    Compliance,

    /// <summary>Own ventilation is above zero but the own rate is 0, so the dead space of the own breaths is unknown.</summary>
    OwnRate,

    /// <summary>P high − P low changes by more than 30 %.</summary>
    PressureStep,

    /// <summary>T low changes by more than 50 %.</summary>
    TimeLow,

    /// <summary>The dead space is not smaller than the release volume, now or after the change: releases would reach no alveoli.</summary>
    DeadSpace,

    /// <summary>Alveolar ventilation would fall below half or rise above twice what it is.</summary>
    AlveolarVentilation,

    /// <summary>PaCO2 would lie outside [15, 150] mmHg.</summary>
    PaCO2,

    /// <summary>With 0.7 or 1.3 times the dead space the same projection would be refused: its size is not known well enough.</summary>
    DeadSpaceBand,
}
