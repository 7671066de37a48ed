using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>R26: more oxygen than is aimed at, for hours.</summary>
public sealed class OxygenAboveTargetRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R26";

    /// <inheritdoc/>
    public override Family Family => Family.Oxygen;

    /// <inheritdoc/>
    public override string Seen => "oxygen above target";

    /// <inheritdoc/>
    public override string Levels => "SpO2 over 96 % or PaO2 over 100 mmHg at FiO2 over 0.40 in two readings over 2 h, or PaO2 over 150 mmHg, advisory";

    /// <inheritdoc/>
    public override string Remarks => "The upper edges of the patient’s targets replace 96 % and 100 mmHg.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.OxygenAboveTarget;
        var gas = picture.LatestGas is { } latest && picture.AsOf - latest.Gas.At <= picture.Limits.Gas && OxygenReadings.PaO2(latest) is not null ? latest : null;
        if (gas is not null && OxygenReadings.PaO2(gas) > options.AtOnceMmHg)
        {
            return High(picture, $"PaO2 {Numbers.Fixed(OxygenReadings.PaO2(gas)!.Value)} mmHg", gas.FiO2, gas.Gas.At, OxygenReadings.PaO2(gas)!.Value, [gas.Gas.Id]);
        }

        var byCheck = Lasting(Checks(picture, options), picture.Limits.Readings, picture, options);
        var byGas = Lasting(Gases(picture, options), picture.Limits.Gas, picture, options);
        return (byCheck ?? byGas) is not { } run
            ? gas is null && OxygenReadings.SpO2(picture) is null ? CannotTell("Needs a recent SpO2 or arterial gas.") : Clear(picture.AsOf)
            : High(picture, $"{run[0].What} over {Times.Hours(run[0].At - run[^1].At)}", run[0].FiO2, run[0].At, run[0].Value, [.. run.Select(r => (Guid?)r.Entry)]);
    }

    private RuleOutcome High(PatientPicture picture, string what, double? fiO2, Instant at, double badness, Guid?[] entries) => Raise(
        Severity.Advisory,
        what + (fiO2 is { } f ? $" at FiO2 {Numbers.Fixed(f, 2)}" : "") + (picture.Targets is null ? "" : ", above the patient’s target"),
        "FiO2 against the target, the probe",
        at,
        Evidence.Of(badness, entries, [("reading", badness), .. fiO2 is { } f2 ? new[] { ("fiO2", f2) } : []]));

    /// <summary>The latest readings that are all high, youngest first, when they are two or more and span the time; else null.</summary>
    private static List<Shown>? Lasting(IEnumerable<Shown> youngestFirst, Duration limit, PatientPicture picture, OxygenAboveTargetOptions options)
    {
        var run = youngestFirst.TakeWhile(r => r.IsHigh && r.FiO2 > options.AtFiO2Above).ToList();
        return run.Count >= 2 && picture.AsOf - run[0].At <= limit && run[0].At - run[^1].At >= Duration.FromHours(options.OverHours) ? run : null;
    }

    private static IEnumerable<Shown> Checks(PatientPicture picture, OxygenAboveTargetOptions options)
    {
        var edge = (double?)picture.Targets?.Body.SpO2HighPercent ?? options.SpO2AbovePercent;
        return picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf)
            .Where(c => c.Body.SpO2Percent is not null).Reverse()
            .Select(c => new Shown(c.At, c.Id, (double)c.Body.SpO2Percent! > edge, (double)c.Body.SpO2Percent, $"SpO2 {c.Body.SpO2Percent} %", (double?)InForce.Settings(picture.Window, c.At)?.Body.FiO2));
    }

    private static IEnumerable<Shown> Gases(PatientPicture picture, OxygenAboveTargetOptions options)
    {
        var edge = (double?)picture.Targets?.Body.PaO2HighMmHg ?? options.PaO2AboveMmHg;
        return picture.Gases.Where(g => OxygenReadings.PaO2(g) is not null).Reverse()
            .Select(g => new Shown(g.Gas.At, g.Gas.Id, OxygenReadings.PaO2(g) > edge, OxygenReadings.PaO2(g)!.Value, $"PaO2 {Numbers.Fixed(OxygenReadings.PaO2(g)!.Value)} mmHg", g.FiO2));
    }

    private readonly record struct Shown(Instant At, Guid Entry, bool IsHigh, double Value, string What, double? FiO2);
}
