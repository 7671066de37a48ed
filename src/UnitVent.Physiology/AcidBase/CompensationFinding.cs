namespace UnitVent.Physiology;

/// <summary>Where the other side lies against what a single disturbance lets expect.</summary>
public enum CompensationFinding
{
    /// <summary>Below the expected range: an added acidosis (bicarbonate) or respiratory alkalosis (PCO2) is possible.</summary>
    Below,

    /// <summary>Inside the expected range, its ends included.</summary>
    AsExpected,

    /// <summary>Above the expected range: an added alkalosis (bicarbonate) or respiratory acidosis (PCO2) is possible.</summary>
    Above,
}
