using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Pictures;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>A unit's board as the interface writes it.</summary>
public sealed record BoardBody(Instant AsOf, IReadOnlyList<BoardRowBody> Rows)
{
    public static BoardBody Of(UnitBoard board, Instant now) => new(board.AsOf, [.. board.Rows.Select(r => BoardRowBody.Of(r, now))]);
}

/// <summary>One ventilated patient.</summary>
public sealed record BoardRowBody(
    Guid EpisodeId,
    string Bed,
    Band Band,
    string Why,
    AcknowledgedBody? InHand,
    PatientFacts Patient,
    JsonElement? Settings,
    IReadOnlyDictionary<string, ValueBody> Values,
    IReadOnlyList<FlagBody> Flags,
    IReadOnlyList<string> Badges,
    AgesBody Ages,
    IReadOnlyList<DueBody> Due)
{
    public static BoardRowBody Of(BoardRow row, Instant now)
    {
        var (picture, episode) = (row.Picture, row.Picture.Window.Episode);
        return new(
            episode.Id,
            episode.Bed,
            row.Standing.Band,
            row.Standing.Why,
            AcknowledgedBody.Of(row.Standing.Leading?.Leading.InHand),
            episode.Patient,
            picture.Settings is { } settings ? JsonSerializer.SerializeToElement(settings.Body, ChartJson.Options) : null,
            picture.Values.ToDictionary(v => v.Key, v => ValueBody.Of(v.Value)),
            [.. row.Standing.Cards.SelectMany(c => c.Flags).Select(FlagBody.Of)],
            [.. BadgesOf(picture)],
            AgesBody.Of(picture, now),
            [.. picture.FollowUps.Select(f => new DueBody(f.Id, f.Body.What!, f.Body.DueAt!.Value, f.Body.ForRole))]);
    }

    private static IEnumerable<string> BadgesOf(PatientPicture picture) =>
        (picture.Prone ? ["prone"] : Enumerable.Empty<string>())
            .Concat(picture.Ongoing.Order().Select(e => JsonNamingPolicy.CamelCase.ConvertName(e.ToString())))
            .Concat(picture.Context.Select(c => JsonNamingPolicy.CamelCase.ConvertName(c.Body.Flag!.Value.ToString())));
}

/// <summary>How old what is shown is, in minutes; null for what was never charted.</summary>
public sealed record AgesBody(long? SettingsMin, long? CheckMin, long? GasMin, long? BreathingMin, long? AirwayMin)
{
    public static AgesBody Of(PatientPicture picture, Instant now)
    {
        return new(Since(picture.SettingsConfirmedAt), Since(picture.Check?.At), Since(picture.LatestGas?.Gas.At), Since(picture.Breathing?.At), Since(picture.Airway?.At));

        long? Since(Instant? at) => at is { } then ? (long)(now - then).TotalMinutes : null;
    }
}

/// <summary>Something to be done by a time.</summary>
public sealed record DueBody(Guid Id, string What, Instant DueAt, string? ForRole);
