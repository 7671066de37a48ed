namespace UnitVent.Charting.Results;

/// <summary>One reason why something typed cannot stand as it is.</summary>
/// <param name="Field">The member's name as the HTTP interface spells it, for example <c>pCO2</c>.</param>
/// <param name="Code">A stable code. Codes that begin with <c>ask.</c> are questions: repeating the entry with the code confirmed records it.</param>
/// <param name="Message">A sentence for the person who typed: field, value and limit.</param>
public sealed record FieldError(string Field, string Code, string Message)
{
    /// <summary>Gets whether this is a question that a person may answer with yes.</summary>
    public bool IsAsk => Code.StartsWith("ask.", StringComparison.Ordinal);
}
