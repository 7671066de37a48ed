using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Bands;

/// <summary>Where a patient stands on the board, and the sentence that says why.</summary>
/// <param name="Band">The band.</param>
/// <param name="Why">One sentence, numbers first, with its age.</param>
/// <param name="Since">Since when; null when nothing is raised.</param>
public sealed record Standing(Band Band, string Why, Instant? Since)
{
    /// <summary>Gets the card that leads; null when none is open.</summary>
    public Card? Leading { get; private init; }

    /// <summary>Gets all open cards, the leading one first.</summary>
    public IReadOnlyList<Card> Cards { get; private init; } = [];

    /// <summary>Where the patient stands, from the open flags and the picture.</summary>
    public static Standing Of(IReadOnlyList<Flag> open, PatientPicture picture) => new(Band.NothingRaised, "", null);
}
