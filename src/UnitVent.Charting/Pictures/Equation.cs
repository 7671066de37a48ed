namespace UnitVent.Charting.Pictures;

/// <summary>An equation in words, for whoever asks how a number was made.</summary>
/// <param name="Id">Its id, as values carry it.</param>
/// <param name="Formula">The formula with its units.</param>
/// <param name="Source">Where it is printed.</param>
public sealed record Equation(string Id, string Formula, string Source);
