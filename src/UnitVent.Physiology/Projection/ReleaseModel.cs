namespace UnitVent.Physiology;

/// <summary>The one-compartment lung that explains the present releases and is asked about the planned ones.</summary>
internal sealed class ReleaseModel
{
    private readonly bool refillsIncompletely;

    public ReleaseModel(ReleaseReading present, AprvSettings planned)
    {
        Tau = ExpiratoryTimeConstant.Compute(present.Settings.TimeLow, present.TerminationRatio);
        refillsIncompletely = IncompleteRefilling.Needed(present.Settings.TimeHigh, Tau) || IncompleteRefilling.Needed(planned.TimeHigh, Tau);
        MlPerCmH2O = present.Volume.Millilitres / SwingCmH2O(present.Settings);
    }

    public BreathTime Tau { get; }

    /// <summary>Gets the compliance; not limited to what a <see cref="Compliance"/> holds.</summary>
    public double MlPerCmH2O { get; }

    private static Compliance One => Compliance.FromMlPerCmH2O(1);

    public GasVolume Volume(AprvSettings settings) => GasVolume.FromMillilitres(MlPerCmH2O * SwingCmH2O(settings));

    public double TerminationRatio(AprvSettings settings) => Math.Exp(-settings.TimeLow.Seconds / Tau.Seconds);

    /// <summary>The swing of alveolar pressure: what the release volume is for each unit of compliance.</summary>
    private double SwingCmH2O(AprvSettings s)
        => refillsIncompletely
            ? IncompleteRefilling.ReleaseVolume(One, s.High, s.Low, s.TimeHigh, s.TimeLow, Tau, Tau).Millilitres
            : ReleaseMechanics.AlveolarSwing(s.High, s.Low, TerminationRatio(s)).CmH2O;
}
