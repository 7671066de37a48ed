namespace UnitVent.Store.Model;

/// <summary>The head of a patient: who it is now. Its history is in <see cref="PatientFactRow"/>.</summary>
internal sealed class PatientRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public string Mrn { get; set; } = "";

    public string Facts { get; set; } = "";

    public uint Version { get; set; }
}
