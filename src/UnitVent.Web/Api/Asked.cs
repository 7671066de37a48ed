using NodaTime;
using NodaTime.Text;
using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>Reads what a caller asks for in the query, and keeps everything that has the wrong shape.</summary>
public sealed class Asked(IQueryCollection query)
{
    private readonly List<FieldError> errors = [];

    /// <summary>Everything that could not be read, as an answer; null when all of it could.</summary>
    public IResult? Problem => errors.Count > 0 ? Problems.Of(Refusal.Shape, errors) : null;

    public Instant? Time(string name)
    {
        if (Text(name) is not { } text)
        {
            return null;
        }

        // An unescaped plus sign of an offset arrives as a space.
        var parsed = OffsetDateTimePattern.Rfc3339.Parse(text.Replace(' ', '+'));
        return parsed.Success ? parsed.Value.ToInstant() : Wrong<Instant>(name, "a time with its offset from UTC");
    }

    public int? Whole(string name) =>
        Text(name) is not { } text ? null : int.TryParse(text, System.Globalization.CultureInfo.InvariantCulture, out var number) ? number : Wrong<int>(name, "a whole number");

    /// <summary>A choice by its name in the interface's spelling.</summary>
    public T? Choice<T>(string name)
        where T : struct, Enum =>
        Text(name) is not { } text ? null : Choices.Read<T>(text) ?? Wrong<T>(name, "one of " + string.Join(", ", Choices.Names<T>()));

    public string? Text(string name) => query[name].ToString() is { Length: > 0 } text ? text : null;

    private T? Wrong<T>(string name, string wanted)
        where T : struct
    {
        errors.Add(new(name, "shape.query", $"{name}: {wanted} is needed."));
        return null;
    }
}
