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
            extensions: new Dictionary<string, object?> { ["errors"] = errors.Select(e => new Reason(e.Field, e.Code, e.Message)) });
    }

    /// <summary>The answer to a missing, unknown, revoked or expired token.</summary>
    public static IResult Unknown() => TypedResults.Problem(
        statusCode: StatusCodes.Status401Unauthorized,
        title: "A valid bearer token is needed.",
        detail: "The token is missing, unknown, revoked or expired.");

    public static IResult NotHere() => Of(Refusal.NotFound, [new FieldError("", "not-found", "There is no such address.")]);

    public static IResult StoreIsAway() => Of(Refusal.Unavailable, [new FieldError("", "store.unavailable", "The store did not answer.")]);

    public static IResult TooMany() => TypedResults.Problem(
        statusCode: StatusCodes.Status429TooManyRequests,
        title: "Too many requests.",
        detail: "Wait as long as the Retry-After header says.");

    public static IResult Failed(int status, string reference) => TypedResults.Problem(
        statusCode: status,
        title: status == StatusCodes.Status413PayloadTooLarge ? "The body is too long." : "The request could not be carried out.",
        detail: $"Reference {reference}.");

    private static (int Status, string Title) Meaning(Refusal refusal) => refusal switch
    {
        Refusal.Shape => (StatusCodes.Status400BadRequest, "The request does not have the right shape."),
        Refusal.Value => (StatusCodes.Status422UnprocessableEntity, "A value cannot stand, or a question is open."),
        Refusal.Denied => (StatusCodes.Status403Forbidden, "The role does not allow it."),
        Refusal.NotFound => (StatusCodes.Status404NotFound, "There is no such thing here."),
        Refusal.Conflict => (StatusCodes.Status409Conflict, "The state forbids it."),
        Refusal.Unavailable => (StatusCodes.Status503ServiceUnavailable, "The store did not answer; nothing was written."),
    };

    private sealed record Reason(string Field, string Code, string Message);
}
