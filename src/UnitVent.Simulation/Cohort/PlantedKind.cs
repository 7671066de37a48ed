using UnitVent.Charting.Rules;
using static UnitVent.Charting.Rules.Family;

namespace UnitVent.Simulation.Cohort;

/// <summary>What is planted, from when on it matters, and which cards say so.</summary>
/// <param name="Kind">The kind.</param>
/// <param name="What">What is done to the patient.</param>
/// <param name="Matters">From when on the truth has changed by more than the minimum important change.</param>
/// <param name="Fits">The families whose card counts as having found it.</param>
/// <param name="Because">Why those.</param>
public sealed record PlantedKind(Deterioration Kind, string What, string Matters, IReadOnlyList<Family> Fits, string Because)
{
    public static IReadOnlyList<PlantedKind> All { get; } =
    [
        new(Deterioration.ReleaseLengthened, "T low ×2", "end of release −10 points", [Timing, Collapse, VolumeAndPressure],
            "the release ends long, empties more, and mean pressure falls with it") { Passed = (b, n) => n.EndOfPeakPercent <= b.EndOfPeakPercent - 10 },
        new(Deterioration.ComplianceFalling, "compliance −40 % in 10 h", "compliance −15 %", [Collapse, Timing, CarbonDioxide, Drive, VolumeAndPressure],
            "a stiffer lung empties sooner, so that the release ends long, is smaller, and carries less carbon dioxide")
        { Passed = (b, n) => n.Compliance <= 0.85 * b.Compliance },
        new(Deterioration.OwnBreathingFading, "own breathing −75 % in 8 h, T high ×1.3", "own share −15 points or PaCO2 +10 %", [Drive, CarbonDioxide],
            "less own breathing, and carbon dioxide that stays") { Passed = BreathesLess },
        new(Deterioration.ShuntRising, "shunt +0.13 in 9 h", "P/F −15 %", [Collapse, Oxygen],
            "oxygenation worse at equal pressures, and in the end low") { Passed = (b, n) => n.PaO2OverFiO2 <= 0.85 * b.PaO2OverFiO2 },
        new(Deterioration.ResistanceRising, "resistance ×2.3 in 8 h", "time constant +20 %", [Airway, Timing, CarbonDioxide, Drive, VolumeAndPressure],
            "the release empties slowly, ends short, is smaller, and carries less carbon dioxide") { Passed = (b, n) => n.TimeConstantS >= 1.2 * b.TimeConstantS },
        new(Deterioration.DeepSedation, "RASS −4 within 1 h, own breathing gone", "own share −15 points or PaCO2 +10 %", [Drive, CarbonDioxide],
            "no own breathing, and carbon dioxide that stays") { Passed = BreathesLess },
        new(Deterioration.BicarbonateSlip, "one gas with bicarbonate 7 mmol/L off", "that gas", [Entry], "the gas does not fit itself"),
        new(Deterioration.Pneumothorax, "within 6 min shunt +0.18, compliance −45 %, mean arterial pressure −22", "its first minute",
            [Sudden, Oxygen, Collapse, Circulation, CarbonDioxide, Drive, Timing, VolumeAndPressure],
            "oxygen, pressure and volume fall at once; each of them may speak first") { Passed = (_, _) => true },
    ];

    /// <summary>Whether the truth has passed the minimum important change, from what was true before and what is true now.</summary>
    internal Func<TrueValues, TrueValues, bool> Passed { get; init; } = (_, _) => true;

    public static PlantedKind Of(Deterioration kind) => All.First(k => k.Kind == kind);

    private static bool BreathesLess(TrueValues before, TrueValues now) =>
        now.OwnSharePercent <= before.OwnSharePercent - 15 || now.PaCO2MmHg >= 1.1 * before.PaCO2MmHg;
}
