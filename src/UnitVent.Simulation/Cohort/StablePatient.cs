using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Physiology;
using UnitVent.Simulation.Demo;
using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation.Cohort;

/// <summary>Draws settings and, backwards from what shall be true under them, the lung: inside every usual window, with room for wander.</summary>
/// <remarks>The ranges are common practice.</remarks>
internal sealed class StablePatient
{
    private const double OwnRatePerMmHg = 0.3;

    private readonly Draw draw;
    private readonly Sex sex;
    private readonly decimal heightCm;
    private readonly double weightKg;
    private readonly bool flowGuided;

    public StablePatient(Draw draw)
    {
        this.draw = draw;
        sex = draw.OneOf("sex", Sex.Female, Sex.Male);
        heightCm = (decimal)Math.Round(sex == Sex.Male ? draw.Between("height", 166, 192) : draw.Between("height", 154, 178));
        weightKg = BodySize.PredictedWeightKg(new PatientFacts { Sex = sex, HeightCm = heightCm })!.Value;
        flowGuided = draw.Between("method", 0, 1) < 0.25;
        Settings = new SettingChange
        {
            Mode = VentilationMode.Aprv,
            FiO2 = draw.OneOf("FiO2", 0.40m, 0.45m, 0.50m),
            PHighCmH2O = draw.OneOf("P high", 22m, 23m, 24m, 25m, 26m, 27m, 28m),
            PLowCmH2O = 0,
            THighS = draw.OneOf("T high", 4.2m, 4.5m, 4.8m, 5.0m, 5.5m),
            TLowS = flowGuided ? draw.OneOf("T low", 0.35m, 0.40m) : draw.OneOf("T low", 0.45m, 0.50m, 0.55m, 0.60m),
            TubeCompensation = TubeCompensation.On,
        };
    }

    public SettingChange Settings { get; }

    public ScenarioPatient Facts(int number) => new()
    {
        Mrn = $"S{number + 1:000}",
        FamilyName = "Study",
        GivenName = $"{number + 1}",
        Sex = sex,
        HeightCm = heightCm,
        AgeYears = 60,
        Reason = "Hypoxaemic respiratory failure",
        AirwaySecuredHoursBefore = 24,
        Method = flowGuided ? SettingMethod.FlowGuided : SettingMethod.FixedRate,
        Phase = CoursePhase.Maintaining,
    };

    public PatientParameters Lung(BarometricPressure barometric)
    {
        var paCO2 = draw.Between("PaCO2", 40, 50);
        var pH = BloodPH.FromPH(draw.Between("pH", 7.34, 7.43));
        var tension = PartialPressure.FromMmHg(paCO2);
        var breathing = WithOwnBreathing(Mechanics(), paCO2);
        var alveolar = AlveolarVentilation.LitresPerMinute(VentilatorModel.Deliver(Settings, breathing, OwnBreathing.Of(breathing, paCO2)), breathing);
        var balanced = breathing with
        {
            CarbonDioxideOutputMlMin = paCO2 * alveolar / 0.863,
            StandardBaseExcessMmolL = BaseExcess.Standard(pH, HendersonHasselbalch.Bicarbonate(pH, tension)),
        };
        return balanced with { ShuntFraction = ShuntFor(balanced, draw.Between("PaO2", 68, 80), barometric, pH, tension) };
    }

    /// <summary>Compliance and resistance that give the wanted release volume and end of release.</summary>
    private PatientParameters Mechanics()
    {
        var end = flowGuided ? draw.Between("end of release", 0.74, 0.80) : draw.Between("end of release", 0.57, 0.68);
        var volume = weightKg * (flowGuided ? draw.Between("release volume", 4.6, 5.4) : draw.Between("release volume", 5.0, 6.5));
        var compliance = volume / ((double)Settings.PHighCmH2O! * (1 - end));
        var resistance = (double)Settings.TLowS! / Math.Log(1 / end) / compliance * 1000;
        return new PatientParameters
        {
            ComplianceMlPerCmH2O = compliance,
            InspiratoryResistanceCmH2OSPerL = resistance / 2,
            ExpiratoryResistanceCmH2OSPerL = resistance,
            AnatomicalDeadSpaceMl = 1.3 * weightKg,
            ApparatusDeadSpaceMl = 40,
            AlveolarDeadSpaceFraction = draw.Between("alveolar dead space", 0.08, 0.20),
            ShuntFraction = 0,
            CarbonDioxideOutputMlMin = 200,
            CardiacOutputLMin = draw.Between("cardiac output", 4.8, 6.8),
            HaemoglobinGDl = draw.Between("haemoglobin", 8.5, 12),
            StandardBaseExcessMmolL = 0,
            Drive = 1,
            OwnRatePerMin = 0,
            OwnVolumeMl = draw.Between("own volume", 3.2, 4.2) * weightKg,
            OwnRatePerMmHg = OwnRatePerMmHg,
            CarbonDioxideSetPointMmHg = 0,
            MusclePressureCmH2O = 2,
            MeanArterialPressureMmHg = draw.Between("mean arterial pressure", 75, 88),
            LactateMmolL = draw.Between("lactate", 0.8, 1.8),
            Rass = draw.OneOf("RASS", -2, -1, 0),
        };
    }

    private PatientParameters WithOwnBreathing(PatientParameters passive, double paCO2MmHg)
    {
        var share = draw.Between("own share", 0.20, 0.34);
        var machine = VentilatorModel.Deliver(Settings, passive, new OwnBreathing(0, 0, 0)).MachineMinuteVolumeLMin;
        var own = machine * share / (1 - share);
        return passive with { OwnRatePerMin = 1000 * own / passive.OwnVolumeMl, CarbonDioxideSetPointMmHg = paCO2MmHg };
    }

    private double ShuntFor(PatientParameters patient, double paO2MmHg, BarometricPressure barometric, BloodPH pH, PartialPressure paCO2)
    {
        var (low, high) = (0.0, 0.8);
        while (high - low > 1e-6)
        {
            var middle = (low + high) / 2;
            var reached = ShuntedBlood.ArterialPO2(
                patient with { ShuntFraction = middle }, OxygenFraction.FromFraction((double)Settings.FiO2!), barometric, pH, paCO2);
            (low, high) = reached.MmHg > paO2MmHg ? (middle, high) : (low, middle);
        }

        return low;
    }
}
