using System.Diagnostics.CodeAnalysis;

namespace UnitVent.Charting.Results;

/// <summary>What came of an action: a value, or a refusal with every reason at once. Exceptions are for defects only.</summary>
/// <typeparam name="T">What a successful action answers.</typeparam>
[SuppressMessage("Design", "CA1000", Justification = "The factory reads best on the type whose result it makes.")]
public sealed class Result<T>
{
    private readonly T? value;

    private Result(T? value, Refusal? refusal, IReadOnlyList<FieldError> errors)
    {
        this.value = value;
        Refusal = refusal;
        Errors = errors;
    }

    /// <summary>Gets why it was refused; null when it was carried out.</summary>
    public Refusal? Refusal { get; }

    /// <summary>Gets every reason; empty when it was carried out.</summary>
    public IReadOnlyList<FieldError> Errors { get; }

    /// <summary>Gets whether the action was carried out.</summary>
    public bool Succeeded => Refusal is null;

    /// <summary>Gets the value.</summary>
    /// <exception cref="InvalidOperationException">The action was refused.</exception>
    public T Value => Succeeded ? value! : throw new InvalidOperationException($"Refused: {Errors.Count} reasons, first {Errors[0].Code}.");

    /// <summary>Carried out.</summary>
    public static Result<T> Of(T value) => new(value, null, []);

    /// <summary>Refused, with every reason.</summary>
    /// <exception cref="ArgumentException">No reason was given.</exception>
    public static Result<T> Refused(Refusal refusal, IReadOnlyList<FieldError> errors) =>
        errors.Count > 0 ? new(default, refusal, errors) : throw new ArgumentException("A refusal needs a reason.", nameof(errors));

    /// <summary>Refused for one reason.</summary>
    public static Result<T> Refused(Refusal refusal, string field, string code, string message) =>
        Refused(refusal, [new FieldError(field, code, message)]);

    /// <summary>The same refusal for another kind of result.</summary>
    public Result<TOther> As<TOther>() => Result<TOther>.Refused(Refusal ?? throw new InvalidOperationException("Not refused."), Errors);
}
