namespace UnitVent.Charting.Rules;

/// <summary>The numbers and entries behind a finding.</summary>
/// <param name="Badness">How bad it is on the rule's own scale: larger is worse.</param>
/// <param name="Numbers">The numbers by name.</param>
/// <param name="Entries">The entries.</param>
public sealed record Evidence(double Badness, IReadOnlyDictionary<string, double> Numbers, IReadOnlyList<Guid> Entries)
{
    internal static Evidence Of(double badness, IEnumerable<Guid?> entries, params (string Name, double Value)[] numbers) =>
        new(badness, numbers.ToDictionary(n => n.Name, n => n.Value), [.. entries.OfType<Guid>().Distinct()]);
}
