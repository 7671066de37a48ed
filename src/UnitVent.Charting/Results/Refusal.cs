namespace UnitVent.Charting.Results;

/// <summary>Why an action was not carried out. The names say what the caller can do about it.</summary>
public enum Refusal
{
    /// <summary>What was sent does not have the shape of the thing: unknown member, wrong type, unknown choice, missing member.</summary>
    Shape,

    /// <summary>A value is outside what can be, or a question has to be answered first.</summary>
    Value,

    /// <summary>The role does not allow it.</summary>
    Denied,

    /// <summary>There is no such thing, or it belongs to a unit that the caller may not see.</summary>
    NotFound,

    /// <summary>The state forbids it: a bed is taken, an episode has ended, an id was used for something else.</summary>
    Conflict,

    /// <summary>The store did not answer; nothing was written.</summary>
    Unavailable,
}
