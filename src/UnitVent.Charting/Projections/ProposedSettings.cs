using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Projections;

/// <summary>APRV settings that are considered, not set; what is null stays as it is. Limits are those of a setting change.</summary>
public sealed record ProposedSettings
{
    /// <summary>Gets P high in cmH2O.</summary>
    [Field("P high")]
    public decimal? PHighCmH2O { get; init; }

    /// <summary>Gets P low in cmH2O.</summary>
    [Field("P low")]
    public decimal? PLowCmH2O { get; init; }

    /// <summary>Gets T high in s.</summary>
    [Field("T high")]
    public decimal? THighS { get; init; }

    /// <summary>Gets T low in s.</summary>
    [Field("T low")]
    public decimal? TLowS { get; init; }

    /// <summary>Gets how much lower P high is at each stage of a step-down, cmH2O; 2 when null.</summary>
    [Number("Step", 0.5, 5, Unit = "cmH2O", Decimals = 1)]
    public decimal? StepCmH2O { get; init; }

    /// <summary>Gets how much longer T high is at each stage of a step-down, s; 1 when null.</summary>
    [Number("Stretch", 0, 5, Unit = "s", Decimals = 1)]
    public decimal? StretchS { get; init; }
}
