namespace UnitVent.Web.Charting;

/// <summary>How far a form is.</summary>
public enum SaveState
{
    /// <summary>Somebody types.</summary>
    Typing,

    /// <summary>It is on its way to the store.</summary>
    Saving,

    /// <summary>Something speaks against it, or a question has to be answered.</summary>
    Refused,

    /// <summary>The store did not answer; everything typed is kept.</summary>
    NotSaved,

    /// <summary>It is in the chart.</summary>
    Saved,
}
