using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Parts;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover;

/// <summary>The sheet of a unit: one line a patient, in bed order.</summary>
public static class UnitSheet
{
    /// <summary>The unit's sheet as a PDF.</summary>
    /// <exception cref="InvalidOperationException">No font for printing is installed.</exception>
    public static byte[] Render(UnitSheetInput input, Paper paper)
    {
        var times = new Times(input.Unit.Zone, input.PrintedAt);
        var frame = new PageFrame(
            $"{input.Unit.Name} · ventilated patients",
            $"{input.Patients.Count} in bed order",
            "Unit sheet",
            Cautions.Foot(times, input.PrintedAt, AsOf(input), input.PrintedBy));
        var section = new SheetSection(input.Unit.Name, frame, [Body(input, times)]);
        var document = new SheetDocument($"Unit sheet, {input.Unit.Name}", paper, input.PrintedAt, [section])
        {
            Watermark = input.Unit.IsDemo ? Cautions.Demonstration : null,
        };
        return SheetWriter.Write(document, SystemFonts.Installed);
    }

    /// <summary>The oldest of the pictures: nothing on the sheet is newer than it says.</summary>
    private static Instant AsOf(UnitSheetInput input) => input.Patients.Select(patient => patient.Now.AsOf).DefaultIfEmpty(input.PrintedAt).Min();

    private static Block Body(UnitSheetInput input, Times times) => input.Patients.Count == 0
        ? new Paragraph("No ventilated patients.")
        : new Table(
            [new("Bed"), new("Patient", Share: 1), new("Mode, days"), new("Stands, why", Share: 2), new("In hand, due", Share: 1.2)],
            [.. InBedOrder(input).Select(patient => Line(patient, times))],
            IsRuled: true);

    private static IEnumerable<UnitSheetPatient> InBedOrder(UnitSheetInput input)
    {
        var places = input.Unit.Beds.Select((bed, place) => (bed, place)).ToDictionary(bed => bed.bed, bed => bed.place);
        return input.Patients
            .OrderBy(patient => places.GetValueOrDefault(patient.Now.Window.Episode.Bed, int.MaxValue))
            .ThenBy(patient => patient.Now.Window.Episode.Bed, StringComparer.Ordinal);
    }

    private static Row Line(UnitSheetPatient patient, Times times)
    {
        var (now, standing) = (patient.Now, patient.Standing);
        var facts = now.Window.Episode.Patient;
        return Row.Of(
            now.Window.Episode.Bed,
            $"{facts.DisplayName()}\nMRN {facts.Mrn}",
            $"{(now.Settings is { } settings ? Words.Of(settings.Body) : "none charted")}\n{Printed.Bare(now[ValueNames.VentilatorDays]) ?? "–"}",
            new Cell(Stands(standing, times), Mark: Marks.Of(standing.Band)),
            InHandAndDue(patient, times));
    }

    /// <summary>The band's word and the sentence that says why, without saying the word twice.</summary>
    private static string Stands(Standing standing, Times times)
    {
        var word = Words.Of(standing.Band);
        if (standing.Why.StartsWith(word, StringComparison.OrdinalIgnoreCase))
        {
            return word + standing.Why[word.Length..];
        }

        var since = standing is { Band: Band.NotKnown, Since: { } from } ? $" since {times.At(from)}" : "";
        return $"{word}{since}\n{standing.Why}";
    }

    private static string InHandAndDue(UnitSheetPatient patient, Times times)
    {
        var inHand = patient.Standing.Leading?.Leading.InHand is { } hand ? $"In hand: {hand.By}, until {times.At(hand.Until)}" : null;
        var due = patient.Now.FollowUps.Count > 0 ? $"Due {times.At(patient.Now.FollowUps[0].Body.DueAt!.Value)}: {patient.Now.FollowUps[0].Body.What}" : null;
        return string.Join('\n', new[] { inHand, due }.OfType<string>());
    }
}
