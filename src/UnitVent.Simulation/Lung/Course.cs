namespace UnitVent.Simulation.Lung;

/// <summary>How a patient changes with time: the parameters that have a track follow it, the others stay.</summary>
public sealed record Course
{
    public IReadOnlyList<Keyframe>? ComplianceMlPerCmH2O { get; init; }

    public IReadOnlyList<Keyframe>? InspiratoryResistanceCmH2OSPerL { get; init; }

    public IReadOnlyList<Keyframe>? ExpiratoryResistanceCmH2OSPerL { get; init; }

    public IReadOnlyList<Keyframe>? ShuntFraction { get; init; }

    public IReadOnlyList<Keyframe>? CarbonDioxideOutputMlMin { get; init; }

    public IReadOnlyList<Keyframe>? StandardBaseExcessMmolL { get; init; }

    public IReadOnlyList<Keyframe>? Drive { get; init; }

    public IReadOnlyList<Keyframe>? OwnVolumeMl { get; init; }

    public IReadOnlyList<Keyframe>? MeanArterialPressureMmHg { get; init; }

    public IReadOnlyList<Keyframe>? Rass { get; init; }

    public IEnumerable<IReadOnlyList<Keyframe>> Tracks() => new[]
    {
        ComplianceMlPerCmH2O, InspiratoryResistanceCmH2OSPerL, ExpiratoryResistanceCmH2OSPerL, ShuntFraction, CarbonDioxideOutputMlMin,
        StandardBaseExcessMmolL, Drive, OwnVolumeMl, MeanArterialPressureMmHg, Rass,
    }.OfType<IReadOnlyList<Keyframe>>();

    public PatientParameters At(PatientParameters start, double hour)
    {
        return start with
        {
            ComplianceMlPerCmH2O = Value(ComplianceMlPerCmH2O, start.ComplianceMlPerCmH2O),
            InspiratoryResistanceCmH2OSPerL = Value(InspiratoryResistanceCmH2OSPerL, start.InspiratoryResistanceCmH2OSPerL),
            ExpiratoryResistanceCmH2OSPerL = Value(ExpiratoryResistanceCmH2OSPerL, start.ExpiratoryResistanceCmH2OSPerL),
            ShuntFraction = Value(ShuntFraction, start.ShuntFraction),
            CarbonDioxideOutputMlMin = Value(CarbonDioxideOutputMlMin, start.CarbonDioxideOutputMlMin),
            StandardBaseExcessMmolL = Value(StandardBaseExcessMmolL, start.StandardBaseExcessMmolL),
            Drive = Value(Drive, start.Drive),
            OwnVolumeMl = Value(OwnVolumeMl, start.OwnVolumeMl),
            MeanArterialPressureMmHg = Value(MeanArterialPressureMmHg, start.MeanArterialPressureMmHg),
            Rass = Value(Rass, start.Rass),
        };

        double Value(IReadOnlyList<Keyframe>? track, double otherwise) => track is null ? otherwise : Keyframe.At(track, hour);
    }
}
