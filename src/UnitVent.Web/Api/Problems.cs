using UnitVent.Charting.Results;

namespace UnitVent.Web.Api;

/// <summary>Refusals as problem details (RFC 9457), with every reason at once.</summary>
public static class Problems
{
    /// <summary>The answer to a refused action.</summary>
    public static IResult Of<T>(Result<T> refused) => Of(refused.Refusal!.Value, refused.Errors);

    public static IResult Of(Refusal refusal, IReadOnlyList<FieldError> errors)
    {
        var (status, title) = Meaning(refusal);
        return TypedResults.Problem(
            statusCode: status,
            title: title,
            detail: errors[0].Message,
            extensions: new Dictionary<string, object?> { ["errors"] = errors.Select(e => new { e.Field, e.Code, e.Message }) });
    }

    public static IResult NotHere() =>
        Of(Refusal.NotFound, [new FieldError("", "notFound", "There is no such thing in the units that this token sees.")]);

    private static (int Status, string Title) Meaning(Refusal refusal) => refusal switch
    {
        Refusal.Shape => (StatusCodes.Status400BadRequest, "The request does not have the right shape."),
        Refusal.Value => (StatusCodes.Status422UnprocessableEntity, "A value cannot stand, or a question is open."),
        Refusal.Denied => (StatusCodes.Status403Forbidden, "The role does not allow it."),
        Refusal.NotFound => (StatusCodes.Status404NotFound, "There is no such thing here."),
        Refusal.Conflict => (StatusCodes.Status409Conflict, "The state forbids it."),
        Refusal.Unavailable => (StatusCodes.Status503ServiceUnavailable, "The store did not answer; nothing was written."),
    };
}
