using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Bands;

/// <summary>The open flags of one family: the strongest leads, the others stand under it.</summary>
/// <param name="Family">The family.</param>
/// <param name="Flags">The flags, the leading one first; never empty.</param>
public sealed record Card(Family Family, IReadOnlyList<Flag> Flags)
{
    /// <summary>Gets the flag that leads.</summary>
    public Flag Leading => Flags[0];

    /// <summary>Gets the strongest severity.</summary>
    public Severity Severity => Flags[0].Finding.Severity;

    /// <summary>Gets whether every flag of the card's severity is in hand.</summary>
    public bool InHand => Flags.Where(f => f.Finding.Severity == Severity).All(f => f.InHand is not null);
}
