namespace UnitVent.Web.Board;

/// <summary>What is said aloud when the board changes: who moved to another band, and nothing else.</summary>
public static class BandMoves
{
    /// <summary>The moves as words; empty when nobody moved, or when there was no board before.</summary>
    public static string Between(IReadOnlyList<PatientRow> before, IReadOnlyList<PatientRow> after)
    {
        var bands = before.ToDictionary(r => r.EpisodeId, r => r.Band);
        return before.Count == 0 ? "" : string.Join(" ", after
            .Where(r => !bands.TryGetValue(r.EpisodeId, out var was) || was != r.Band)
            .Select(r => $"Bed {r.Bed}: {MarkShape.Word(r.Band)}."));
    }
}
