using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>The settings now beside those of 24 hours before; what changed stands out.</summary>
internal static class SettingsPart
{
    /// <summary>Printed in a column of their own, beside another member, or not at all.</summary>
    private static readonly HashSet<string> Elsewhere =
        ["effectiveAt", "mode", "modeText", "phase", "reason", "pressureSupportReference", "tubeCompensationPercent"];

    public static IEnumerable<Block> Of(SheetPart part)
    {
        if (part.Now.Settings is not { } now)
        {
            return [new Heading("Settings"), new Paragraph("No settings charted.")];
        }

        var before = part.Input.DayBefore?.Settings?.Body;
        var fields = EntryFields.Of<SettingChange>()
            .Where(field => !Elsewhere.Contains(field.Name))
            .Where(field => field.ValueIn(now.Body) is not null || (before is not null && field.ValueIn(before) is not null))
            .ToList();
        Column[] columns = [new(""), new("Mode"), .. fields.Select(Head)];
        return [new Heading("Settings", Aside(part, now)), new Table(columns, [Current(now.Body, before, fields), Earlier(now.Body, before, fields)])];
    }

    private static string Aside(SheetPart part, Charted<SettingChange> now)
    {
        var confirmed = part.Now.SettingsConfirmedAt ?? now.At;
        var age = part.Now.AsOf - confirmed;
        var confirmation = age > part.Now.Limits.Settings ? $"NOT CONFIRMED FOR {Times.Length(age)}" : $"last confirmed {part.Times.At(confirmed)}";
        return $"in force since {part.Source(now)} · {confirmation}";
    }

    private static Row Current(SettingChange now, SettingChange? before, List<EntryField> fields) =>
        new([
            new Cell("Now"),
            new Cell(Words.Of(now), IsStrong: before is not null && Words.Of(before) != Words.Of(now)),
            .. fields.Select(field => new Cell(Text(field, now), IsStrong: before is not null && Text(field, before) != Text(field, now))),
        ]);

    private static Row Earlier(SettingChange now, SettingChange? before, List<EntryField> fields) => before is null
        ? new([new Cell("24 h ago"), new Cell("none charted"), .. fields.Select(_ => new Cell(""))])
        : new([
            new Cell("24 h ago"),
            new Cell(SameOr(Words.Of(before), Words.Of(now))),
            .. fields.Select(field => new Cell(SameOr(Text(field, before), Text(field, now)))),
        ]);

    private static string Reference(PressureReference? reference) => reference switch
    {
        PressureReference.PHigh => " above P high",
        PressureReference.PLow => " above P low",
        null => "",
    };

    private static string SameOr(string before, string now) => before == now ? "same" : before;

    private static Column Head(EntryField field) => new(
        string.IsNullOrEmpty(field.Number?.Unit) ? field.Label : $"{field.Label}\n{field.Number.Unit}",
        field.Kind is FieldKind.Number or FieldKind.Whole ? Align.Right : Align.Left);

    private static string Text(EntryField field, SettingChange settings) => field.ValueIn(settings) switch
    {
        null => "–",
        decimal number when field.Name == "pressureSupportCmH2O" => $"{Printed.Typed(number)}{Reference(settings.PressureSupportReference)}",
        decimal number => Printed.Typed(number),
        ReleaseEnd end => Words.Spelled(end),
        TubeCompensation compensation when settings.TubeCompensationPercent is { } percent => $"{Words.Spelled(compensation)}, {Printed.Typed(percent, "%")}",
        TubeCompensation compensation => Words.Spelled(compensation),
        var other => throw new NotSupportedException($"{other.GetType().Name} has no words on a sheet."),
    };
}
