using NodaTime;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Episodes;

/// <summary>Who the patient is. Height, sex and birth date may be missing; what rests on them then says so.</summary>
public sealed record PatientFacts
{
    /// <summary>Gets the medical record number.</summary>
    [Field("MRN", Required = true, MaxLength = 40)]
    public string? Mrn { get; init; }

    /// <summary>Gets the family name.</summary>
    [Field("Family name", Required = true, MaxLength = 120)]
    public string? FamilyName { get; init; }

    /// <summary>Gets the given name.</summary>
    [Field("Given name", MaxLength = 120)]
    public string? GivenName { get; init; }

    /// <summary>Gets the birth date.</summary>
    [Field("Born")]
    public LocalDate? BirthDate { get; init; }

    /// <summary>Gets the sex used for the lung-size formula.</summary>
    [Field("Sex (for lung size)")]
    public Sex? Sex { get; init; }

    /// <summary>Gets the height. Limits: common practice.</summary>
    [Number("Height", 120, 230, Unit = "cm", AskBelow = 140, AskAbove = 205)]
    public decimal? HeightCm { get; init; }

    /// <summary>Gets whether the height was estimated, from arm span or otherwise.</summary>
    [Field("Height estimated")]
    public bool? HeightEstimated { get; init; }

    /// <summary>The name as it is read: family name, given name.</summary>
    public string DisplayName() => string.IsNullOrWhiteSpace(GivenName) ? FamilyName ?? "" : $"{FamilyName}, {GivenName}";

    /// <summary>The age in whole years on a day; null without a birth date.</summary>
    public int? AgeOn(LocalDate day) => BirthDate is { } born && born <= day ? Period.Between(born, day, PeriodUnits.Years).Years : null;
}
