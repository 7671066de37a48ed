namespace UnitVent.Physiology;

/// <summary>The range of the ARDS definitions in which oxygenation lies. Oxygenation alone: whether it is ARDS is for a person to say.</summary>
public enum OxygenationClass
{
    /// <summary>Not to be classified: too little pressure, or a saturation above 97 %.</summary>
    NotClassified,

    /// <summary>Better than the mild range.</summary>
    AboveMild,

    /// <summary>The mild range.</summary>
    Mild,

    /// <summary>The moderate range.</summary>
    Moderate,

    /// <summary>The severe range.</summary>
    Severe,
}
