namespace UnitVent.Charting.Pictures;

/// <summary>Every equation behind a value of the picture.</summary>
public static class Equations
{
    private const string Identity = "standard identity";
    private const string OneCompartment = "one-compartment model, J Appl Physiol 1993;74:922-933; common practice at the bedside";
    private const string ReleaseModel = "one-compartment model; formulas of this family in Respir Res 2022;23:101";
    private const string PassiveRelease = "passive release, no leak, no obstruction; r 2–95 % of peak, else shown as doubtful; no value at r = 0";
    private const string AprvOnly = "APRV only";
    private const string ArdsNetwork = "ARDS Network protocol, N Engl J Med 2000;342:1301-1308";
    private const string Refill = "; a = exp(−{tHighS} ÷ {expiratoryTimeConstantS}); b = exp(−{tLowS} ÷ {expiratoryTimeConstantS})";
    private const string HeightLimits = "height 120–230 cm; below 140 cm or estimated: shown as doubtful";
    private const string UpTo97 = "SpO2 up to 97 %; above, no value";

    /// <summary>Predicted body weight, men.</summary>
    public static readonly Equation PredictedBodyWeightMale = new("A1", ValueNames.PredictedBodyWeightKg, "kg", "50 + 0.91 × ({heightCm} − 152.4)", "men; " + HeightLimits, ArdsNetwork);

    /// <summary>Predicted body weight, women.</summary>
    public static readonly Equation PredictedBodyWeightFemale = PredictedBodyWeightMale with { Form = "45.5 + 0.91 × ({heightCm} − 152.4)", Limits = "women; " + HeightLimits };

    /// <summary>Release volume per kg.</summary>
    public static readonly Equation ReleaseVolumePerKg = new("A2", ValueNames.ReleaseVolumePerKg, "mL/kg", "{releaseVolumeMl} ÷ {predictedBodyWeightKg}", "release volume 20–2500 mL", Identity);

    /// <summary>Tidal volume per kg.</summary>
    public static readonly Equation TidalVolumePerKg = new("A2", ValueNames.TidalVolumePerKg, "mL/kg", "{tidalVolumeMl} ÷ {predictedBodyWeightKg}", "tidal volume 20–2500 mL; not in APRV", Identity);

    /// <summary>P/F.</summary>
    public static readonly Equation PfRatio = new("A3", ValueNames.PfRatio, "mmHg", "{pO2} ÷ {fiO2}", "arterial gas, PaO2 10–700 mmHg, FiO2 0.21–1.00; depends on FiO2 and mean airway pressure, so compare with both", "JAMA 2012;307:2526-2533");

    /// <summary>S/F.</summary>
    public static readonly Equation SfRatio = new("A4", ValueNames.SfRatio, "", "{spO2Percent} ÷ {fiO2}", UpTo97, "Chest 2007;132:410-417");

    /// <summary>P/F imputed from S/F.</summary>
    public static readonly Equation ImputedPfRatio = new("A4", ValueNames.ImputedPfRatio, "mmHg", "({sfRatio} − 64) ÷ 0.84", "S/F above 64; not with poor perfusion or dyshaemoglobin", "Chest 2007;132:410-417") { Kind = ValueKind.Estimated };

    /// <summary>Oxygenation index.</summary>
    public static readonly Equation OxygenationIndex = new("A5", ValueNames.OxygenationIndex, "", "100 × {fiO2} × {meanAirwayPressureMeasured|meanAirwayPressureComputed} ÷ {pO2}", "as P/F; no bands for adults", "Chest 2017;152:1151-1158");

    /// <summary>Oxygen saturation index.</summary>
    public static readonly Equation OxygenSaturationIndex = new("A5", ValueNames.OxygenSaturationIndex, "", "100 × {fiO2} × {meanAirwayPressureMeasured|meanAirwayPressureComputed} ÷ {spO2Percent}", UpTo97, "J Clin Med 2018;7:205");

    /// <summary>Mean airway pressure in APRV.</summary>
    public static readonly Equation MeanPressureAprv = new("A6", ValueNames.MeanAirwayPressureComputed, "cmH2O", "({pHighCmH2O} × {tHighS} + {pLowCmH2O} × {tLowS}) ÷ ({tHighS} + {tLowS})", "P low below P high; square pressure: measured is usually above when T low is short", Identity);

    /// <summary>Mean airway pressure in pressure control.</summary>
    public static readonly Equation MeanPressureControlled = new("A7", ValueNames.MeanAirwayPressureComputed, "cmH2O", "{peepCmH2O} + {inspiratoryPressureAbovePeepCmH2O} × ({inspiratoryTimeS}[ − {riseTimeS} ÷ 2]) × {setRatePerMin} ÷ 60", "square wave or linear rise within the inspiratory time; not in pressure support and CPAP", "Crit Care Med 1992;20:1461-1472; rise: computed");

    /// <summary>Mean airway pressure in volume control.</summary>
    public static readonly Equation MeanPressureVolumeControlled = MeanPressureControlled with
    {
        Form = "{peepCmH2O} + (({peakPressureCmH2O} − {plateauPressureCmH2O} + ({plateauPressureCmH2O} − {peepCmH2O}) ÷ 2) × ({inspiratoryTimeS}[ − {pauseTimeS}])[ + ({plateauPressureCmH2O} − {peepCmH2O}) × {pauseTimeS}]) × {setRatePerMin} ÷ 60",
        Limits = "constant flow; peak, plateau and PEEP of one check",
        Source = "computed from the pressure curve of constant flow",
    };

    /// <summary>Cycle time.</summary>
    public static readonly Equation CycleTime = new("A9", ValueNames.CycleTimeS, "s", "{tHighS} + {tLowS}", AprvOnly, Identity);

    /// <summary>Release rate.</summary>
    public static readonly Equation ReleaseRate = new("A9", ValueNames.ReleaseRatePerMin, "/min", "60 ÷ ({tHighS} + {tLowS})", AprvOnly, Identity);

    /// <summary>T high : T low.</summary>
    public static readonly Equation TimeRatio = new("A9", ValueNames.TimeRatio, ":1", "{tHighS} ÷ {tLowS}", AprvOnly, Identity);

    /// <summary>Share of the cycle at P high.</summary>
    public static readonly Equation ShareAtPHigh = new("A9", ValueNames.ShareAtPHighPercent, "%", "100 × {tHighS} ÷ ({tHighS} + {tLowS})", AprvOnly, Identity);

    /// <summary>Release minute volume from the release rate as measured.</summary>
    public static readonly Equation ReleaseMinuteVolume = new("A10", ValueNames.ReleaseMinuteVolumeLMin, "L/min", "{releaseVolumeMl} ÷ 1000 × {releaseRatePerMin}", AprvOnly, Identity);

    /// <summary>Release minute volume from the set times.</summary>
    public static readonly Equation ReleaseMinuteVolumeBySettings = ReleaseMinuteVolume with { Form = "{releaseVolumeMl} ÷ 1000 × 60 ÷ ({tHighS} + {tLowS})" };

    /// <summary>The patient's own minute volume as what the releases leave over.</summary>
    public static readonly Equation OwnMinuteVolumeDerived = new("A10", ValueNames.SpontaneousMinuteVolumeDerivedLMin, "L/min", "max(0, {totalMinuteVolumeLMin} − {releaseMinuteVolumeLMin})", "down to −5 % of the total shown as 0, below: no value", Identity);

    /// <summary>The patient's own share of minute volume.</summary>
    public static readonly Equation OwnShare = new("A10", ValueNames.SpontaneousSharePercent, "%", "100 × {spontaneousMinuteVolumeLMin} ÷ {totalMinuteVolumeLMin}", "an error of 10 % in the release volume moves a share of 30 % by about 7 points", Identity);

    /// <summary>Release termination ratio.</summary>
    public static readonly Equation EndReleaseFlow = new("A11", ValueNames.EndReleaseFlowPercent, "%", "100 × {endReleaseFlowLMin} ÷ {peakExpiratoryFlowLMin}", "end below peak, both of one release without effort; 0 is a reading", "Crit Care Med 2005;33:S228-S240");

    /// <summary>Expiratory time constant.</summary>
    public static readonly Equation TimeConstant = new("A12", ValueNames.ExpiratoryTimeConstantS, "s", "{tLowS} ÷ ln(100 ÷ {endReleaseFlowPercent})", PassiveRelease, OneCompartment) { Kind = ValueKind.Estimated };

    /// <summary>T low that would end the release at three quarters of peak flow.</summary>
    public static readonly Equation TLowFor75 = new("A12", ValueNames.TLowFor75S, "s", "{expiratoryTimeConstantS} × ln(1 ÷ 0.75)", PassiveRelease, OneCompartment) { Kind = ValueKind.Estimated };

    /// <summary>T low that would end the release at half of peak flow.</summary>
    public static readonly Equation TLowFor50 = TLowFor75 with { Result = ValueNames.TLowFor50S, Form = "{expiratoryTimeConstantS} × ln(1 ÷ 0.50)" };

    /// <summary>T low that would end the release at a quarter of peak flow.</summary>
    public static readonly Equation TLowFor25 = TLowFor75 with { Result = ValueNames.TLowFor25S, Form = "{expiratoryTimeConstantS} × ln(1 ÷ 0.25)" };

    /// <summary>Alveolar pressure at the end of a release.</summary>
    public static readonly Equation EndReleasePressure = new("A13", ValueNames.EndReleaseAlveolarPressureCmH2O, "cmH2O", "{pLowCmH2O} + ({pHighCmH2O} − {pLowCmH2O}) × {endReleaseFlowPercent} ÷ 100", PassiveRelease + "; T high at least four time constants; never a plateau pressure", ReleaseModel) { Kind = ValueKind.Estimated };

    /// <summary>Alveolar pressure at the end of a release when T high is too short to refill the lung.</summary>
    public static readonly Equation EndReleasePressureRefilling = EndReleasePressure with
    {
        Id = "A14",
        Form = "{pLowCmH2O} + ({pHighCmH2O} − {pLowCmH2O}) × (1 − a) × b ÷ (1 − a × b)" + Refill,
        Limits = PassiveRelease + "; used when T high is shorter than four time constants; one time constant stands for filling and emptying",
        Source = "pressure-controlled one-compartment model, J Appl Physiol 1993;74:922-933",
    };

    /// <summary>Part of the lung's releasable volume that left.</summary>
    public static readonly Equation Emptied = new("A13", ValueNames.EmptiedPercent, "%", "100 − {endReleaseFlowPercent}", PassiveRelease, ReleaseModel) { Kind = ValueKind.Estimated };

    /// <summary>Swing of alveolar pressure over a release.</summary>
    public static readonly Equation AlveolarSwing = EndReleasePressure with { Result = ValueNames.AlveolarSwingCmH2O, Form = "({pHighCmH2O} − {pLowCmH2O}) × (1 − {endReleaseFlowPercent} ÷ 100)" };

    /// <summary>Swing of alveolar pressure when T high is too short to refill the lung.</summary>
    public static readonly Equation AlveolarSwingRefilling = EndReleasePressureRefilling with
    {
        Result = ValueNames.AlveolarSwingCmH2O,
        Form = "({pHighCmH2O} − {pLowCmH2O}) × (1 − a) × (1 − b) ÷ (1 − a × b)" + Refill,
    };

    /// <summary>Effective compliance.</summary>
    public static readonly Equation EffectiveCompliance = new("A13", ValueNames.EffectiveCompliance, "mL/cmH2O", "{releaseVolumeMl} ÷ {alveolarSwingCmH2O}", PassiveRelease, ReleaseModel) { Kind = ValueKind.Estimated };

    /// <summary>Effective resistance of airways, tube and valve.</summary>
    public static readonly Equation EffectiveResistance = new("A13", ValueNames.EffectiveResistance, "cmH2O·s/L", "{expiratoryTimeConstantS} ÷ ({effectiveCompliance} ÷ 1000)", PassiveRelease + "; includes tube and valve", ReleaseModel) { Kind = ValueKind.Estimated };

    /// <summary>Peak flow that the model implies.</summary>
    public static readonly Equation PeakFlowModel = new("A13", ValueNames.PeakFlowModelLMin, "L/min", "60 × {releaseVolumeMl} ÷ 1000 ÷ ({expiratoryTimeConstantS} × (1 − {endReleaseFlowPercent} ÷ 100))", PassiveRelease + "; to be held against the peak flow that was read", OneCompartment) { Kind = ValueKind.Estimated };

    /// <summary>Mean alveolar pressure.</summary>
    public static readonly Equation MeanAlveolarPressure = new("A15", ValueNames.MeanAlveolarPressureCmH2O, "cmH2O", "mean airway pressure + VE ÷ 60 × (R expiratory − R inspiratory)", "needs both resistances", "Crit Care Med 1992;20:1461-1472") { Kind = ValueKind.Estimated };

    /// <summary>Driving pressure.</summary>
    public static readonly Equation DrivingPressure = new("A18", ValueNames.DrivingPressureCmH2O, "cmH2O", "{plateauPressureCmH2O} − ({peepCmH2O}[ + {autoPeepCmH2O}])", "passive patient, hold of 0.5 s; plateau above PEEP; not in APRV", "N Engl J Med 2015;372:747-755");

    /// <summary>Static compliance.</summary>
    public static readonly Equation StaticCompliance = new("A18", ValueNames.StaticCompliance, "mL/cmH2O", "{tidalVolumeMl} ÷ ({plateauPressureCmH2O} − ({peepCmH2O}[ + {autoPeepCmH2O}]))", "passive patient, hold of 0.5 s; plateau above PEEP; not in APRV", ArdsNetwork);

    /// <summary>Ventilatory ratio.</summary>
    public static readonly Equation VentilatoryRatio = new("A19", ValueNames.VentilatoryRatio, "", "{totalMinuteVolumeLMin} × 1000 × {pCO2} ÷ ({predictedBodyWeightKg} × 100 × 37.5)", "validated in mandatory ventilation; in APRV shown as doubtful", "Am J Respir Crit Care Med 2019;199:333-341");

    /// <summary>Alveolar oxygen tension.</summary>
    public static readonly Equation AlveolarPO2 = new("A20", ValueNames.AlveolarPO2MmHg, "mmHg", "{fiO2} × ({barometricPressureMmHg} − 47) − {pCO2} × ({fiO2} + (1 − {fiO2}) ÷ 0.8)", "respiratory quotient 0.8, 37 °C; barometric pressure from the unit's altitude", "alveolar gas equation, full form: standard respiratory physiology");

    /// <summary>Alveolar–arterial difference.</summary>
    public static readonly Equation AlveolarArterialDifference = new("A20", ValueNames.AlveolarArterialGradientMmHg, "mmHg", "max(0, {alveolarPO2MmHg} − {pO2})", "down to −5 mmHg shown as 0, below: no value", Identity);

    /// <summary>Arterial–alveolar ratio.</summary>
    public static readonly Equation ArterialAlveolarRatio = new("A20", ValueNames.ArterialAlveolarRatio, "", "{pO2} ÷ {alveolarPO2MmHg}", "as the alveolar oxygen tension", Identity);

    /// <summary>Bicarbonate from pH and PaCO2.</summary>
    public static readonly Equation BicarbonateComputed = new("A22", ValueNames.BicarbonateComputedMmolL, "mmol/L", "0.0307 × {pCO2} × 10^({pH} − 6.105)", "pH 6.50–8.00, PaCO2 5–250 mmHg", "CLSI C46 constants");

    /// <summary>Whether a gas fits itself.</summary>
    public static readonly Equation GasConsistency = new("A22", ValueNames.GasConsistencyDeltaPH, "", "6.105 + log10({bicarbonateMmolL} ÷ (0.0307 × {pCO2})) − {pH}", "actual bicarbonate; other constants move it by 0.005", "CLSI C46 constants");

    /// <summary>Base excess of the extracellular fluid.</summary>
    public static readonly Equation StandardBaseExcess = new("A23", ValueNames.StandardBaseExcessMmolL, "mmol/L", "{bicarbonateComputedMmolL} − 24.8 + 16.2 × ({pH} − 7.40)", "beyond ±30 mmol/L shown as doubtful; −0.6 at pH 7.40 and 40 mmHg by its constants", "CLSI C46");

    /// <summary>Base excess of blood.</summary>
    public static readonly Equation BloodBaseExcess = new("A23", ValueNames.BloodBaseExcessMmolL, "mmol/L", "(1 − 0.014 × {haemoglobinGDl}) × ({bicarbonateComputedMmolL} − 24.8 + (1.43 × {haemoglobinGDl} + 7.7) × ({pH} − 7.40))", "haemoglobin 2–25 g/dL; analysers differ by design by up to 2 mmol/L", "CLSI C46");

    /// <summary>Standard bicarbonate.</summary>
    public static readonly Equation StandardBicarbonate = new("A23", ValueNames.StandardBicarbonateMmolL, "mmol/L", "24.47 + 0.919 × Z + Z × a × (Z − 8); Z = {bloodBaseExcessMmolL} − 0.3062 × h × (1 − {sO2Percent} ÷ 100); a = 0.00404 + 0.000425 × h; h = 0.6206 × {haemoglobinGDl}", "as base excess of blood; needs the measured saturation", "CLSI C46 family");

    /// <summary>Saturation that the curve gives for a tension.</summary>
    public static readonly Equation SaturationComputed = new("A25", ValueNames.SaturationComputedPercent, "%", "100 ÷ (23400 ÷ (p^3 + 150 × p) + 1); p = {pO2} × 10^(0.40 × ({pH} − 7.40) + 0.06 × (log10(40) − log10({pCO2})))", "adult haemoglobin at 37 °C, within 0.55 points; no dyshaemoglobin", "J Appl Physiol 1979;46:599-602; virtual tension: J Appl Physiol 1966;21:1375-1376") { Kind = ValueKind.Estimated };

    /// <summary>Oxygen content of arterial blood.</summary>
    public static readonly Equation OxygenContent = new("A25", ValueNames.OxygenContentMlDl, "mL/dL", "1.34 × {haemoglobinGDl} × {sO2Percent} ÷ 100 + 0.0031 × {pO2}", "measured saturation; 1.34–1.39 mL/g are both in use", "from memory");

    /// <summary>Arterial minus end-tidal carbon dioxide.</summary>
    public static readonly Equation ArterialEndTidalGap = new("A26", ValueNames.ArterialEndTidalCO2GapMmHg, "mmHg", "{pCO2} − {etCO2MmHg}", "end-tidal at the draw or within 60 min", Identity);

    /// <summary>Anion gap.</summary>
    public static readonly Equation AnionGap = new("A27", ValueNames.AnionGapMmolL, "mmol/L", "{sodiumMmolL} − {chlorideMmolL} − {bicarbonateComputedMmolL}", "without potassium", "from memory");

    /// <summary>Oxygenation by the ranges of the ARDS definition: 0 better than mild, 1 mild, 2 moderate, 3 severe.</summary>
    public static readonly Equation OxygenationClass = new("A28", ValueNames.OxygenationClass, "", "P/F {pfRatio} against 300, 200 and 100 mmHg at {peepCmH2O|meanAirwayPressureMeasured|meanAirwayPressureComputed} cmH2O", "needs a PEEP or, in APRV, a mean airway pressure (common practice) of 5 cmH2O; under the barometric pressure of 1000 m the limits are scaled by it ÷ 760 mmHg (from memory); the other criteria of the definition are a person's to judge", "JAMA 2012;307:2526-2533");

    /// <summary>Rapid shallow breathing.</summary>
    public static readonly Equation RapidShallow = new("A29", ValueNames.RapidShallowIndex, "/min/L", "{spontaneousRatePerMin} ÷ ({spontaneousTidalVolumeMl} ÷ 1000)", "own breaths at low support; in APRV shown as doubtful: not the published index", "N Engl J Med 1991;324:1445-1450");

    /// <summary>Mechanical power in volume control.</summary>
    public static readonly Equation PowerVolumeControlled = new("A30", ValueNames.MechanicalPowerJMin, "J/min", "0.098 × {totalRatePerMin} × {tidalVolumeMl} ÷ 1000 × ({peakPressureCmH2O} − {drivingPressureCmH2O} ÷ 2)", "constant flow; never in APRV", "Intensive Care Med 2016;42:1567-1575");

    /// <summary>Mechanical power in pressure control.</summary>
    public static readonly Equation PowerPressureControlled = PowerVolumeControlled with
    {
        Form = "0.098 × {totalRatePerMin} × {tidalVolumeMl} ÷ 1000 × ({inspiratoryPressureAbovePeepCmH2O} + {peepCmH2O})",
        Limits = "square wave; reads high with a slow rise; never in APRV",
        Source = "Intensive Care Med 2019;45:1321-1323",
    };

    /// <summary>Time on the ventilator.</summary>
    public static readonly Equation VentilatorDays = new("A31", ValueNames.VentilatorDays, "d", "{sinceAirwaySecuredH} ÷ 24", "elapsed time, not calendar days", Identity);

    /// <summary>Gets all of them, in the order of their ids.</summary>
    public static IReadOnlyList<Equation> All { get; } =
    [
        PredictedBodyWeightMale, PredictedBodyWeightFemale, ReleaseVolumePerKg, TidalVolumePerKg, PfRatio, SfRatio, ImputedPfRatio, OxygenationIndex, OxygenSaturationIndex,
        MeanPressureAprv, MeanPressureControlled, MeanPressureVolumeControlled, CycleTime, ReleaseRate, TimeRatio, ShareAtPHigh, ReleaseMinuteVolume,
        ReleaseMinuteVolumeBySettings, OwnMinuteVolumeDerived, OwnShare, EndReleaseFlow, TimeConstant, TLowFor75, TLowFor50, TLowFor25, EndReleasePressure, Emptied, AlveolarSwing,
        EffectiveCompliance, EffectiveResistance, PeakFlowModel, EndReleasePressureRefilling, AlveolarSwingRefilling, MeanAlveolarPressure, DrivingPressure, StaticCompliance,
        VentilatoryRatio, AlveolarPO2, AlveolarArterialDifference, ArterialAlveolarRatio, BicarbonateComputed, GasConsistency, StandardBaseExcess, BloodBaseExcess,
        StandardBicarbonate, SaturationComputed, OxygenContent, ArterialEndTidalGap, AnionGap, OxygenationClass, RapidShallow, PowerVolumeControlled, PowerPressureControlled, VentilatorDays,
    ];
}
