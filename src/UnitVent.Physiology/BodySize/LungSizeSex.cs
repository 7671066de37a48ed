namespace UnitVent.Physiology;

/// <summary>The sex used for the formulas of body size, above all that of lung size. It says nothing else about the person.</summary>
public enum LungSizeSex
{
    /// <summary>The formula's constant for women.</summary>
    Female,

    /// <summary>The formula's constant for men.</summary>
    Male,
}
