namespace UnitVent.Handover;

/// <summary>The paper a sheet is laid out for, always upright.</summary>
public enum Paper
{
    /// <summary>210 mm × 297 mm, ISO 216.</summary>
    A4,

    /// <summary>8.5 in × 11 in, ANSI/ASME Y14.1 size A.</summary>
    Letter,
}
