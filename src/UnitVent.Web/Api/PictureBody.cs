using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Store.Reading;

namespace UnitVent.Web.Api;

/// <summary>Everything computed about one patient at one instant, as the interface writes it. Values are unrounded.</summary>
public sealed record PictureBody(
    Guid EpisodeId,
    Instant At,
    VentilationMode? Mode,
    CoursePhase Phase,
    Band Band,
    string Why,
    IReadOnlyDictionary<string, ValueBody> Values,
    AcidBaseBody? AcidBase,
    IReadOnlyList<FlagBody> Flags)
{
    public static PictureBody Of(PatientChart chart)
    {
        var (picture, standing) = (chart.Picture, chart.Standing);
        return new(
            picture.Window.Episode.Id,
            picture.AsOf,
            picture.Settings?.Body.Mode,
            picture.Phase,
            standing.Band,
            standing.Why,
            picture.Values.ToDictionary(v => v.Key, v => ValueBody.Of(v.Value)),
            picture.AcidBase is { } says ? new(says) : null,
            [.. standing.Cards.SelectMany(c => c.Flags).Select(FlagBody.Of)]);
    }
}

/// <summary>How the latest arterial gas reads as acid and base.</summary>
public sealed record AcidBaseBody(string Says);
