using System.Globalization;
using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Handover;
using UnitVent.Store.Auditing;
using UnitVent.Store.People;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Handover;

/// <summary>Prints sheets from the same pictures as the screens show, and keeps in the audit trail that they were printed.</summary>
public sealed class Sheets(ChartReader charts, UnitBoards boards, AuditTrail audit, IClock clock)
{
    private static readonly Duration Day = Duration.FromHours(24);

    /// <summary>The sheets of some patients, each from a page of its own, in the order given.</summary>
    public async Task<Result<Sheet>> OfPatientsAsync(Actor actor, IReadOnlyList<Guid> episodes, Paper paper, CancellationToken cancel)
    {
        var now = clock.GetCurrentInstant();
        var inputs = new List<SheetInput>();
        foreach (var id in episodes)
        {
            var input = await InputAsync(actor, id, now, cancel);
            if (!input.Succeeded)
            {
                return input.As<Sheet>();
            }

            inputs.Add(input.Value);
        }

        var unit = inputs[0].Now.Window.Unit;
        var what = inputs.Count == 1 ? "bed-" + inputs[0].Now.Window.Episode.Bed : "patients";
        return Result<Sheet>.Of(new Sheet(PatientSheet.Render(inputs, paper), Name(unit.Code, what, now, unit.Zone)));
    }

    /// <summary>The sheet of a unit.</summary>
    public async Task<Result<Sheet>> OfUnitAsync(Actor actor, string code, Paper paper, CancellationToken cancel)
    {
        var board = await boards.GetAsync(actor, code, cancel);
        if (!board.Succeeded)
        {
            return board.As<Sheet>();
        }

        var (unit, now) = (board.Value.Unit, clock.GetCurrentInstant());
        var kept = await audit.AppendAsync(unit.Id, actor.Name, "print", unit.Id, "unit sheet", cancel);
        if (!kept.Succeeded)
        {
            return kept.As<Sheet>();
        }

        var input = new UnitSheetInput(unit, [.. board.Value.Rows.Select(r => new UnitSheetPatient(r.Picture, r.Standing))], now, actor.Name);
        return Result<Sheet>.Of(new Sheet(UnitSheet.Render(input, paper), Name(unit.Code, "unit", now, unit.Zone)));
    }

    private async Task<Result<SheetInput>> InputAsync(Actor actor, Guid id, Instant now, CancellationToken cancel)
    {
        var chart = await charts.PatientAsync(actor, id, null, cancel);
        if (!chart.Succeeded)
        {
            return chart.As<SheetInput>();
        }

        var dayBefore = chart.Value.Window.Episode.AdmittedAt <= now - Day ? await charts.PatientAsync(actor, id, now - Day, cancel) : null;
        var kept = await charts.PrintedAsync(actor, id, cancel);
        return kept.Succeeded
            ? Result<SheetInput>.Of(new SheetInput(chart.Value.Picture, now, actor.Name)
            {
                DayBefore = dayBefore is { Succeeded: true } ? dayBefore.Value.Picture : null,
                OpenFlags = chart.Value.Flags,
            })
            : kept.As<SheetInput>();
    }

    /// <summary>A name that says unit, bed and time, and nobody's name.</summary>
    private static string Name(string unit, string what, Instant now, DateTimeZone zone) =>
        $"handover-{Safe(unit)}-{Safe(what)}-{now.InZone(zone).ToString("uuuuMMdd-HHmm", CultureInfo.InvariantCulture)}.pdf";

    private static string Safe(string text) => string.Concat(text.Select(c => char.IsAsciiLetterOrDigit(c) ? c : '-'));
}
