using UnitVent.Charting.Results;

namespace UnitVent.Web.Charting;

/// <summary>A question that a value raised, and whether it was answered with yes.</summary>
public sealed class Question(FieldError asked)
{
    public FieldError Asked { get; } = asked;

    public bool Yes { get; set; }
}
