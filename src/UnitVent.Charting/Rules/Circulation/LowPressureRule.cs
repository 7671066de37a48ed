using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Circulation;

/// <summary>R47: blood pressure is low, or the vasopressor rises, on a high mean airway pressure.</summary>
public sealed class LowPressureRule : Rule
{
    private const double HalfImportantChangeMmHg = 2.5; // half of 5 mmHg [common practice]

    /// <inheritdoc/>
    public override string Id => "R47";

    /// <inheritdoc/>
    public override Family Family => Family.Circulation;

    /// <inheritdoc/>
    public override string Seen => "low blood pressure on high mean airway pressure";

    /// <inheritdoc/>
    public override string Levels => "mean arterial pressure under 65 mmHg or a vasopressor rising, at a mean airway pressure from 20 cmH2O, caution; under 60 mmHg urgent";

    /// <inheritdoc/>
    public override string Remarks => "A lower target of the patient moves both edges down with it.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        Airway(picture).Value < picture.Window.Unit.Thresholds.LowPressure.MeanAirwayFromCmH2O
        || (Check(picture) is { } check
            && !((double?)check.Body.MeanArterialPressureMmHg < Edges(picture).Caution + HalfImportantChangeMmHg)
            && check.Body.Vasopressor != Vasopressor.Rising);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (Check(picture) is not { } check || Airway(picture) is not { Value: { } airway })
        {
            return CannotTell("Needs a recent mean arterial pressure or vasopressor, and mean airway pressure.");
        }

        var edges = Edges(picture);
        var arterial = (double?)check.Body.MeanArterialPressureMmHg;
        var rising = check.Body.Vasopressor == Vasopressor.Rising;
        if (airway < picture.Window.Unit.Thresholds.LowPressure.MeanAirwayFromCmH2O || !(rising || arterial < edges.Caution))
        {
            return Clear(check.At);
        }

        var says = (arterial is { } pressure ? $"mean arterial pressure {Numbers.Fixed(pressure)} mmHg" + (pressure < edges.Caution ? $", edge {Numbers.Fixed(edges.Caution)} mmHg" : "") + ", " : "")
            + (rising ? "vasopressor rising, " : "") + $"at mean airway pressure {Numbers.Fixed(airway)} cmH2O";
        return Raise(
            arterial < edges.Urgent ? Severity.Urgent : Severity.Caution,
            says,
            "pulse pressure and its swing, volume status, pneumothorax, trapped pressure, sedation, bleeding, sepsis",
            check.At,
            Evidence.Of(
                -(arterial ?? edges.Caution),
                [check.Id],
                [("meanAirwayPressure", airway), .. arterial is { } mmHg ? new[] { ("meanArterialPressure", mmHg) } : []]));
    }

    private static Charted<VentilatorCheck>? Check(PatientPicture picture) =>
        picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.MeanArterialPressureMmHg is not null || c.Vasopressor is not null) is { } check
        && picture.AsOf - check.At <= picture.Limits.Readings ? check : null;

    private static PictureValue Airway(PatientPicture picture) =>
        MeanPressure.Best(picture[ValueNames.MeanAirwayPressureComputed], picture[ValueNames.MeanAirwayPressureMeasured]);

    private static (double Caution, double Urgent) Edges(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.LowPressure;
        var down = Math.Max(0, options.UnderMmHg - ((double?)picture.Targets?.Body.MeanArterialPressureMmHg ?? options.UnderMmHg));
        return (options.UnderMmHg - down, options.UrgentUnderMmHg - down);
    }
}
