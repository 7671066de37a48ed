using System.Globalization;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;
using UnitVent.Physiology;
using UnitVent.Web.Charting;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Board;

/// <summary>The numbers of a row in their fixed columns.</summary>
public sealed class BoardColumns(PatientPicture picture, Instant now)
{
    private static readonly Duration Comparable = Duration.FromHours(12);
    private const double AboutTheSame = 0.10; // common practice

    private DateTimeZone Zone => picture.Window.Unit.Zone;

    public string Mode => picture.Settings is { } s ? SettingWords.Brief(s.Body) : "no settings charted";

    public string? ModeSince => picture.Settings is { } s ? "for " + Format.Length(now - s.At) : null;

    public BoardCell FiO2 => picture.Settings?.Body.FiO2 is { } set ? new(set.ToString("0.##", CultureInfo.InvariantCulture)) : new("–", "Needs settings.");

    /// <summary>The computed mean pressure; the measured one beside it only when they disagree, or alone when none can be computed.</summary>
    public BoardCell Mean
    {
        get
        {
            var (computed, measured) = (picture[ValueNames.MeanAirwayPressureComputed], picture[ValueNames.MeanAirwayPressureMeasured]);
            return (computed.Value, measured.Value) switch
            {
                ({ } c, { } m) when !MeanPressureAgreement.IsWithinTolerance(AirwayPressure.FromCmH2O(m), AirwayPressure.FromCmH2O(c)) =>
                    new(Format.Number(c, 1), "measured " + Format.Number(m, 1)),
                ({ } c, _) => new(Format.Number(c, 1)),
                (null, { } m) => new(Format.Number(m, 1), "measured"),
                _ => BoardCell.Of(computed, 1),
            };
        }
    }

    /// <summary>P/F of the latest arterial gas at its own settings, greyed past its limit.</summary>
    public BoardCell Pf => picture.LatestGas is { } gas
        ? new(Format.Number(gas.Values[ValueNames.PfRatio].Value, 0), gas.Values[ValueNames.PfRatio].Because, GasIsOld)
        : new("–", "No arterial gas yet.");

    /// <summary>Where P/F goes, in words; null when the gas before is too far back.</summary>
    public string? PfDirection
    {
        get
        {
            if (picture.Gases.Count < 2 || Pair(^1) is not { } latest || Pair(^2) is not { } before || picture.Gases[^1].Gas.At - picture.Gases[^2].Gas.At >= Comparable)
            {
                return null;
            }

            var (was, at) = (Format.Number(before, 0), Time(picture.Gases[^2].Gas.At));
            return Math.Abs(latest - before) <= AboutTheSame * before ? $"about as {was} at {at}" : $"{(latest > before ? "up" : "down")} from {was} at {at}";
        }
    }

    public BoardCell PH => picture.LatestGas is { } gas ? new(Format.Typed(gas.Gas.Body.PH), Quiet: GasIsOld) : new("–");

    public BoardCell PaCO2 => picture.LatestGas is { } gas ? new(Tensions.Shown(gas.Gas.Body.PCO2, gas.Gas.Body.TensionUnit, picture.Window.Unit.TensionUnit), Quiet: GasIsOld) : new("–");

    public string? GasAt => picture.LatestGas is { } gas ? "gas " + Time(gas.Gas.At) : null;

    public (BoardCell Value, string? At) SpO2 => LatestSpO2() is { } seen ? (new(Format.Typed(seen.Value)), Time(seen.At)) : (new("–"), null);

    public BoardCell Rate => picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, now, c => c.TotalRatePerMin is not null) is { } check
        ? new(Format.Typed(check.Body.TotalRatePerMin), Quiet: now - check.At > picture.Limits.Readings)
        : new("–");

    public BoardCell EndFlow => BoardCell.Of(picture[ValueNames.EndReleaseFlowPercent], 0);

    public BoardCell PerKg => BoardCell.Of(picture[picture.Settings?.Body.Mode is null or VentilationMode.Aprv ? ValueNames.ReleaseVolumePerKg : ValueNames.TidalVolumePerKg], 1);

    public BoardCell OwnShare => BoardCell.Of(picture[ValueNames.SpontaneousSharePercent], 0);

    public double? OwnSharePercent => picture[ValueNames.SpontaneousSharePercent].Value;

    public string Rass => Badges.OnRelaxant(picture) ? "relaxant"
        : picture.Breathing?.Body is { RassNotAssessable: true } ? "not assessable"
        : Format.Typed(picture.Window.Latest<BreathingCheck>(EntryKind.BreathingCheck, now, b => b.Rass is not null)?.Body.Rass);

    /// <summary>The last setting change, and whether a gas came since.</summary>
    public (string What, string Since)? LastChange
    {
        get
        {
            if (picture.Settings is not { } last)
            {
                return null;
            }

            var before = picture.Window.Latest<SettingChange>(EntryKind.SettingChange, last.At - Duration.Epsilon);
            var what = before is { } b ? TimelineMarks.Changed(b.Body, last.Body) : "first settings";
            var gas = picture.LatestGas is { } g && g.Gas.At > last.At ? "gas since " + Time(g.Gas.At) : "no gas since";
            return (what, $"{gas} · {Time(last.At)}");
        }
    }

    private bool GasIsOld => picture.LatestGas is { } gas && now - gas.Gas.At > picture.Limits.Gas;

    private double? Pair(Index index) => picture.Gases[index].Values[ValueNames.PfRatio].Value;

    private (decimal Value, Instant At)? LatestSpO2()
    {
        var seen = new List<(decimal Value, Instant At)>();
        Add(picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, now, c => c.SpO2Percent is not null), c => c.SpO2Percent);
        Add(picture.Window.Latest<BreathingCheck>(EntryKind.BreathingCheck, now, c => c.SpO2Percent is not null), c => c.SpO2Percent);
        Add(picture.Window.Latest<BloodGas>(EntryKind.BloodGas, now, c => c.SpO2Percent is not null), c => c.SpO2Percent);
        return seen.Count == 0 ? null : seen.MaxBy(s => s.At);

        void Add<T>(Charted<T>? found, Func<T, decimal?> value)
            where T : Entry
        {
            if (found is { } charted)
            {
                seen.Add((value(charted.Body)!.Value, charted.At));
            }
        }
    }

    private string Time(Instant at) => Format.Time(at, now, Zone);
}
