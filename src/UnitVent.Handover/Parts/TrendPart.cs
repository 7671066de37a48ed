using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>P/F of every arterial gas and mean airway pressure from every setting, over two days.</summary>
internal static class TrendPart
{
    private static readonly Duration Back = Duration.FromHours(48);

    public static IEnumerable<Block> Of(SheetPart part)
    {
        var span = new Interval(part.Now.AsOf - Back, part.Now.AsOf);
        var changes = part.Now.Window.Of<SettingChange>(EntryKind.SettingChange, span.End).Select(change => change.At).Where(at => at >= span.Start).ToList();
        var oxygen = Oxygen(part.Now, span);
        var pressure = Pressure(part.Now, changes.Prepend(span.Start));
        if (oxygen.Count == 0 && pressure.All(point => point.Value is null))
        {
            return [new Heading("Trend"), new Paragraph("Neither an arterial gas nor settings within the last 48 h.")];
        }

        var lanes = new[]
        {
            new TrendLane("P/F, mmHg", LaneStyle.Line, oxygen, Last(part.Now.LatestGas?.Values[ValueNames.PfRatio])),
            new TrendLane("Mean airway pressure from the settings, cmH2O", LaneStyle.Step, pressure, Last(part.Now[ValueNames.MeanAirwayPressureComputed])),
        };
        return [new KeepTogether([
            new Heading("Trend", "last 48 h · ticks on the time axis: settings changed"),
            new TrendStrip(Described(part, oxygen), span, Ticks(part, span), changes, lanes)])];
    }

    private static string Last(PictureValue? value) => value is null ? "" : Printed.Bare(value) ?? "";

    /// <summary>The gases of the span; two that lie further apart than a gas holds are not joined.</summary>
    private static List<TrendPoint> Oxygen(PatientPicture now, Interval span)
    {
        var points = new List<TrendPoint>();
        foreach (var gas in now.Gases.Where(gas => gas.Gas.At >= span.Start))
        {
            if (points.Count > 0 && gas.Gas.At - points[^1].At > now.Limits.Gas)
            {
                points.Add(new TrendPoint(points[^1].At + now.Limits.Gas, null));
            }

            points.Add(new TrendPoint(gas.Gas.At, gas.Values[ValueNames.PfRatio].Value));
        }

        return points;
    }

    private static List<TrendPoint> Pressure(PatientPicture now, IEnumerable<Instant> changes) =>
        [.. changes.Select(at => new TrendPoint(at, PatientPicture.At(now.Window, at)[ValueNames.MeanAirwayPressureComputed].Value))];

    /// <summary>Every midnight by its day and every noon by its hour.</summary>
    private static List<TimeTick> Ticks(SheetPart part, Interval span)
    {
        var zone = part.Now.Window.Unit.Zone;
        var first = span.Start.InZone(zone).Date;
        return [.. Enumerable.Range(0, Period.DaysBetween(first, span.End.InZone(zone).Date) + 1)
            .Select(first.PlusDays)
            .SelectMany(day => new[]
            {
                new TimeTick(zone.AtStartOfDay(day).ToInstant(), Times.WeekDay(day)),
                new TimeTick(zone.AtLeniently(day.At(LocalTime.Noon)).ToInstant(), "12:00"),
            })
            .Where(tick => span.Contains(tick.At))];
    }

    private static string Described(SheetPart part, List<TrendPoint> oxygen)
    {
        var known = oxygen.Where(point => point.Value is not null).Select(point => part.Now.Gases.First(gas => gas.Gas.At == point.At)).ToList();
        return known.Count == 0
            ? "No P/F within the last 48 hours; mean airway pressure from the settings as steps."
            : $"P/F from {Spoken(known[0])} to {Spoken(known[^1])}, {known.Count} gases; mean airway pressure from the settings as steps.";

        string Spoken(PairedGas gas) => $"{Printed.Bare(gas.Values[ValueNames.PfRatio])} at {part.Times.At(gas.Gas.At)}";
    }
}
