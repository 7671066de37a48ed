using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>One episode with its patient and what is in force.</summary>
public sealed record EpisodeBody(
    Guid Id,
    string Unit,
    string Bed,
    PatientFacts Patient,
    Instant AirwaySecuredAt,
    Instant AdmittedAt,
    string? Reason,
    Instant? EndedAt,
    Outcome? Outcome,
    CoursePhase Phase,
    SettingMethod Method,
    IReadOnlyList<JsonElement> Context,
    JsonElement? Targets)
{
    public static EpisodeBody Of(PatientChart chart)
    {
        var (episode, picture) = (chart.Window.Episode, chart.Picture);
        return new(
            episode.Id,
            chart.Window.Unit.Code,
            episode.Bed,
            episode.Patient,
            episode.AirwaySecuredAt,
            episode.AdmittedAt,
            episode.Reason,
            episode.EndedAt,
            episode.Outcome,
            picture.Phase,
            picture.Method,
            [.. picture.Context.Select(c => JsonSerializer.SerializeToElement(c.Body, ChartJson.Options))],
            picture.Targets is { } targets ? JsonSerializer.SerializeToElement(targets.Body, ChartJson.Options) : null);
    }
}
