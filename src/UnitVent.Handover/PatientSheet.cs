using UnitVent.Charting.Episodes;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;
using UnitVent.Handover.Parts;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover;

/// <summary>The handover sheet of a patient: everything on it is read from the picture, nothing is computed for print.</summary>
public static class PatientSheet
{
    /// <summary>One patient's sheet as a PDF.</summary>
    /// <exception cref="InvalidOperationException">No font for printing is installed.</exception>
    public static byte[] Render(SheetInput input, Paper paper) => Render([input], paper);

    /// <summary>The sheets of several patients in one PDF, each from a page of its own, in the order given.</summary>
    /// <exception cref="ArgumentException">No patient was given.</exception>
    /// <exception cref="InvalidOperationException">No font for printing is installed.</exception>
    public static byte[] Render(IReadOnlyList<SheetInput> inputs, Paper paper)
    {
        ArgumentOutOfRangeException.ThrowIfZero(inputs.Count);

        var title = inputs.Count == 1 ? $"Handover, bed {inputs[0].Now.Window.Episode.Bed}" : "Handover";
        var document = new SheetDocument(title, paper, inputs[0].PrintedAt, [.. inputs.Select(Section)])
        {
            Watermark = inputs.Any(input => input.Now.Window.Unit.IsDemo) ? Cautions.Demonstration : null,
        };
        return SheetWriter.Write(document, SystemFonts.Installed);
    }

    private static SheetSection Section(SheetInput input)
    {
        var times = new Times(input.Now.Window.Unit.Zone, input.Now.AsOf);
        return new SheetSection($"Bed {input.Now.Window.Episode.Bed}", Frame(input, times), [.. Blocks(new SheetPart(input, times))]);
    }

    private static PageFrame Frame(SheetInput input, Times times)
    {
        var episode = input.Now.Window.Episode;
        return new PageFrame(
            $"Bed {episode.Bed} · {episode.Patient.DisplayName()}",
            Identity(episode.Patient, times),
            $"{input.Now.Window.Unit.Name}\nHandover sheet",
            Cautions.Foot(times, input.PrintedAt, input.Now.AsOf, input.PrintedBy));
    }

    private static string Identity(PatientFacts patient, Times times)
    {
        var born = patient.BirthDate is { } birth ? $"born {Times.Date(birth)}, {patient.AgeOn(times.Today)} years" : "birth date not recorded";
        var sex = patient.Sex is { } known ? Words.Spelled(known).ToLowerInvariant() : "sex not recorded";
        return $"MRN {patient.Mrn} · {born} · {sex}";
    }

    private static IEnumerable<Block> Blocks(SheetPart part) =>
    [
        new SideBySide([.. SummaryPart.Of(part)], [.. AirwayPart.Of(part)]),
        .. FlagsPart.Of(part),
        .. SettingsPart.Of(part),
        .. GasesPart.Of(part),
        new SideBySide([.. MechanicsPart.Of(part)], [.. BreathingPart.Of(part)]),
        .. TrendPart.Of(part),
        new SideBySide([.. TargetsPart.Of(part)], [.. FollowUpsPart.Of(part)]),
        new KeepTogether([
            .. FollowUpsPart.Notes(part),
            new Space(),
            new FillIn("Read back by the one who takes over; initials", ["Gave", "Took over", "Time"]),
        ]),
        .. WorkingsPart.Of(part),
    ];
}
